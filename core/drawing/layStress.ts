import type { Line, Point } from './drawing.ts';
import type { Laid } from './laid.ts';
import { condensed, type Measure } from './measure.ts';
import { boxOf, CAPITAL, createPad, drawLine, drawStroke, type Pad, setLine, widthOf } from './pad.ts';
import type { StressFigure, StressProfile } from './stressFigure.ts';

export interface StressOptions {
  /** Text size (em), mm of the piece. */
  readonly textHeight: number;
  /** Width of the largest stress, mm of the piece. */
  readonly width: number;
  readonly measure?: Measure;
}

/** In text heights: hatch, base lines under the figure, space from figure to figure, the peak's line beyond base line and curve. */
const HATCH = 0.55;
const LEADING = 1.25;
const APART = 1.2;
const OVER = 0.6;
/** A limit is drawn as a line if it stands no further out than this share of the largest peak. */
const NEAR_LIMIT = 1.25;

/**
 * The profiles side by side from x = 0, on the piece's own levels: drawn beside the piece at its scale, levels read straight across.
 * Thick base line, curve, level hatch, the peak's level with its value, the mean stress dashed, the limit dashed where it is near.
 */
export const layoutStress = (figure: StressFigure, options: StressOptions): Laid => {
  const pad = createPad(options.textHeight, options.measure ?? condensed, 'gap');
  const { em } = pad;
  const bottom = Math.max(...figure.profiles.map((it) => it.bottom));
  let x = 0;
  for (const it of figure.profiles) {
    drawProfile(pad, it, x, options.width, Math.min(...figure.profiles.map((one) => one.top)));
    const rows = [it.mean.text, ...(it.limit === undefined ? [] : [it.limit.text])].map(second);
    for (const [i, row] of rows.entries()) setLine(pad, 'words', row, { x, y: bottom + (1.2 + i * LEADING) * em });
    const words = Math.max(...rows.map((row) => widthOf(pad, row)), options.width + OVER * em + valueWidth(pad, it));
    x += words + APART * em;
  }
  const lines = figure.profiles.some((it) => it.limit !== undefined) ? 2 : 1;
  setLine(pad, 'words', figure.foot, { x: 0, y: bottom + (1.4 + lines * LEADING) * em });
  const box = boxOf(pad.marks);
  const air = 0.35 * em;
  return {
    marks: pad.marks,
    box: { left: box.left - air, top: box.top - air, right: box.right + air, bottom: box.bottom + air },
    textHeight: em,
  };
};

const second = (text: string): Line => [{ text, role: 'second' }];
const value = ({ peak }: StressProfile): Line => [{ text: peak.text, role: 'note' }];
const valueWidth = (pad: Pad, it: StressProfile): number => widthOf(pad, value(it)) + 0.25 * pad.em;

const drawProfile = (pad: Pad, it: StressProfile, x: number, width: number, head: number): void => {
  const { em } = pad;
  const at = ({ x: share, y }: Point): Point => ({ x: x + share * width, y });
  const over = OVER * em;
  for (const y of levels(it, HATCH * em)) {
    drawLine(pad, 'piece', { x, y }, at({ x: shareAt(it.curve, y), y }), { kind: 'hatch' });
  }
  drawStroke(pad, 'piece', {
    kind: 'outline',
    from: { x, y: it.top },
    to: [...it.curve.map(at), { x, y: it.bottom }],
  });
  drawStroke(pad, 'piece', { kind: 'outline', from: { x, y: it.top }, to: [{ x, y: it.bottom }] });
  const peak = at({ x: it.peak.share, y: it.peak.at });
  drawLine(pad, 'piece', { x: x - over, y: peak.y }, { x: peak.x + over, y: peak.y }, { kind: 'centre' });
  setLine(pad, 'words', value(it), { x: peak.x + over + 0.2 * em, y: peak.y + (CAPITAL / 2) * em });
  upright(pad, at({ x: it.mean.share, y: it.top }), it.bottom);
  if (it.limit !== undefined && it.limit.share <= NEAR_LIMIT)
    upright(pad, at({ x: it.limit.share, y: it.top }), it.bottom);
  setLine(pad, 'words', [{ text: it.title, role: 'note' }], { x, y: head - 0.9 * em });
};

const upright = (pad: Pad, from: Point, bottom: number): void =>
  drawLine(pad, 'piece', from, { x: from.x, y: bottom }, { kind: 'hidden' });

/** Levels of the hatch, centred on the section. */
const levels = ({ top, bottom }: StressProfile, spacing: number): number[] => {
  const count = Math.floor((bottom - top) / spacing);
  const first = top + (bottom - top - (count - 1) * spacing) / 2;
  return Array.from({ length: count }, (_, i) => first + i * spacing);
};

/** The curve at a level, straight between its points. */
const shareAt = (curve: readonly Point[], y: number): number => {
  for (let i = 1; i < curve.length; i++) {
    const [a, b] = [curve[i - 1]!, curve[i]!];
    if (y >= a.y && y <= b.y && b.y > a.y) return a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y);
  }
  return 0;
};
