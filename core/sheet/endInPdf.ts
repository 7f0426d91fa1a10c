import { canonicalJson } from '../end/canonical.ts';

/** Stands in the document properties before the data. */
const MARKER = 'copewright-end:';
/** No sheet carries more than this, bytes of base64url. */
const MOST = 88_000;

const bytesToBase64Url = (bytes: Uint8Array): string => {
  let text = '';
  for (const byte of bytes) text += String.fromCharCode(byte);
  return btoa(text).replaceAll('+', '-').replaceAll('/', '_').replace(/=+$/, '');
};

/** What a sheet's document properties carry: the end's canonical JSON, in signs that every reader and writer of PDF leaves alone. */
export const endKeywords = (end: unknown): string =>
  MARKER + bytesToBase64Url(new TextEncoder().encode(canonicalJson(end)));

/** The end that a sheet's file carries, as parsed JSON; undefined where there is none that can be read. Any bytes may be given. */
export const endInPdf = (bytes: Uint8Array): unknown => {
  const from = indexOf(bytes, MARKER);
  if (from < 0) return undefined;
  let to = from;
  while (to < bytes.length && to - from <= MOST && isBase64Url(bytes[to]!)) to += 1;
  if (to - from > MOST) return undefined;
  const text = String.fromCharCode(...bytes.subarray(from, to));
  try {
    const binary = atob(text.replaceAll('-', '+').replaceAll('_', '/'));
    const json = new TextDecoder('utf-8', { fatal: true }).decode(Uint8Array.from(binary, (one) => one.charCodeAt(0)));
    return JSON.parse(json);
  } catch {
    return undefined;
  }
};

/** Where the text ends for the first time, or -1. */
const indexOf = (bytes: Uint8Array, text: string): number => {
  const codes = [...text].map((one) => one.charCodeAt(0));
  const first = codes[0]!;
  for (let at = bytes.indexOf(first); at >= 0; at = bytes.indexOf(first, at + 1)) {
    if (codes.every((code, i) => bytes[at + i] === code)) return at + codes.length;
  }
  return -1;
};

const isBase64Url = (code: number): boolean =>
  (code >= 48 && code <= 57) || (code >= 65 && code <= 90) || (code >= 97 && code <= 122) || code === 45 || code === 95;
