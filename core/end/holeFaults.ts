import type { Facts } from './facts.ts';
import { type Fault, fault } from './fault.ts';
import { inFile, NOISE } from './geometryFaults.ts';
import { fittingOf, supportBoltsOf, webBoltsOf } from './jointParts.ts';
import type { End } from './schema.ts';

/** Holes that break through an edge of the web. */
const inWeb = (end: End, f: Facts): Fault[] => {
  const placed = webBoltsOf(end.joint);
  if (!placed) return [];
  const { firstRow, endDistance } = placed;
  const file = inFile(end);
  const found: Fault[] = [];
  const half = f.d0 / 2;
  const top = Math.max(f.mTop > 0 ? f.dt : 0, f.mTop < f.m ? f.tf : 0, f.tf > f.dt ? f.tf : 0);
  const foot = f.h - Math.max(f.mBottom > 0 ? f.db : 0, f.mBottom < f.m ? f.tf : 0, f.tf > f.db ? f.tf : 0);
  if (f.y1 - half <= top + NOISE) {
    found.push(fault('hole-outside-web', 'joint.firstRow', firstRow, { above: file(top + half) }));
  }
  if (f.yn + half >= foot - NOISE) {
    const path = f.n > 1 ? 'joint.bolts.rows' : 'joint.firstRow';
    const given = f.n > 1 ? f.n : firstRow;
    const fits = Math.floor((foot - half - f.y1) / f.p) + 1;
    const limit = f.n > 1 && fits >= 1 ? { most: fits, lastRowBelow: file(foot - half) } : { below: file(foot - half) };
    found.push(fault('hole-below-web', path, given, limit));
  }
  if (f.eEnd <= half + NOISE) {
    found.push(fault('hole-outside-web', 'joint.endDistance', endDistance, { above: file(half) }));
  }
  return found;
};

/** A distance from hole centres to an edge, and the field whose growth by `per` adds 1 to it. mm */
interface Edge {
  readonly edge: number;
  readonly path: string;
  readonly size: number;
  readonly per: number;
}

const broken = (end: End, half: number, edges: readonly Edge[]): Fault[] => {
  const file = inFile(end);
  return edges
    .filter(({ edge }) => edge <= half + NOISE)
    .map(({ edge, path, size, per }) =>
      fault('hole-outside-plate', path, file(size), { above: file(size + per * (half - edge)) }),
    );
};

/** Edges of plate, ply or cleat beside the bolts through the web. */
const besideWeb = (end: End, f: Facts): Fault[] => {
  // Nearly every end of a schedule leaves here.
  if (f.n === 0 || Math.min(f.eTop, f.eBot, f.ex) > f.d0 / 2 + NOISE) return [];
  const { path } = fittingOf(end.joint);
  const last = f.kind === 'fin-plate' || f.kind === 'web-bolts' ? 'edge' : 'legWeb';
  return broken(end, f.d0 / 2, [
    { edge: f.eTop, path: `${path}.topEdge`, size: f.eTop, per: 1 },
    { edge: f.eBot, path: `${path}.bottomEdge`, size: f.eBot, per: 1 },
    { edge: f.ex, path: `${path}.${last}`, size: last === 'edge' ? f.ex : f.legWeb, per: 1 },
  ]);
};

/** Edges of the leg or end plate beside the bolts into the support, which stand clear of the web, or of the other leg, too. */
const besideSupport = (end: End, f: Facts): Fault[] => {
  if (!supportBoltsOf(end.joint)) return [];
  const { eTop, eBot, eh, cc, d0, n, p } = f.supportBolts;
  const half = d0 / 2;
  const file = inFile(end);
  const path = 'joint.supportBolts';
  const inner = (cc - f.tw) / 2 - (f.legSupport > 0 ? f.tp : 0);
  const outer =
    f.legSupport > 0
      ? { edge: eh, path: 'joint.cleat.legSupport', size: f.legSupport, per: 1 }
      : { edge: eh, path: 'joint.plate.width', size: f.bp, per: 2 };
  const faults = broken(end, half, [
    { edge: eTop, path: `${path}.topEdge`, size: eTop, per: 1 },
    outer,
    { edge: inner, path: `${path}.crossCentres`, size: cc, per: 2 },
  ]);
  if (eBot > half + NOISE) return faults;
  const lowest = f.hp - half;
  const limit = n > 1 ? { most: Math.max(0, Math.floor((lowest - eTop) / p) + 1) } : { below: file(lowest) };
  const at = n > 1 && limit.most !== 0 ? `${path}.rows` : `${path}.topEdge`;
  return [...faults, fault('hole-outside-plate', at, n > 1 && limit.most !== 0 ? n : file(eTop), limit)];
};

/** Holes that break through an edge of the web, or of the plate or cleat. */
export const holeFaults = (end: End, f: Facts): Fault[] => [
  ...inWeb(end, f),
  ...besideWeb(end, f),
  ...besideSupport(end, f),
];

/** A leg that does not reach the web, or a weld along it that reaches past the beam's end. */
const legFaults = (end: End, f: Facts): Fault[] => {
  if (f.legWeb === 0 || f.weldTo !== 'web') return [];
  const file = inFile(end);
  const onWeb = f.legWeb - f.g;
  if (onWeb <= NOISE) return [fault('leg-off-web', 'joint.cleat.legWeb', file(f.legWeb), { above: file(f.g) })];
  if (f.weldReturn <= onWeb + NOISE) return [];
  return [fault('return-too-long', 'joint.cleat.webWeld.return', file(f.weldReturn), { most: file(onWeb) })];
};

/** A plate or cleat that reaches below the beam, or past its web. */
export const fittingFaults = (end: End, f: Facts): Fault[] => {
  const file = inFile(end);
  const { path } = fittingOf(end.joint);
  const ofLeg = legFaults(end, f);
  if (ofLeg.length > 0) return ofLeg;
  if (f.kind === 'full-end-plate' || f.n > 0) return [];
  if (f.yp + f.hp <= f.h + NOISE) return [];
  return [fault('fitting-below-beam', `${path}.depth`, file(f.hp), { most: file(f.h - f.yp) })];
};
