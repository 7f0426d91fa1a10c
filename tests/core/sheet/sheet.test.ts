import { beforeAll, describe, expect, it } from 'vitest';
import { sheetPdf } from '../../../core/sheet/sheet.ts';
import { end, examined, fullest, withSheet } from './ends.ts';
import { type FoundText, textsOf, wholeText } from './readPdf.ts';

const write = (input: unknown, workings: 'governing' | 'all' = 'governing') => sheetPdf(examined(input), { workings });
const read = async (input: unknown, workings: 'governing' | 'all' = 'governing') =>
  textsOf(await write(input, workings));
const firstPage = async (input: unknown) => wholeText((await read(input))[0]!);

describe('the sheet of an end that holds', () => {
  let page: FoundText[];
  let text: string;
  let pages: number;

  beforeAll(async () => {
    const found = await read(end);
    pages = found.length;
    page = found[0]!;
    text = wholeText(page);
  });

  it('is one page', () => {
    expect(pages).toBe(1);
  });

  it('carries the mark in the largest type of the page', () => {
    const largest = page.toSorted((a, b) => b.size - a.size)[0]!;
    expect(largest.text).toBe('K-207/L');
  });

  it('says the verdict with its number, and in one sentence what governs', () => {
    expect(text).toContain('HOLDS 0.97');
    expect(text).toContain('Bolt shear governs: reaction 165 kN, fails at 170.0 kN.');
    expect(text).toContain('close: 0.95 to 1.00');
  });

  it('names the standard with its edition, and every option in force', () => {
    expect(text).toContain('SANS 10162-1:2011');
    for (const [key, value] of Object.entries(examined(end).report.options)) expect(text).toContain(`${key} ${value}`);
  });

  it('has one row for every check that holds, fails or refers, the weakest first and marked', () => {
    const { checks } = examined(end).report;
    const rows = checks.filter(({ id, state }) => state === 'holds' && !id.startsWith('fit-'));
    const bases = page.filter((one) => ['memory', 'practice', 'research', 'seen'].includes(one.text) && one.size < 8.5);
    expect(bases.length).toBe(rows.length);
    expect(text).toContain('→ Bolt shear');
    const at = rows.map(({ title }) => text.indexOf(title, text.indexOf('Check, weakest first')));
    expect(at).toEqual(at.toSorted((a, b) => a - b));
    expect(at.every((one) => one > 0)).toBe(true);
  });

  it('prints reactions at failure rounded down and ratios to the nearest 0.01', () => {
    const bearing = examined(end).report.checks.find(({ id }) => id === 'web-bearing')!;
    // 289.708 kN and 0.5695
    expect(bearing.reactionAtFailure).toBeGreaterThan(289.7);
    expect(text).toMatch(/Bearing on the web .*? 0\.57 289\.7/);
  });

  it('says in one line that fit holds, and names what does not apply with its reason', () => {
    expect(text).toContain('Fit holds : pitch 70 ≥ 54'.replace(' :', ':'));
    expect(text).toContain('gauge (one bolt column)');
  });

  it('shows the governing working in symbols and numbers that a pencil can follow', () => {
    expect(text).toContain('Governing working: bolt shear');
    const line = text.replaceAll(' ', '');
    expect(line).toContain('=0.6×0.8×314.159×830×0.7/10³=87.61kN');
    expect(line).toContain('=165×√((55×70/9800)²+(1/3)²)=85.01kN');
  });

  it('prints every assumption, what the bases mean, and the cautions', () => {
    const flat = text.replaceAll(' ', '');
    for (const { text: one } of examined(end).report.assumptions) expect(flat).toContain(one.replaceAll(' ', ''));
    expect(text).toContain('memory, standard not seen when the check was written');
    expect(text).toContain('For a competent person and for the data shown only.');
    expect(text).toContain('Local codes govern; licensed practice decides.');
  });

  it('has boxes to prepare, check and approve, revision, reason, fingerprint, program and sheet number', () => {
    const { fingerprint, version } = examined(end).report;
    for (const one of ['Prepared', 'Checked', 'Approved', 'P1', 'first, for checking', '1 of 1']) {
      expect(text).toContain(one);
    }
    expect(text).toContain(`${fingerprint.slice(0, 4)} ${fingerprint.slice(4)}`);
    expect(text).toContain(`Copewright ${version}`);
  });

  it('gives the shear stress of the full and of the cut section, for information', () => {
    expect(text).toContain('information');
    for (const one of ['full section', 'cut tee', 'mean 51.4', 'yield at 583.0', '210.9 at 599.8', '78.9']) {
      expect(text).toContain(one);
    }
  });

  it('reads back in Greek and with every mathematical sign', () => {
    for (const sign of 'φρ√²³×−≤≥→′') expect(text).toContain(sign);
  });

  it('is smaller than 25 kB, and the same bytes each time', async () => {
    const [a, b] = [await write(end), await write(end)];
    expect(a.length).toBeLessThan(25_000);
    expect(Buffer.compare(a, b)).toBe(0);
  });
});

describe('the verdict on paper', () => {
  it('of an end that fails says at which reaction, and prints no ratio below 1.01', async () => {
    expect(await firstPage({ ...end, reaction: 180 })).toContain('FAILS 1.06');
    const barely = await firstPage({ ...end, reaction: 170.1 });
    expect(barely).toContain('FAILS 1.01');
    expect(barely).toContain('Bolt shear fails at 170.0 kN; the reaction is 170.1 kN.');
  });

  it('of an end that refers gives the reason and no ratio beside the word', async () => {
    const text = await firstPage({ ...end, reaction: 60, top: { length: 900, depth: 45, radius: 10 } });
    expect(text).toMatch(/REFER Web buckling at the notch, tee: the notch is longer than the method covers, 2 h/);
  });

  it('of an end with a rule of fit that is broken gives what is there and what must be, in a row of its own', async () => {
    const bad = { ...end, joint: { ...end.joint, plate: { ...end.joint.plate, edge: 25 } } };
    const text = await firstPage({ ...bad, reaction: 20 });
    expect(text).toContain('FAILS 1.36 Plate edge, free edge: 25 mm given, must be ≥ 34 mm.');
    expect(text).toMatch(/Fit, not held limit given .*Plate edge, free edge ≥ 34 25 mm 1\.36/);
  });

  it('of an end with several checks that refer for one reason tells it once, by a letter at each row', async () => {
    const text = await firstPage({ ...end, reaction: 90, top: { length: 50, depth: 45, radius: 10 } });
    expect(text).toContain('5 checks: a hole cuts the face of the notch');
    expect(text).toContain('First of the others: Bolt shear, at 170.0 kN.');
    expect(text.match(/ \(a\)/g)?.length).toBe(6);
    expect(text).toContain('(a) a hole cuts the face of the notch.');
    expect(text).toContain('Other rules of fit hold');
  });

  it('of an end that fails by its tie force gives force and resistance', async () => {
    const text = await firstPage({ ...end, reaction: 20, tie: 500 });
    expect(text).toMatch(/FAILS \d\.\d\d Tie force, acting alone, bolts: 500\.0 kN against \d+\.\d kN\./);
  });

  it('stands without a reaction too', async () => {
    const text = await firstPage({ ...end, reaction: 0 });
    expect(text).toContain('HOLDS 0.00 Bolt shear governs: reaction 0 kN, fails at 170.0 kN.');
  });
});

describe('the title block', () => {
  it('of a sheet without a revision says that it is unchecked and not for manufacture', async () => {
    const { sheet: _, ...plain } = end;
    expect(await firstPage(plain)).toContain('unchecked, not for manufacture');
    expect(await firstPage(end)).not.toContain('unchecked');
  });

  it('prints the names, numbers and date that were given', async () => {
    const sheet = {
      job: 'Mill (demo)',
      drawing: 'S-1104',
      number: 'CW-017',
      revision: 'A/0',
      reason: 'issued',
      date: '2026-03-14',
      prepared: 'A. Tester',
      checked: 'B. Tester',
      approved: 'C. Tester',
      loadCase: '1.2 G + 1.6 Q',
    };
    const text = await firstPage(withSheet(sheet));
    for (const one of Object.values(sheet)) expect(text.replaceAll(' ', '')).toContain(one.replaceAll(' ', ''));
  });
});

describe('the job', () => {
  it('may ask for a decimal comma: numbers take it, clauses, bolt grades and editions keep their points', async () => {
    const text = await firstPage(withSheet({ ...end.sheet, decimal: ',' }));
    for (const one of ['HOLDS 0,97', '170,0 kN', 'decimal comma', '13.13.2.2', 'M20 8.8', 'close: 0,95 to 1,00']) {
      expect(text).toContain(one);
    }
    expect(text.match(/\d\.\d/g)?.length).toBeLessThan(40);
    expect(text).not.toMatch(/\b170\.0\b/);
  });

  it('may ask for Letter', async () => {
    const pdf = await write(withSheet({ ...end.sheet, paper: 'Letter' }));
    expect(Buffer.from(pdf).toString('latin1')).toMatch(/MediaBox \[0 0 612\.? 792\.?\]/);
    expect((await textsOf(pdf)).length).toBe(1);
  });

  it('may speak inches and kips', async () => {
    const inches = {
      mark: 'B12-L',
      standard: 'sans-10162-1',
      units: 'in-kip',
      reaction: 36,
      beam: { section: 'W16x36', grade: 'S355JR' },
      top: { length: 4.5, depth: 1.5, radius: 0.5 },
      bottom: null,
      setback: 0.5,
      joint: {
        kind: 'fin-plate',
        firstRow: 3.5,
        endDistance: 1.75,
        bolts: { size: 'M20', grade: '8.8', rows: 3, pitch: 3 },
        plate: { thickness: 0.375, grade: 'S355JR', topEdge: 1.5, bottomEdge: 1.5, edge: 2 },
        weld: { leg: 0.3125 },
      },
    };
    const text = await firstPage(inches);
    for (const one of ['in, kip, ksi', '36 kip', 'kip in', '4 1/2', 'fails, kip']) {
      expect(text.replaceAll('\u00a0', ' ')).toContain(one);
    }
    expect(text).not.toContain(' kN');
  });
});

describe('further sheets', () => {
  it('carry the working of every check when asked, each step once, and are numbered', async () => {
    const pages = await read(end, 'all');
    expect(pages.length).toBeGreaterThan(1);
    const texts = pages.map(wholeText);
    texts.forEach((text, i) => {
      expect(text).toContain(`${i + 1} of ${pages.length}`);
      expect(text).toContain('Local codes govern');
    });
    const rest = texts.slice(1).join(' ');
    for (const { title, state, working } of examined(end).report.checks) {
      if (state !== 'notApplicable' && working?.length) expect(rest).toContain(title);
    }
    expect(rest).toContain('as above: y');
  });

  it('are not needed for notches above and below with two columns and a tie', async () => {
    expect((await read(fullest)).length).toBe(1);
    const letter = await read(withSheet({ ...end.sheet, paper: 'Letter' }, fullest));
    expect(letter.length).toBeLessThanOrEqual(2);
  });
});
