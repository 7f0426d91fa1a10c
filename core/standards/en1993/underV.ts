import type { Gate, Limit } from '../../end/gates.ts';
import { V } from '../../end/given.ts';
import type { Tree } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { Way } from '../standard.ts';

/** A way that V alone uses up; resistance N. */
export const underV = (
  of: string,
  resistance: Tree<Force>,
  off: readonly Gate[] = [],
  limits: readonly Limit[] = [],
): Way => ({ of, symbol: 'V', load: 'V', demand: V, resistance, off, limits });
