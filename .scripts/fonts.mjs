/**
 * Makes the faces of screen and sheet from two openly licensed packages: node .scripts/fonts.mjs
 * Subset to the product's characters, signs added, renamed inside (the licence reserves the original name), licence text beside them.
 * Writes web/fonts (woff2, style sheet) and core/sheet/fonts (base64 modules for the PDF writer).
 */
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import subsetFont from 'subset-font';
import { buildFace } from './fonts/buildFace.mjs';
import { accented, drawn, greek, latin, latinExtended, punctuation } from './fonts/characters.mjs';
import { readCharacterMap, readTables } from './fonts/sfnt.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const packageFile = (name, file) => join(dirname(createRequire(import.meta.url).resolve(`${name}/package.json`)), file);

const NORMAL = { name: '@fontsource/ibm-plex-sans', stem: 'ibm-plex-sans' };
const NARROW = { name: '@fontsource/ibm-plex-sans-condensed', stem: 'ibm-plex-sans-condensed' };
/** The condensed family has no Greek: the normal width's is narrowed by this much. */
const SQUEEZE = 0.9;

/** Those with a module go into the sheet too. */
const faces = [
  { family: 'Cw', style: 'Regular', source: NORMAL, cut: '400-normal', weight: 400 },
  { family: 'Cw', style: 'Italic', source: NORMAL, cut: '400-italic', weight: 400, italic: true },
  { module: 'semibold', family: 'Cw', style: 'SemiBold', source: NORMAL, cut: '600-normal', weight: 600 },
  { module: 'condensed', family: 'CwC', style: 'Regular', source: NARROW, cut: '400-normal', weight: 400 },
  {
    module: 'condensedItalic',
    family: 'CwC',
    style: 'Italic',
    source: NARROW,
    cut: '400-italic',
    weight: 400,
    italic: true,
  },
  { module: 'condensedSemibold', family: 'CwC', style: 'SemiBold', source: NARROW, cut: '600-normal', weight: 600 },
];

const characters = [...new Set(latin + greek + punctuation + drawn + latinExtended)].sort().join('');

const build = ({ family, style, source, cut, italic }) => {
  const file = ({ name, stem }, script) => readFileSync(packageFile(name, `files/${stem}-${script}-${cut}.woff2`));
  const psName = `${family}-${style}`;
  return buildFace({
    files: { latin: file(source, 'latin'), latinExtended: file(source, 'latin-ext'), greek: file(NORMAL, 'greek') },
    texts: { latin: latin + latinExtended + punctuation, latinExtended, greek },
    squeeze: source === NORMAL ? 1 : SQUEEZE,
    slant: italic ? Math.tan((9.5 * Math.PI) / 180) : 0,
    names: {
      1: family,
      2: style,
      3: psName,
      4: `${family} ${style}`,
      5: 'Version 1.0',
      6: psName,
      13: 'SIL Open Font License 1.1; made from a face under that licence, subset, signs added and renamed',
      14: 'http://scripts.sil.org/OFL',
    },
  });
};

/** Characters as ranges of a style sheet. */
const unicodeRange = (text) => {
  const codes = [...text].map((one) => one.codePointAt(0)).sort((a, b) => a - b);
  const runs = [];
  for (const code of codes) {
    if (runs.length > 0 && runs.at(-1)[1] === code - 1) runs.at(-1)[1] = code;
    else runs.push([code, code]);
  }
  const hex = (code) => code.toString(16).toUpperCase().padStart(4, '0');
  return runs.map(([a, b]) => (a === b ? `U+${hex(a)}` : `U+${hex(a)}-${hex(b)}`)).join(', ');
};

const rule = ({ family, weight, italic }, file, text) => `@font-face {
  font-family: "${family}";
  font-style: ${italic ? 'italic' : 'normal'};
  font-weight: ${weight};
  font-display: swap;
  src: url("./${file}") format("woff2");
  unicode-range: ${unicodeRange(text)};
}
`;

const web = join(root, 'web/fonts');
const sheet = join(root, 'core/sheet/fonts');
for (const folder of [web, sheet]) for (const file of readdirSync(folder)) rmSync(join(folder, file));

let css =
  '/* Made by .scripts/fonts.mjs; licence in OFL.txt. accented letters are apart and load only where a page uses them. */\n';
for (const face of faces) {
  const font = await build(face);
  const covered = readCharacterMap(readTables(font).get('cmap'));
  const missing = [...characters].filter((one) => !covered.has(one.codePointAt(0)));
  if (missing.length > 0) throw new Error(`${face.family} ${face.style} lacks ${missing.join(' ')}`);
  const [main, apart] = [false, true].map((is) =>
    [...characters].filter((one) => accented.includes(one) === is).join(''),
  );
  for (const [part, text] of [
    ['', main],
    ['-accents', apart],
  ]) {
    const file = `${face.family}-${face.style}${part}.woff2`;
    const woff2 = await subsetFont(font, text, {
      targetFormat: 'woff2',
      noHinting: true,
      keepFeatures: ['kern'],
      preserveNameIds: [13, 14],
    });
    writeFileSync(join(web, file), woff2);
    css += rule(face, file, text);
  }
  console.log(face.family, face.style, `${covered.size} characters`);
  if (!face.module) continue;
  const ttf = await subsetFont(font, characters, {
    targetFormat: 'sfnt',
    noHinting: true,
    keepFeatures: [],
    noLayoutClosure: true,
    dropTables: ['GPOS', 'GSUB', 'GDEF', 'gasp'],
    preserveNameIds: [13, 14],
  });
  const print = createHash('sha256').update(ttf).digest('hex').slice(0, 16);
  writeFileSync(
    join(sheet, `${face.module}.ts`),
    `/** ${face.family} ${face.style} as base64 of a TrueType file; made by .scripts/fonts.mjs, licence in OFL.txt. SHA-256 ${print}. */\nexport const ${face.module} =\n  '${Buffer.from(ttf).toString('base64')}';\n`,
  );
}
writeFileSync(join(web, 'fonts.css'), css);
const licence = readFileSync(packageFile(NORMAL.name, 'LICENSE'));
for (const folder of [web, sheet]) writeFileSync(join(folder, 'OFL.txt'), licence);
