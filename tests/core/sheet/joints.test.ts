import { describe, expect, test } from 'vitest';
import { standards } from '../../../core/standards/index.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';
import { examined } from './ends.ts';
import { inOtherUnits } from './inOtherUnits.ts';
import { pagesOf } from './onPage.ts';
import { wholeText } from './readPdf.ts';

const names = [
  'double-cleat',
  'double-cleat-other-beam',
  'single-cleat',
  'double-cleat-web-welded',
  'double-cleat-support-welded',
  'end-plate',
  'end-plate-opposite',
  'full-end-plate',
];
const endOf = (name: string): Record<string, unknown> => goodEnds().find((one) => one.name === name)!.end;

const sheetOf = async (end: unknown): Promise<string[]> => (await pagesOf(examined(end))).map(wholeText);

describe('the sheet of cleats and end plates', () => {
  // One has a tie force and a beam opposite: there is more to say of it than a page holds.
  const short = names.filter((name) => name !== 'double-cleat-other-beam');
  const plain = ['sans-10162-1', 'as-4100'].flatMap((id) => short.map((name) => [name, id] as const));

  test.each(plain)('of %s under %s is one page with the working of the check that governs', async (name, id) => {
    const pages = await sheetOf(underStandard(endOf(name), standards[id]!));
    expect(pages).toHaveLength(1);
    if (name !== 'full-end-plate') expect(pages[0]).toMatch(/Governing working: .* ratio [\d./]+ = [\d.]+, printed/);
  });

  test('of a pair with a tie force and a beam opposite has that working on its second page', async () => {
    const pages = await sheetOf(endOf('double-cleat-other-beam'));
    expect(pages).toHaveLength(2);
    expect(pages[0]).toContain('Governing working: on sheet 2');
    expect(pages[1]).toMatch(/Bearing on the web .* = 149\.3 kN/);
  });

  test.each(names)('of %s says once that the support is checked only where the list says so', async (name) => {
    const [page] = await sheetOf(endOf(name));
    expect(page!.match(/support/gi)!.length).toBeGreaterThan(1);
    expect(page!.match(/checked only where the list says so/g)).toHaveLength(1);
  });

  test.each(['double-cleat', 'single-cleat', 'double-cleat-support-welded', 'end-plate', 'full-end-plate'])(
    'of %s shows the face of the support beside the side view',
    async (name) => {
      expect((await sheetOf(endOf(name)))[0]).toMatch(/side view.* on the support/);
    },
  );

  test('names a leg in place of the cleat where the column is narrow', async () => {
    const [page] = await sheetOf(endOf('double-cleat'));
    for (const title of ['Block tearing, support leg', 'Tear-out, web leg, along', 'Net shear, web leg'])
      expect(page).toContain(title);
  });

  test('tells bolts into the support and cleats by count, and a support whose top is level as such', async () => {
    const [page] = await sheetOf(endOf('double-cleat'));
    expect(page).toContain('two 100 × 100 × 10, long 220');
    expect(page).toMatch(/2 × 3 M20 8\.8, f ?ub/);
    expect(page).toContain('beam web UB 610×229×125, tops level');
    const lower = {
      ...endOf('double-cleat'),
      support: { ...(endOf('double-cleat').support as object), topOfSteel: 5 },
    };
    expect((await sheetOf(lower))[0]).toContain('top of steel 5');
  });

  test('tells the bolts of a beam opposite after its reaction', async () => {
    const [page] = await sheetOf(endOf('end-plate-opposite'));
    expect(page).toMatch(/tops level, opposite V ?o 90, its bolts 2 × 4, y ?1 100, p 70, c ?c 140/);
    expect(page).toContain('the beam opposite does not share every bolt');
    const [inches] = await sheetOf(inOtherUnits(endOf('end-plate-opposite') as { units: string }));
    expect(inches).toMatch(/its bolts 2 × 4, y ?1 3 15\/16, p 2 3\/4, c ?c 5 1\/2/);
    const told = endOf('end-plate-opposite');
    const { opposite: _, ...untold } = told.support as Record<string, unknown>;
    const assumed = (await sheetOf({ ...told, support: untold })).join(' ');
    expect(assumed).toContain('The beam opposite shares these bolts, row for row (assumed)');
  });

  test('leaves no heading of the table without a row under it at the foot of a sheet', async () => {
    for (const standard of Object.values(standards)) {
      for (const name of names) {
        for (const page of await sheetOf(underStandard(endOf(name), standard)))
          expect(page, `${standard.id} ${name}`).not.toMatch(
            /Fit, not held limit given (Fit|Other|Not applicable|\(a\))/,
          );
      }
    }
  });
});
