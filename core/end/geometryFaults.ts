import type { Section } from '../shape/section.ts';
import type { Facts } from './facts.ts';
import { lengthSize } from './factsOf.ts';
import { type Fault, fault } from './fault.ts';
import { type End, plyOf } from './schema.ts';

/** mm: a hole that touches an edge touches it in inches too. */
const NOISE = 1e-9;

/** Lengths back in the file's own unit, free of conversion noise. */
const inFile = (end: End) => {
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

/** Rows and columns that are not told, or that run into each other. */
export const patternFaults = (end: End, hole: number): Fault[] => {
  const { bolts } = end.joint;
  const k = lengthSize(end);
  const file = inFile(end);
  const found: Fault[] = [];
  const spaced = (count: number, value: number | undefined, name: 'pitch' | 'gauge', code: string) => {
    if (count < 2) return;
    const path = `joint.bolts.${name}`;
    if (value === undefined) found.push(fault('missing', path, null, 'number'));
    else if (value * k <= hole + NOISE) found.push(fault(code, path, value, { above: file(hole) }));
  };
  spaced(bolts.rows, bolts.pitch, 'pitch', 'rows-overlap');
  spaced(bolts.columns ?? 1, bolts.gauge, 'gauge', 'columns-overlap');
  return found;
};

/** Holes that break through an edge of the web or of the plate. */
export const holeFaults = (end: End, f: Facts): Fault[] => {
  const file = inFile(end);
  const found: Fault[] = [];
  const half = f.d0 / 2;
  const top = Math.max(f.mTop > 0 ? f.dt : 0, f.mTop < f.m ? f.tf : 0, f.tf > f.dt ? f.tf : 0);
  const foot = f.h - Math.max(f.mBottom > 0 ? f.db : 0, f.mBottom < f.m ? f.tf : 0, f.tf > f.db ? f.tf : 0);
  if (f.y1 - half <= top + NOISE) {
    found.push(fault('hole-outside-web', 'joint.firstRow', end.joint.firstRow, { above: file(top + half) }));
  }
  if (f.yn + half >= foot - NOISE) {
    const path = f.n > 1 ? 'joint.bolts.rows' : 'joint.firstRow';
    const given = f.n > 1 ? f.n : end.joint.firstRow;
    const fits = Math.floor((foot - half - f.y1) / f.p) + 1;
    const limit = f.n > 1 && fits >= 1 ? { most: fits, lastRowBelow: file(foot - half) } : { below: file(foot - half) };
    found.push(fault('hole-below-web', path, given, limit));
  }
  if (f.eEnd <= half + NOISE) {
    found.push(fault('hole-outside-web', 'joint.endDistance', end.joint.endDistance, { above: file(half) }));
  }
  const ply = end.joint.kind === 'fin-plate' ? 'plate' : 'ply';
  const given = plyOf(end.joint);
  for (const name of ['topEdge', 'bottomEdge', 'edge'] as const) {
    if (given[name] * lengthSize(end) > half + NOISE) continue;
    found.push(fault('hole-outside-plate', `joint.${ply}.${name}`, given[name], { above: file(half) }));
  }
  return found;
};
