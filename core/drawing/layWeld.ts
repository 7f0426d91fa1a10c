import type { Box, Line, Point, WeldMark } from './drawing.ts';
import { CAPITAL, drawHead, drawStroke, keepOff, type Pad, setLine, widthOf } from './pad.ts';

/** In text heights: the triangle's leg, its upright side to the line's near end, the air around words and symbol, the tail's fork. */
const LEG = 0.7;
const CORNER = 0.95;
const AIR = 0.3;
const FORK = 0.45;
/** Of the words over and under the reference line, and of the dashed line of the other side. */
const LIFT = 0.25;
const OTHER_SIDE = 0.22;

/** Dislike of places far above or below, for where the near ones are taken. */
const CROWDED = 15;

interface Spot {
  readonly target: Point;
  readonly knee: Point;
}

/** Arrow line, reference line, fillet, size before it: ISO 2553 (system A) or AWS A2.4. */
export const layWeld = (pad: Pad, weld: WeldMark): void => {
  let best: Spot | undefined;
  let least = Number.POSITIVE_INFINITY;
  for (const spot of spots(pad, weld)) {
    if (spot.cost >= least) continue;
    const cost =
      spot.cost + pad.ground.cost(symbolBox(pad, weld, spot.knee)) + pad.ground.crossing(spot.knee, spot.target);
    if (cost < least) [best, least] = [spot, cost];
  }
  if (best !== undefined) draw(pad, weld, best);
};

const outOf = ({ towards }: WeldMark): 1 | -1 => (towards === 'right' ? 1 : -1);

const spots = function* ({ em }: Pad, weld: WeldMark): Generator<Spot & { cost: number }> {
  const out = outOf(weld);
  for (const [i, target] of weld.targets.entries()) {
    for (const away of [0.8, 1.4, 2.2, 3.6, 5, 7, 9, 11]) {
      for (const down of i === 1 ? [-1.6, -2.6, -4] : [1.6, 2.4, 3.4, 5, -1.6]) {
        const knee = { x: target.x + out * away * em, y: target.y + down * em };
        yield { target, knee, cost: i * 3 + away + Math.abs(down) * 0.5 };
      }
      for (const down of [-7, -5, 7, 9]) {
        const knee = { x: target.x + out * away * em, y: target.y + down * em };
        yield { target, knee, cost: CROWDED + i * 3 + away + Math.abs(down) };
      }
    }
  }
};

/** How far the reference line reaches from the knee: size and triangle, and the tail with its words. */
const reach = (pad: Pad, { line, tail }: WeldMark): { symbol: number; tail: number } => ({
  symbol: widthOf(pad, line) + (CORNER + AIR) * pad.em,
  tail: tail === undefined ? 0 : (FORK + AIR) * pad.em + widthOf(pad, tail),
});

const symbolBox = (pad: Pad, weld: WeldMark, knee: Point): Box => {
  const { em } = pad;
  const long = reach(pad, weld);
  const far = long.symbol + long.tail + AIR * em;
  const right = weld.towards === 'right';
  const words = (CAPITAL + LIFT + AIR) * em;
  const under = weld.practice === 'aws' ? words : ((weld.sides === 'both' ? LEG : OTHER_SIDE) + AIR) * em;
  return {
    left: knee.x - (right ? 0.1 * em : far),
    right: knee.x + (right ? far : 0.1 * em),
    top: knee.y - words,
    bottom: knee.y + under,
  };
};

const draw = (pad: Pad, weld: WeldMark, { target, knee }: Spot): void => {
  const { em, ground } = pad;
  const { line, practice, sides } = weld;
  const long = reach(pad, weld);
  // The reference line is read from the left: words, then the triangle, whichever end the arrow leaves from.
  const left = weld.towards === 'right' ? knee.x : knee.x - long.symbol;
  const far = knee.x + outOf(weld) * long.symbol;
  const corner = left + widthOf(pad, line) + AIR * em;
  drawStroke(pad, 'words', { kind: 'narrow', from: { x: far, y: knee.y }, to: [knee, target] });
  drawHead(pad, 'words', [knee, target], 0.6);
  const above = sides === 'both' || practice === 'iso';
  const below = sides === 'both' || practice === 'aws';
  drawTriangle(pad, { x: corner, y: knee.y }, above, below);
  if (practice === 'iso' && sides === 'arrow') {
    const y = knee.y + OTHER_SIDE * em;
    drawStroke(pad, 'words', { kind: 'hidden', from: { x: left, y }, to: [{ x: left + long.symbol, y }] });
  }
  writeSizes(pad, weld, { x: left, y: knee.y });
  if (weld.tail) drawTail(pad, weld, { x: far, y: knee.y }, weld.tail);
  ground.take(symbolBox(pad, weld, knee));
  keepOff(pad, [knee, target], 8);
};

/** The fillet's triangle, its upright side to the left, on one side of the line or on both. */
const drawTriangle = (pad: Pad, { x, y }: Point, above: boolean, below: boolean): void => {
  const leg = LEG * pad.em;
  drawStroke(pad, 'words', {
    kind: 'narrow',
    from: { x, y: y - (above ? leg : 0) },
    to: [
      { x, y: y + (below ? leg : 0) },
      { x: x + leg, y },
    ],
    closed: true,
  });
};

/** The size stands once over the line; by AWS on each side that is welded, and once only as a field. */
const writeSizes = (pad: Pad, { line, practice, sides }: WeldMark, { x, y }: Point): void => {
  const over = y - LIFT * pad.em;
  const under = y + (LIFT + CAPITAL) * pad.em;
  const only = practice === 'aws' && sides === 'arrow';
  setLine(pad, 'words', line, { x, y: only ? under : over });
  if (practice === 'aws' && sides === 'both') {
    const again = line.map(({ text }): Line[number] => ({ text, role: 'note' }));
    setLine(pad, 'words', again, { x, y: under });
  }
};

/** A fork at the line's far end, and the words in it. */
const drawTail = (pad: Pad, weld: WeldMark, { x, y }: Point, tail: Line): void => {
  const { em } = pad;
  const out = outOf(weld);
  const tip = x + out * FORK * em;
  drawStroke(pad, 'words', {
    kind: 'narrow',
    from: { x: tip, y: y - FORK * em },
    to: [
      { x, y },
      { x: tip, y: y + FORK * em },
    ],
  });
  const start = out > 0 ? tip + 0.1 * em : tip - 0.1 * em - widthOf(pad, tail);
  setLine(pad, 'words', tail, { x: start, y: y + (CAPITAL / 2) * em });
};
