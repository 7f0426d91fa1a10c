import type { Facts } from '../../end/facts.ts';
import type { Area, FailurePath, Point, Stroke, Tag } from '../drawing.ts';
import type { DrawingWords } from '../words.ts';

/** Draws one way of failing, or null where this end has no such path. `of`: the way or part of the check, as the report names it. */
export type PathMaker = (it: Facts, words: DrawingWords, of: string) => FailurePath | null;

/** What a path is made of; parts that it has not are left out. */
export const path = (caption: string, parts: Partial<Omit<FailurePath, 'caption'>>): FailurePath => ({
  strokes: [],
  circles: [],
  areas: [],
  tags: [],
  fields: [],
  ...parts,
  caption,
});

/** A torn or sheared line through these points. */
export const torn = (...points: readonly [Point, ...Point[]]): Stroke => ({
  kind: 'path',
  from: points[0],
  to: points.slice(1),
});

export const tag = (from: Point, to: Point, text: string): Tag => ({ along: [from, to], text });

/** A quadrilateral between two columns and two levels. */
export const block = (left: number, top: number, right: number, bottom: number): Area => ({
  fill: 'hatch',
  outline: [
    { x: left, y: top },
    { x: right, y: top },
    { x: right, y: bottom },
    { x: left, y: bottom },
  ],
});

/** The plate, ply or cleat as a sentence names it; of a pair each one. */
export const fitting = ({ k }: Facts, { plate }: DrawingWords): string => `${k > 1 ? 'each' : 'the'} ${plate}`;
