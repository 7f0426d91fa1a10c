import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readFont } from './fontFile.ts';

const root = new URL('../../../', import.meta.url);
const modules = ['regular', 'italic', 'semibold', 'condensed', 'condensedItalic', 'condensedSemibold'];

const face = async (name: string) => {
  const module = (await import(`../../../core/sheet/fonts/${name}.ts`)) as Record<string, string>;
  return readFont(Buffer.from(module[name]!, 'base64'));
};

describe('the faces of sheet and bench', () => {
  it.each(modules)('%s draws letters, Greek, mathematical signs, small digits and narrow spaces', async (name) => {
    const { characters } = await face(name);
    const ascii = Array.from({ length: 95 }, (_, i) => String.fromCharCode(0x20 + i)).join('');
    const wanted = `${ascii}ÀÉÑÖØßàéñöøÿĄŁŘŠžαβγδεηθλμνξπρστφχψωΓΔΘΛΞΠΣΦΨΩ−×·÷±≤≥≠≈√∑∞⌀°′″→½¼¾⅛⅜⅝⅞⁄⁰¹²³⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉\u00a0\u2009\u202f–—‘’“”✓□`;
    expect([...wanted].filter((one) => !characters.has(one))).toEqual([]);
  });

  it.each(modules)(
    '%s does not carry the name that its licence reserves, and keeps the copyright line',
    async (name) => {
      const { names } = await face(name);
      expect(names.filter((one) => /plex/i.test(one))).toEqual([]);
      expect(names.some((one) => one.startsWith('Copyright'))).toBe(true);
      expect(names.some((one) => one.includes('Open Font License'))).toBe(true);
    },
  );

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
