import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Card, Cell } from '../../../core/card/card.ts';
import { cardOf } from '../../../core/card/cardOf.ts';
import { letters } from '../../../core/card/letters.ts';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Outcome, SaidFault } from '../../../core/check/report.ts';
import { joints } from '../../../core/joints/index.ts';
import { standards } from '../../../core/standards/index.ts';
import { listSections } from '../../../core/steel/findSection.ts';
import { goodEnds } from '../../support/published.ts';
import { goodEndsUnder } from '../../support/underStandard.ts';
import { end } from '../sheet/ends.ts';
import { inches } from '../sheet/twoStandards.ts';

type Json = Record<string, unknown>;

const made = (input: unknown): Card => {
  const found = cardOf(input);
  if ('faults' in found) throw new Error(found.faults.map(({ text }) => text).join(' '));
  return found.made.card;
};

const faultsOf = (input: unknown): readonly SaidFault[] => {
  const found = cardOf(input);
  return 'faults' in found ? found.faults : [];
};

const cellsOf = (card: Card, section: string): readonly Cell[] =>
  card.sections.find((one) => one.section === section)?.cells ?? [];

interface Template {
  beam: Json;
  joint: { bolts?: Bolts; supportBolts?: Bolts; plate?: Json; cleat?: Json };
  reaction: unknown;
}
interface Bolts {
  rows: number;
  pitch: number;
}

/** A full check of the template's end in this section with so many rows, written by hand into its JSON: web and support have as many. */
const fullCheck = (template: unknown, section: string, rows: number, reaction: number): Outcome => {
  const one = structuredClone(template) as Template;
  const { bolts, supportBolts, plate, cleat } = one.joint;
  for (const fitting of [plate, cleat]) {
    if (supportBolts && typeof fitting?.depth === 'number')
      fitting.depth += (rows - supportBolts.rows) * supportBolts.pitch;
  }
  if (bolts) bolts.rows = rows;
  if (supportBolts) supportBolts.rows = rows;
  one.beam.section = section;
  one.reaction = reaction;
  return checkEnd(one);
};

const verdictOf = (outcome: Outcome): string => ('report' in outcome ? outcome.report.verdict : 'fault');

describe('a cell of the shop card', () => {
  const designations = listSections().flatMap((one) => one.designations);

  test.each(Object.values(standards).map((one) => [one.id, one] as const))(
    'says what a full check of that end says: it holds at the number, and no longer one step on; %s',
    (_, standard) => {
      const ends = goodEndsUnder(standard).map((one) => one.end);
      const own = (template: Json): string => {
        const { section } = template.beam as { section: unknown };
        return typeof section === 'string' ? section : 'UB 406x178x60';
      };
      const holding = ends.filter((one) => [3, 4].some((n) => verdictOf(fullCheck(one, own(one), n, 0)) === 'holds'));
      const seen = new Map<string, number>();
      fc.assert(
        fc.property(
          fc.oneof(fc.constantFrom(...ends), fc.constantFrom(...holding)),
          fc.option(fc.constantFrom(...designations), { nil: undefined, freq: 2 }),
          fc.integer({ min: 2, max: 8 }),
          (template, other, rows) => {
            const section = other ?? own(template);
            const found = cardOf({ end: template, sections: [section], rows: [rows] });
            const unloaded = verdictOf(fullCheck(template, section, rows, 0));
            if ('faults' in found) {
              const none = found.faults.some(({ code }) => code === 'nothing-to-print');
              if (none) seen.set(unloaded, (seen.get(unloaded) ?? 0) + 1);
              expect(none ? ['fails', 'refer'] : ['fault']).toContain(unloaded);
              return;
            }
            const cell = found.made.card.sections[0]!.cells[0]!;
            if (cell.verdict !== 'holds') throw new Error('a card of one cell without a number');
            seen.set('holds', (seen.get('holds') ?? 0) + 1);
            const step = template.units === 'mm-kN' ? 1 : 0.1;
            const at = fullCheck(template, section, rows, cell.reaction);
            expect('report' in at && [at.report.verdict, at.report.governing]).toEqual(['holds', cell.governing]);
            expect(verdictOf(fullCheck(template, section, rows, cell.reaction + step))).not.toBe('holds');
          },
        ),
        { numRuns: 250, seed: 7 },
      );
      expect(seen.get('holds') ?? 0).toBeGreaterThan(5);
      expect(seen.get('refer') ?? 0).toBeGreaterThan(5);
    },
  );

  const card = made({ end, family: 'UB' });

  test('has no number exactly where a full check without a reaction does not hold, and the same verdict', () => {
    for (const { section, cells } of card.sections) {
      cells.forEach((cell, i) => {
        const unloaded = verdictOf(fullCheck(end, section, card.rows[i]!, 0));
        expect(cell.verdict, `${section} ${card.rows[i]}`).toBe(unloaded === 'fault' ? 'fails' : unloaded);
      });
    }
  });

  test('is the capacity of the end rounded down to whole kN, and names the check that governs', () => {
    const [, three] = cellsOf(card, 'UB 406x178x60');
    const full = fullCheck(end, 'UB 406x178x60', 3, 0);
    const capacity = 'report' in full ? full.report.capacity! : 0;
    expect(capacity).toBeCloseTo(170.1, 1);
    expect(three).toEqual({ verdict: 'holds', reaction: 170, governing: 'bolt-shear' });
  });

  test('is rounded down to a tenth of a kip', () => {
    const { units, sections } = made({ end: inches, sections: ['W16x36', 'W18x50'], rows: [3] });
    expect(units).toBe('in-kip');
    for (const { section, cells } of sections) {
      const full = fullCheck(inches, section, 3, 0);
      const capacity = 'report' in full ? full.report.capacity! : 0;
      expect(cells[0]).toMatchObject({ verdict: 'holds', reaction: Math.floor(capacity * 10) / 10 });
    }
  });

  test.each([
    // Top edge, (n - 1) pitches of 70, bottom edge; the end plate and the welded cleat say their depth of 220 with three rows.
    ['double-cleat', 'UB 533x210x92', 4, 290],
    ['double-cleat', 'UB 406x178x60', 3, 220],
    ['single-cleat', 'UB 533x210x92', 4, 290],
    ['double-cleat-web-welded', 'UB 533x210x92', 4, 290],
    ['double-cleat-web-welded', 'UB 406x178x60', 3, 220],
    ['end-plate', 'UB 533x210x92', 4, 290],
    ['end-plate', 'UB 406x178x60', 3, 220],
  ] as const)('of %s in %s with %i rows, %i deep, holds in a full check at its number and not 1 kN on', (...asked) => {
    const [name, section, rows, deep] = asked;
    const template = goodEnds().find((one) => one.name === name)!.end;
    const { plateDepths, sections } = made({ end: template, sections: [section], rows: [rows] });
    expect(plateDepths).toEqual([deep]);
    const cell = sections[0]!.cells[0]!;
    if (cell.verdict !== 'holds') throw new Error(JSON.stringify(cell));
    const at = fullCheck(template, section, rows, cell.reaction);
    expect('report' in at && [at.report.verdict, at.report.governing]).toEqual(['holds', cell.governing]);
    expect(verdictOf(fullCheck(template, section, rows, cell.reaction + 1))).toBe('fails');
  });

  test('has no number where the geometry cannot be, and says so', () => {
    expect(cellsOf(card, 'UB 127x76x13')[0]).toMatchObject({ verdict: 'fails', because: [{ code: 'hole-below-web' }] });
  });

  test('has no number where a rule of fit fails, such as a plate too shallow in the web', () => {
    // AISC 360: at least half of the depth between the root fillets of W16x36, (15.9 - 2 x 1.13)/2 = 6.8; 1.5 + 3 + 1.5 = 6, one row more 9.
    const [two, three] = cellsOf(made({ end: inches, sections: ['W16x36'], rows: [2, 3] }), 'W16x36');
    expect(two).toMatchObject({ verdict: 'fails', because: [{ code: 'fit-plate-depth' }] });
    expect(three?.verdict).toBe('holds');
  });

  test('has no number where a limit is passed: it refers, by the checks that refer', () => {
    const [two] = cellsOf(card, 'UB 457x191x67');
    expect(two).toMatchObject({ verdict: 'refer' });
    expect(two?.verdict === 'refer' && two.because.map(({ code }) => code)).toContain('fit-plate-depth');
  });

  test('has no number below the least reaction that its standard asks for', () => {
    // AS 4100: 40 kN or 0.15 of the section's shear at least; this weld carries 18 kN with two rows.
    const weak = goodEndsUnder(standards['as-4100']!).find(({ name }) => name === 'as-4100-fin-plate')!.end;
    const { joint } = structuredClone(weak) as { joint: { bolts: Json; weld: Json } };
    joint.bolts.size = 'M12';
    joint.bolts.grade = { fu: 60 };
    const asked = { end: { ...weak, joint }, sections: ['410UB59.7', '360UB44.7'], rows: [2, 3] };
    const found = cardOf(asked);
    const cells = 'made' in found ? found.made.card.sections.flatMap((one) => one.cells) : [];
    expect(cells.filter(({ verdict }) => verdict === 'holds')).toEqual([]);
  });
});

describe('a shop card', () => {
  test('has the rows from 2 to 8, and every section of a family in the order of its table', () => {
    const { rows, sections } = made({ end, family: 'UB' });
    expect(rows).toEqual([2, 3, 4, 5, 6, 7, 8]);
    const family = listSections().find((one) => one.family === 'UB');
    expect(sections.map((one) => one.section)).toEqual(family?.designations);
  });

  test('has the sections of a list in its order, by the names of the library', () => {
    const { sections } = made({ end, sections: ['457x191x67 ub', 'UB 406x178x60'], rows: [4, 3] });
    expect(sections.map((one) => one.section)).toEqual(['UB 457x191x67', 'UB 406x178x60']);
  });

  test('has plates whose depth follows the rows: first row, pitch and edges are kept', () => {
    // 40 + (n - 1) 70 + 40
    expect(made({ end, family: 'UB', rows: [2, 3, 8] }).plateDepths).toEqual([150, 220, 570]);
    // 1.5 + (n - 1) 3 + 1.5
    expect(made({ end: inches, family: 'W', rows: [2, 5] }).plateDepths).toEqual([6, 15]);
  });

  test('does not depend on the section, the reaction, the count of rows, or the mark of its template', () => {
    const bolts = { ...end.joint.bolts, rows: 1 };
    const other = {
      ...end,
      mark: 'X',
      reaction: { ofWebShear: 0.5 },
      beam: { ...end.beam, section: 'no such thing' },
      joint: { ...end.joint, bolts },
    };
    expect(made({ end: other, family: 'UB' })).toEqual(made({ end, family: 'UB' }));
  });

  test('has another fingerprint for another template, list or rows', () => {
    const prints = [
      { end, family: 'UB' },
      { end, family: 'UC' },
      { end, family: 'UB', rows: [2, 3] },
      { end: { ...end, setback: 11 }, family: 'UB' },
    ].map((one) => made(one).fingerprint);
    expect(new Set(prints).size).toBe(prints.length);
  });

  test('carries what was assumed for any of its cells, each once', () => {
    const { tie: _, ...untold } = end;
    const { assumptions } = made({ end: untold, family: 'UB' });
    expect(assumptions.map(({ code }) => code)).toContain('tie-assumed');
    expect(new Set(assumptions.map(({ text }) => text)).size).toBe(assumptions.length);
  });

  test('names each check by a letter of its own, which is no figure and not V', () => {
    for (const one of Object.values(letters)) expect(one).toMatch(/^[A-HJ-NP-UW-Z]$/);
    for (const { strength } of Object.values(joints)) {
      const here = strength.map(([id]) => id).filter((id) => id !== 'weld');
      expect(new Set(here.map((id) => letters[id])).size).toBe(here.length);
    }
  });
});

describe('a card that cannot be made', () => {
  const codes = (input: unknown): string[] => faultsOf(input).map(({ code, path }) => `${code} ${path}`);

  test('for an unknown family or section names the nearest', () => {
    expect(faultsOf({ end, family: 'UBB' })[0]).toMatchObject({ code: 'unknown-family', path: 'family' });
    expect(faultsOf({ end, family: 'UBB' })[0]?.limit).toContain('UB');
    const [fault] = faultsOf({ end, sections: ['UB 406x178x61'] });
    expect(fault).toMatchObject({ code: 'unknown-section', path: 'sections', given: 'UB 406x178x61' });
    expect(fault?.limit).toContain('UB 406x178x60');
  });

  test('needs a template, and a family or sections, not both', () => {
    expect(codes({ family: 'UB' })).toEqual(['missing end']);
    expect(codes({ end })).toEqual(['family-or-sections sections']);
    expect(codes({ end, family: 'UB', sections: ['UB 406x178x60'] })).toEqual(['family-or-sections sections']);
    expect(codes([])).toEqual(['not-a-card ']);
    expect(codes({ end: 5, family: 'UB' })).toEqual(['wrong-kind end']);
    expect(codes({ end, family: 'UB', row: [2] })).toEqual(['unknown-card-field row']);
  });

  test('takes up to eight counts of rows, whole and from 1 to 30', () => {
    expect(codes({ end, family: 'UB', rows: [2.5, 0, 31, '3'] })).toEqual(
      Array(4).fill('row-count rows').concat('count-outside rows').slice(0, 4),
    );
    expect(codes({ end, family: 'UB', rows: [] })).toEqual(['count-outside rows']);
    expect(codes({ end, family: 'UB', rows: [1, 2, 3, 4, 5, 6, 7, 8, 9] })).toEqual(['count-outside rows']);
    expect(codes({ end, family: 'UB', rows: 3 })).toEqual(['wrong-kind rows']);
    expect(codes({ end, sections: [] })).toEqual(['count-outside sections']);
    expect(codes({ end, sections: Array(401).fill('UB 406x178x60') })).toEqual(['count-outside sections']);
  });

  test('says what is wrong with the template itself, once', () => {
    const pitchless = { ...end, joint: { ...end.joint, bolts: { ...end.joint.bolts, pitch: undefined } } };
    expect(codes({ end: pitchless, family: 'UB' })).toEqual(['missing joint.bolts.pitch']);
    expect(codes({ end: { ...end, standard: 'sans-10162' }, family: 'UB' })).toEqual(['unknown-standard standard']);
    expect(codes({ end: { ...end, beam: { grade: 'S999' } }, family: 'UB' })).toEqual(['unknown-grade beam.grade']);
  });

  test('says when no cell has a number, and why: refers as well as fails', () => {
    const [refers] = faultsOf({ end, sections: ['UB 1016x305x584'] });
    expect(refers?.code).toBe('nothing-to-print');
    expect(refers?.text).toContain('shallower than the flange');
    const [fault] = faultsOf({ end: { ...end, tie: 9000 }, family: 'UB' });
    expect(fault?.code).toBe('nothing-to-print');
    expect(fault?.text).toContain('Tie force');
  });

  test('never throws, whatever it is given', () => {
    const any = fc.record(
      {
        end: fc.oneof(fc.constant(end), fc.jsonValue()),
        family: fc.oneof(fc.constantFrom('UB', 'PFC'), fc.jsonValue()),
        sections: fc.oneof(fc.array(fc.string()), fc.jsonValue()),
        rows: fc.oneof(fc.array(fc.integer({ min: -1, max: 40 })), fc.jsonValue()),
      },
      { requiredKeys: [] },
    );
    fc.assert(
      fc.property(fc.oneof(any, fc.jsonValue()), (input) => void cardOf(input)),
      { numRuns: 150, seed: 3 },
    );
  });
});
