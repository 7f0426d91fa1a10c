import { chords, endOf } from './arcs.ts';
import type { Circle, FailurePath, Point, Tag } from './drawing.ts';
import { hatchLines } from './hatch.ts';
import { layTag } from './layTag.ts';
import { boxOf, drawStroke, keepOff, type Pad } from './pad.ts';

/** Spacing of the hatch in text heights. */
const HATCH = 0.5;
/** How much words keep off the edge of a black area. */
const BLACK = 40;

/** The areas and lines of a way of failing, where they run through the fewest words; gives its words back, which speak of the lines as they lie now. */
export const layPathLines = (pad: Pad, given: FailurePath, holes: readonly Circle[]): readonly Tag[] => {
  const path = moved(given, clearShift(pad, given));
  for (const { outline, fill } of path.areas) {
    if (fill === 'black') {
      pad.marks.push({ shape: 'fill', layer: 'path', outline });
      keepOff(pad, outline, BLACK);
    } else {
      for (const [from, to] of hatchLines(outline, HATCH * pad.em, holes)) {
        drawStroke(pad, 'path', { kind: 'hatch', from, to: [to] });
      }
    }
  }
  for (const stroke of path.strokes) drawStroke(pad, 'path', stroke);
  for (const { kind, centre, radius, filled } of path.circles) {
    pad.marks.push({ shape: 'circle', layer: 'path', kind, centre, radius, filled: filled ?? false });
  }
  return path.tags;
};

/** Words of a path where they cover least. */
export const layTags = (pad: Pad, tags: readonly Tag[]): void => {
  const drawn = boxOf(pad.marks);
  for (const tag of tags) layTag(pad, tag, drawn);
};

/** The shift at which the strokes run through the fewest words. */
const clearShift = ({ ground, em }: Pad, { strokes, slide = 0 }: FailurePath): number => {
  let best = 0;
  let least = Number.POSITIVE_INFINITY;
  for (let shift = 0; shift <= slide && least > 0; shift += 0.4 * em) {
    let cost = 0;
    for (const { from, to } of strokes) {
      const points = chords(from, to);
      for (let i = 1; i < points.length; i++)
        cost += ground.words(along(points[i - 1]!, shift), along(points[i]!, shift));
    }
    if (cost < least) [least, best] = [cost, shift];
  }
  return best;
};

const along = ({ x, y }: Point, shift: number): Point => ({ x: x + shift, y });

/** Only straight strokes are ever moved. */
const moved = (path: FailurePath, shift: number): FailurePath =>
  shift === 0
    ? path
    : {
        ...path,
        strokes: path.strokes.map((it) => ({
          ...it,
          from: along(it.from, shift),
          to: it.to.map((step) => along(endOf(step), shift)),
        })),
        tags: path.tags.map(({ along: [a, b], text }) => ({ along: [along(a, shift), along(b, shift)], text })),
      };
