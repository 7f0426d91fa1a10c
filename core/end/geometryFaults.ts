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

/** Rows and columns that are not told, or that run into each other; `holes`: diameters in web and support, mm, 0 where there are none. */
export const patternFaults = (end: End, holes: { readonly web: number; readonly support: number }): Fault[] => {
  const k = lengthSize(end);
  const file = inFile(end);
  const found: Fault[] = [];
  const spaced = (count: number, value: number | undefined, path: string, hole: number, code: string) => {
    if (count < 2 || hole === 0) return;
    if (value === undefined) found.push(fault('missing', path, null, 'number'));
    else if (value * k <= hole + NOISE) found.push(fault(code, path, value, { above: file(hole) }));
  };
  const bolts = webBoltsOf(end.joint)?.bolts;
  spaced(bolts?.rows ?? 0, bolts?.pitch, 'joint.bolts.pitch', holes.web, 'rows-overlap');
  spaced(bolts?.columns ?? 0, bolts?.gauge, 'joint.bolts.gauge', holes.web, 'columns-overlap');
  const inSupport = supportBoltsOf(end.joint);
  spaced(inSupport?.rows ?? 0, inSupport?.pitch, 'joint.supportBolts.pitch', holes.support, 'rows-overlap');
  return found;
};
