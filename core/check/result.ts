import type { CheckName } from '../end/checkNames.ts';
import type { State } from './report.ts';

/** The numbers of one check: N and mm; demand at V, capacity as the reaction at which it is used up. */
export interface Result {
  readonly id: CheckName;
  state: State;
  /** Code of the reason, where it refers or does not apply. */
  reason: string;
  /** Which of the rule's ways or parts the numbers speak of; -1 where none applies. */
  way: number;
  demand: number;
  resistance: number;
  /** NaN for checks that do not depend on V. Inside core only: reports turn what is not finite into null. */
  reactionAtFailure: number;
  utilisation: number;
}

/** How bad a state is: the worst of several parts stands for all. */
export const severity: Readonly<Record<State, number>> = {
  fails: 4,
  refer: 3,
  holds: 2,
  information: 1,
  notApplicable: 0,
};

/** A result that nothing has been found out about. */
export const blank = (id: CheckName): Result => ({
  id,
  state: 'notApplicable',
  reason: '',
  way: -1,
  demand: Number.NaN,
  resistance: Number.NaN,
  reactionAtFailure: Number.NaN,
  utilisation: Number.NaN,
});

/** The gate of that number; undefined where it is none of them. (To read a list beyond its ends costs as much as a whole check.) */
export const gateAt = <G>(gates: readonly G[], at: number): G | undefined =>
  at >= 0 && at < gates.length ? gates[at] : undefined;
