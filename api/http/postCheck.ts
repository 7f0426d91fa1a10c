import type { Outcome } from '../../core/check/report.ts';
import { checkText, END_MOST_BYTES, lineOf } from '../checkText.ts';
import { reportJson } from '../json/reportJson.ts';
import { linesOf } from '../linesOf.ts';
import { faulty, problem } from './problem.ts';
import { readBody } from './readBody.ts';
import { lines, writtenJson } from './reply.ts';
import type { Handler } from './route.ts';

/** Most bytes of many ends in one request, and most lines. */
export const LINES_MOST_BYTES = 8 * 1024 * 1024;
export const LINES_MOST = 25_000;

const countLines = (body: Uint8Array): number => {
  let count = 1;
  for (let at = body.indexOf(0x0a); at >= 0 && count <= LINES_MOST + 1; at = body.indexOf(0x0a, at + 1)) count += 1;
  return body.at(-1) === 0x0a ? count - 1 : count;
};

const NEWLINE = Buffer.from('\n');

const lineBytes = (outcome: Outcome): readonly Uint8Array[] =>
  'report' in outcome ? [reportJson(outcome.report), NEWLINE] : [Buffer.from(lineOf(outcome))];

/** One line back for each line of the body, as fast as the caller takes them. */
const answered = (body: Uint8Array, working: boolean): ReadableStream<Uint8Array> => {
  const batches = linesOf([body], END_MOST_BYTES);
  return new ReadableStream<Uint8Array>({
    async pull(controller) {
      const { done, value } = await batches.next();
      if (done) controller.close();
      else controller.enqueue(Buffer.concat(value.flatMap((line) => lineBytes(checkText(line, { working })))));
    },
  });
};

/** Checks one end, or every line of many. */
export const postCheck: Handler = async (request, query, type) => {
  const working = query.working === '1';
  if (type === 'application/x-ndjson') {
    const body = await readBody(request, LINES_MOST_BYTES);
    if (body instanceof Response) return body;
    if (countLines(body) > LINES_MOST) return problem(413, `Send at most ${LINES_MOST} lines in one request.`);
    return lines(answered(body, working));
  }
  const body = await readBody(request, END_MOST_BYTES);
  if (body instanceof Response) return body;
  const outcome = checkText(body, { working });
  return 'report' in outcome ? writtenJson(reportJson(outcome.report)) : faulty(outcome.faults);
};
