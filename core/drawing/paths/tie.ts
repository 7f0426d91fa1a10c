import type { Facts } from '../../end/facts.ts';
import { centres } from '../bolts.ts';
import type { FailurePath, Stroke } from '../drawing.ts';
import { force, forceUnit } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { platePulled, platePulledToEdge, webPulled, webPulledToFoot, webPulledToTop } from './block.ts';
import { blackBolts, halfMoon } from './bolts.ts';
import { type PathMaker, path, tag } from './pathMaker.ts';
import { plateNetTension, webGrossTension, webNetTension } from './shear.ts';
import { weld } from './weld.ts';

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

const ways: Readonly<Record<string, PathMaker>> = {
  '': webPulled,
  bolts,
  'bearing, web': (it, words) => bearing(it, words, 'web', -1),
  'bearing, plate': (it, words) => bearing(it, words, words.plate, 1),
  'block, web': webPulled,
  'block to the top, web': webPulledToTop,
  'block to the foot, web': webPulledToFoot,
  'block, plate': platePulled,
  'block to an edge, plate': platePulledToEdge,
  'net tension, web': webNetTension,
  'gross tension, web': webGrossTension,
  'net tension, plate': plateNetTension,
  weld,
};
