import type { Report } from '../../core/check/report.ts';
import type { Numbers } from '../../core/sheet/numbers.ts';
import { sheetWords as say } from '../../core/sheet/sheetWords.ts';
import { verdictSentence } from '../../core/sheet/verdictSentence.ts';

/** The verdict's word, the ratio of what governs, and the sentence. */
export const verdictLine = (report: Report, numbers: Numbers): readonly [lead: string, sentence: string] => {
  const governing = report.checks.find(({ id }) => id === report.governing);
  const stated = report.verdict !== 'refer' && governing?.utilisation != null;
  const number = stated ? ` ${numbers.ratio(governing.utilisation)}` : '';
  return [`${say.verdict[report.verdict]}${number}  `, verdictSentence(report, numbers)];
};
