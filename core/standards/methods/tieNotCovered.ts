import { noTieForce } from '../../end/gates.ts';
import { flag, T } from '../../end/given.ts';
import { not } from '../../formula/tree.ts';
import type { Way } from '../standard.ts';

const weldedLegOrEndPlate = flag(
  'a welded leg or an end plate',
  (f) => f.n === 0 || (f.legSupport > 0 && f.weldTo === 'support'),
);

/** A tie force through a welded leg of a cleat or through an end plate: no formula here, so that it refers, never passes by silence. */
export const tieNotCovered: Way = {
  of: '',
  symbol: 'T',
  load: 'T',
  demand: T,
  off: [noTieForce, { when: not(weldedLegOrEndPlate), reason: 'covered' }],
  limits: [{ when: weldedLegOrEndPlate, reason: 'tie-not-covered', always: true, noNumber: true }],
};
