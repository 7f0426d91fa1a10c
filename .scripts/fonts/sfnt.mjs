/** Reading and writing of the container of a TrueType font: tables, character map, names. */

const view = (buffer) => new DataView(buffer.buffer, buffer.byteOffset, buffer.byteLength);

/** Tables of a font by tag. */
export const readTables = (font) => {
  const v = view(font);
  const tables = new Map();
  for (let i = 0; i < v.getUint16(4); i++) {
    const at = 12 + 16 * i;
    const offset = v.getUint32(at + 8);
    tables.set(font.toString('latin1', at, at + 4), font.subarray(offset, offset + v.getUint32(at + 12)));
  }
  return tables;
};

const checksum = (table) => {
  let sum = 0;
  for (let i = 0; i < table.length; i += 4) sum = (sum + table.readUInt32BE(i)) >>> 0;
  return sum;
};

const padded = (table) => Buffer.concat([table, Buffer.alloc((4 - (table.length % 4)) % 4)]);

/** A font file from its tables; the whole file's checksum goes into `head`. */
export const writeTables = (tables) => {
  const tags = [...tables.keys()].sort();
  const entry = 2 ** Math.floor(Math.log2(tags.length));
  const header = Buffer.alloc(12 + 16 * tags.length);
  header.writeUInt32BE(0x00010000, 0);
  header.writeUInt16BE(tags.length, 4);
  header.writeUInt16BE(entry * 16, 6);
  header.writeUInt16BE(Math.log2(entry), 8);
  header.writeUInt16BE((tags.length - entry) * 16, 10);
  tables.get('head').writeUInt32BE(0, 8);
  let offset = header.length;
  const bodies = tags.map((tag, i) => {
    const body = padded(tables.get(tag));
    const at = 12 + 16 * i;
    header.write(tag, at, 'latin1');
    header.writeUInt32BE(checksum(body), at + 4);
    header.writeUInt32BE(offset, at + 8);
    header.writeUInt32BE(tables.get(tag).length, at + 12);
    offset += body.length;
    return body;
  });
  const file = Buffer.concat([header, ...bodies]);
  const head = header.readUInt32BE(12 + 16 * tags.indexOf('head') + 8);
  file.writeUInt32BE((0xb1b0afba - checksum(file)) >>> 0, head + 8);
  return file;
};

/** Glyph of each character, from the map of format 4. */
export const readCharacterMap = (table) => {
  const v = view(table);
  const map = new Map();
  for (let i = 0; i < v.getUint16(2); i++) {
    const at = v.getUint32(4 + 8 * i + 4);
    if (v.getUint16(at) !== 4) continue;
    const count = v.getUint16(at + 6) / 2;
    for (let s = 0; s < count; s++) {
      const end = v.getUint16(at + 14 + 2 * s);
      const start = v.getUint16(at + 16 + 2 * count + 2 * s);
      const delta = v.getInt16(at + 16 + 4 * count + 2 * s);
      const rangeAt = at + 16 + 6 * count + 2 * s;
      const range = v.getUint16(rangeAt);
      for (let code = start; code <= end && code < 0xffff; code++) {
        const found = range === 0 ? code : v.getUint16(rangeAt + range + 2 * (code - start));
        if (found !== 0) map.set(code, (found + delta) & 0xffff);
      }
    }
  }
  return map;
};

/** Runs of characters whose glyphs follow one another. */
const runsOf = (map) => {
  const runs = [];
  for (const code of [...map.keys()].sort((a, b) => a - b)) {
    const last = runs.at(-1);
    if (last && code === last.end + 1 && map.get(code) - code === last.delta) last.end = code;
    else runs.push({ start: code, end: code, delta: map.get(code) - code });
  }
  runs.push({ start: 0xffff, end: 0xffff, delta: 1 });
  return runs;
};

/** A character map of format 4 for the Unicode and Windows platforms. */
export const writeCharacterMap = (map) => {
  const runs = runsOf(map);
  const n = runs.length;
  const half = 2 ** Math.floor(Math.log2(n));
  const body = Buffer.alloc(16 + 8 * n);
  [4, body.length, 0, 2 * n, 2 * half, Math.log2(half), 2 * (n - half)].forEach((x, i) => {
    body.writeUInt16BE(x, 2 * i);
  });
  runs.forEach(({ start, end, delta }, i) => {
    body.writeUInt16BE(end, 14 + 2 * i);
    body.writeUInt16BE(start, 16 + 2 * n + 2 * i);
    body.writeUInt16BE(delta & 0xffff, 16 + 4 * n + 2 * i);
  });
  const header = Buffer.alloc(20);
  header.writeUInt16BE(2, 2);
  header.writeUInt16BE(0, 4);
  header.writeUInt16BE(3, 6);
  header.writeUInt32BE(20, 8);
  header.writeUInt16BE(3, 12);
  header.writeUInt16BE(1, 14);
  header.writeUInt32BE(20, 16);
  return Buffer.concat([header, body]);
};

/** A name table with English names for Windows; keys are the name numbers of the OpenType specification. */
export const writeNames = (names) => {
  const entries = Object.entries(names).map(([id, text]) => [Number(id), Buffer.from(text, 'utf16le').swap16()]);
  const header = Buffer.alloc(6 + 12 * entries.length);
  header.writeUInt16BE(entries.length, 2);
  header.writeUInt16BE(header.length, 4);
  let offset = 0;
  entries.forEach(([id, text], i) => {
    [3, 1, 0x409, id, text.length, offset].forEach((x, k) => {
      header.writeUInt16BE(x, 6 + 12 * i + 2 * k);
    });
    offset += text.length;
  });
  return Buffer.concat([header, ...entries.map(([, text]) => text)]);
};

/** The copyright line (name 0) of a font. */
export const copyrightOf = (table) => {
  const strings = table.readUInt16BE(4);
  for (let i = 0; i < table.readUInt16BE(2); i++) {
    const at = 6 + 12 * i;
    if (table.readUInt16BE(at) !== 3 || table.readUInt16BE(at + 6) !== 0) continue;
    const from = strings + table.readUInt16BE(at + 10);
    return Buffer.from(table.subarray(from, from + table.readUInt16BE(at + 8)))
      .swap16()
      .toString('utf16le');
  }
  return '';
};

/** Glyphs that a single-substitution feature (such as `numr`) puts in place of others. */
export const substitutions = (table, feature) => {
  const v = view(table);
  const [features, lookups] = [v.getUint16(6), v.getUint16(8)];
  const swaps = new Map();
  for (let i = 0; i < v.getUint16(features); i++) {
    const record = features + 2 + 6 * i;
    if (table.toString('latin1', record, record + 4) !== feature) continue;
    const at = features + v.getUint16(record + 4);
    for (let k = 0; k < v.getUint16(at + 2); k++) {
      const lookup = lookups + v.getUint16(lookups + 2 + 2 * v.getUint16(at + 4 + 2 * k));
      if (v.getUint16(lookup) === 1) for (const [from, to] of singles(v, lookup)) swaps.set(from, to);
    }
  }
  return swaps;
};

function* singles(v, lookup) {
  for (let s = 0; s < v.getUint16(lookup + 4); s++) {
    const at = lookup + v.getUint16(lookup + 6 + 2 * s);
    const covered = coverage(v, at + v.getUint16(at + 2));
    for (const [i, glyph] of covered.entries()) {
      yield [glyph, v.getUint16(at) === 1 ? (glyph + v.getInt16(at + 4)) & 0xffff : v.getUint16(at + 6 + 2 * i)];
    }
  }
}

const coverage = (v, at) => {
  const count = v.getUint16(at + 2);
  if (v.getUint16(at) === 1) return Array.from({ length: count }, (_, i) => v.getUint16(at + 4 + 2 * i));
  const glyphs = [];
  for (let i = 0; i < count; i++) {
    for (let g = v.getUint16(at + 4 + 6 * i); g <= v.getUint16(at + 6 + 6 * i); g++) glyphs.push(g);
  }
  return glyphs;
};
