import { INCH } from '../units/systems.ts';
import { boltSizeNames, findBoltSize } from './bolts.ts';

/** What a bolt needs round its axis so that a power wrench turns head or nut, mm. */
export interface WrenchRoom {
  /** Outside diameter of the socket. It covers the bolt's washer too. */
  readonly socket: number;
  /** Between the socket and a face beside it. */
  readonly spare: number;
  /** Head or nut of the neighbouring bolt, across its corners: the wide hexagon of structural bolts. */
  readonly corners: number;
}

type Row = readonly [socket: number, acrossFlats: number];

/**
 * mm. Sockets of M16, M20, M24 and M30: common practice, from memory; M22 and M27 lie on straight lines between them, M12 and M36 on the
 * outer lines carried on. Widths across flats: EN 14399-4, from memory.
 */
const metric: Readonly<Record<string, Row>> = {
  M12: [30, 22],
  M16: [38, 27],
  M20: [46, 32],
  M22: [50, 36],
  M24: [54, 41],
  M27: [61, 46],
  M30: [68, 50],
  M36: [82, 60],
};

/**
 * Inches. Sockets: AISC Steel Construction Manual, Part 7, entering and tightening clearances, from memory; that of 1/2 in, which it does
 * not list, stands as far outside its nut as that of 5/8 in does. Widths across flats: heavy hexagons of ASME B18.2.6, from memory.
 */
const inch: Readonly<Record<string, Row>> = {
  '1/2': [1 + 1 / 2, 7 / 8],
  '5/8': [1 + 3 / 4, 1 + 1 / 16],
  '3/4': [2 + 1 / 4, 1 + 1 / 4],
  '7/8': [2 + 1 / 2, 1 + 7 / 16],
  '1': [2 + 5 / 8, 1 + 5 / 8],
  '1-1/8': [2 + 7 / 8, 1 + 13 / 16],
  '1-1/4': [3 + 1 / 8, 2],
};

/** Spare room beyond half a socket: 2 mm in metric shops, 1/8 in in the Manual. */
const roomOf = ([socket, flats]: Row, unit: number, spare: number): WrenchRoom => ({
  socket: socket * unit,
  spare,
  corners: (flats * unit) / Math.cos(Math.PI / 6),
});

const unknown: WrenchRoom = { socket: Number.NaN, spare: Number.NaN, corners: Number.NaN };

const byDiameter = new Map<number, WrenchRoom>();
for (const name of boltSizeNames) {
  const size = findBoltSize(name);
  const row = metric[name] ?? inch[name];
  if ('nearest' in size || !row) continue;
  const room = size.thread === 'metric' ? roomOf(row, 1, 2) : roomOf(row, INCH, INCH / 8);
  byDiameter.set(size.diameter, room);
}

/** Room for the wrench of a bolt by its diameter in mm, M12 to M36 and 1/2 to 1-1/4 in; not numbers for any other. */
export const wrenchRoom = (diameter: number): WrenchRoom => byDiameter.get(diameter) ?? unknown;
