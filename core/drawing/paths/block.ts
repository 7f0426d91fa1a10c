import { columnX, lastColumnX } from '../bolts.ts';
import type { FailurePath } from '../drawing.ts';
import { plateField } from '../fields.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { block, fitting, type PathMaker, path, tag, torn } from './pathMaker.ts';

/** Sheared along the inner column up to the cut edge, pulled apart along the last row to the beam's end; columns inside the cope only. */
export const webBlock: PathMaker = (it, words) => {
  if (it.mTop === 0 || it.dt === 0) return null;
  const x = columnX(it, it.mTop - 1);
  const [top, corner, end] = [
    { x, y: it.dt },
    { x, y: it.yn },
    { x: 0, y: it.yn },
  ];
  const size = (mm: number): string => length(mm, words.units);
  return path(`The hatched block tears out of the web: sheared along the bolts, pulled apart along the last row.`, {
    strokes: [torn(top, corner, end)],
    areas: [block(0, it.dt, x, it.yn)],
    tags: [tag(top, corner, `${size(it.yn - it.dt)} in shear`), tag(end, corner, `${size(x)} in tension`)],
    fields: ['joint.firstRow', 'top.depth', 'joint.bolts.pitch', 'joint.endDistance', 'joint.bolts.gauge'],
  });
};

/** In the plate: sheared along the column next to the support down to its bottom edge, pulled apart along the first row to its free edge. */
export const plateBlock: PathMaker = (it, words) => {
  const { right, bottom } = plateBox(it);
  const x = columnX(it, 0);
  const [end, corner, foot] = [
    { x: right, y: it.y1 },
    { x, y: it.y1 },
    { x, y: bottom },
  ];
  const size = (mm: number): string => length(mm, words.units);
  return path(
    `The hatched block tears out of ${fitting(it, words)}: sheared along the bolts down to its bottom edge, pulled apart along the first row.`,
    {
      strokes: [torn(end, corner, foot)],
      areas: [block(x, it.y1, right, bottom)],
      tags: [tag(corner, foot, `${size(bottom - it.y1)} in shear`), tag(corner, end, `${size(right - x)} in tension`)],
      fields: ['joint.bolts.pitch', 'joint.bolts.gauge', plateField(it, 'bottomEdge'), plateField(it, 'edge')],
    },
  );
};

/** Pulled out along the beam by the tie force: two planes along the outer rows to the beam's end, tension between them. */
export const webPulled: PathMaker = (it, words) => {
  if (it.n < 2) return null;
  const x = lastColumnX(it);
  const size = (mm: number): string => length(mm, words.units);
  const corners = [
    { x: 0, y: it.y1 },
    { x, y: it.y1 },
    { x, y: it.yn },
    { x: 0, y: it.yn },
  ] as const;
  return path("The tie force pulls the hatched block out of the web to the beam's end.", {
    strokes: [torn(...corners)],
    areas: [block(0, it.y1, x, it.yn)],
    tags: [
      tag(corners[3], corners[2], `2 × ${size(x)} in shear`),
      tag(corners[1], corners[2], `${size(it.yn - it.y1)} in tension`),
    ],
    fields: ['joint.endDistance', 'joint.bolts.pitch', 'joint.bolts.gauge'],
  });
};

/** The same in the plate, to its free edge. */
export const platePulled: PathMaker = (it, words) => {
  if (it.n < 2) return null;
  const x = columnX(it, 0);
  const { right } = plateBox(it);
  const size = (mm: number): string => length(mm, words.units);
  const corners = [
    { x: right, y: it.y1 },
    { x, y: it.y1 },
    { x, y: it.yn },
    { x: right, y: it.yn },
  ] as const;
  return path(`The tie force pulls the hatched block out of ${fitting(it, words)} to its free edge.`, {
    strokes: [torn(...corners)],
    areas: [block(x, it.y1, right, it.yn)],
    tags: [
      tag(corners[2], corners[3], `2 × ${size(right - x)} in shear`),
      tag(corners[1], corners[2], `${size(it.yn - it.y1)} in tension`),
    ],
    fields: [plateField(it, 'edge'), 'joint.bolts.pitch', 'joint.bolts.gauge'],
  });
};

interface PulledAside {
  readonly name: string;
  /** Ends of the sheared plane: at the ply's free end, and at the far column. */
  readonly from: number;
  readonly x: number;
  readonly row: number;
  readonly edge: number;
}

/** Pulled out toward one edge: one plane along the far row, tension from there to the edge. */
const pulledAside = (words: DrawingWords, { name, from, x, row, edge }: PulledAside): FailurePath => {
  const size = (mm: number): string => length(Math.abs(mm), words.units);
  const corners = [
    { x: from, y: row },
    { x, y: row },
    { x, y: edge },
  ] as const;
  return path(`The tie force pulls the hatched block out of the ${name}, as far as its edge.`, {
    strokes: [torn(...corners)],
    areas: [block(Math.min(from, x), Math.min(row, edge), Math.max(from, x), Math.max(row, edge))],
    tags: [
      tag(corners[0], corners[1], `${size(x - from)} in shear`),
      tag(corners[1], corners[2], `${size(edge - row)} in tension`),
    ],
    fields: ['joint.bolts.pitch', 'joint.bolts.gauge'],
  });
};

export const webPulledToTop: PathMaker = (it, words) =>
  pulledAside(words, { name: 'web', from: 0, x: lastColumnX(it), row: it.yn, edge: it.dt });
export const webPulledToFoot: PathMaker = (it, words) =>
  pulledAside(words, { name: 'web', from: 0, x: lastColumnX(it), row: it.y1, edge: it.h - it.db });

/** To the nearer of the plate's edges. */
export const platePulledToEdge: PathMaker = (it, words) => {
  const { right, top, bottom } = plateBox(it);
  const [row, edge] = it.eTop <= it.eBot ? [it.yn, top] : [it.y1, bottom];
  return pulledAside(words, { name: words.plate, from: right, x: columnX(it, 0), row, edge });
};
