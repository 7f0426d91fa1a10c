import { said } from '../../core/check/examineNumbers.ts';
import { fault } from '../../core/end/fault.ts';
import { readEnd } from '../../core/end/readEnd.ts';
import type { End } from '../../core/end/schema.ts';
import { commonwealth } from '../../core/words/commonwealth.ts';
import { faultSentences } from '../../core/words/faults.ts';
import { faultText } from '../../core/words/words.ts';

/** No end is longer than this, bytes; a PDF is larger, for its faces. */
export const MOST_JSON = 64 * 1024;
export const MOST_PDF = 4 * 1024 * 1024;

/** An end that was opened, or why it could not be, in words. */
export type Opened = { readonly end: End } | { readonly refused: readonly string[] };

const refusal = (code: string, given: unknown, limit: unknown): Opened => ({
  refused: [faultText(commonwealth, faultSentences, fault(code, '', given, limit))],
});

/** Reads an end from parsed JSON. */
export const openedFrom = (input: unknown): Opened => {
  if (typeof input !== 'object' || input === null || Array.isArray(input)) return refusal('not-an-end', null, null);
  const read = readEnd(input);
  return 'end' in read ? read : { refused: said(read.faults).faults.map(({ text }) => text) };
};

/** Reads an end from the text of a file. */
export const openedText = (text: string): Opened => {
  try {
    return openedFrom(JSON.parse(text));
  } catch {
    return refusal('not-json', `${text.trim().slice(0, 30)}…`, null);
  }
};

const isPdf = (bytes: Uint8Array): boolean => String.fromCharCode(...bytes.subarray(0, 5)) === '%PDF-';

/** Reads an end from a file: its JSON, or a sheet that carries it. Never throws. */
export const openedFile = async (bytes: Uint8Array): Promise<Opened> => {
  if (isPdf(bytes)) {
    if (bytes.length > MOST_PDF) return refusal('too-large', bytes.length, MOST_PDF);
    const { endInPdf } = await import('../../core/sheet/endInPdf.ts');
    return openedFrom(endInPdf(bytes));
  }
  if (bytes.length > MOST_JSON) return refusal('too-large', bytes.length, MOST_JSON);
  return openedText(new TextDecoder().decode(bytes));
};

/** Reads an end from the part of a link behind its `#`. */
export const openedLink = async (text: string): Promise<Opened> => {
  const { decodeLink } = await import('../../core/exchange/link.ts');
  const found = decodeLink(text);
  return 'fault' in found
    ? { refused: [faultText(commonwealth, faultSentences, found.fault)] }
    : openedFrom(found.input);
};
