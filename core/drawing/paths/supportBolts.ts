import type { Facts } from '../../end/facts.ts';
import { supportCentres } from '../../end/supportPattern.ts';
import type { Circle, Point } from '../drawing.ts';
import { supportForces } from '../onSupport/supportForces.ts';
import { force, forceUnit } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { shares } from './boltForces.ts';
import { arrowsOf, halfMoon } from './bolts.ts';
import { onSupport } from './onSupport.ts';
import { fitting, type PathMaker, tag } from './pathMaker.ts';

const fields = ['joint.supportBolts.pitch', 'joint.supportBolts.crossCentres'];

/** All bolts into the support black, as cut. */
const blackBolts = (it: Facts): Circle[] =>
  supportCentres(it).map((centre) => ({ kind: 'path', centre, radius: it.supportBolts.d0 / 2, filled: true }));

/** Bolts cut between the support and what they hold; the force of each as an arrow. */
export const supportBoltShear: PathMaker = (it, words) => {
  const { n, p, d0 } = it.supportBolts;
  if (n === 0) return null;
  const unit = forceUnit(words.units);
  return onSupport(
    `Bolts into the support cut in one plane, black. Arrows: force of each bolt on ${fitting(it, words)}, ${unit}.`,
    {
      circles: blackBolts(it),
      ...arrowsOf(supportForces(it), { d0, spacing: Math.min(n > 1 ? p : Infinity, 3.2 * d0) }, words),
      fields,
    },
  );
};

/** Where the bolts press on the leg or end plate, which they push up; or on the support, which they push down. */
export const supportBearing: PathMaker = (it, words, of) => {
  if (it.supportBolts.n === 0) return null;
  const onIt = of.startsWith('support') && of !== 'support leg';
  const way = onIt ? -1 : 1;
  const forces = supportForces(it);
  const part = shares(forces);
  const worst = forces.find((_, i) => part[i]! > 0.9995);
  const { d0 } = it.supportBolts;
  const pushed = (towards: Point): Point => ({ x: way * towards.x, y: way * towards.y });
  const name = onIt ? 'the support' : fitting(it, words);
  return onSupport(
    `Bolts press on ${name} where it is black, on the side to which they push it. ${forceUnit(words.units)} on the bolt that carries the most.`,
    {
      areas: forces.map(({ at, towards }) => halfMoon(at, d0 / 2, pushed(towards))),
      tags: worst ? [beside(worst.at, pushed(worst.towards), d0, force(worst.size, words.units))] : [],
      fields,
    },
  );
};

const beside = (at: Point, towards: Point, far: number, text: string) => {
  const tip = { x: at.x + towards.x * far, y: at.y + towards.y * far };
  return tag(tip, tip, text);
};

/** The tie force pulls at the bolts into the support, and bends what they hold. */
export const supportPulled = (it: Facts, words: DrawingWords) =>
  it.supportBolts.n === 0
    ? null
    : onSupport(
        `The tie force pulls at the bolts into the support, black, and bends ${fitting(it, words)} between them and the web.`,
        { circles: blackBolts(it), fields },
      );
