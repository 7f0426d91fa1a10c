import type { Box, Callout, Line, Point } from './drawing.ts';
import { CAPITAL, drawHead, drawLine, keepOff, type Pad } from './pad.ts';
import { AIR, blockBox, setBlock } from './place.ts';
import { rings } from './rings.ts';

/** Dislike of distance from the best place and of a long leader, in text heights. */
const FAR = 0.45;
const LEADER = 0.15;
/** A later variant of the words, and words beside the beam that should stand on it. */
const VARIANT = 1.5;
const OUTSIDE = 12;

interface Found {
  readonly lines: readonly Line[];
  readonly at: Point;
  readonly leader: readonly [Point, Point] | null;
}

/** Words with their leaders, each at the free place nearest to where it stands best; blocks set to the left stand under each other if they can. */
export const layCallouts = (pad: Pad, callouts: readonly Callout[], beam: Box): void => {
  let column: number | undefined;
  for (const it of callouts) {
    const near = column === undefined || it.align === 'end' ? it.near : { ...it.near, x: column };
    const found = search(pad, { ...it, near }, beam);
    if (found === undefined) continue;
    if (found.leader !== null) drawLeader(pad, found.leader, it.end);
    setBlock(pad, found.lines, found.at, it.align);
    if (it.align === 'start') column = found.at.x;
  }
};

const search = (pad: Pad, it: Callout, beam: Box): Found | undefined => {
  const { em, ground } = pad;
  let best: Found | undefined;
  let least = Number.POSITIVE_INFINITY;
  for (const [v, lines] of it.variants.entries()) {
    // The block with its middle left (or right) end at the origin.
    const own = blockBox(pad, lines, { x: 0, y: 0 });
    const shift = { x: it.align === 'start' ? -own.left : -own.right, y: -(own.top + own.bottom) / 2 };
    for (const { x, y, far } of rings) {
      const base = far * FAR + v * VARIANT;
      if (base >= least) break;
      const at = { x: it.near.x + x * em + shift.x, y: it.near.y + y * em + shift.y };
      const box = {
        left: at.x + own.left,
        right: at.x + own.right,
        top: at.y + own.top,
        bottom: at.y + own.bottom,
      };
      const there = base + (!it.onBeam || within(box, beam) ? 0 : OUTSIDE);
      if (there >= least) continue;
      const words = there + ground.cost(box, undefined, least - there);
      if (words >= least) continue;
      const { leader, cost } = leaderOf(pad, it, box, words, least);
      if (cost < least) [best, least] = [{ lines, at, leader }, cost];
    }
  }
  return best;
};

const leaderOf = (
  pad: Pad,
  { targets, end }: Callout,
  box: Box,
  words: number,
  enough: number,
): { leader: readonly [Point, Point] | null; cost: number } => {
  if (end === 'none') return { leader: null, cost: words };
  let leader: readonly [Point, Point] | null = null;
  let least = enough;
  const y = box.top + (AIR + CAPITAL / 2) * pad.em;
  for (const [i, target] of targets.entries()) {
    const x = target.x <= (box.left + box.right) / 2 ? box.left : box.right;
    const run = Math.hypot(target.x - x, target.y - y) / pad.em;
    const inBox = target.x > box.left - pad.em && target.x < box.right + pad.em;
    const steep = Math.abs(target.y - y) > 1.2 * Math.abs(target.x - x) ? 3 : 0;
    const cost = words + i * 0.3 + run * LEADER + steep + (inBox ? 4 : 0);
    if (cost >= least) continue;
    const whole = cost + pad.ground.crossing({ x, y }, target);
    if (whole < least) [leader, least] = [[{ x, y }, target], whole];
  }
  return { leader, cost: leader === null ? Number.POSITIVE_INFINITY : least };
};

const drawLeader = (pad: Pad, [from, to]: readonly [Point, Point], end: Callout['end']): void => {
  drawLine(pad, 'words', from, to);
  keepOff(pad, [from, to], 8);
  if (end === 'arrow') drawHead(pad, 'words', [from, to], 0.6);
  else
    pad.marks.push({
      shape: 'circle',
      layer: 'words',
      kind: 'narrow',
      centre: to,
      radius: 0.11 * pad.em,
      filled: true,
    });
};

const within = (box: Box, beam: Box): boolean =>
  box.left >= beam.left && box.right <= beam.right && box.top >= beam.top && box.bottom <= beam.bottom;
