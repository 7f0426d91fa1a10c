import { checkEnd } from '../../core/check/checkEnd.ts';
import { type Compared, comparedIn } from '../../core/check/proof.ts';
import type { Report } from '../../core/check/report.ts';
import type { PublishedFixture } from './published.ts';

export const reportOf = (end: unknown, working = true): Report => {
  const outcome = checkEnd(end, { working });
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  return outcome.report;
};

/** Every expectation of a fixture beside the program's own number. */
export const compared = (fixture: PublishedFixture): Compared[] => {
  const all = comparedIn(fixture);
  if (all.length !== fixture.expect.length) throw new Error(`${fixture.id} is refused`);
  return all;
};
