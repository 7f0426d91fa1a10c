import { type Face, type Glyph, viewOf } from './trueType.ts';

/** Several faces cut down to the characters used and put into one file: its glyphs are named by number, so they may come from anywhere. */
export interface CutFaces {
  /** A TrueType file. */
  readonly file: Uint8Array;
  /** Number, from 1, of the character with each code in each face. */
  readonly numbers: ReadonlyMap<Face, Uint16Array>;
  /** Width of glyph 1, 2, 3 …, thousandths of the type size. */
  readonly widths: readonly number[];
  /** Code of the character of glyph 1, 2, 3 … */
  readonly codes: readonly number[];
}

const joined = (parts: readonly Uint8Array[]): Uint8Array => {
  const out = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    out.set(part, at);
    at += part.length;
  }
  return out;
};

/** A table of 16-bit numbers. */
const words = (...values: number[]): Uint8Array => {
  const out = new Uint8Array(2 * values.length);
  const view = viewOf(out);
  values.forEach((value, i) => {
    view.setUint16(2 * i, value & 0xffff);
  });
  return out;
};

const asciiOf = (text: string): Uint8Array => Uint8Array.from(text, (one) => one.charCodeAt(0));

const changed = (table: Uint8Array, at: number, value: number): Uint8Array => {
  const out = table.slice();
  viewOf(out).setUint16(at, value);
  return out;
};

/** A character map of format 4 that holds the blank alone, glyph 1: the pages of a PDF name glyphs, not characters. */
const emptyMap = words(0, 1, 3, 1, 0, 12, 4, 32, 0, 4, 4, 1, 0, 32, 0xffff, 0, 32, 0xffff, -31, 1, 0, 0);

/** Name 6 alone, which the PDF library asks for. */
const namesOf = (name: string): Uint8Array => joined([words(0, 1, 18, 1, 0, 0, 6, name.length, 0), asciiOf(name)]);

const sumOf = (table: Uint8Array): number => {
  const view = viewOf(table);
  let sum = 0;
  for (let i = 0; i < table.length; i += 4) sum = (sum + view.getUint32(i)) >>> 0;
  return sum;
};

/** The sum over the whole file in `head` stays as it was: readers of PDF do not look at it. */
const fileOf = (tables: readonly (readonly [tag: string, table: Uint8Array])[]): Uint8Array => {
  const header = new Uint8Array(12 + 16 * tables.length);
  const view = viewOf(header);
  view.setUint32(0, 0x00010000);
  view.setUint16(4, tables.length);
  let offset = header.length;
  const bodies = tables.map(([tag, table], i) => {
    const at = 12 + 16 * i;
    header.set(asciiOf(tag), at);
    const padded = joined([table, new Uint8Array((4 - (table.length % 4)) % 4)]);
    view.setUint32(at + 4, sumOf(padded));
    view.setUint32(at + 8, offset);
    view.setUint32(at + 12, table.length);
    offset += padded.length;
    return padded;
  });
  return joined([header, ...bodies]);
};

const assembled = (name: string, model: Face, glyphs: readonly Glyph[]): Uint8Array => {
  const bodies = glyphs.map(({ body }) => body);
  const offsets = [0];
  for (const body of bodies) offsets.push(offsets.at(-1)! + body.length);
  return fileOf([
    ['cmap', emptyMap],
    ['glyf', joined(bodies)],
    ['head', changed(model.table('head'), 50, 1)],
    ['hhea', changed(model.table('hhea'), 34, glyphs.length)],
    ['hmtx', words(...glyphs.flatMap(({ advance, leftBearing }) => [advance, leftBearing]))],
    ['loca', words(...offsets.flatMap((offset) => [offset >>> 16, offset]))],
    ['maxp', changed(model.table('maxp'), 4, glyphs.length)],
    ['name', namesOf(name)],
    ['post', model.table('post').slice(0, 32)],
  ]);
};

/** By the code of a character: 1 where it is used. */
export type Used = Uint8Array;

/** `used`: the characters of each face, all of which the face has; the first face must use the blank, which becomes glyph 1. */
export const cutFaces = (name: string, used: ReadonlyMap<Face, Used>): CutFaces => {
  const codes: number[] = [];
  const glyphs: Glyph[] = [];
  const numbers = new Map<Face, Uint16Array>();
  for (const [face, wanted] of used) {
    const own = new Uint16Array(face.codes);
    for (let code = wanted.indexOf(1); code >= 0; code = wanted.indexOf(1, code + 1)) {
      codes.push(code);
      glyphs.push(face.glyph(code));
      own[code] = glyphs.length;
    }
    numbers.set(face, own);
  }
  const [model] = used.keys();
  const none: Glyph = { advance: 0, leftBearing: 0, body: new Uint8Array(0) };
  return {
    file: assembled(name, model!, [none, ...glyphs]),
    numbers,
    widths: glyphs.map(({ advance }) => advance),
    codes,
  };
};
