import type { SaidFault } from '../../core/check/report.ts';
import { checkText, END_MOST_BYTES, lineOf } from '../checkText.ts';
import { linesOf } from '../linesOf.ts';
import type { Asked } from './arguments.ts';
import { complain, HOLDS, NOT_UNDERSTOOD, print, statusOf } from './output.ts';
import { printReport } from './printReport.ts';
import { fileSentence, open, readWhole } from './readFile.ts';
import { hanging, harmless } from './wrap.ts';

/** Each fault as its sentence, behind the place that it speaks of. */
export const printFaults = (faults: readonly SaidFault[]): string =>
  faults.flatMap(({ path, text }) => hanging(path ? `${harmless(path)}: ` : '', harmless(text))).join('\n');

const checkOne = async (file: string, flags: ReadonlySet<string>): Promise<number> => {
  const outcome = checkText(await readWhole(file, END_MOST_BYTES), { working: flags.has('working') });
  if (flags.has('json')) await print(lineOf(outcome));
  if ('faults' in outcome) return flags.has('json') ? NOT_UNDERSTOOD : complain(printFaults(outcome.faults));
  if (!flags.has('json')) await print(printReport(outcome.report));
  return statusOf(outcome.report.verdict);
};

const checkLines = async (file: string, working: boolean): Promise<number> => {
  let status = HOLDS;
  for await (const batch of linesOf(open(file), END_MOST_BYTES)) {
    let text = '';
    for (const line of batch) {
      const outcome = checkText(line, { working });
      status = Math.max(status, 'report' in outcome ? statusOf(outcome.report.verdict) : NOT_UNDERSTOOD);
      text += lineOf(outcome);
    }
    await print(text);
  }
  return status;
};

/** Checks the end in a file, or every line of many; the exit status. */
export const checkCommand = async ({ file, flags }: Asked): Promise<number> => {
  const many = flags.has('ndjson');
  const from = file ?? (many ? '-' : undefined);
  if (from === undefined) return complain('check needs a file, or - for standard input.');
  try {
    return await (many ? checkLines(from, flags.has('working')) : checkOne(from, flags));
  } catch (error) {
    return complain(fileSentence(from, error));
  }
};
