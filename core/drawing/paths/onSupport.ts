import type { Facts } from '../../end/facts.ts';
import { linesX, rowsY } from '../../end/supportPattern.ts';
import { capital } from '../../words/capital.ts';
import type { FailurePath, Point, Stroke } from '../drawing.ts';
import { fixedBox, sidesOf } from '../onSupport/legs.ts';
import { length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { block, fitting, type PathMaker, path, tag, torn } from './pathMaker.ts';

/** Fields whose sizes make the paths around the support bolts. */
const rowFields = ['joint.supportBolts.pitch', 'joint.supportBolts.topEdge'];

/** A path over the view on the support. */
export const onSupport = (caption: string, parts: Partial<Omit<FailurePath, 'caption' | 'view'>>): FailurePath => ({
  ...path(caption, parts),
  view: 'support',
});

const upright = (x: number, top: number, bottom: number): [Point, Point] => [
  { x, y: top },
  { x, y: bottom },
];

/** What the bolts push up: to its nearer edge, the other one taken for safety where it is nearer. From the farthest row to that edge. */
const toNearer = (it: Facts): { from: number; edge: number } => {
  const { top, bottom } = fixedBox(it);
  const rows = rowsY(it);
  const { eTop, eBot } = it.supportBolts;
  return eTop <= eBot ? { from: rows.at(-1)!, edge: top } : { from: rows[0]!, edge: bottom };
};

/** Sheared upright between web and bolts, on each side that is held. */
export const supportLegShear: PathMaker = (it, words) => {
  const { top, bottom } = fixedBox(it);
  const start = it.tw / 2 + (it.bp > 0 ? it.leg : it.tp);
  const end = it.supportBolts.n > 0 ? (it.supportBolts.cc - it.supportBolts.d0) / 2 : it.tw / 2 + it.legSupport;
  const x = start + 0.4 * Math.max(0, end - start);
  const planes = sidesOf(it).map((side) => upright(side * x, top, bottom));
  return onSupport(`${capital(fitting(it, words))} shears upright beside the web.`, {
    strokes: planes.map(([head, foot]) => torn(head, foot)),
    tags: [tag(...planes.at(-1)!, `${many(planes.length)}${length(bottom - top, words.units)} in shear`)],
  });
};

/** The same through the holes of each line. */
export const supportLegNet: PathMaker = (it, words) => {
  if (it.supportBolts.n === 0) return null;
  const { top, bottom } = fixedBox(it);
  const { n, d0, dn } = it.supportBolts;
  const edges = [top, ...rowsY(it).flatMap((y) => [y - d0 / 2, y + d0 / 2]), bottom];
  const xs = linesX(it);
  const strokes = xs.flatMap((x) =>
    Array.from({ length: n + 1 }, (_, i): Stroke => torn({ x, y: edges[2 * i]! }, { x, y: edges[2 * i + 1]! })),
  );
  const net = length(Math.max(0, bottom - top - n * dn), words.units);
  return onSupport(`${capital(fitting(it, words))} shears through the holes beside the web.`, {
    strokes,
    tags: [tag(...upright(xs.at(-1)!, top, bottom), `${many(xs.length)}${net} net in shear`)],
    fields: rowFields,
  });
};

/** Outer edge beside a line. */
const freeEdge = (it: Facts, x: number): number => (x < 0 ? fixedBox(it).left : fixedBox(it).right);

/** Sheared along each line of bolts to the nearer edge, pulled apart along the last row to the free edge. */
export const supportLegBlock: PathMaker = (it, words) => {
  if (it.supportBolts.n === 0) return null;
  const { from, edge } = toNearer(it);
  const xs = linesX(it);
  const size = (mm: number): string => length(Math.abs(mm), words.units);
  const corners = xs.map((x): [Point, Point, Point] => [
    { x: freeEdge(it, x), y: from },
    { x, y: from },
    { x, y: edge },
  ]);
  const [end, corner, head] = corners.at(-1)!;
  return onSupport(
    `The hatched ${xs.length > 1 ? 'blocks tear' : 'block tears'} out of ${fitting(it, words)}, pushed up by the bolts: sheared along them to the nearer edge, pulled apart along a row.`,
    {
      strokes: corners.map((run) => torn(...run)),
      areas: corners.map(([a, b, c]) =>
        block(Math.min(a.x, b.x), Math.min(b.y, c.y), Math.max(a.x, b.x), Math.max(b.y, c.y)),
      ),
      tags: [
        tag(corner, head, `${many(xs.length)}${size(from - edge)} in shear`),
        tag(end, corner, `${many(xs.length)}${size(end.x - corner.x)} in tension`),
      ],
      fields: [...rowFields, 'joint.supportBolts.crossCentres'],
    },
  );
};

/** Torn out beside each line to the nearer edge; `along`: beside one bolt of the row that pushes one cleat's leg to its free edge. */
export const supportLegTearout: PathMaker = (it, words, of) => {
  if (it.supportBolts.n === 0) return null;
  const r = it.supportBolts.d0 / 2;
  const xs = linesX(it);
  if (of.endsWith('along')) return along(it, words, xs[0]!, r);
  const { from, edge } = toNearer(it);
  const size = length(Math.abs(from - edge), words.units);
  return onSupport(
    `The bolts push ${fitting(it, words)} up and tear out of it, on two planes beside each line, to the nearer edge.`,
    {
      strokes: xs.flatMap((x) => [x - r, x + r].map((side) => torn({ x: side, y: from }, { x: side, y: edge }))),
      areas: xs.map((x) => block(x - r, Math.min(from, edge), x + r, Math.max(from, edge))),
      tags: [tag(...upright(xs.at(-1)! + r, from, edge), `${2 * xs.length} × ${size} in shear`)],
      fields: rowFields,
    },
  );
};

const along = (it: Facts, words: DrawingWords, x: number, r: number): FailurePath => {
  const y = rowsY(it)[0]!;
  const edge = freeEdge(it, x);
  const low: [Point, Point] = [
    { x, y: y + r },
    { x: edge, y: y + r },
  ];
  return onSupport(`The first bolt tears ${fitting(it, words)} along its row, to its free edge.`, {
    strokes: [torn({ x, y: y - r }, { x: edge, y: y - r }), torn(...low)],
    areas: [block(Math.min(x, edge), y - r, Math.max(x, edge), y + r)],
    tags: [tag(...low, `2 × ${length(Math.abs(x - edge), words.units)} in shear`)],
    fields: ['joint.supportBolts.crossCentres', 'joint.cleat.legSupport'],
  });
};

/** V from the web's middle bends one cleat's leg at its bolts, or at the weld along its toe. */
export const supportLegBending: PathMaker = (it, words) => {
  const { top, bottom } = fixedBox(it);
  const arm = it.supportBolts.n > 0 ? it.supportBolts.cc / 2 : it.tw / 2 + it.legSupport;
  const side = sidesOf(it)[0]!;
  const [head, foot] = upright(side * arm, top, bottom);
  const y = bottom - 0.1 * (bottom - top);
  const ends: [Point, Point] = [
    { x: 0, y },
    { x: side * arm, y },
  ];
  return onSupport(`The leg of ${fitting(it, words)} on the support bends in its own plane; its edges yield first.`, {
    strokes: [
      torn(head, foot),
      { kind: 'narrow', from: ends[0], to: [ends[1]], arrow: true },
      { kind: 'narrow', from: ends[1], to: [ends[0]], arrow: true },
    ],
    tags: [tag(...ends, `arm ${length(arm, words.units)}`)],
    fields: ['joint.supportBolts.crossCentres'],
  });
};

const many = (count: number): string => (count > 1 ? `${count} × ` : '');
