/** A TrueType face with simple glyphs only, opened for measuring and for cutting out the characters that a document uses. */
export interface Face {
  readonly name: string;
  has(character: string): boolean;
  /** Width of a line, in thousandths of the type size. */
  width(text: string): number;
  /** The face with these characters alone, as a TrueType file. */
  cutOut(characters: Iterable<string>): Uint8Array;
}

type Tables = ReadonlyMap<string, Uint8Array>;

const viewOf = (bytes: Uint8Array): DataView => new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);

const tablesOf = (file: Uint8Array): Tables => {
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

/** Codes in order map to glyphs 1, 2, 3 …: each run of neighbours is a segment. */
const cmapOf = (codes: readonly number[]): Uint8Array => {
  const runs: { start: number; end: number; glyph: number }[] = [];
  codes.forEach((code, i) => {
    const last = runs.at(-1);
    if (last && last.end + 1 === code) last.end = code;
    else runs.push({ start: code, end: code, glyph: i + 1 });
  });
  runs.push({ start: 0xffff, end: 0xffff, glyph: 0 });
  const half = 2 ** Math.floor(Math.log2(runs.length));
  const body = words(
    4,
    16 + 8 * runs.length,
    0,
    2 * runs.length,
    2 * half,
    Math.log2(half),
    2 * (runs.length - half),
    ...runs.map((run) => run.end),
    0,
    ...runs.map((run) => run.start),
    ...runs.map((run) => run.glyph - run.start),
    ...runs.map(() => 0),
  );
  return joined([words(0, 1, 3, 1, 0, 12), body]);
};

/** Readers of PDF check no sums, so those of the tables stay zero. */
const fileOf = (tables: Tables): Uint8Array => {
  const entries = [...tables].sort(([a], [b]) => (a < b ? -1 : 1));
  const header = new Uint8Array(12 + 16 * entries.length);
  const view = viewOf(header);
  view.setUint32(0, 0x00010000);
  view.setUint16(4, entries.length);
  let offset = header.length;
  const bodies = entries.map(([tag, table], i) => {
    const at = 12 + 16 * i;
    header.set(asciiOf(tag), at);
    view.setUint32(at + 8, offset);
    view.setUint32(at + 12, table.length);
    const padded = joined([table, new Uint8Array((4 - (table.length % 4)) % 4)]);
    offset += padded.length;
    return padded;
  });
  return joined([header, ...bodies]);
};

/** Opens a face; `file` must hold horizontal metrics for every glyph and a map of format 4, as the project's own faces do. */
export const openFace = (name: string, file: Uint8Array): Face => {
  const tables = tablesOf(file);
  const table = (tag: string): Uint8Array => tables.get(tag)!;
  const glyphs = glyphsOf(table('cmap'));
  const hmtx = viewOf(table('hmtx'));
  const loca = viewOf(table('loca'));
  const long = viewOf(table('head')).getInt16(50) === 1;
  const metrics = viewOf(table('hhea')).getUint16(34);
  const place = (glyph: number): number => (long ? loca.getUint32(4 * glyph) : 2 * loca.getUint16(2 * glyph));
  const glyphOf = (code: number): number => glyphs.get(code) ?? 0;
  const advance = (glyph: number): number => hmtx.getUint16(4 * Math.min(glyph, metrics - 1));

  const cutOut = (characters: Iterable<string>): Uint8Array => {
    const wanted = new Set([...characters].map((one) => one.codePointAt(0)!).filter((code) => glyphs.has(code)));
    const codes = [...wanted].sort((a, b) => a - b);
    const kept = [0, ...codes.map(glyphOf)];
    const bodies = kept.map((glyph) => table('glyf').subarray(place(glyph), place(glyph + 1)));
    const offsets = bodies.reduce<number[]>((all, body) => [...all, all.at(-1)! + body.length], [0]);
    return fileOf(
      new Map([
        ['cmap', cmapOf(codes)],
        ['glyf', joined(bodies)],
        ['head', changed(table('head'), 50, 1)],
        ['hhea', changed(table('hhea'), 34, kept.length)],
        ['hmtx', words(...kept.flatMap((glyph) => [advance(glyph), hmtx.getInt16(4 * glyph + 2)]))],
        ['loca', words(...offsets.flatMap((offset) => [offset >>> 16, offset]))],
        ['maxp', changed(table('maxp'), 4, kept.length)],
        ['name', joined([words(0, 1, 18, 1, 0, 0, 6, name.length, 0), asciiOf(name)])],
        ['post', table('post').slice(0, 32)],
      ]),
    );
  };

  return {
    name,
    has: (character) => glyphs.has(character.codePointAt(0)!),
    width: (text) => {
      let sum = 0;
      for (let i = 0; i < text.length; i += 1) sum += advance(glyphOf(text.charCodeAt(i)));
      return sum;
    },
    cutOut,
  };
};
