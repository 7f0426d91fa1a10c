import type { Facts } from '../end/facts.ts';
import { shearPeak } from '../shape/shearStress.ts';
import { centreLines, holes } from './bolts.ts';
import { callouts } from './callouts.ts';
import { dimensions } from './dimensions.ts';
import type { Box, Drawing, Line, Point } from './drawing.ts';
import { drawnLength } from './drawnLength.ts';
import { before, fittingFromSide } from './fitting.ts';
import { elevation } from './outline.ts';
import { plateBox } from './plate.ts';
import { forceUnit, length, reaction } from './sizes.ts';
import { faceSpan, supportBox, supportSection } from './support.ts';
import { weldFromSide } from './weldMarks.ts';
import type { DrawingWords } from './words.ts';

/**
 * The elevation of one end with everything that is said on it. Facts in N and mm; the reaction shown is `facts.V`, so pass the end's own.
 * Any facts with finite numbers give a drawing; ends that cannot be made are drawn as they are described.
 */
export const drawEnd = (facts: Facts, words: DrawingWords): Drawing => {
  const right = drawnLength(facts, words);
  const box = pieceBox(facts, right);
  const { h } = facts;
  return {
    name: 'side',
    title: [{ text: 'side view', role: 'second' }],
    box,
    beam: { left: 0, top: 0, right, bottom: h },
    strokes: [
      ...supportSection(facts),
      ...fittingFromSide(facts),
      ...elevation(facts, right, before(facts)),
      ...centreLines(facts),
    ],
    cuts: [],
    holes: holes(facts),
    breaks: [{ x: right, top: 0, bottom: h }],
    dimensions: [
      ...dimensions(facts, words, box),
      {
        axis: 'y',
        from: { x: right, y: 0 },
        to: { x: right, y: h },
        at: { side: 'right', base: right, lane: 1 },
        line: [{ text: `(${length(h, words.units)})`, role: 'derived' }],
        value: h,
      },
    ],
    callouts: callouts(facts, words, right),
    weld: weldFromSide(facts, words),
    keptClear: keptClear(facts, right),
    face: {
      x: -facts.g,
      ...faceSpan(facts),
      line: [{ text: 'support face', role: 'second' }],
    },
    reaction: reactionLine(facts, words),
  };
};

const pieceBox = (it: Facts, right: number): Box => {
  const plate = plateBox(it);
  const support = supportBox(it);
  return {
    left: Math.min(0, plate.left, support?.left ?? 0),
    top: Math.min(0, plate.top, support?.top ?? 0),
    right: Math.max(right, support?.right ?? 0),
    bottom: Math.max(it.h, plate.bottom, support?.bottom ?? 0),
  };
};

const reactionLine = (it: Facts, { units }: DrawingWords): Line => [
  { text: 'V', role: 'note', italic: true },
  { text: reaction(it.V, units), role: 'size', path: 'reaction' },
  { text: forceUnit(units), role: 'second' },
];

/** Faces of the copes through the web, the first column, and the level where the full section is sheared most. */
const keptClear = (it: Facts, right: number): [Point, Point][] => {
  const level = shearPeak(it.whole).at;
  const uncut = Math.max(it.ct, it.cb, plateBox(it).right);
  return [
    ...[it.ct, it.cb, it.eEnd]
      .filter((x) => x > 0)
      .map((x): [Point, Point] => [
        { x, y: it.dt },
        { x, y: it.h - it.db },
      ]),
    [
      { x: uncut, y: level },
      { x: right, y: level },
    ],
  ];
};
