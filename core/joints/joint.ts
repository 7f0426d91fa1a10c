import type { FitName, PartName, StrengthName } from '../end/checkNames.ts';
import type { Gate } from '../end/gates.ts';

/** What is checked on one kind of joint: each way of failing with the part it belongs to, and the rules of fit; off under the gate named. */
export interface JointChecks {
  readonly strength: readonly (readonly [StrengthName, PartName, Gate?])[];
  readonly fit: readonly (readonly [FitName, PartName, Gate?])[];
}
