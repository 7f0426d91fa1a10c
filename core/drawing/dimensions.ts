import type { Facts } from '../end/facts.ts';
import { CROSS, columnX, lastColumnX } from './bolts.ts';
import type { Box, Dimension, Lane, Point, Room } from './drawing.ts';
import { plateField } from './fields.ts';
import { plateBox } from './plate.ts';
import { type Make, maker } from './sized.ts';
import type { DrawingWords } from './words.ts';

/** Free width in a notch that its depth and its radius need, and free height that one chain needs and two need, in text heights. */
const ROOM_OF_DEPTH = 6;
const ROOM_OF_CHAIN = 3;
const ROOM_OF_TWO = 5.2;

/** Every size of the end that stands on the piece from the side, each once. `box` is the piece with the support's section. */
export const dimensions = (it: Facts, words: DrawingWords, box: Box): Dimension[] => {
  const make = maker(words);
  return [
    ...alongTop(it, make, box),
    ...alongBottom(it, make, box),
    ...upright(it, make, box),
    ...(it.n > 0 ? [...plateHeights(it, make), ...plateWidths(it, make, box)] : []),
    ...(it.legWeb > 0 ? legWidths(it, make, box) : []),
  ];
};

const alongTop = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at: Lane = { side: 'top', base: Math.min(0, box.top), lane: 1 };
  const end: Point = { x: 0, y: it.dt };
  const path = it.bp > 0 ? 'joint.plate.thickness' : 'setback';
  const setback = make({ axis: 'x', from: { x: -it.g, y: box.top }, to: end, at, path });
  if (it.ct === 0) return [setback];
  return [setback, make({ axis: 'x', from: end, to: { x: it.ct, y: 0 }, at, path: 'top.length' })];
};

const alongBottom = (it: Facts, make: Make, box: Box): Dimension[] => {
  if (it.cb === 0) return [];
  const at: Lane = { side: 'bottom', base: Math.max(it.h, box.bottom), lane: 2 };
  const from: Point = { x: 0, y: it.h - it.db };
  return [make({ axis: 'x', from, to: { x: it.cb, y: it.h }, at, path: 'bottom.length' })];
};

/** Heights left of the end: depths of the copes (in the notch itself where it is roomy), rows or the plate, and what is left of the depth. */
const upright = (it: Facts, make: Make, box: Box): Dimension[] => {
  const at = (lane: number): Lane => ({ side: 'left', base: box.left, lane });
  const top: Point = { x: it.ct, y: 0 };
  const cutTop: Point = { x: 0, y: it.dt };
  const cutBottom: Point = { x: 0, y: it.h - it.db };
  const bottom: Point = { x: it.cb, y: it.h };

  const depths: Dimension[] = [];
  if (it.ct > 0) {
    const room: Room = { side: 'right', base: 0, width: it.ct, heights: ROOM_OF_DEPTH };
    depths.push(make({ axis: 'y', from: top, to: cutTop, at: at(1), room, path: 'top.depth' }));
  }
  if (it.cb > 0) {
    const room: Room = { side: 'right', base: 0, width: it.cb, heights: ROOM_OF_DEPTH };
    depths.push(make({ axis: 'y', from: cutBottom, to: bottom, at: at(1), room, path: 'bottom.depth' }));
  }
  const placed = it.n > 0 ? rows(it, make, at(2), top) : plateFromTop(it, make, at(2), top);
  const left = it.ct > 0 || it.cb > 0 ? [make({ axis: 'y', from: cutTop, to: cutBottom, at: at(3) })] : [];
  return [...depths, ...placed, ...left];
};

const rows = (it: Facts, make: Make, at: Lane, top: Point): Dimension[] => {
  const row = (y: number): Point => ({ x: it.eEnd - (CROSS * it.d0) / 2, y });
  const first = make({ axis: 'y', from: top, to: row(it.y1), at, path: 'joint.firstRow' });
  if (it.n === 1) return [first];
  const spaces = it.n - 1;
  return [first, make({ axis: 'y', from: row(it.y1), to: row(it.yn), at, path: 'joint.bolts.pitch', spaces })];
};

/** Where no bolts place it, a plate or cleat is placed by its own top. */
const plateFromTop = (it: Facts, make: Make, at: Lane, top: Point): Dimension[] => {
  const plate = plateBox(it);
  const [head, foot] = [
    { x: plate.left, y: plate.top },
    { x: plate.left, y: plate.bottom },
  ];
  return [
    make({ axis: 'y', from: top, to: head, at, path: plateField(it, 'top') }),
    make({ axis: 'y', from: head, to: foot, at, path: plateField(it, 'depth') }),
  ];
};

/** The plate's vertical edge distances beside its free edge. */
const plateHeights = (it: Facts, make: Make): Dimension[] => {
  const plate = plateBox(it);
  const at: Lane = { side: 'right', base: plate.right, lane: 1 };
  const row = (y: number): Point => ({ x: lastColumnX(it) + (CROSS * it.d0) / 2, y });
  const [head, foot] = [
    { x: plate.right, y: plate.top },
    { x: plate.right, y: plate.bottom },
  ];
  return [
    make({ axis: 'y', from: head, to: row(it.y1), at, path: plateField(it, 'topEdge') }),
    make({ axis: 'y', from: row(it.yn), to: foot, at, path: plateField(it, 'bottomEdge') }),
  ];
};

/** Under the plate, or under the beam where the web leaves no room for it. */
const under = (it: Facts, box: Box, lane: number): { at: Lane; room: Room } => {
  const { bottom } = plateBox(it);
  const webEnds = it.cb > 0 ? it.h - it.db : it.h - it.tf - it.r;
  const heights = it.legWeb > 0 ? ROOM_OF_TWO : ROOM_OF_CHAIN;
  return {
    at: { side: 'bottom', base: Math.max(it.h, box.bottom), lane: lane === 1 ? 1 : 3 },
    room: { side: 'bottom', base: bottom, width: webEnds - bottom, heights, lane },
  };
};

/** One chain: beam's end, columns, free edge; of a cleat, whose whole leg is given, that edge follows. */
const plateWidths = (it: Facts, make: Make, box: Box): Dimension[] => {
  const plate = plateBox(it);
  const places = under(it, box, 1);
  const level = it.yn + (CROSS * 1.3 * it.d0) / 2;
  const column = (j: number): Point => ({ x: columnX(it, j), y: level });
  const chain = [
    make({ axis: 'x', from: { x: 0, y: it.h - it.db }, to: column(0), ...places, path: 'joint.endDistance' }),
  ];
  if (it.m > 1) {
    const spaces = it.m - 1;
    chain.push(
      make({ axis: 'x', from: column(0), to: column(it.m - 1), ...places, path: 'joint.bolts.gauge', spaces }),
    );
  }
  const edge: Point = { x: plate.right, y: plate.bottom };
  const last = { axis: 'x', from: column(it.m - 1), to: edge, ...places } as const;
  chain.push(make(it.legWeb > 0 ? last : { ...last, path: plateField(it, 'edge') }));
  return chain;
};

/** A cleat's web leg from its heel at the support's face, and the return of its weld. */
const legWidths = (it: Facts, make: Make, box: Box): Dimension[] => {
  const { left, right, bottom } = plateBox(it);
  const [heel, toe] = [
    { x: left, y: bottom },
    { x: right, y: bottom },
  ];
  const leg = make({ axis: 'x', from: heel, to: toe, ...under(it, box, 2), path: plateField(it, 'legWeb') });
  if (it.n > 0) return [leg];
  const from = { x: right - it.weldReturn, y: bottom };
  const whole = Math.abs(it.weldReturn - right) < 1e-6;
  const back = { axis: 'x', from, to: toe, ...under(it, box, 1) } as const;
  return [make(whole ? back : { ...back, path: plateField(it, 'webWeld.return') }), leg];
};
