import fc from 'fast-check';
import type { End } from '../../core/end/schema.ts';
import { standards } from '../../core/standards/index.ts';

/** Random but plausible fin-plate ends with own section and own strengths, metric, so that one size can change and nothing else. Invented. */
export interface PlausibleEnd {
  readonly standard: string;
  readonly h: number;
  readonly b: number;
  readonly tf: number;
  readonly tw: number;
  readonly r: number;
  readonly copes: 'none' | 'top' | 'bottom' | 'both';
  readonly ct: number;
  readonly dt: number;
  readonly cb: number;
  readonly db: number;
  readonly rows: number;
  readonly columns: number;
  readonly pitch: number;
  readonly gauge: number;
  readonly size: string;
  readonly at: number;
  readonly eEnd: number;
  readonly tp: number;
  readonly e: number;
  readonly ex: number;
  readonly leg: number;
  readonly g: number;
  readonly V: number;
}

const between = (min: number, max: number) => fc.integer({ min, max });

export const plausibleEnd: fc.Arbitrary<PlausibleEnd> = fc.record({
  standard: fc.constantFrom(...Object.keys(standards)),
  h: between(300, 900),
  b: between(120, 300),
  tf: between(8, 30),
  tw: fc.integer({ min: 55, max: 200 }).map((tenths) => tenths / 10),
  r: between(0, 20),
  copes: fc.constantFrom('none', 'top', 'bottom', 'both'),
  ct: between(30, 600),
  dt: between(5, 120),
  cb: between(30, 600),
  db: between(5, 120),
  rows: between(1, 6),
  columns: between(1, 3),
  pitch: between(55, 100),
  gauge: between(55, 100),
  size: fc.constantFrom('M12', 'M16', 'M20', 'M24', 'M30'),
  at: between(30, 90),
  eEnd: between(30, 90),
  tp: between(6, 20),
  e: between(25, 60),
  ex: between(25, 80),
  leg: between(4, 14),
  g: between(5, 30),
  V: between(0, 900),
});

/** The end as JSON. Reaction in kN. */
export const endOf = (x: PlausibleEnd): End & Record<string, unknown> => {
  const top = x.copes === 'top' || x.copes === 'both';
  const bottom = x.copes === 'bottom' || x.copes === 'both';
  return {
    standard: x.standard,
    units: 'mm-kN',
    reaction: x.V,
    beam: {
      section: { depth: x.h, width: x.b, flange: x.tf, web: x.tw, radius: x.r },
      grade: { fy: 355, fu: 470 },
    },
    top: top ? { length: x.ct, depth: x.dt, radius: 10 } : null,
    bottom: bottom ? { length: x.cb, depth: x.db, radius: 10 } : null,
    setback: x.g,
    joint: {
      kind: 'fin-plate',
      firstRow: (top ? Math.max(x.dt, x.tf) : x.tf) + x.at,
      endDistance: x.eEnd,
      bolts: {
        size: x.size,
        grade: { fu: 800 },
        threads: 'in',
        rows: x.rows,
        columns: x.columns,
        pitch: x.pitch,
        gauge: x.gauge,
        holes: 'punched',
      },
      plate: { thickness: x.tp, grade: { fy: 355, fu: 470 }, topEdge: x.e, bottomEdge: x.e, edge: x.ex },
      weld: { leg: x.leg, electrode: 480 },
    },
  };
};
