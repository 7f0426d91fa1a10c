import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { canonicalJson } from '../end/canonical.ts';
import { VERSION } from './version.ts';

/**
 * First 8 hex digits of SHA-256 over the canonical JSON of the end, or of what a card is made from, without `sheet`, the standard's id and edition and the program's
 * version: paper and file belong together when it is the same.
 */
export const fingerprintOf = <Input extends { readonly sheet?: unknown }>(
  input: Input,
  standard: { readonly id: string; readonly edition: string },
): string => {
  const { sheet: _, ...checked } = input;
  const text = `${canonicalJson(checked)}\n${standard.id}\n${standard.edition}\n${VERSION}`;
  return bytesToHex(sha256(utf8ToBytes(text))).slice(0, 8);
};
