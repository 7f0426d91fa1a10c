import { chords } from './arcs.ts';
import type { Arc, Box, Line, LineKind, Point, Stroke, Word } from './drawing.ts';
import { createGround, type Ground } from './ground.ts';
import type { LaidRun, Layer, Mark } from './laid.ts';
import type { Measure } from './measure.ts';

/** The sheet that the layout writes on: marks made so far, what stands where, and the text it is set in. */
export interface Pad {
  /** Text size, mm of the piece. */
  readonly em: number;
  readonly measure: Measure;
  readonly values: 'gap' | 'parallel';
  readonly ground: Ground;
  readonly marks: Mark[];
  /** Widths of the lines measured so far: a line is measured again for every place that is tried for it. */
  readonly widths: Map<Line, number>;
}

/** Height of capitals and figures over the text size. */
export const CAPITAL = 0.7;
/** Space between words over the text size. */
const SPACE = 0.24;

/** How much words should keep off a line of each kind. */
const WEIGHTS: Readonly<Record<LineKind, number>> = {
  outline: 40,
  break: 30,
  path: 30,
  force: 40,
  hidden: 18,
  neighbour: 10,
  centre: 8,
  narrow: 20,
  hatch: 0.4,
};

export const createPad = (em: number, measure: Measure, values: 'gap' | 'parallel'): Pad => ({
  em,
  measure,
  values,
  ground: createGround(),
  marks: [],
  widths: new Map(),
});

/** Draws a stroke and keeps words off it. */
export const drawStroke = (pad: Pad, layer: Layer, { kind, from, to, closed, arrow }: Stroke): void => {
  pad.marks.push({ shape: 'run', layer, kind, from, to, closed: closed ?? false });
  keepOff(pad, chords(from, to, closed), WEIGHTS[kind]);
  if (arrow === true) drawHead(pad, layer, chords(from, to), kind === 'force' ? 0.85 : 0.6);
};

/** Draws a straight line that belongs to a dimension. */
export const drawLine = (
  pad: Pad,
  layer: Layer,
  from: Point,
  to: Point,
  more: { kind?: LineKind; path?: string | undefined; tick?: boolean } = {},
): void => {
  const run: LaidRun = { shape: 'run', layer, kind: more.kind ?? 'narrow', from, to: [to], closed: false };
  pad.marks.push({
    ...run,
    ...(more.path === undefined ? {} : { path: more.path }),
    ...(more.tick === true ? { tick: true } : {}),
  });
};

export const keepOff = ({ ground }: Pad, points: readonly Point[], weight: number, owner?: object): void => {
  for (let i = 1; i < points.length; i++) ground.line(points[i - 1]!, points[i]!, weight, owner);
};

/** A filled head at the end of a line; `size` in text heights. */
export const drawHead = ({ em, marks }: Pad, layer: Layer, points: readonly Point[], size: number): void => {
  const [tip, from] = [points.at(-1), points.at(-2)];
  if (tip === undefined || from === undefined) return;
  const run = Math.hypot(tip.x - from.x, tip.y - from.y);
  if (run < 1e-9) return;
  const [ux, uy] = [(tip.x - from.x) / run, (tip.y - from.y) / run];
  const [long, half] = [size * em, size * em * 0.21];
  const back = { x: tip.x - ux * long, y: tip.y - uy * long };
  marks.push({
    shape: 'fill',
    layer,
    outline: [tip, { x: back.x - uy * half, y: back.y + ux * half }, { x: back.x + uy * half, y: back.y - ux * half }],
  });
};

const wordWidth = ({ measure, em }: Pad, { text, role }: Word): number => measure(text, em, role === 'path');

export const widthOf = (pad: Pad, line: Line): number => {
  const { em, widths } = pad;
  const known = widths.get(line);
  if (known !== undefined) return known;
  const words = line.reduce((sum, word) => sum + wordWidth(pad, word), 0);
  const width = words + Math.max(0, line.length - 1) * SPACE * em;
  widths.set(line, width);
  return width;
};

/** A line of words whose left end (upright: lower end) stands on the base line at `at`. */
export const setLine = (pad: Pad, layer: Layer, line: Line, at: Point, rotation: 0 | -90 = 0): void => {
  const { em, marks, ground } = pad;
  let along = 0;
  for (const word of line) {
    const { text, role, path, italic } = word;
    const width = wordWidth(pad, word);
    const box = wordBox(at, along, width, em, rotation);
    const middle = along + width / 2;
    marks.push({
      shape: 'text',
      layer,
      text,
      at: rotation === 0 ? { x: at.x + middle, y: at.y } : { x: at.x, y: at.y - middle },
      anchor: 'middle',
      rotation,
      size: em,
      role,
      italic: italic ?? false,
      ...(path === undefined ? {} : { path }),
      box,
    });
    ground.take(box);
    along += width + SPACE * em;
  }
};

const wordBox = (at: Point, along: number, width: number, em: number, rotation: 0 | -90): Box => {
  const [up, down] = [(CAPITAL + 0.06) * em, 0.11 * em];
  return rotation === 0
    ? { left: at.x + along, right: at.x + along + width, top: at.y - up, bottom: at.y + down }
    : { left: at.x - up, right: at.x + down, top: at.y - along - width, bottom: at.y - along };
};

/** The least box around marks. */
export const boxOf = (marks: readonly Mark[]): Box => {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  const add = ({ x, y }: Point): void => {
    left = Math.min(left, x);
    right = Math.max(right, x);
    top = Math.min(top, y);
    bottom = Math.max(bottom, y);
  };
  for (const it of marks) {
    if (it.shape === 'run') for (const point of chords(it.from, it.to as readonly (Point | Arc)[])) add(point);
    else if (it.shape === 'fill') for (const point of it.outline) add(point);
    else if (it.shape === 'circle') {
      add({ x: it.centre.x - it.radius, y: it.centre.y - it.radius });
      add({ x: it.centre.x + it.radius, y: it.centre.y + it.radius });
    } else {
      add({ x: it.box.left, y: it.box.top });
      add({ x: it.box.right, y: it.box.bottom });
    }
  }
  return { left, top, right, bottom };
};
