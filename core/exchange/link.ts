import { deflateSync, Inflate, strToU8 } from 'fflate';
import { canonicalJson } from '../end/canonical.ts';
import { type Fault, fault } from '../end/fault.ts';

/** Longest link that is read, characters, and longest text that one may unfold to, bytes. */
export const LINK_MOST_CHARACTERS = 8 * 1024;
export const LINK_MOST_BYTES = 64 * 1024;

const VERSION = '1';
/** Deflate grows at most a thousandfold, so no step can run far past the limit. */
const STEP = 128;

const toBase64Url = (bytes: Uint8Array): string => {
  let binary = '';
  for (const byte of bytes) binary += String.fromCharCode(byte);
  return btoa(binary).replaceAll('+', '-').replaceAll('/', '_').replace(/=+$/, '');
};

const fromBase64Url = (text: string): Uint8Array =>
  Uint8Array.from(atob(text.replaceAll('-', '+').replaceAll('_', '/')), (letter) => letter.charCodeAt(0));

/** An end as one short text, for a link, a QR code or a PDF: version, packed canonical JSON, fingerprint. */
export const encodeLink = (end: unknown, fingerprint: string): string =>
  `${VERSION}.${toBase64Url(deflateSync(strToU8(canonicalJson(end)), { level: 9 }))}.${fingerprint}`;

/** What a link holds: parsed JSON that is still to be read as an end, and the fingerprint it was issued with; or why it cannot be read. */
export type DecodedLink = { readonly input: unknown; readonly fingerprint: string } | { readonly fault: Fault };

const refused = (code: string, given: unknown, limit: unknown): DecodedLink => ({
  fault: fault(code, '', given, limit),
});

/** Unpacks step by step and stops at the limit; undefined where the data are damaged. */
const inflated = (packed: Uint8Array): Uint8Array | 'too-large' | undefined => {
  const text = new Uint8Array(LINK_MOST_BYTES);
  let length = 0;
  let ended = false;
  const inflate = new Inflate((chunk, final) => {
    if (length + chunk.length <= LINK_MOST_BYTES) text.set(chunk, length);
    length += chunk.length;
    ended = final;
  });
  try {
    for (let at = 0; !ended; at += STEP) {
      inflate.push(packed.subarray(at, at + STEP), at + STEP >= packed.length);
      if (length > LINK_MOST_BYTES) return 'too-large';
    }
  } catch {
    return undefined;
  }
  return text.subarray(0, length);
};

/** The value written as JSON in UTF-8; undefined where it is neither. */
const parsed = (bytes: Uint8Array): { input: unknown } | undefined => {
  try {
    return { input: JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes)) };
  } catch {
    return undefined;
  }
};

/** Reads a link. Never throws: what cannot be read comes back as a fault. */
export const decodeLink = (text: string): DecodedLink => {
  if (text.length > LINK_MOST_CHARACTERS) return refused('too-large', text.length, LINK_MOST_CHARACTERS);
  const [version = '', packed = '', fingerprint = '', ...more] = text.trim().split('.');
  if (version !== VERSION) return refused('link-version', version.slice(0, 20), VERSION);
  if (more.length > 0 || packed === '' || !/^[0-9a-f]{8}$/.test(fingerprint)) return refused('link-form', null, null);
  if (!/^[A-Za-z0-9_-]+$/.test(packed) || packed.length % 4 === 1) return refused('link-letters', null, null);
  const bytes = inflated(fromBase64Url(packed));
  if (bytes === undefined) return refused('link-damaged', null, null);
  if (bytes === 'too-large') return refused('too-large', null, LINK_MOST_BYTES);
  const value = parsed(bytes);
  return value ? { ...value, fingerprint } : refused('link-damaged', null, null);
};
