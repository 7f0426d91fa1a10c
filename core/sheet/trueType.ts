/** A TrueType face with simple glyphs only, opened for measuring and for taking glyphs out. */
export interface Face {
  readonly name: string;
  /** All characters have codes below this. */
  readonly codes: number;
  has(character: string): boolean;
  /** True where the face has every character of the text. */
  covers(text: string): boolean;
  /** Width of a line, in thousandths of the type size; characters that the face lacks count as the empty square that stands for them. */
  width(text: string): number;
  /** Glyph of the character with this code. */
  glyph(code: number): Glyph;
  /** Table of the file, such as `head`. */
  table(tag: string): Uint8Array;
}

export interface Glyph {
  /** Thousandths of the type size. */
  readonly advance: number;
  readonly leftBearing: number;
  /** Entry of the glyf table. */
  readonly body: Uint8Array;
}

/** Stands for characters that a face does not have. */
export const UNKNOWN = '□';

/** In place of the advance of a character that a face does not have. */
const NONE = 0xffff;

export const viewOf = (bytes: Uint8Array): DataView => new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);

const tablesOf = (file: Uint8Array): ReadonlyMap<string, Uint8Array> => {
  const view = viewOf(file);
  const tables = new Map<string, Uint8Array>();
  for (let i = 0; i < view.getUint16(4); i += 1) {
    const at = 12 + 16 * i;
    const offset = view.getUint32(at + 8);
    const tag = String.fromCharCode(...file.subarray(at, at + 4));
    tables.set(tag, file.subarray(offset, offset + view.getUint32(at + 12)));
  }
  return tables;
};

/** Glyph of each character, from a map of format 4. */
const glyphsOf = (cmap: Uint8Array): Map<number, number> => {
  const view = viewOf(cmap);
  const glyphs = new Map<number, number>();
  const at = view.getUint32(8);
  const count = view.getUint16(at + 6) / 2;
  for (let s = 0; s < count; s += 1) {
    const end = view.getUint16(at + 14 + 2 * s);
    const start = view.getUint16(at + 16 + 2 * count + 2 * s);
    const delta = view.getInt16(at + 16 + 4 * count + 2 * s);
    const rangeAt = at + 16 + 6 * count + 2 * s;
    const range = view.getUint16(rangeAt);
    for (let code = start; code <= end && code < 0xffff; code += 1) {
      const found = range === 0 ? code : view.getUint16(rangeAt + range + 2 * (code - start));
      if (found !== 0) glyphs.set(code, (found + delta) & 0xffff);
    }
  }
  return glyphs;
};

/** Opens a face; `file` must have a map of format 4 and 1000 units to the em, as the project's own faces do. */
export const openFace = (name: string, file: Uint8Array): Face => {
  const tables = tablesOf(file);
  const table = (tag: string): Uint8Array => tables.get(tag)!;
  const glyphs = glyphsOf(table('cmap'));
  const hmtx = viewOf(table('hmtx'));
  const loca = viewOf(table('loca'));
  const long = viewOf(table('head')).getInt16(50) === 1;
  const metrics = viewOf(table('hhea')).getUint16(34);
  const place = (glyph: number): number => (long ? loca.getUint32(4 * glyph) : 2 * loca.getUint16(2 * glyph));
  const advance = (glyph: number): number => hmtx.getUint16(4 * Math.min(glyph, metrics - 1));
  const bearing = (glyph: number): number =>
    glyph < metrics ? hmtx.getInt16(4 * glyph + 2) : hmtx.getInt16(4 * metrics + 2 * (glyph - metrics));
  const advances = new Uint16Array(Math.max(...glyphs.keys()) + 1).fill(NONE);
  for (const [code, glyph] of glyphs) advances[code] = advance(glyph);
  const unknown = glyphs.has(UNKNOWN.charCodeAt(0)) ? advances[UNKNOWN.charCodeAt(0)]! : 0;
  const widthOf = (code: number): number => {
    const found = code < advances.length ? advances[code]! : NONE;
    return found === NONE ? unknown : found;
  };
  return {
    name,
    codes: advances.length,
    table,
    has: (character) => glyphs.has(character.codePointAt(0)!),
    covers: (text) => {
      for (let i = 0; i < text.length; i += 1) if (!(advances[text.charCodeAt(i)]! < NONE)) return false;
      return true;
    },
    width: (text) => {
      let sum = 0;
      for (let i = 0; i < text.length; i += 1) sum += widthOf(text.charCodeAt(i));
      return sum;
    },
    glyph: (code) => {
      const glyph = glyphs.get(code) ?? 0;
      return {
        advance: advance(glyph),
        leftBearing: bearing(glyph),
        body: table('glyf').subarray(place(glyph), place(glyph + 1)),
      };
    },
  };
};
