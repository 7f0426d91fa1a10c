import type { Check, Numbers } from '../../core/check/report.ts';
import { isFooting, type Rungs, rungsOf } from '../ladder/rungs.ts';
import { secondChecks } from './second.ts';

/** The reaction at which a rung stands: the first standard's, else the second's; without one above all others. */
const heightOf = (first: Check, second: Check | undefined): number => {
  const own = first.state === 'notApplicable' ? second : first;
  return own?.reactionAtFailure ?? Number.POSITIVE_INFINITY;
};

/**
 * The checks of the first report as the ladder groups them, with those that only the second standard makes in their places: they have no
 * number of the first, but its reason.
 */
export const pairedRungs = (report: Numbers): Rungs => {
  const own = rungsOf(report);
  const second = new Map(secondChecks().map((one) => [one.id, one]));
  const added = own.notApplicable.filter(({ id }) => second.has(id));
  const of = (test: (by: Check) => boolean): Check[] => added.filter(({ id }) => test(second.get(id)!));
  const measured = (by: Check): boolean => typeof by.reactionAtFailure === 'number' || by.utilisation !== null;
  const height = (check: Check): number => heightOf(check, second.get(check.id));
  const byReaction = (by: Check): boolean => !isFooting(by) && by.reactionAtFailure !== undefined && measured(by);
  return {
    rungs: [...of(byReaction), ...own.rungs].sort((a, b) => (height(a) === height(b) ? 0 : height(b) - height(a))),
    alone: [...own.alone, ...of((by) => !isFooting(by) && by.reactionAtFailure === undefined && measured(by))],
    unmeasured: [...own.unmeasured, ...of((by) => !isFooting(by) && !measured(by))],
    footing: [...own.footing, ...of(isFooting)],
    notApplicable: own.notApplicable.filter((one) => !added.includes(one)),
  };
};
