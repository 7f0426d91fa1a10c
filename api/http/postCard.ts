import { END_MOST_BYTES } from '../checkText.ts';
import { cardJson, printCard } from '../makeCard.ts';
import { faulty } from './problem.ts';
import { readBody } from './readBody.ts';
import { json, pdf } from './reply.ts';
import type { Handler } from './route.ts';

/** The shop card of one fitting, as PDF or as the table in it. */
export const postCard: Handler = async (request, query) => {
  const body = await readBody(request, END_MOST_BYTES);
  if (body instanceof Response) return body;
  const found = cardJson(body);
  if ('faults' in found) return faulty(found.faults);
  if (query.as === 'json') return json(found.made.card);
  const { bytes, name } = await printCard(found.made);
  return pdf(bytes, name);
};
