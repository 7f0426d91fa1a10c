import type { Box, Point, WeldMark } from './drawing.ts';
import { CAPITAL, drawHead, drawStroke, keepOff, type Pad, setLine, widthOf } from './pad.ts';

/** In text heights: the triangle's leg, from its upright side to the knee, and the air around words and symbol. */
const LEG = 0.7;
const CORNER = 0.95;
const AIR = 0.3;
/** Of the words over the reference line. */
const LIFT = 0.25;

interface Spot {
  readonly target: Point;
  readonly knee: Point;
}

/** Arrow line, reference line, fillet on both sides, size before it (ISO 2553); left of the support's face. */
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

const spots = function* ({ em }: Pad, { targets }: WeldMark): Generator<Spot & { cost: number }> {
  for (const [i, target] of targets.entries()) {
    for (const away of [0.8, 1.4, 2.2, 3.6, 5, 7, 9, 11]) {
      for (const down of i === 1 ? [-1.6, -2.6, -4] : [1.6, 2.4, 3.4, 5, -1.6]) {
        const knee = { x: target.x - away * em, y: target.y + down * em };
        yield { target, knee, cost: i * 3 + away + Math.abs(down) * 0.5 };
      }
    }
  }
};

const symbolBox = (pad: Pad, { line }: WeldMark, knee: Point): Box => ({
  left: knee.x - widthOf(pad, line) - (CORNER + 2 * AIR) * pad.em,
  right: knee.x + 0.1 * pad.em,
  top: knee.y - (CAPITAL + LIFT + AIR) * pad.em,
  bottom: knee.y + (LEG + AIR) * pad.em,
});

const draw = (pad: Pad, weld: WeldMark, { target, knee }: Spot): void => {
  const { em, ground } = pad;
  const corner = knee.x - CORNER * em;
  const start = { x: corner - AIR * em - widthOf(pad, weld.line), y: knee.y };
  drawStroke(pad, 'words', { kind: 'narrow', from: start, to: [knee, target] });
  drawHead(pad, 'words', [knee, target], 0.6);
  const leg = LEG * em;
  drawStroke(pad, 'words', {
    kind: 'narrow',
    from: { x: corner, y: knee.y - leg },
    to: [
      { x: corner, y: knee.y + leg },
      { x: corner + leg, y: knee.y },
    ],
    closed: true,
  });
  setLine(pad, 'words', weld.line, { x: start.x, y: knee.y - LIFT * em });
  ground.take(symbolBox(pad, weld, knee));
  keepOff(pad, [knee, target], 8);
};
