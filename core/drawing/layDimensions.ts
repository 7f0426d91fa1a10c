import { endOf, middleOf, overAnother, pointOn, startOf } from './dimensionLine.ts';
import type { Box, Point, View } from './drawing.ts';
import { layExtensions } from './extensions.ts';
import { WORDS } from './ground.ts';
import { intoLanes, type Placed } from './lanes.ts';
import { CAPITAL, drawLine, keepOff, type Pad, setLine, widthOf } from './pad.ts';
import { rings } from './rings.ts';

const LINE_WEIGHT = 9;
const TICK_WEIGHT = 20;
/** A place further off with a leader is looked for where the places at the line cost more than this. */
const AWAY = 10;
/** In text heights: half-length of the oblique stroke, the free space beside a value in its line, a line drawn on beyond its end. */
const TICK = 0.3;
const GAP = 0.25;
const ON = 0.85;
/** Lines this near lie in one chain. */
const CHAIN = 0.5;

/** All dimensions: extension lines, dimension lines with oblique strokes, values. */
export const layDimensions = (pad: Pad, { dimensions }: View): Placed[] => {
  const placed = intoLanes(pad, dimensions);
  layExtensions(pad, placed);
  for (const it of placed) keepOff(pad, [pointOn(it, startOf(it)), pointOn(it, endOf(it))], LINE_WEIGHT, it);
  layTicks(pad, placed);
  const fits = (it: Placed): boolean => candidates(pad, it)[0]!.manner === 'in';
  for (const it of [...placed.filter(fits), ...placed.filter((one) => !fits(one))]) {
    layValue(pad, it, placed);
  }
  return placed;
};

/** `in` its line's gap (or above it), on the line drawn `on` beyond an end, `beside` it, or `away` from it with a leader. */
interface Spot {
  readonly manner: 'in' | 'on' | 'beside' | 'away';
  /** Middle of the value along the line, and its distance across from the line. */
  readonly along: number;
  readonly across: number;
  readonly cost: number;
}

const layValue = (pad: Pad, it: Placed, placed: readonly Placed[]): void => {
  const { dimension } = it;
  const close = cheapest(pad, it, candidates(pad, it), placed);
  const far = close.cost < AWAY ? close : cheapest(pad, it, anywhere(pad, it), placed);
  const best = far.cost < close.cost ? far.spot : close.spot;
  drawOwnLine(pad, it, best);
  const width = widthOf(pad, dimension.line);
  const { x, y } = spotPoint(it, best);
  const drop = (CAPITAL / 2) * pad.em;
  if (dimension.axis === 'y' && pad.values === 'parallel') {
    setLine(pad, 'size', dimension.line, { x: x + drop, y: y + width / 2 }, -90);
  } else {
    setLine(pad, 'size', dimension.line, { x: x - width / 2, y: y + drop });
  }
};

const cheapest = (
  pad: Pad,
  it: Placed,
  spots: readonly Spot[],
  placed: readonly Placed[],
): { spot: Spot; cost: number } => {
  let best = spots[0]!;
  let least = Number.POSITIVE_INFINITY;
  for (const spot of spots) {
    if (spot.cost >= least) continue;
    const cost = spot.cost + pad.ground.cost(valueBox(pad, it, spot), it, least - spot.cost);
    if (cost >= least) continue;
    const whole = cost + linesCost(pad, it, spot, placed);
    if (whole < least) [best, least] = [spot, whole];
  }
  return { spot: best, cost: least };
};

/**
 * What the value's own lines cost: the leader, and the dimension line drawn on beyond its end, which should not pass close by other words, nor lie
 * where another line of its chain does.
 */
const linesCost = (pad: Pad, it: Placed, spot: Spot, placed: readonly Placed[]): number => {
  const { em, ground } = pad;
  if (spot.manner === 'away') return ground.crossing(leaderEnd(pad, it, spot), middleOf(it));
  if (spot.manner !== 'on') return 0;
  const drawn = drawnOn(pad, it, spot);
  const beyond: [number, number] = spot.along < startOf(it) ? [drawn[0], startOf(it)] : [endOf(it), drawn[1]];
  const beside = [-GAP * em, 0, GAP * em].map((off) => ({ ...it, level: it.level + off }));
  const words = beside.map((line) => ground.words(pointOn(line, beyond[0]), pointOn(line, beyond[1])));
  return WORDS * (Math.max(...words) + (overAnother(it, beyond, placed, CHAIN * em) ? 1 : 0));
};

/** From where to where a line runs that is drawn on beyond its end. */
const drawnOn = (pad: Pad, it: Placed, spot: Spot): [number, number] => {
  const { em, values } = pad;
  const [start, end] = [startOf(it), endOf(it)];
  const far = values === 'gap' ? ON * em : widthOf(pad, it.dimension.line) + 0.7 * em;
  return spot.along < start ? [start - far, end + 0.45 * em] : [start - 0.45 * em, end + far];
};

/** Where even the places beside the line are taken: further off, with a leader. */
const anywhere = (pad: Pad, it: Placed): Spot[] => {
  const middle = (startOf(it) + endOf(it)) / 2;
  const level = it.dimension.axis === 'x';
  return rings.map(({ x, y, far }) => ({
    manner: 'away',
    along: middle + (level ? x : y) * pad.em,
    across: (level ? y : x) * pad.em,
    cost: AWAY + far,
  }));
};

/** Places for a value, those it would rather have first. */
const candidates = (pad: Pad, it: Placed): Spot[] => {
  const { em, values } = pad;
  const [start, end] = [startOf(it), endOf(it)];
  const middle = (start + end) / 2;
  const width = widthOf(pad, it.dimension.line);
  const level = it.dimension.axis === 'x';
  const size = level || values === 'parallel' ? width : CAPITAL * em;
  const clear = (values === 'gap' ? 2 * (GAP + TICK) : 0.3) * em;
  const rest = end - start - size - clear;
  const lift = values === 'parallel' ? -0.62 * em : 0;
  const spots: Spot[] = [];
  if (rest >= 0) {
    for (const share of [0, 0.15, -0.15, 0.3, -0.3, 0.45, -0.45]) {
      spots.push({ manner: 'in', along: middle + share * rest, across: lift, cost: Math.abs(share) * 4 });
    }
  }
  const beyond = size / 2 + (ON + GAP) * em;
  const over = values === 'parallel' ? size / 2 + 0.5 * em : beyond;
  spots.push({ manner: 'on', along: start - over, across: lift, cost: 3 });
  spots.push({ manner: 'on', along: end + over, across: lift, cost: 3.2 });
  const aside = level || values === 'parallel' ? 0.75 * em : width / 2 + 0.45 * em;
  for (const far of [1, 2, 3]) {
    const out = it.side === 'left' || it.side === 'top' ? -1 : 1;
    spots.push({ manner: 'beside', along: middle, across: out * aside * far, cost: 1 + 3 * far });
    spots.push({ manner: 'beside', along: middle, across: -out * aside * far, cost: 1.5 + 3 * far });
  }
  return spots;
};

const valueBox = (pad: Pad, it: Placed, spot: Spot): Box => {
  const { em } = pad;
  const { x, y } = spotPoint(it, spot);
  const half = widthOf(pad, it.dimension.line) / 2 + 0.12 * em;
  const high = 0.46 * em;
  return it.dimension.axis === 'y' && pad.values === 'parallel'
    ? { left: x - high, right: x + high, top: y - half, bottom: y + half }
    : { left: x - half, right: x + half, top: y - high, bottom: y + high };
};

const drawOwnLine = (pad: Pad, it: Placed, spot: Spot): void => {
  const { em } = pad;
  const [start, end] = [startOf(it), endOf(it)];
  const level = it.dimension.axis === 'x';
  const width = widthOf(pad, it.dimension.line);
  const along = level || pad.values === 'parallel' ? width : CAPITAL * em;
  const { path } = it.dimension;
  const piece = (a: number, b: number): void => drawLine(pad, 'size', pointOn(it, a), pointOn(it, b), { path });
  const half = along / 2 + GAP * em;
  if (spot.manner === 'in' && pad.values === 'gap') {
    piece(start, spot.along - half);
    piece(spot.along + half, end);
  } else if (spot.manner === 'on') {
    const [from, to] = drawnOn(pad, it, spot);
    piece(from, to);
    keepOff(pad, [pointOn(it, from), pointOn(it, to)], LINE_WEIGHT, it);
  } else piece(start, end);
  if (spot.manner === 'away') {
    drawLine(pad, 'size', middleOf(it), leaderEnd(pad, it, spot), { path });
    keepOff(pad, [middleOf(it), leaderEnd(pad, it, spot)], LINE_WEIGHT, it);
  }
};

/** The middle of the side of the value's box that faces its line. */
const leaderEnd = (pad: Pad, it: Placed, spot: Spot): Point => {
  const { left, top, right, bottom } = valueBox(pad, it, spot);
  return it.dimension.axis === 'x'
    ? { x: (left + right) / 2, y: spot.across < 0 ? bottom : top }
    : { x: spot.across < 0 ? right : left, y: (top + bottom) / 2 };
};

/** One oblique stroke wherever a dimension line ends, or two of them meet. */
const layTicks = (pad: Pad, placed: readonly Placed[]): void => {
  const half = TICK * pad.em;
  const ends = placed.flatMap((it) => [pointOn(it, startOf(it)), pointOn(it, endOf(it))]);
  const places = new Map(ends.map((at) => [`${at.x.toFixed(3)} ${at.y.toFixed(3)}`, at]));
  for (const { x, y } of places.values()) {
    const [from, to] = [
      { x: x - half, y: y + half },
      { x: x + half, y: y - half },
    ];
    drawLine(pad, 'size', from, to, { tick: true });
    keepOff(pad, [from, to], TICK_WEIGHT);
  }
};

const spotPoint = (it: Placed, { along, across }: Spot): Point =>
  it.dimension.axis === 'x' ? { x: along, y: it.level + across } : { x: it.level + across, y: along };
