import { byKind, isCleat } from '../../end/byKind.ts';
import type { Gate } from '../../end/gates.ts';
import { oneLine } from '../../end/supportGroup.ts';
import { not } from '../../formula/tree.ts';

/** A joint with cleats. */
export const cleats = byKind('a joint with cleats', isCleat);

/** Ways and parts that only one kind of joint has, where another way or part of the same rule stands for the others. */
export const ofCleat: Gate = { when: cleats, reason: 'covered' };
export const notCleat: Gate = { when: not(cleats), reason: 'covered' };
export const notFinPlate: Gate = { when: byKind('no fin plate', (kind) => kind !== 'fin-plate'), reason: 'no-weld' };
/** One line of support bolts has no cross centres. */
export const oneLineOnly: Gate = { when: oneLine, reason: 'single-column' };
