import { writeFile } from 'node:fs/promises';
import { END_MOST_BYTES } from '../checkText.ts';
import { type CardChoice, cardOfEnd, printCard } from '../makeCard.ts';
import type { Asked } from './arguments.ts';
import { printFaults } from './checkCommand.ts';
import { complain, HOLDS, print } from './output.ts';
import { fileSentence, readWhole } from './readFile.ts';

/** `2-8`, `2,3,4` or `3` as counts; undefined for anything else. */
const countsOf = (text: string): number[] | undefined => {
  const [, from, to] = /^(\d{1,2})-(\d{1,2})$/.exec(text.trim()) ?? [];
  if (from !== undefined && Number(from) <= Number(to)) {
    return Array.from({ length: Number(to) - Number(from) + 1 }, (_, i) => Number(from) + i);
  }
  const parts = text.split(',').map((one) => one.trim());
  return parts.every((one) => /^\d{1,2}$/.test(one)) ? parts.map(Number) : undefined;
};

const choiceOf = ({ family, sections, rows }: Asked['values']): CardChoice | undefined => {
  const counts = rows === undefined ? undefined : countsOf(rows);
  if (rows !== undefined && !counts) return undefined;
  const names = sections
    ?.split(',')
    .map((one) => one.trim())
    .filter(Boolean);
  return {
    ...(family !== undefined && { family }),
    ...(names && { sections: names }),
    ...(counts && { rows: counts }),
  };
};

/** Makes the shop card of the end in a file; 0 where there is one. */
export const cardCommand = async ({ file, flags, values }: Asked): Promise<number> => {
  const { output } = values;
  const json = flags.has('json');
  if (file === undefined) return complain('card needs a file with an end as template, or - for standard input.');
  if (output === undefined && !json)
    return complain('card needs -o and the name of the PDF to write, or --json for the table.');
  if (output === '-' && json) return complain('One of the two can go to standard output: the table or the PDF.');
  const choice = choiceOf(values);
  if (!choice) return complain('--rows may be as 2-8, or as 2,3,5.');
  let at = file;
  try {
    const found = cardOfEnd(await readWhole(file, END_MOST_BYTES), choice);
    if ('faults' in found) return complain(printFaults(found.faults));
    if (json) await print(`${JSON.stringify(found.made.card)}\n`);
    if (output === undefined) return HOLDS;
    at = output;
    const { bytes } = await printCard(found.made);
    await (output === '-' ? print(bytes) : writeFile(output, bytes));
    return HOLDS;
  } catch (error) {
    return complain(fileSentence(at, error));
  }
};
