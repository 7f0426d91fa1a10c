import { checkEnd } from '../core/check/checkEnd.ts';
import { said } from '../core/check/examine.ts';
import type { Outcome } from '../core/check/report.ts';
import { fault } from '../core/end/fault.ts';
import { readJson } from './readJson.ts';

/** Most bytes of one end. */
export const END_MOST_BYTES = 1024 * 1024;

/** The JSON of one end, within the limit. */
export const read = (bytes: Uint8Array): ReturnType<typeof readJson> =>
  bytes.length > END_MOST_BYTES ? { fault: fault('too-large', '', bytes.length, END_MOST_BYTES) } : readJson(bytes);

/** Checks an end that is still text: one request, one file, or one line of many. */
export const checkText = (bytes: Uint8Array, options: { readonly working: boolean }): Outcome => {
  const json = read(bytes);
  return 'fault' in json ? said([json.fault]) : checkEnd(json.value, options);
};

/** One line of an answer to many ends: the report, or the faults. */
export const lineOf = (outcome: Outcome): string =>
  `${JSON.stringify('report' in outcome ? outcome.report : { faults: outcome.faults })}\n`;
