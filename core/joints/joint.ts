import type { FitName, PartName, StrengthName } from '../end/checkNames.ts';

/** What is checked on one kind of joint: each way of failing with the part it belongs to, and the rules of fit. */
export interface JointChecks {
  readonly strength: readonly (readonly [StrengthName, PartName])[];
  readonly fit: readonly (readonly [FitName, PartName])[];
}
