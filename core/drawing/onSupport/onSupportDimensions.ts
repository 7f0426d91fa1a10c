import type { Facts } from '../../end/facts.ts';
import { linesX, rowsY } from '../../end/supportPattern.ts';
import { CROSS } from '../bolts.ts';
import type { Box, Dimension, Lane, Point } from '../drawing.ts';
import { plateField } from '../fields.ts';
import { type Make, maker } from '../sized.ts';
import type { DrawingWords } from '../words.ts';
import { fixedBox, sidesOf, supportLegBox } from './legs.ts';

/** Sizes that the view on the support adds to those from the side, each once. */
export const onSupportDimensions = (it: Facts, words: DrawingWords, box: Box): Dimension[] => {
  const make = maker(words);
  return [
    ...(it.supportBolts.n > 0 ? [...rows(it, make, box), ...lines(it, make, box)] : weldReturn(it, make)),
    ...widths(it, make, box),
  ];
};

/** Edge, rows, and the edge below that follows. */
const rows = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at: Lane = { side: 'left', base: box.left, lane: 1 };
  const plate = fixedBox(it);
  const x = linesX(it)[0]! - (CROSS * it.supportBolts.d0) / 2;
  const levels = rowsY(it);
  const [first, last] = [
    { x, y: levels[0]! },
    { x, y: levels.at(-1)! },
  ];
  const [head, foot] = [
    { x: plate.left, y: plate.top },
    { x: plate.left, y: plate.bottom },
  ];
  const spaces = it.supportBolts.n - 1;
  return [
    make({ axis: 'y', from: head, to: first, at, path: 'joint.supportBolts.topEdge' }),
    ...(spaces > 0 ? [make({ axis: 'y', from: first, to: last, at, path: 'joint.supportBolts.pitch', spaces })] : []),
    make({ axis: 'y', from: last, to: foot, at }),
  ];
};

/** Cross centres, and the edge beside them that follows. Of one line alone its distance from the web's middle, which is half of them. */
const lines = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at: Lane = { side: 'top', base: box.top, lane: 1 };
  const y = rowsY(it)[0]! - (CROSS * 1.3 * it.supportBolts.d0) / 2;
  const path = 'joint.supportBolts.crossCentres';
  const plate = fixedBox(it);
  const [first, second] = linesX(it);
  const left: Point = { x: first!, y };
  if (second === undefined) {
    const middle: Point = { x: 0, y: it.dt };
    const edge: Point = { x: plate.left, y: plate.top };
    return [
      make({ axis: 'x', from: left, to: middle, at, path, spaces: 0.5 }),
      make({ axis: 'x', from: edge, to: left, at }),
    ];
  }
  const right: Point = { x: second, y };
  const edge: Point = { x: plate.right, y: plate.top };
  return [make({ axis: 'x', from: left, to: right, at, path }), make({ axis: 'x', from: right, to: edge, at })];
};

/** Width of an end plate, or a leg from its heel. */
const widths = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at: Lane = { side: 'bottom', base: box.bottom, lane: 1 };
  const side = sidesOf(it).at(-1)!;
  const { left, right, bottom } = it.bp > 0 ? fixedBox(it) : supportLegBox(it, side);
  const [from, to] = [
    { x: left, y: bottom },
    { x: right, y: bottom },
  ];
  return [make({ axis: 'x', from, to, at, path: plateField(it, it.bp > 0 ? 'width' : 'legSupport') })];
};

/** Across the top of a leg that is welded to the support; none where it has no return. */
const weldReturn = (it: Facts, make: Make): Dimension[] => {
  if (it.weldTo !== 'support' || it.weldReturn === 0) return [];
  const side = sidesOf(it).at(-1)!;
  const { left, right, top } = supportLegBox(it, side);
  const toe = side > 0 ? right : left;
  const [from, to] = [
    { x: toe - side * it.weldReturn, y: top },
    { x: toe, y: top },
  ];
  const at: Lane = { side: 'top', base: top, lane: 1 };
  return [make({ axis: 'x', from, to, at, path: plateField(it, 'supportWeld.return') })];
};
