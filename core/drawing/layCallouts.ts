import type { Box, Callout, Line, Point } from './drawing.ts';
import { boxOf, CAPITAL, drawHead, drawLine, keepOff, type Pad } from './pad.ts';
import { AIR, blockBox, move, setBlock } from './place.ts';
import { rings } from './rings.ts';

/** Dislike of distance from the best place and of a long leader, in text heights. */
const FAR = 0.45;
const LEADER = 0.15;
/** A later variant of the words, and words beside the beam that should stand on it. */
const VARIANT = 1.5;
const OUTSIDE = 12;
/** A leader steeper than about 50 degrees. */
const STEEP = 3;
/** Air between words that else would be read on, in text heights. */
const ASIDE = 0.35;
/** Words that would make the drawing wider. */
const WIDER = 40;
/** Words that would make it higher, by the text height. */
const HIGHER = 3;

interface Found {
  readonly lines: readonly Line[];
  readonly at: Point;
  readonly leader: readonly [Point, Point] | null;
}

/** Words with their leaders, each at the free place nearest to where it stands best; blocks set to the left stand under each other if they can. */
export const layCallouts = (pad: Pad, callouts: readonly Callout[], beam: Box): void => {
  const drawn = boxOf(pad.marks);
  const places = { beam, drawn };
  let column: number | undefined;
  for (const it of callouts) {
    const near = column === undefined || it.align === 'end' ? it.near : { ...it.near, x: column };
    const found = search(pad, { ...it, near }, places);
    if (found === undefined) continue;
    if (found.leader !== null) drawLeader(pad, found.leader, it.end);
    setBlock(pad, found.lines, found.at, it.align);
    if (it.align === 'start') column = found.at.x;
  }
};

interface Places {
  readonly beam: Box;
  /** How far the drawing reaches already. */
  readonly drawn: Box;
}

const search = (pad: Pad, it: Callout, places: Places): Found | undefined => {
  const { em, ground } = pad;
  let best: Found | undefined;
  let least = Number.POSITIVE_INFINITY;
  // One box for all places tried: they are many.
  const box = { left: 0, top: 0, right: 0, bottom: 0 };
  for (const [v, lines] of it.variants.entries()) {
    // The block with its middle left (or right) end at the origin.
    const own = blockBox(pad, lines, { x: 0, y: 0 });
    const shift = { x: it.align === 'start' ? -own.left : -own.right, y: -(own.top + own.bottom) / 2 };
    for (const { x, y, far } of rings) {
      const base = far * FAR + v * VARIANT;
      if (base >= least) break;
      const [left, top] = [it.near.x + x * em + shift.x, it.near.y + y * em + shift.y];
      move(box, own, left, top);
      const there = base + dislike(it, box, places, em);
      if (there >= least) continue;
      const words = there + ground.cost(box, undefined, least - there, ASIDE * em);
      if (words >= least) continue;
      const { leader, cost } = leaderOf(pad, it, box, words, least);
      if (cost < least) [best, least] = [{ lines, at: { x: left, y: top }, leader }, cost];
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
  for (const [i, target] of targets.entries()) {
    const start = leaderStart(pad, box, target);
    if (start === null) continue;
    const run = Math.hypot(target.x - start.x, target.y - start.y) / pad.em;
    const steep = Math.abs(target.y - start.y) > 1.2 * Math.abs(target.x - start.x) ? STEEP : 0;
    const cost = words + i * 0.3 + run * LEADER + steep;
    if (cost >= least) continue;
    const whole = cost + pad.ground.crossing(start, target);
    if (whole < least) [leader, least] = [[start, target], whole];
  }
  return { leader, cost: leader === null ? Number.POSITIVE_INFINITY : least };
};

/** Beside the first line; above or below the block for a target that stands over or under it; none for one within. */
const leaderStart = ({ em }: Pad, { left, top, right, bottom }: Box, target: Point): Point | null => {
  const y = top + (AIR + CAPITAL / 2) * em;
  if (target.x <= left - 0.5 * em) return { x: left, y };
  if (target.x >= right + 0.5 * em) return { x: right, y };
  const x = Math.min(Math.max(target.x, left + 0.5 * em), right - 0.5 * em);
  if (target.y >= bottom) return { x, y: bottom };
  if (target.y <= top) return { x, y: top };
  return null;
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

const dislike = ({ onBeam }: Callout, box: Box, { beam, drawn }: Places, em: number): number =>
  (!onBeam || within(box, beam) ? 0 : OUTSIDE) +
  (box.left >= drawn.left && box.right <= drawn.right ? 0 : WIDER) +
  (HIGHER * Math.max(0, drawn.top - box.top, box.bottom - drawn.bottom)) / em;

const within = (box: Box, beam: Box): boolean =>
  box.left >= beam.left && box.right <= beam.right && box.top >= beam.top && box.bottom <= beam.bottom;
