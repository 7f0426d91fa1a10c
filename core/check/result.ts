import { reasonCode } from './reasons.ts';
import type { State } from './report.ts';
import { DEMAND, FAILS_AT, REASON, RESISTANCE, STATE, states, UTILISATION, WAY, WIDTH } from './row.ts';

/** The numbers of one check: N and mm; demand at V, capacity as the reaction at which it is used up. */
export interface Result {
  readonly state: State;
  /** Code of the reason, where it refers or does not apply. */
  readonly reason: string;
  /** Which of the rule's ways or parts the numbers speak of; -1 where none applies. */
  readonly way: number;
  readonly demand: number;
  readonly resistance: number;
  /** NaN for checks that do not depend on V. Inside core only: reports turn what is not finite into null. */
  readonly reactionAtFailure: number;
  readonly utilisation: number;
}

/** The result of one check out of the rows of all. */
export const resultAt = (rows: readonly number[], check: number): Result => {
  const at = check * WIDTH;
  return {
    state: states[rows[at + STATE]!]!,
    reason: reasonCode(rows[at + REASON]!),
    way: rows[at + WAY]!,
    demand: rows[at + DEMAND]!,
    resistance: rows[at + RESISTANCE]!,
    reactionAtFailure: rows[at + FAILS_AT]!,
    utilisation: rows[at + UTILISATION]!,
  };
};
