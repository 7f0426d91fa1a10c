import type { Facts } from '../../end/facts.ts';
import { centres } from '../bolts.ts';
import type { Area, Circle, FailurePath, Point, Stroke, Tag } from '../drawing.ts';
import { force, forceUnit, length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { type BoltForce, boltForces, shares } from './boltForces.ts';
import { fitting, type PathMaker, path, tag } from './pathMaker.ts';

/** As many bolts as can all bear their number; of more, those that carry the most. */
const NUMBERED = 8;
const NEARLY_MOST = 0.9995;

/** Bolts cut in one plane, black; the force of each on the web as an arrow. */
export const boltShear: PathMaker = (it, words) => {
  const forces = boltForces(it);
  const unit = forceUnit(words.units);
  const alone = forces.length === 1 ? ' One bolt alone holds no moment.' : '';
  const arm = length(it.z, words.units);
  const spacing = Math.min(it.n > 1 ? it.p : Infinity, it.m > 1 ? it.q : Infinity, 3.2 * it.d0);
  return path(
    `Bolts cut in ${it.k > 1 ? 'two planes' : 'one plane'}, black. Arrows: force of each bolt on the web, ${unit}; V at arm ${arm}.${alone}`,
    {
      circles: blackBolts(it),
      ...arrowsOf(forces, { d0: it.d0, spacing }, words),
      fields: boltFields,
    },
  );
};

/** Where the bolts press on the web: on the side to which each pushes it. */
export const webBearing: PathMaker = (it, words) =>
  bearing(it, words, 1, 'Bolts press on the web where it is black, on the side to which they push it.', 1);

export const plateBearing: PathMaker = (it, words) =>
  bearing(
    it,
    words,
    -1,
    `Bolts press on ${fitting(it, words)} where it is black, on the side to which they push it.`,
    it.k,
  );

const boltFields = ['setback', 'joint.endDistance', 'joint.bolts.pitch', 'joint.bolts.gauge'];

/** `plies`: those that share the force of each bolt. */
const bearing = (it: Facts, words: DrawingWords, way: 1 | -1, caption: string, plies: number): FailurePath => {
  const forces = boltForces(it);
  const part = shares(forces);
  const worst = forces.filter((_, i) => part[i]! > NEARLY_MOST);
  return path(`${caption} ${forceUnit(words.units)} on the bolt that carries the most.`, {
    areas: forces.map(({ at, towards }) => halfMoon(at, it.d0 / 2, { x: way * towards.x, y: way * towards.y })),
    tags: worst.slice(0, 1).map(({ at, towards, size }) => {
      const tip = { x: at.x + way * towards.x * it.d0, y: at.y + way * towards.y * it.d0 };
      return tag(tip, tip, force(size / plies, words.units));
    }),
    fields: boltFields,
  });
};

/** All bolts black, as cut. */
export const blackBolts = (it: Facts): Circle[] =>
  centres(it).map((centre) => ({ kind: 'path', centre, radius: it.d0 / 2, filled: true }));

/** A crescent beside a hole, thickest in the direction given. */
export const halfMoon = (centre: Point, radius: number, towards: Point): Area => {
  const [steps, half, thick] = [12, 1.45, 0.5 * radius];
  const middle = Math.atan2(towards.y, towards.x);
  const at = (angle: number, r: number): Point => ({
    x: centre.x + r * Math.cos(middle + angle),
    y: centre.y + r * Math.sin(middle + angle),
  });
  const angles = Array.from({ length: steps + 1 }, (_, i) => -half + (2 * half * i) / steps);
  return {
    fill: 'black',
    outline: [
      ...angles.map((a) => at(a, radius)),
      ...angles.reverse().map((a) => at(a, radius + thick * Math.cos((a / half) * (Math.PI / 2)))),
    ],
  };
};

/** An arrow at each hole by the share of the largest force, and the size beside it. */
export const arrowsOf = (
  forces: readonly BoltForce[],
  { d0, spacing }: { readonly d0: number; readonly spacing: number },
  words: DrawingWords,
): { strokes: Stroke[]; tags: Tag[] } => {
  const longest = Math.max(0.75 * spacing, 1.2 * d0);
  const part = shares(forces);
  const strokes: Stroke[] = [];
  const tags: Tag[] = [];
  forces.forEach(({ at, towards, size }, i) => {
    const reach = (r: number): Point => ({ x: at.x + towards.x * r, y: at.y + towards.y * r });
    const tip = reach(d0 / 2 + longest * part[i]!);
    strokes.push({ kind: 'force', from: reach(d0 / 2), to: [tip], arrow: true });
    if (forces.length <= NUMBERED || part[i]! > NEARLY_MOST) tags.push(tag(tip, tip, force(size, words.units)));
  });
  return { strokes, tags };
};
