import type { Dimension, Lane, Line, Point, Room } from './drawing.ts';
import { length } from './sizes.ts';
import type { DrawingWords } from './words.ts';

/** A size as it is drawn. */
export interface Given {
  readonly axis: 'x' | 'y';
  readonly from: Point;
  readonly to: Point;
  readonly at: Lane;
  /** Absent: it follows from others, and stands in brackets. */
  readonly path?: string;
  readonly room?: Room;
  /** How many equal spaces the two points are apart, each as long as the value; a half where they are half of it apart. */
  readonly spaces?: number;
}

/** Makes a dimension of what is drawn. */
export type Make = (given: Given) => Dimension;

export const maker =
  ({ units }: DrawingWords): Make =>
  ({ spaces = 1, ...given }) => {
    const value = Math.abs(given.to[given.axis] - given.from[given.axis]) / spaces;
    const text = length(value, units);
    const { path } = given;
    const line: Line = path === undefined ? [{ text: `(${text})`, role: 'derived' }] : counted(spaces, text, path);
    return { ...given, value, line };
  };

const counted = (spaces: number, text: string, path: string): Line => [
  ...(spaces > 1 ? [{ text: `${spaces} ×`, role: 'note' } as const] : []),
  { text, role: 'size', path },
  ...(spaces < 1 ? [{ text: `/ ${Math.round(1 / spaces)}`, role: 'note' } as const] : []),
];
