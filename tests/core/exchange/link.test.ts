import fc from 'fast-check';
import { deflateSync } from 'fflate';
import { describe, expect, test } from 'vitest';
import { exampleEnd } from '../../../api/exampleEnd.ts';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { canonicalJson } from '../../../core/end/canonical.ts';
import { decodeLink, encodeLink, LINK_MOST_BYTES, LINK_MOST_CHARACTERS } from '../../../core/exchange/link.ts';

const outcome = checkEnd(exampleEnd);
const fingerprint = 'report' in outcome ? outcome.report.fingerprint : '';
const link = encodeLink(exampleEnd, fingerprint);

const packed = (text: string | Uint8Array): string =>
  Buffer.from(deflateSync(typeof text === 'string' ? Buffer.from(text) : text, { level: 9 })).toString('base64url');
const codeOf = (text: string): string => {
  const read = decodeLink(text);
  return 'fault' in read ? read.fault.code : 'read';
};

describe('a link', () => {
  test('gives back the end that it was made from, with its fingerprint', () => {
    expect(decodeLink(link)).toEqual({ input: JSON.parse(canonicalJson(exampleEnd)), fingerprint });
    expect(checkEnd((decodeLink(link) as { input: unknown }).input)).toEqual(outcome);
  });

  test('is the same for the same end, whatever the order of its fields', () => {
    const turned = Object.fromEntries(Object.entries(exampleEnd).reverse());
    expect(encodeLink(turned, fingerprint)).toBe(link);
  });

  test('is made of characters that need no escape in an address', () => {
    expect(link).toMatch(/^1\.[A-Za-z0-9_-]+\.[0-9a-f]{8}$/);
  });

  test('fits a QR code of version 20 at level M, 666 bytes (ISO/IEC 18004)', () => {
    expect(link.length).toBeLessThanOrEqual(666);
  });

  test('carries letters beyond ASCII, and is read with blanks around it', () => {
    const end = { ...exampleEnd, mark: 'Träger ⌀20 — 梁' };
    expect(decodeLink(` ${encodeLink(end, fingerprint)}\n`)).toMatchObject({ input: { mark: end.mark } });
  });

  test('gives back any JSON value', () => {
    fc.assert(
      fc.property(fc.json(), (text) => {
        const value = JSON.parse(canonicalJson(JSON.parse(text)));
        expect(decodeLink(encodeLink(value, '0123abcd'))).toEqual({ input: value, fingerprint: '0123abcd' });
      }),
    );
  });
});

describe('a link that cannot be read is named by its fault', () => {
  const cases: readonly (readonly [name: string, text: string, code: string])[] = [
    ['nothing', '', 'link-version'],
    ['another version', link.replace(/^1/, '2'), 'link-version'],
    ['no fingerprint', link.slice(0, link.lastIndexOf('.')), 'link-form'],
    ['a torn fingerprint', link.slice(0, -1), 'link-form'],
    ['no data', `1..${fingerprint}`, 'link-form'],
    ['a fourth part', `${link}.x`, 'link-form'],
    ['letters outside the alphabet', `1.ab+/.${fingerprint}`, 'link-letters'],
    ['a length that base64 cannot have', `1.abcde.${fingerprint}`, 'link-letters'],
    ['data cut short', `1.${link.split('.')[1]?.slice(0, 100)}.${fingerprint}`, 'link-damaged'],
    ['text that is no JSON', `1.${packed('{"mark":')}.${fingerprint}`, 'link-damaged'],
    ['bytes that are no UTF-8', `1.${packed(new Uint8Array([0x22, 0xff, 0x22]))}.${fingerprint}`, 'link-damaged'],
    ['a link that is too long', `1.${'A'.repeat(LINK_MOST_CHARACTERS)}.${fingerprint}`, 'too-large'],
    ['text that unfolds past the limit', `1.${packed(`"${' '.repeat(LINK_MOST_BYTES)}"`)}.${fingerprint}`, 'too-large'],
  ];
  test.each(cases)('%s', (_, text, code) => {
    expect(codeOf(text)).toBe(code);
  });

  test('text of exactly the limit is read', () => {
    expect(codeOf(`1.${packed(`"${' '.repeat(LINK_MOST_BYTES - 2)}"`)}.${fingerprint}`)).toBe('read');
  });

  test('a link that would unfold a thousandfold stops at the limit', () => {
    const bomb = `1.${packed(new Uint8Array(5_900_000))}.${fingerprint}`;
    expect(bomb.length).toBeLessThanOrEqual(LINK_MOST_CHARACTERS);
    expect(codeOf(bomb)).toBe('too-large');
  });

  test('nesting as deep as the limit allows is read without a crash', () => {
    const depth = LINK_MOST_BYTES / 2;
    expect(codeOf(`1.${packed('['.repeat(depth) + ']'.repeat(depth))}.${fingerprint}`)).toBe('read');
  });

  test('no text whatever makes it throw', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary' }), (text) => void decodeLink(text)));
    const body = fc.string({ unit: fc.constantFrom(...'ABCXYZabcxyz0189-_') });
    fc.assert(
      fc.property(body, (text) => void decodeLink(`1.${text}.${fingerprint}`)),
      { numRuns: 2000 },
    );
    fc.assert(fc.property(fc.uint8Array(), (bytes) => void codeOf(`1.${packed(bytes)}.${fingerprint}`)));
  });

  test('no change of one character makes it throw', () => {
    for (let at = 0; at < link.length; at += 1) {
      for (const letter of 'A_z9.') {
        const read = decodeLink(link.slice(0, at) + letter + link.slice(at + 1));
        expect('fault' in read || 'input' in read).toBe(true);
      }
    }
  });
});
