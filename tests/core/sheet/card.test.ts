import { describe, expect, it } from 'vitest';
import type { MadeCard } from '../../../core/card/card.ts';
import { cardOf } from '../../../core/card/cardOf.ts';
import { cardPages, cardPdf } from '../../../core/sheet/card/card.ts';
import { bottomOf, LEFT, TOP, WIDTH } from '../../../core/sheet/page.ts';
import { standards } from '../../../core/standards/index.ts';
import { listSections } from '../../../core/steel/findSection.ts';
import { goodEndsUnder } from '../../support/underStandard.ts';
import { end, fullest, withSheet } from './ends.ts';
import { inOtherUnits } from './inOtherUnits.ts';
import { boxOfText, overprints } from './overprints.ts';
import { textsOf, wholeText } from './readPdf.ts';
import { inches } from './twoStandards.ts';

const made = (input: unknown): MadeCard => {
  const found = cardOf(input);
  if ('faults' in found) throw new Error(found.faults.map(({ text }) => text).join(' '));
  return found.made;
};

const pagesOf = async (input: unknown): Promise<string[]> =>
  (await textsOf(await cardPdf(made(input)))).map((texts) => wholeText(texts).replaceAll('\u00a0', ' '));

const one = { end, sections: ['UB 406x178x60', 'UB 457x191x67', 'UB 127x76x13'] };

describe('the printed shop card', () => {
  it('prints the number and letter of each cell, REFER, and nothing where it does not fit', async () => {
    const [texts = []] = await textsOf(await cardPdf(made(one)));
    const at = (text: string) => texts.filter((found) => found.text === text);
    const row = at('UB 406 × 178 × 60')[0]!;
    const cells = texts.filter(({ x, y }) => Math.abs(y - row.y) < 0.2 && x > row.x + row.width);
    expect(cells.map(({ text }) => text)).toEqual(['REFER', '170', 'M', '254', 'M', 'REFER']);
  });

  it('says what it stands on: standard, template, letters, assumptions, cautions, fingerprint, version', async () => {
    const card = made(one);
    const [text = ''] = await pagesOf(one);
    for (const said of [
      'Shop card',
      'SANS 10162-1:2011',
      'Reaction that each section carries, kN, factored',
      'top 110 long, 45 deep, corner radius 10',
      'M20 8.8, threads in plane; holes 22 drilled',
      'one, 45 from the end of the beam',
      'first 90 below top of steel, pitch 70',
      'M Bolt shear',
      'Strength and listed rules only.',
      'Beam held against lateral-torsional buckling at the notch.',
      'Local codes govern; licensed practice decides.',
      'Prepared',
      `${card.card.fingerprint.slice(0, 4)} ${card.card.fingerprint.slice(4)}`,
      `Copewright ${card.card.version}`,
      '1 of 1',
      'P1',
    ])
      expect(text).toContain(said);
  });

  it('names the sections that have no number, once, and says why cells are blank or refer', async () => {
    const [text = ''] = await pagesOf(one);
    expect(text).toContain('Blank in every column: UB 127 × 76 × 13.');
    expect(text).toContain('Blank: does not fit, or holds at no reaction: holes past the lower edge of the web.');
    expect(text).toMatch(/REFER: outside the limits [^.]*plate in the web/);
  });

  it('has as many sheets as its sections need, each with its number and all that a single one says', async () => {
    const pages = await pagesOf({ end, family: 'UB' });
    expect(pages.length).toBeGreaterThan(1);
    pages.forEach((text, i) => {
      for (const said of [`${i + 1} of ${pages.length}`, 'M Bolt shear', 'Local codes govern', 'SANS 10162-1:2011'])
        expect(text).toContain(said);
    });
    const { card } = made({ end, family: 'UB' });
    const all = pages.join(' ');
    for (const { section, cells } of card.sections.filter((row) =>
      row.cells.some(({ verdict }) => verdict === 'holds'),
    )) {
      expect(all.split(`${section.replace(/(?<=\d)x(?=\d)/g, ' × ')} `).length, section).toBe(2);
      expect(cells).toHaveLength(7);
    }
    expect(all.split('REFER in every column that fits').length).toBe(2);
    expect(pages[0]).toContain(`Sections without a number stand on sheet ${pages.length}.`);
  });

  it('speaks the words of the region, in inches and kips with tenths', async () => {
    const [text = ''] = await pagesOf({ end: inches, sections: ['W16x36', 'W18x50'], rows: [3, 4] });
    for (const said of ['Single plate 3/8, 3/4 A325, top cope 4 1/2 × 1 1/2', 'kip, factored', 'to 0.1 kip'])
      expect(text).toContain(said);
    expect(text).not.toMatch(/notch|fin plate/i);
  });

  it('is for an ASD standard said to be of service reactions, and takes the decimal comma', async () => {
    const asd = { ...inches, standard: 'aisc-360-asd', sheet: { decimal: ',' } };
    const [text = ''] = await pagesOf({ end: asd, sections: ['W16x36', 'W18x50'], rows: [3, 4] });
    expect(text).toContain('kip, service');
    expect(text).toMatch(/W16 × 36 \d+,\d [A-Z]/);
  });

  it('says that a card without a revision is unchecked', async () => {
    const { sheet: _, ...bare } = end;
    expect((await pagesOf({ ...one, end: bare }))[0]).toContain('none: unchecked, not for manufacture');
  });

  it('is the same bytes whatever was printed before it', async () => {
    const print = async (input: unknown): Promise<Buffer> => Buffer.from(await cardPdf(made(input)));
    const first = await print(one);
    await print({ end: inches, family: 'W' });
    expect(Buffer.compare(await print(one), first)).toBe(0);
    const together = await Promise.all([one, one].map(print));
    for (const bytes of together) expect(Buffer.compare(bytes, first)).toBe(0);
  });
});

const few = ['UB 610x229x140', 'UB 533x210x92', 'UB 457x191x67', 'UB 406x178x60', 'UB 305x165x40', 'UB 127x76x13'];

const manySections = listSections().flatMap((one) => one.designations.filter((_, i) => i % 2 === 0));

type Named = [name: string, input: { end: object; [choice: string]: unknown }];

const cards: Named[] = [
  ['a family', { end, family: 'UB' }],
  ['the fullest end', { end: fullest, family: 'UC', rows: [3, 4, 5] }],
  ['inches', { end: inches, family: 'W', rows: [3, 4, 5] }],
  [
    'long names',
    { end: withSheet({ job: 'Überführung '.repeat(16), revision: 'B', reason: 'x '.repeat(90) }), family: 'PFC' },
  ],
  ['a list whose sections mostly have no number', { end, sections: manySections.slice(0, 400), rows: [2] }],
  [
    'a support and own strengths',
    {
      end: {
        ...end,
        beam: { grade: { fy: 355.5, fu: 470.5 } },
        support: { kind: 'beam-web', section: 'UB 610x229x140' },
      },
      family: 'IPE',
    },
  ],
  ...Object.values(standards).flatMap((standard) =>
    goodEndsUnder(standard)
      .filter(({ name }) => ['example', 'web-bolts', 'all-options', 'two-columns'].includes(name))
      .map(
        ({ name, end: template }): Named => [
          `${name} under ${standard.id}`,
          { end: template, sections: few, rows: [2, 3, 4] },
        ],
      ),
  ),
];

describe.each(cards)('the shop card of %s', (_, input) => {
  it.each(['A4', 'Letter'] as const)('on %s prints no text on another, and none outside the window', async (paper) => {
    for (const template of [input.end, inOtherUnits(input.end as { units: string })]) {
      const sheet = { ...(template as { sheet?: object }).sheet, paper };
      const found = cardOf({ ...input, end: { ...template, sheet } });
      if ('faults' in found) continue;
      const { pages } = await cardPages(found.made);
      for (const page of pages) {
        expect(overprints(page)).toEqual([]);
        for (const mark of page) {
          if (mark.kind !== 'text') continue;
          const box = boxOfText(mark);
          expect(box.left, mark.text).toBeGreaterThan(LEFT - 1);
          expect(box.right, mark.text).toBeLessThan(LEFT + WIDTH + 0.3);
          expect(box.top, mark.text).toBeGreaterThan(TOP);
          expect(box.bottom, mark.text).toBeLessThan(bottomOf(paper) + 1);
        }
      }
    }
  });
});
