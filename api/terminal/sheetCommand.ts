import { writeFile } from 'node:fs/promises';
import { END_MOST_BYTES } from '../checkText.ts';
import { sheetText } from '../sheetText.ts';
import type { Asked } from './arguments.ts';
import { printFaults } from './checkCommand.ts';
import { complain, print, statusOf } from './output.ts';
import { fileSentence, readWhole } from './readFile.ts';

/** Writes the sheet of the end in a file; the exit status is that of its check. */
export const sheetCommand = async ({ file, values }: Asked): Promise<number> => {
  const { output, workings = 'governing' } = values;
  if (file === undefined) return complain('sheet needs a file, or - for standard input.');
  if (output === undefined)
    return complain('sheet needs -o and the name of the PDF to write, or - for standard output.');
  if (workings !== 'governing' && workings !== 'all') return complain('--workings may be governing or all.');
  let at = file;
  try {
    const sheet = await sheetText(await readWhole(file, END_MOST_BYTES), { workings });
    if ('faults' in sheet) return complain(printFaults(sheet.faults));
    at = output;
    await (output === '-' ? print(sheet.pdf) : writeFile(output, sheet.pdf));
    return statusOf(sheet.report.verdict);
  } catch (error) {
    return complain(fileSentence(at, error));
  }
};
