import { describe, expect, it } from 'vitest';
import { sheetText } from '../../../api/sheetText.ts';
import { besideOf } from '../../../core/check/besideOf.ts';
import { encodeLink } from '../../../core/exchange/link.ts';
import { sheetPdf } from '../../../core/sheet/sheet.ts';
import { end, examined, withSheet } from './ends.ts';
import { textsOf, wholeText } from './readPdf.ts';
import { australian, beside, inches, onPaper, pairs } from './twoStandards.ts';

const write = (input: object, workings: 'governing' | 'all' = 'governing') => {
  const whole = examined(input);
  const link = encodeLink(whole.end, whole.report.fingerprint);
  return sheetPdf({ ...whole, link }, { workings });
};
const read = async (input: object, workings: 'governing' | 'all' = 'governing') =>
  (await textsOf(await write(input, workings))).map(wholeText);
const first = async (input: object) => (await read(input))[0]!;
const secondOf = (input: object) => {
  const found = besideOf(examined(input));
  if (!found || 'faults' in found) throw new Error('no second standard');
  return found.examined.report;
};

describe('a sheet with two standards', () => {
  it.each(pairs)(
    '%s: is one page, on A4 and on Letter; its fullest table with the longest notes on A4',
    async (name, input) => {
      expect((await read(onPaper(input, 'A4'))).length).toBe(1);
      const letter = await read(onPaper(input, 'Letter'));
      expect(letter.length).toBeLessThanOrEqual(name === 'SANS beside EN, two notches and a tie' ? 2 : 1);
    },
  );

  it('names both with their editions in the head, and the verdict of each by word and number', async () => {
    const text = await first(beside(end, 'csa-s16'));
    expect(text).toContain('SANS 10162-1:2011');
    expect(text).toContain('beside CSA S16:2019');
    expect(text).toContain('HOLDS 0.97 close: 0.95 to 1.00 Bolt shear governs: reaction 165 kN, fails at 170.0 kN.');
    expect(text).toMatch(/HOLDS 0\.97 CSA S16:2019/);
  });

  it('puts the edition after the standard, not after its national choice', async () => {
    expect(await first(beside(end, 'en-1993-uk'))).toContain('EN 1993-1-8:2005, UK National Annex');
  });

  it('pairs the checks: each row has ratio, reaction at failure and clause of both, rounded alike', async () => {
    const input = beside(end, 'csa-s16');
    const text = await first(input);
    const rows = secondOf(input).checks.filter(({ id, state }) => state === 'holds' && !id.startsWith('fit-'));
    expect(rows.length).toBeGreaterThan(12);
    // 289.7 under SANS stands beside 345.9 under CSA.
    expect(text).toMatch(/Bearing on the web 85\.0 149\.3 kN 0\.57 289\.7 13\.10 m 0\.48 345\.9 13\.12\.1\.2 a s/);
  });

  it('shows what only one of them makes, and says where the other has no rule', async () => {
    const text = await first(beside(end, 'as-4100'));
    expect(text).toMatch(/Net shear of the web 165\.0 592\.3 kN 0\.28 592\.2 13\.11 m no rule/);
    const reversed = await first(beside(australian, 'en-1993'));
    expect(reversed).toMatch(/Net shear of the web no rule \d\.\d\d \d+\.\d joint guide 2008/);
  });

  it('tells the reasons of the second by letters', async () => {
    const text = await first(beside(end, 'aisc-360-lrfd'));
    expect(text).toMatch(/J3\.7 \(a\)/);
    expect(text).toMatch(/\(a\) ?a bolt that this standard does not list/);
    expect(text).toMatch(/REFER ANSI\/AISC 360:2022, LRFD/);
  });

  it('says how the rules of fit of the second stand, and what was carried over and assumed', async () => {
    const text = await first(beside(end, 'csa-s16'));
    expect(text).toContain('Fit, CSA S16: holds.');
    expect(text).toContain('Strengths carried over from SANS 10162-1: web 355/470, plate 355/470, bolts 830 MPa.');
    expect(await first(beside(end, 'en-1993'))).toMatch(/Fit, EN 1993-1-8: plate in the web, depth 220, ≥ 243\.84 mm/);
    const unsaid = { ...end, joint: { ...end.joint, weld: { leg: 8 } } };
    expect((await first(beside(unsaid, 'csa-s16'))).replaceAll(' ', '')).toMatch(
      /CSAS16\..*Weldmetal490MPa\(assumed\)/,
    );
  });

  it('prints every option in force of both', async () => {
    const input = beside(end, 'as-4100');
    const flat = (await first(input)).replaceAll(' ', '');
    for (const { options } of [examined(input).report, secondOf(input)]) {
      for (const [key, value] of Object.entries(options)) expect(flat).toContain(`${key}${value}`);
    }
  });

  it('explains each letter of a basis', async () => {
    const text = await first(beside(end, 'csa-s16'));
    for (const one of ['s seen, formula read', 'm memory, standard not seen', 'r research, published', 'p practice']) {
      expect(text).toContain(one);
    }
  });

  it('speaks in the words of the first standard alone', async () => {
    const text = await first(beside(end, 'csa-s16'));
    expect(text).toContain('otch');
    expect(text).not.toMatch(/\b[Cc]ope\b(?!-)|single plate/);
  });

  it('has the working of every check of both on further sheets, each under its standard', async () => {
    const input = beside(end, 'csa-s16');
    const [, ...pages] = await read(input, 'all');
    const rest = pages.join(' ');
    const second = rest.indexOf('CSA S16:2019 Bolt shear');
    expect(second).toBeGreaterThan(rest.indexOf('SANS 10162-1:2011 Bolt shear'));
    for (const { title, state, working } of secondOf(input).checks) {
      if (state !== 'notApplicable' && working?.length) expect(rest.slice(second)).toContain(title);
    }
  });

  it('is the same bytes each time', async () => {
    const input = beside(inches, 'aisc-360-asd', 24);
    expect(Buffer.compare(Buffer.from(await write(input, 'all')), Buffer.from(await write(input, 'all')))).toBe(0);
  });
});

describe('a second standard at the other level', () => {
  it('with a reaction of its own is checked at that, which is printed with its level', async () => {
    const input = beside(inches, 'aisc-360-asd', 24);
    const text = await first(input);
    expect(text).toContain('reaction 24 kip, service');
    expect(text).toMatch(/V 24 service/);
    // A third: 24/36 of the load against strengths at 1/1.5 of those of load and resistance factors.
    expect(text).toMatch(/Shear at the cope 36\.0 127\.4 kip 0\.28 127\.4 J4\.2, J4-3 m 0\.28 84\.9/);
  });

  it('without one gives strengths only: no ratio, no state, and that is said', async () => {
    const text = await first(beside(inches, 'aisc-360-asd'));
    expect(text).toContain('Strengths only: no service reaction is given.');
    expect(text).toMatch(/Shear at the cope 36\.0 127\.4 kip 0\.28 127\.4 J4\.2, J4-3 m 84\.9/);
    expect(text.match(/HOLDS|FAILS|REFER/g)).toEqual(['HOLDS']);
  });

  it('without one has the workings of its strengths, without the steps that the reaction drives', async () => {
    const pages = await read(beside(inches, 'aisc-360-asd'), 'all');
    const rest = pages.slice(1).join(' ');
    expect(rest).toContain('31.74 kip');
    expect(rest).not.toMatch(/= 0 (kip|ksi)/);
  });
});

describe('the words of the sheet', () => {
  it('are those of North America under a standard of North America', async () => {
    const text = await first(inches);
    for (const one of ['Single plate', 'single plate', 'Cope', 'gage (one bolt column)']) expect(text).toContain(one);
    expect(text).not.toMatch(/fin plate|[Nn]otch|gauge/);
  });

  it('are those that the end asks for', async () => {
    const text = await first(withSheet({ words: 'commonwealth' }, inches));
    for (const one of ['Fin plate', 'Notch', 'gauge (one bolt column)']) expect(text).toContain(one);
    expect(text).not.toMatch(/single plate|\b[Cc]ope\b(?!-)/);
  });
});

describe('a second standard that has nothing to say', () => {
  it.each([
    ['nope', 'The standard nope is not known'],
    ['sans-10162-1', 'The second standard must be another than the first'],
  ])('%s: is one sentence, and the first stands as it was', async (id, sentence) => {
    const text = await first(beside(end, id));
    expect(text).toContain(`No second standard. ${sentence}`);
    expect(text).toContain('HOLDS 0.97 close: 0.95 to 1.00 Bolt shear governs: reaction 165 kN, fails at 170.0 kN.');
    expect(text).toMatch(/Bearing on the web R max 85\.0 149\.3 kN 0\.57 289\.7 13\.10 memory/);
  });

  it('is a sheet for the doors of the program too, never a crash', async () => {
    for (const id of ['nope', 'sans-10162-1', '__proto__']) {
      const bytes = new TextEncoder().encode(JSON.stringify(beside(end, id)));
      expect('pdf' in (await sheetText(bytes, { workings: 'all' }))).toBe(true);
    }
  });
});
