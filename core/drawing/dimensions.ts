import type { Facts } from '../end/facts.ts';
import { CROSS, columnX, lastColumnX } from './bolts.ts';
import type { Box, Dimension, Lane, Line, Point, Room } from './drawing.ts';
import { plateBox } from './plate.ts';
import { length } from './sizes.ts';
import type { DrawingWords } from './words.ts';

/** Free width in a notch that its depth and its radius need, and free height that a chain needs, in text heights. */
const ROOM_OF_DEPTH = 6;
const ROOM_OF_CHAIN = 3;

/** Every size of the end that stands on the piece, each once. `box` is the piece with the support's section. */
export const dimensions = (it: Facts, words: DrawingWords, box: Box): Dimension[] => {
  const make = maker(words);
  return [
    ...alongTop(it, make, box),
    ...alongBottom(it, make, box),
    ...upright(it, make, box),
    ...plateHeights(it, make),
    ...plateWidths(it, make, box),
  ];
};

interface Given {
  readonly axis: 'x' | 'y';
  readonly from: Point;
  readonly to: Point;
  readonly at: Lane;
  readonly path?: string;
  readonly room?: Room;
  /** How many equal spaces the two points are apart, each as long as the value. */
  readonly spaces?: number;
}

type Make = (given: Given) => Dimension;

const maker =
  ({ units }: DrawingWords): Make =>
  ({ spaces = 1, ...given }) => {
    const value = Math.abs(given.to[given.axis] - given.from[given.axis]) / spaces;
    const text = length(value, units);
    const { path } = given;
    const line: Line =
      path === undefined
        ? [{ text: `(${text})`, role: 'derived' }]
        : [...(spaces > 1 ? [{ text: `${spaces} ×`, role: 'note' } as const] : []), { text, role: 'size', path }];
    return { ...given, value, line };
  };

const alongTop = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at: Lane = { side: 'top', base: Math.min(0, box.top), lane: 1 };
  const end: Point = { x: 0, y: it.dt };
  const setback = make({ axis: 'x', from: { x: -it.g, y: box.top }, to: end, at, path: 'setback' });
  if (it.ct === 0) return [setback];
  return [setback, make({ axis: 'x', from: end, to: { x: it.ct, y: 0 }, at, path: 'top.length' })];
};

const alongBottom = (it: Facts, make: Make, box: Box): Dimension[] => {
  if (it.cb === 0) return [];
  const at: Lane = { side: 'bottom', base: Math.max(it.h, box.bottom), lane: 2 };
  const from: Point = { x: 0, y: it.h - it.db };
  return [make({ axis: 'x', from, to: { x: it.cb, y: it.h }, at, path: 'bottom.length' })];
};

/** Heights left of the end: depths of the copes (in the notch itself where it is roomy), rows, and what is left of the depth. */
const upright = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at = (lane: number): Lane => ({ side: 'left', base: box.left, lane });
  const top: Point = { x: it.ct, y: 0 };
  const cutTop: Point = { x: 0, y: it.dt };
  const cutBottom: Point = { x: 0, y: it.h - it.db };
  const bottom: Point = { x: it.cb, y: it.h };
  const reach = (CROSS * it.d0) / 2;
  const row = (y: number): Point => ({ x: it.eEnd - reach, y });

  const depths: Dimension[] = [];
  if (it.ct > 0) {
    const room: Room = { side: 'right', base: 0, width: it.ct, heights: ROOM_OF_DEPTH };
    depths.push(make({ axis: 'y', from: top, to: cutTop, at: at(1), room, path: 'top.depth' }));
  }
  if (it.cb > 0) {
    const room: Room = { side: 'right', base: 0, width: it.cb, heights: ROOM_OF_DEPTH };
    depths.push(make({ axis: 'y', from: cutBottom, to: bottom, at: at(1), room, path: 'bottom.depth' }));
  }
  const rows = [make({ axis: 'y', from: top, to: row(it.y1), at: at(2), path: 'joint.firstRow' })];
  if (it.n > 1) {
    const spaces = it.n - 1;
    rows.push(make({ axis: 'y', from: row(it.y1), to: row(it.yn), at: at(2), path: 'joint.bolts.pitch', spaces }));
  }
  const left = it.ct > 0 || it.cb > 0 ? [make({ axis: 'y', from: cutTop, to: cutBottom, at: at(3) })] : [];
  return [...depths, ...rows, ...left];
};

/** The plate's vertical edge distances beside its free edge. */
const plateHeights = (it: Facts, make: Make): Dimension[] => {
  const plate = plateBox(it);
  const at: Lane = { side: 'right', base: plate.right, lane: 1 };
  const row = (y: number): Point => ({ x: lastColumnX(it) + (CROSS * it.d0) / 2, y });
  const name = fieldOfPlate(it);
  return [
    make({ axis: 'y', from: { x: plate.right, y: plate.top }, to: row(it.y1), at, path: `${name}.topEdge` }),
    make({ axis: 'y', from: row(it.yn), to: { x: plate.right, y: plate.bottom }, at, path: `${name}.bottomEdge` }),
  ];
};

/** One chain under the plate: beam's end, columns, free edge; under the beam where the web leaves no room for it. */
const plateWidths = (it: Facts, make: Make, box: Box): Dimension[] => {
  const plate = plateBox(it);
  const at: Lane = { side: 'bottom', base: Math.max(it.h, box.bottom), lane: 1 };
  const webEnds = it.cb > 0 ? it.h - it.db : it.h - it.tf - it.r;
  const room: Room = { side: 'bottom', base: plate.bottom, width: webEnds - plate.bottom, heights: ROOM_OF_CHAIN };
  const under = it.yn + (CROSS * 1.3 * it.d0) / 2;
  const column = (j: number): Point => ({ x: columnX(it, j), y: under });
  const chain = [
    make({ axis: 'x', from: { x: 0, y: it.h - it.db }, to: column(0), at, room, path: 'joint.endDistance' }),
  ];
  if (it.m > 1) {
    const spaces = it.m - 1;
    chain.push(make({ axis: 'x', from: column(0), to: column(it.m - 1), at, room, path: 'joint.bolts.gauge', spaces }));
  }
  const edge: Point = { x: plate.right, y: plate.bottom };
  chain.push(make({ axis: 'x', from: column(it.m - 1), to: edge, at, room, path: `${fieldOfPlate(it)}.edge` }));
  return chain;
};

const fieldOfPlate = ({ kind }: Facts): string => (kind === 'fin-plate' ? 'joint.plate' : 'joint.ply');
