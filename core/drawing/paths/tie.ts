import type { Facts } from '../../end/facts.ts';
import { centres, columnX, lastColumnX, rowY } from '../bolts.ts';
import type { FailurePath, Stroke } from '../drawing.ts';
import { plateBox } from '../plate.ts';
import { force, forceUnit, length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { platePulled, platePulledToEdge, webPulled, webPulledToFoot, webPulledToTop } from './block.ts';
import { blackBolts, halfMoon } from './bolts.ts';
import { throughWeb } from './cleats.ts';
import { block, type PathMaker, path, tag, torn } from './pathMaker.ts';
import { plateNetTension, webGrossTension, webNetTension } from './shear.ts';
import { supportPulled } from './supportBolts.ts';
import { endPlateWebPulled, weld, weldWeb } from './weld.ts';

/** The tie force pulls the beam away from the support: the parts that hold it, each by itself. */
export const webTie: PathMaker = (it, words, of) => ways[of]?.(it, words, of) ?? null;

/** The bolts push the web toward its end; each carries an even share. */
const bolts: PathMaker = (it, words) =>
  path(`Bolts cut in one plane, black. Arrows: force of each bolt on the web, ${forceUnit(words.units)}.`, {
    circles: blackBolts(it),
    strokes: centres(it).map(
      ({ x, y }): Stroke => ({
        kind: 'force',
        from: { x: x - it.d0 / 2, y },
        to: [{ x: x - it.d0 / 2 - Math.min(1.6 * it.d0, it.m > 1 ? 0.7 * it.q : Infinity), y }],
        arrow: true,
      }),
    ),
    tags: share(it, words),
    fields: [],
  });

const bearing = (it: Facts, words: DrawingWords, name: string, way: 1 | -1): FailurePath =>
  path(`The tie force presses the bolts on the ${name} where it is black. ${forceUnit(words.units)} on each bolt.`, {
    areas: centres(it).map((centre) => halfMoon(centre, it.d0 / 2, { x: way, y: 0 })),
    tags: share(it, words),
  });

const share = (it: Facts, words: DrawingWords): FailurePath['tags'] => {
  const spot = { x: it.eEnd, y: it.y1 - 0.8 * it.d0 };
  return [tag(spot, spot, force(it.T / (it.n * it.m), words.units))];
};

/** Every row by itself, on two planes beside its bolts from the column farthest from the edge. */
const rowsTorn = (it: Facts, words: DrawingWords, name: string, from: number, edge: number): FailurePath => {
  const r = it.d0 / 2;
  const rows = Array.from({ length: it.n }, (_, i) => rowY(it, i));
  const planes = rows.flatMap((y) =>
    [y - r, y + r].map((level): Stroke => torn({ x: from, y: level }, { x: edge, y: level })),
  );
  const low = { x: from, y: it.yn + r };
  return path(`The tie force tears each row of bolts out of the ${name}, to its edge.`, {
    strokes: planes,
    areas: rows.map((y) => block(Math.min(from, edge), y - r, Math.max(from, edge), y + r)),
    tags: [tag(low, { x: edge, y: low.y }, `${2 * it.n} × ${length(Math.abs(from - edge), words.units)} in shear`)],
    fields: ['joint.bolts.gauge', 'joint.endDistance'],
  });
};

const inPlate: Readonly<Record<string, PathMaker>> = {
  bearing: (it, words) => bearing(it, words, words.plate, 1),
  rows: (it, words) => rowsTorn(it, words, words.plate, columnX(it, 0), plateBox(it).right),
  block: platePulled,
  'block to an edge': platePulledToEdge,
  'net tension': plateNetTension,
};

/** The same ways under the name that the rules give to the plate, or to the leg of a cleat beside the web. */
const named = (name: string): Record<string, PathMaker> =>
  Object.fromEntries(Object.entries(inPlate).map(([way, maker]) => [`${way}, ${name}`, throughWeb(maker)]));

const ways: Readonly<Record<string, PathMaker>> = {
  '': throughWeb(webPulled),
  bolts: throughWeb(bolts),
  'bearing, web': throughWeb((it, words) => bearing(it, words, 'web', -1)),
  'rows, web': throughWeb((it, words) => rowsTorn(it, words, 'web', lastColumnX(it), 0)),
  'block, web': throughWeb(webPulled),
  'block to the top, web': throughWeb(webPulledToTop),
  'block to the foot, web': throughWeb(webPulledToFoot),
  'net tension, web': throughWeb(webNetTension),
  'gross tension, web': webGrossTension,
  ...named('plate'),
  ...named('web leg'),
  ...named('cleat'),
  weld: (it, words, of) => weld(it, words, of) ?? weldWeb(it, words, of),
  'web at the plate': endPlateWebPulled,
  'support bolts': supportPulled,
  'bending beside the bolts': supportPulled,
  'bending and support bolts': supportPulled,
};
