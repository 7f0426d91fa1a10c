import type { Check } from '../../core/check/report.ts';
import { isMost, size } from './fitSizes.ts';
import { shown } from './shown.ts';
import { stateSaid } from './standing.ts';

/** Given over required; a bound from above carries its sign. The state stands before them for those who listen. */
export const Sizes = ({ check }: { check: Check }) => {
  const { units } = shown.value!.report;
  const given = check.resistance === null ? '–' : size(check.resistance, units);
  const required = check.demand === null ? '–' : size(check.demand, units);
  const most = isMost(check);
  return (
    <span class="rule-sizes">
      <span class="unseen">{` ${stateSaid(check)}: `}</span>
      {given}
      <span aria-hidden="true">{most ? ' / ≤ ' : ' / '}</span>
      <span class="unseen">{most ? ' given, at most ' : ' given, at least '}</span>
      {required}
    </span>
  );
};
