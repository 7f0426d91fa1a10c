import { byKind } from '../../end/byKind.ts';
import { tp } from '../../end/given.ts';
import { pick, times } from '../../formula/tree.ts';

/** A pair of angles: the web's bolts in two planes, two plies beside it. */
export const pair = byKind('', (kind) => kind === 'double-cleat', 'a pair of angles');

/** Thickness of what stands beside the web: plate, one angle, or both, mm. */
export const plies = pick([[pair, times(2, tp)]], tp);
