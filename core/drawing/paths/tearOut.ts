import type { Facts } from '../../end/facts.ts';
import { columnX, lastColumnX } from '../bolts.ts';
import type { FailurePath, Stroke } from '../drawing.ts';
import { plateField } from '../fields.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { block, type PathMaker, path, tag, torn } from './pathMaker.ts';

/** Two planes beside the bolts: `up` to the cut edge beside every column inside the cope (of the `first row` alone, or of all), or `along` the last row to the beam's end. */
export const webTearout: PathMaker = (it, words, of) => {
  if (of === 'along') {
    return along(it, words, { from: columnX(it, 0), edge: 0, name: 'web', field: 'joint.endDistance' });
  }
  if (it.mTop === 0 || it.dt === 0) return null;
  const fields = ['joint.firstRow', 'top.depth', 'joint.bolts.pitch'];
  const alone = of === 'first row';
  const from = alone ? it.y1 : it.yn;
  const columns = of.endsWith('near column') ? 1 : it.mTop;
  return upright(it, words, { columns, from, edge: it.dt, name: 'web', fields, alone });
};

/** In the plate: `down` to its bottom edge beside every column, or `along` the last row to its free edge. */
export const plateTearout: PathMaker = (it, words, of) => {
  const { right, bottom } = plateBox(it);
  if (of === 'along') {
    const field = plateField(it, 'edge');
    return along(it, words, { from: lastColumnX(it), edge: right, name: words.plate, field });
  }
  const fields = [plateField(it, 'bottomEdge'), 'joint.bolts.pitch'];
  const columns = of.endsWith('near column') ? 1 : it.m;
  return upright(it, words, { columns, from: it.y1, edge: bottom, name: words.plate, fields });
};

interface Upright {
  readonly columns: number;
  /** Level of the bolt farthest from the edge, and of the edge. */
  readonly from: number;
  readonly edge: number;
  readonly name: string;
  readonly fields: readonly string[];
  /** One row alone: a line too short for more words than its length. */
  readonly alone?: boolean;
}

const upright = (
  it: Facts,
  words: DrawingWords,
  { columns, from, edge, name, fields, alone }: Upright,
): FailurePath => {
  const r = it.d0 / 2;
  const centres = Array.from({ length: columns }, (_, j) => columnX(it, j));
  const strokes = centres.flatMap((x): Stroke[] =>
    [x - r, x + r].map((side) => torn({ x: side, y: from }, { x: side, y: edge })),
  );
  const x = centres.at(-1)! + r;
  const size = length(Math.abs(from - edge), words.units);
  return path(`The bolts tear out of the ${name}, on two planes beside each column.`, {
    strokes,
    areas: centres.map((centre) => block(centre - r, Math.min(from, edge), centre + r, Math.max(from, edge))),
    tags: [tag({ x, y: from }, { x, y: edge }, `${alone ? '' : `${2 * columns} × `}${size} in shear`)],
    fields,
  });
};

interface Along {
  /** Column nearest to the edge, and the edge, mm from the beam's end. */
  readonly from: number;
  readonly edge: number;
  readonly name: string;
  readonly field: string;
}

/** The shorter net length counts: from the hole to the edge, or from hole to hole. */
const along = (it: Facts, words: DrawingWords, { from, edge, name, field }: Along): FailurePath | null => {
  if (it.n < 2) return null;
  const toEdge = Math.abs(from - edge);
  const toNext = it.m > 1 && it.q - it.dn < toEdge - it.dn / 2;
  const start = toNext ? from + Math.sign(from - edge) * it.q : from;
  const end = toNext ? from : edge;
  const r = it.d0 / 2;
  const planes = [it.yn - r, it.yn + r].map((y) => torn({ x: start, y }, { x: end, y }));
  const low = { from: { x: start, y: it.yn + r }, to: { x: end, y: it.yn + r } };
  return path(
    `A bolt of the outer row tears the ${name} along the row, ${toNext ? 'to the next hole' : 'to its edge'}.`,
    {
      strokes: planes,
      areas: [block(Math.min(start, end), it.yn - r, Math.max(start, end), it.yn + r)],
      tags: [tag(low.from, low.to, `2 × ${length(Math.abs(start - end), words.units)} in shear`)],
      fields: [toNext ? 'joint.bolts.gauge' : field],
    },
  );
};
