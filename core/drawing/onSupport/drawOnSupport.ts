import type { Facts } from '../../end/facts.ts';
import { linesX, rowsY } from '../../end/supportPattern.ts';
import { note, second } from '../callouts.ts';
import type { Box, Callout, Circle, CutPart, Line, Stroke, View, WeldMark } from '../drawing.ts';
import { plateField } from '../fields.ts';
import { outlineOf, webAtPlate } from '../fitting.ts';
import { seam } from '../seam.ts';
import { length } from '../sizes.ts';
import { eachOf, legLine, spotsAlong } from '../weldMarks.ts';
import type { DrawingWords } from '../words.ts';
import { beamCut } from './beamCut.ts';
import { seenEdges } from './behind.ts';
import { fixedBox, sidesOf, supportLegBox, webLegBox } from './legs.ts';
import { liesOnSupport } from './liesOnSupport.ts';
import { onSupportDimensions } from './onSupportDimensions.ts';
import { oppositeHoles, supportCentreLines, supportHoles } from './supportBolts.ts';

/**
 * The view from the beam toward the support, cut just inside the beam's end: what lies on the support, its bolts or welds, and what is left of
 * the beam. Null where nothing lies on it: a plate on edge, a web bolted to a ply. On the levels of `drawEnd`.
 */
export const drawOnSupport = (it: Facts, words: DrawingWords): View | null => {
  if (!liesOnSupport(it)) return null;
  const beam = beamCut(it);
  const fixed = fixedBox(it);
  const piece = around([fixed, ...beam.boxes]);
  const opposite = oppositeHoles(it).filter((one) => isNear(boxOf(one), piece));
  const box = around([piece, ...opposite.map(boxOf)]);
  return {
    name: 'support',
    title: [second('on the support')],
    box,
    beam: box,
    strokes: [...beam.strokes, ...fixedStrokes(it, beam.boxes), ...welds(it), middle(box), ...supportCentreLines(it)],
    cuts: [beam.part, ...(it.bp > 0 ? [] : sidesOf(it).map((side) => cutLeg(it, side)))],
    holes: [...supportHoles(it), ...opposite],
    breaks: [],
    dimensions: onSupportDimensions(it, words, box),
    callouts: callouts(it, words, box),
    weld: weldMark(it, words),
    keptClear: [],
  };
};

const around = (boxes: readonly Box[]): Box => ({
  left: Math.min(...boxes.map((one) => one.left)),
  top: Math.min(...boxes.map((one) => one.top)),
  right: Math.max(...boxes.map((one) => one.right)),
  bottom: Math.max(...boxes.map((one) => one.bottom)),
});

const boxOf = ({ centre: { x, y }, radius }: Circle): Box => ({
  left: x - radius,
  top: y - radius,
  right: x + radius,
  bottom: y + radius,
});

/** A bolt farther off than half the depth of the piece is left out: it would shrink all else. */
const isNear = (one: Box, { left, top, right, bottom }: Box): boolean => {
  const off = (bottom - top) / 2;
  return one.left >= left - off && one.right <= right + off && one.top >= top - off && one.bottom <= bottom + off;
};

const middle = ({ top, bottom }: Box): Stroke => {
  const over = 0.03 * (bottom - top);
  return { kind: 'centre', from: { x: 0, y: top - over }, to: [{ x: 0, y: bottom + over }] };
};

const fixedStrokes = (it: Facts, cut: readonly Box[]): Stroke[] => {
  if (it.bp > 0) return seenEdges(fixedBox(it), cut);
  return sidesOf(it).flatMap((side) => [outlineOf(supportLegBox(it, side)), outlineOf(webLegBox(it, side))]);
};

/** A web leg, slanting against the web beside it. */
const cutLeg = (it: Facts, side: 1 | -1): CutPart => {
  const { left, top, right, bottom } = webLegBox(it, side);
  return {
    outline: [
      { x: left, y: top },
      { x: right, y: top },
      { x: right, y: bottom },
      { x: left, y: bottom },
    ],
    slant: -1,
  };
};

/** Fillets beside the web on an end plate; along the toe of a leg on the support, with its return across the top. */
const welds = (it: Facts): Stroke[] => {
  if (it.bp > 0) {
    const { top, bottom } = webAtPlate(it);
    const along = (side: 1 | -1): Stroke[] => {
      const x = (side * it.tw) / 2;
      return seam({ x, y: top }, { x, y: bottom }, { x: side, y: 0 }, it.leg);
    };
    return [...along(-1), ...along(1)];
  }
  if (it.weldTo !== 'support') return [];
  return sidesOf(it).flatMap((side) => {
    const { left, right, top, bottom } = supportLegBox(it, side);
    const x = side > 0 ? right : left;
    return [
      ...seam({ x, y: top }, { x, y: bottom }, { x: side, y: 0 }, it.leg),
      ...seam({ x: x - side * it.weldReturn, y: top }, { x, y: top }, { x: 0, y: -1 }, it.leg),
    ];
  });
};

const weldMark = (it: Facts, words: DrawingWords): WeldMark | null => {
  if (it.legSupport === 0 || it.weldTo !== 'support') return null;
  const side = sidesOf(it).at(-1)!;
  const { left, right, top, bottom } = supportLegBox(it, side);
  return {
    targets: spotsAlong(side > 0 ? right : left, top, bottom),
    line: legLine(it, words, plateField(it, 'supportWeld.leg')),
    towards: side > 0 ? 'right' : 'left',
    sides: 'arrow',
    practice: words.weldSymbols,
    ...eachOf(it, words),
  };
};

/** Bolts into the support, beside the view. */
const callouts = (it: Facts, { inSupport, units }: DrawingWords, box: Box): Callout[] => {
  const { n, lines, d0 } = it.supportBolts;
  if (n === 0 || inSupport === undefined) return [];
  const x = linesX(it).at(-1)!;
  const levels = rowsY(it);
  const bolts: Line = [note(`${n * lines} × ${inSupport.boltSize} ${inSupport.boltGrade}`)];
  const holes = `holes ${length(d0, units)}`;
  return [
    {
      name: 'support-bolts',
      targets: [...levels]
        .reverse()
        .map((y) => ({ x: x + (d0 / 2) * Math.cos(0.25), y: y + (d0 / 2) * Math.sin(0.25) })),
      end: 'arrow',
      variants: [
        [bolts, [second(`${holes} ${inSupport.holes}`)]],
        [bolts, [second(holes)], [second(inSupport.holes)]],
      ],
      near: { x: (x > 0 ? it.tw / 2 + (it.bp > 0 ? it.leg : 0) : box.left) + d0 / 4, y: it.yp + it.hp + 1.5 * d0 },
      onBeam: false,
      align: 'start',
    },
  ];
};
