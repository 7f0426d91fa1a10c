import subsetFont from 'subset-font';
import { boxOf, moved, readGlyphs, writeGlyph } from './outline.mjs';
import {
  copyrightOf,
  readCharacterMap,
  readTables,
  substitutions,
  writeCharacterMap,
  writeNames,
  writeTables,
} from './sfnt.mjs';
import { makeSigns } from './signs.mjs';

const opened = async (file, text) => {
  const font = Buffer.from(await subsetFont(file, text, { targetFormat: 'sfnt', noHinting: true }));
  const tables = readTables(font);
  return { tables, glyphs: readGlyphs(tables), map: readCharacterMap(tables.get('cmap')) };
};

/**
 * One face under its own name: the Latin file is the stem (so its kerning stays valid), the glyphs of the other files and the composed signs follow.
 * `files` holds the woff2 files latin, latinExtended, greek; `squeeze` narrows Greek taken from a wider face.
 */
export const buildFace = async ({ files, texts, squeeze, names, slant }) => {
  const stem = await opened(files.latin, texts.latin);
  const others = [await opened(files.latinExtended, texts.latinExtended), await opened(files.greek, texts.greek)];
  const glyphs = [...stem.glyphs];
  const map = new Map(stem.map);
  const add = (character, glyph) => {
    const code = character.codePointAt(0);
    if (map.has(code)) return;
    map.set(code, glyphs.length);
    glyphs.push(glyph);
  };
  others.forEach((other, i) => {
    const wide = i === 1 ? squeeze : 1;
    for (const [code, index] of other.map) {
      const { advance, contours } = other.glyphs[index];
      add(String.fromCodePoint(code), { advance: Math.round(advance * wide), contours: moved(contours, { a: wide }) });
    }
  });
  const glyph = (character) => {
    const index = map.get(character.codePointAt(0));
    if (index === undefined) throw new Error(`no glyph for ${character}`);
    return glyphs[index];
  };
  for (const [character, sign] of makeSigns({ glyph, ...smallDigits(stem), slant })) add(character, sign);
  return assembled(stem.tables, glyphs, map, names);
};

/** Small digits of fractions, reached through the face's substitutions. */
const smallDigits = ({ tables, glyphs, map }) => {
  const through = (feature) => {
    const swaps = substitutions(tables.get('GSUB'), feature);
    return (digit) => glyphs[swaps.get(map.get(digit.codePointAt(0)))];
  };
  return { numerator: through('numr'), denominator: through('dnom') };
};

const assembled = (stem, glyphs, map, names) => {
  const bodies = glyphs.map(({ contours }) => {
    const body = writeGlyph(contours);
    return Buffer.concat([body, Buffer.alloc((4 - (body.length % 4)) % 4)]);
  });
  const loca = Buffer.alloc(4 * (glyphs.length + 1));
  let offset = 0;
  bodies.forEach((body, i) => {
    offset += body.length;
    loca.writeUInt32BE(offset, 4 * (i + 1));
  });
  const hmtx = Buffer.alloc(4 * glyphs.length);
  glyphs.forEach(({ advance, contours }, i) => {
    hmtx.writeUInt16BE(advance, 4 * i);
    hmtx.writeInt16BE(boxOf(contours).left, 4 * i + 2);
  });
  const tables = new Map(
    ['GDEF', 'GPOS', 'OS/2', 'gasp'].filter((tag) => stem.has(tag)).map((tag) => [tag, Buffer.from(stem.get(tag))]),
  );
  tables.set('glyf', Buffer.concat(bodies)).set('loca', loca).set('hmtx', hmtx);
  tables.set('cmap', writeCharacterMap(map));
  tables.set('name', writeNames({ 0: copyrightOf(stem.get('name')), ...names }));
  tables.set('post', postOf(stem.get('post')));
  return writeTables(
    tables
      .set('head', headOf(stem.get('head'), glyphs))
      .set('hhea', hheaOf(stem.get('hhea'), glyphs))
      .set('maxp', maxpOf(stem.get('maxp'), glyphs)),
  );
};

const headOf = (table, glyphs) => {
  const head = Buffer.from(table);
  const boxes = glyphs.filter((g) => g.contours.length > 0).map((g) => boxOf(g.contours));
  head.writeInt16BE(Math.min(...boxes.map((b) => b.left)), 36);
  head.writeInt16BE(Math.min(...boxes.map((b) => b.bottom)), 38);
  head.writeInt16BE(Math.max(...boxes.map((b) => b.right)), 40);
  head.writeInt16BE(Math.max(...boxes.map((b) => b.top)), 42);
  head.writeInt16BE(1, 50);
  return head;
};

const hheaOf = (table, glyphs) => {
  const hhea = Buffer.from(table);
  hhea.writeUInt16BE(Math.max(...glyphs.map((g) => g.advance)), 10);
  hhea.writeUInt16BE(glyphs.length, 34);
  return hhea;
};

const maxpOf = (table, glyphs) => {
  const maxp = Buffer.from(table);
  maxp.writeUInt16BE(glyphs.length, 4);
  maxp.writeUInt16BE(Math.max(...glyphs.map((g) => g.contours.flat().length)), 6);
  maxp.writeUInt16BE(Math.max(...glyphs.map((g) => g.contours.length)), 8);
  return maxp;
};

/** Without glyph names: the original's are of no use to a reader of text. */
const postOf = (table) => {
  const post = Buffer.from(table.subarray(0, 32));
  post.writeUInt32BE(0x00030000, 0);
  return post;
};
