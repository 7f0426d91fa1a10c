import { noSupportBolts, noWebHoles } from '../../end/gates.ts';
import type { StrengthRule } from '../standard.ts';
import { plateBearing } from './bolts.ts';
import { clause } from './clauses.ts';
import type { Method } from './method.ts';
import { supportSide } from './supportBolts.ts';

const source = clause('J3.11');

/** The bolts of either leg with every bolt at its weakest; the web leg as a plate, its last row torn down, the other leg torn up. */
export const cleatBearing = (method: Method): StrengthRule => ({
  source,
  ways: [
    ...plateBearing(method).ways.map((one) => ({ ...one, of: 'web leg', off: [noWebHoles] })),
    { ...supportSide(method), off: [noSupportBolts] },
  ],
});

/** The bolts of an end plate with every bolt at its weakest, two lines. */
export const endplateBearing = (method: Method): StrengthRule => ({
  source,
  ways: [{ ...supportSide(method), of: '' }],
});
