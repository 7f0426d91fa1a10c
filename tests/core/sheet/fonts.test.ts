import { readdirSync, readFileSync } from 'node:fs';
import subsetFont from 'subset-font';
import { describe, expect, it } from 'vitest';
import { readFont } from './fontFile.ts';

const root = new URL('../../../', import.meta.url);
const modules = ['semibold', 'condensed', 'condensedItalic', 'condensedSemibold'];
const screens = ['Cw-Regular', 'Cw-Italic', 'Cw-SemiBold', 'CwC-Regular', 'CwC-Italic', 'CwC-SemiBold'];

const face = async (name: string) => {
  const module = (await import(`../../../core/sheet/fonts/${name}.ts`)) as Record<string, string>;
  return readFont(Buffer.from(module[name]!, 'base64'));
};

/** A face of the bench, with its names kept, as an unpacked font. */
const screenFace = async (name: string) => {
  const packed = readFileSync(new URL(`web/fonts/${name}.woff2`, root));
  const options = { targetFormat: 'sfnt', keepAllGlyphs: true, preserveNameIds: [13, 14] } as const;
  return readFont(await subsetFont(packed, undefined, options));
};

const ascii = Array.from({ length: 95 }, (_, i) => String.fromCharCode(0x20 + i)).join('');
const signs = 'αβγδεηθλμνξπρστφχψωΓΔΘΛΞΠΣΦΨΩ−×·÷±≤≥≠≈√∑∞⌀Ø°′″→½¼¾⅛⅜⅝⅞⁄⁰¹²³⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉\u00a0\u2009\u202f–—‘’“”✓□';
const accents = 'ÀÉÑÖßàéñöøÿĄŁŘŠž';

describe('the faces of sheet and bench', () => {
  it.each(modules)('%s draws letters, Greek, mathematical signs, small digits and narrow spaces', async (name) => {
    const { characters } = await face(name);
    expect([...ascii, ...signs, ...accents].filter((one) => !characters.has(one))).toEqual([]);
  });

  it.each(screens)('%s draws the same on the bench, accented letters from a file of their own', async (name) => {
    const { characters } = await screenFace(name);
    expect([...ascii, ...signs].filter((one) => !characters.has(one))).toEqual([]);
    const apart = await screenFace(`${name}-accents`);
    expect([...accents.replace(/[ßØ]/g, '')].filter((one) => !apart.characters.has(one))).toEqual([]);
  });

  it('do not carry the name that their licence reserves, and keep the copyright line', async () => {
    const all = [...modules.map(face), ...screens.flatMap((one) => [screenFace(one), screenFace(`${one}-accents`)])];
    for (const { names } of await Promise.all(all)) {
      expect(names.filter((one) => /plex/i.test(one))).toEqual([]);
      expect(names.some((one) => one.startsWith('Copyright'))).toBe(true);
      expect(names.some((one) => one.includes('Open Font License'))).toBe(true);
    }
  });

  it('stand beside the text of their licence, on the bench and in the sheet', () => {
    for (const folder of ['web/fonts/', 'core/sheet/fonts/']) {
      expect(readFileSync(new URL(`${folder}OFL.txt`, root), 'utf8')).toContain('SIL OPEN FONT LICENSE Version 1.1');
    }
  });

  it('are all named in the style sheet of the bench, and nothing else is', () => {
    const css = readFileSync(new URL('web/fonts/fonts.css', root), 'utf8');
    const named = [...css.matchAll(/url\("\.\/([^"]+)"\)/g)].map((found) => found[1]!);
    const there = readdirSync(new URL('web/fonts/', root)).filter((file) => file.endsWith('.woff2'));
    expect(named.toSorted()).toEqual(there.toSorted());
    expect(css).not.toMatch(/plex/i);
  });
});
