import { END_MOST_BYTES } from '../checkText.ts';
import { sheetText } from '../sheetText.ts';
import { faulty } from './problem.ts';
import { readBody } from './readBody.ts';
import { pdf } from './reply.ts';
import type { Handler } from './route.ts';

/** The sheet of one end, as PDF. */
export const postSheet: Handler = async (request, query) => {
  const body = await readBody(request, END_MOST_BYTES);
  if (body instanceof Response) return body;
  const sheet = await sheetText(body, { workings: query.workings === 'all' ? 'all' : 'governing' });
  return 'faults' in sheet ? faulty(sheet.faults) : pdf(sheet.pdf, sheet.name);
};
