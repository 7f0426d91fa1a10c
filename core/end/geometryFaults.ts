import type { Section } from '../shape/section.ts';
import { lengthSize } from './factsOf.ts';
import { type Fault, fault } from './fault.ts';
import { supportBoltsOf, webBoltsOf } from './jointParts.ts';
import type { End } from './schema.ts';

/** mm: a hole that touches an edge touches it in inches too. */
export const NOISE = 1e-9;

/** Lengths back in the file's own unit, free of conversion noise. */
export const inFile = (end: End) => {
  const k = lengthSize(end);
  return (mm: number): number => Number((mm / k).toPrecision(10));
};

/** A section that cannot be rolled: flanges that meet, a web wider than its flange. */
export const sectionFaults = (end: End, { h, b, tf, tw, r, family }: Section): Fault[] => {
  const file = inFile(end);
  const found: Fault[] = [];
  const fillets = family === 'I' ? 2 : 1;
  if (h <= 2 * (tf + r))
    found.push(fault('section-impossible', 'beam.section.depth', file(h), { above: file(2 * (tf + r)) }));
  if (b <= tw + fillets * r) {
    found.push(fault('section-impossible', 'beam.section.width', file(b), { above: file(tw + fillets * r) }));
  }
  return found;
};

/** Copes that leave nothing of the beam. */
export const copeFaults = (end: End, { h }: Section): Fault[] => {
  const k = lengthSize(end);
  const dt = (end.top?.depth ?? 0) * k;
  const db = (end.bottom?.depth ?? 0) * k;
  if (dt + db < h) return [];
  const path = dt >= db ? 'top.depth' : 'bottom.depth';
  const other = Math.min(dt, db);
  return [
    fault('cope-too-deep', path, dt >= db ? end.top?.depth : end.bottom?.depth, { below: inFile(end)(h - other) }),
  ];
};

/** Bolts in a line that run into each other, or whose spacing is not told; `hole`: diameter, mm. */
const spacingFault = (
  end: End,
  line: { readonly count: number | undefined; readonly value: number | undefined; readonly path: string },
  hole: number,
  code: string,
): Fault | undefined => {
  const { count = 0, value, path } = line;
  if (count < 2 || hole === 0) return undefined;
  if (value === undefined) return fault('missing', path, null, 'number');
  return value * lengthSize(end) <= hole + NOISE ? fault(code, path, value, { above: inFile(end)(hole) }) : undefined;
};

/** Rows and columns that are not told, or that run into each other; `holes`: diameters in web and support, mm, 0 where there are none. */
export const patternFaults = (end: End, holes: { readonly web: number; readonly support: number }): Fault[] => {
  const bolts = webBoltsOf(end.joint)?.bolts;
  const inSupport = supportBoltsOf(end.joint);
  const rows = { count: bolts?.rows, value: bolts?.pitch, path: 'joint.bolts.pitch' };
  const columns = { count: bolts?.columns, value: bolts?.gauge, path: 'joint.bolts.gauge' };
  const supportRows = { count: inSupport?.rows, value: inSupport?.pitch, path: 'joint.supportBolts.pitch' };
  const opposite = end.support?.opposite;
  const otherRows = { count: opposite?.rows, value: opposite?.pitch, path: 'support.opposite.pitch' };
  const otherLines = { count: opposite && 2, value: opposite?.gauge, path: 'support.opposite.gauge' };
  return [
    spacingFault(end, rows, holes.web, 'rows-overlap'),
    spacingFault(end, columns, holes.web, 'columns-overlap'),
    spacingFault(end, supportRows, holes.support, 'rows-overlap'),
    spacingFault(end, otherRows, holes.support, 'rows-overlap'),
    spacingFault(end, otherLines, holes.support, 'columns-overlap'),
  ].filter((one) => one !== undefined);
};
