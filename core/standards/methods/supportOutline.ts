import { byKind, isEndPlate, isPlate } from '../../end/byKind.ts';
import type { Facts } from '../../end/facts.ts';
import { type Gate, noSupportBolts, noSupportWeld } from '../../end/gates.ts';
import { b, bp, flag, hp, leg, legSupport, support, supportBolts, tp, tw, yp } from '../../end/given.ts';
import { atMost, below, constant, minus, over, pick, plus, step, type Tree } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitPart } from '../standard.ts';

/** No clause: what the outline of the support leaves room for. */
const source = { clause: 'practice', basis: 'practice' } as const;

/** Room on either side of a beam that goes in between a column's flanges: common practice, from memory. */
const ROOM = constant('5 mm', 5, '1,0');

const unlessFixedTo = (called: string, kind: Facts['supportKind']): Gate => ({
  when: flag('', (f) => f.supportKind !== kind || f.support.h === 0, `not on ${called} of a section named`),
  reason: 'no-support',
});
const notColumnFlange = unlessFixedTo("a column's flange", 'column-flange');
export const notColumnWeb = unlessFixedTo("a column's web", 'column-web');
export const notBeamWeb = unlessFixedTo("a beam's web", 'beam-web');
const plyOfSupport: Gate = {
  when: byKind('', (kind) => kind === 'web-bolts', 'a ply of the support'),
  reason: 'no-weld',
};

const half = over(support.b, 2);
const flangeEdge = step(
  'e_f',
  minus(half, over(supportBolts.cc, 2)),
  source,
  'from the line to the edge of the flange',
);

/**
 * Bolts lie inside a column's flange, the beam's web at its middle: its rolled edge as far from them as any edge of that kind, `least`, mm. A
 * hole that leaves the flange cannot be drilled.
 */
export const insideFlange = (least: Tree<Length>, breach?: FitPart['breach']): FitPart => ({
  of: "in the column's flange",
  given: flangeEdge,
  least,
  off: [noSupportBolts, notColumnFlange],
  clash: atMost(flangeEdge, over(supportBolts.d0, 2)),
  ...(breach && { breach }),
});

/** From the web's middle to the outer edge of what lies on the support, its weld included. */
const outer = step(
  'x_o',
  pick(
    [
      [byKind('', isEndPlate, 'an end plate'), over(bp, 2)],
      [byKind('', isPlate, 'a fin plate'), plus(over(tw, 2), tp, leg)],
      [flag('', (f) => f.weldTo === 'support', 'a weld to the support'), plus(over(tw, 2), legSupport, leg)],
    ],
    plus(over(tw, 2), legSupport),
  ),
  source,
  "from the web's middle to the outer edge",
);
/** From the middle of a column's web to the inner face of its flange. */
export const columnFace = minus(over(support.h, 2), support.tf);

/**
 * What is welded lies on a column's flange; what is bolted may overhang it. On a column's web both lie on its flat, between the root fillets:
 * on a fillet they do not lie flat, over a flange they cannot lie at all.
 */
export const onColumn: readonly FitPart[] = [
  {
    of: "on the column's flange",
    given: outer,
    most: half,
    off: [noSupportWeld, notColumnFlange],
    clash: below(half, outer),
    source,
  },
  {
    of: "between the column's flanges",
    given: outer,
    most: step('x_max', minus(columnFace, support.r), source, "half the flat of the column's web"),
    off: [plyOfSupport, notColumnWeb],
    breach: 'refer',
    clash: below(columnFace, outer),
    source,
  },
];

const root = step('t_f,s + r_s', plus(support.tf, support.r), source);
const belowTop = step('y_s', plus(yp, support.above), source, "from the support's top to the fitting");
const aboveFoot = step(
  'y_s',
  minus(support.h, plus(yp, hp, support.above)),
  source,
  "from the fitting to the support's foot",
);
const onWeb = (of: string, given: Tree<Length>): FitPart => ({
  of,
  given,
  least: root,
  off: [plyOfSupport, notBeamWeb],
  breach: 'refer',
  clash: below(given, support.tf),
  source,
});

/** What lies on the web of a supporting beam lies on its flat, between the root fillets; over a flange it cannot lie. */
export const onBeamWeb: readonly FitPart[] = [
  onWeb("top, on the support's web", belowTop),
  onWeb("bottom, on the support's web", aboveFoot),
];

/** How far the beam's flange reaches from the middle of its web, mm. */
const reach = pick([[flag('', (f) => f.channel, 'a channel'), minus(b, over(tw, 2))]], over(b, 2));
const besideBeam = step('x_b', minus(columnFace, reach), source, "from the beam's flange to the column's");

/** No flange of the beam goes in between the flanges of the column: both are cut back past them, or the beam ends before. */
const flangesOutside: Gate = {
  when: flag(
    '',
    ({ support: s, g, ct, dt, cb, db, tf }) => {
      const past = (s.b - s.tw) / 2 - 1e-9;
      return g >= past || (dt >= tf && g + ct >= past && db >= tf && g + cb >= past);
    },
    "the beam's flanges end before the column's",
  ),
  reason: 'clear-of-support',
};

/** A beam that goes in between a column's flanges has room beside its own. */
export const betweenFlanges: readonly FitPart[] = [
  {
    of: "between the column's flanges",
    given: besideBeam,
    least: ROOM,
    off: [notColumnWeb, flangesOutside],
    breach: 'refer',
    clash: atMost(besideBeam, constant('0', 0, '1,0')),
    source,
  },
];
