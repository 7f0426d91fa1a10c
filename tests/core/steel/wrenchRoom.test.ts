import { describe, expect, test } from 'vitest';
import { boltSizeNames, findBoltSize } from '../../../core/steel/bolts.ts';
import { wrenchRoom } from '../../../core/steel/wrenchRoom.ts';
import { INCH } from '../../../core/units/systems.ts';

const diameterOf = (name: string): number => {
  const found = findBoltSize(name);
  if ('nearest' in found) throw new Error(name);
  return found.diameter;
};
const reach = (name: string): number => {
  const { socket, spare } = wrenchRoom(diameterOf(name));
  return socket / 2 + spare;
};

describe('room for the wrench of a bolt', () => {
  test('every bolt size of the library has its socket, wider than the bolt head across its corners', () => {
    for (const name of boltSizeNames) {
      const { socket, corners } = wrenchRoom(diameterOf(name));
      expect(socket, name).toBeGreaterThan(corners + 4);
      expect(corners, name).toBeGreaterThan(1.6 * diameterOf(name));
    }
  });

  test('a thicker bolt never needs less, metric or inch', () => {
    for (const thread of ['metric', 'inch']) {
      const names = boltSizeNames.filter((name) => name.startsWith('M') === (thread === 'metric'));
      const rooms = names.map(reach);
      expect([...rooms].sort((a, b) => a - b)).toEqual(rooms);
    }
  });

  // From memory: entering and tightening clearance C1, AISC Steel Construction Manual, Part 7, inches.
  test.each([
    ['5/8', 1],
    ['3/4', 1.25],
    ['7/8', 1.375],
    ['1', 1.4375],
    ['1-1/8', 1.5625],
    ['1-1/4', 1.6875],
  ])('%s in needs %s in to a face beside it, as the Manual has it', (name, least) => {
    expect(reach(name) / INCH).toBeCloseTo(least, 12);
  });

  // Outside diameters of washers, mm: ISO 7089, and ASTM F436 for inch bolts; from memory.
  test.each([
    ['M12', 24],
    ['M16', 30],
    ['M20', 37],
    ['M24', 44],
    ['M27', 50],
    ['M30', 56],
    ['M36', 66],
    ['1/2', 1.0625 * INCH],
    ['3/4', 1.46875 * INCH],
    ['1', 2 * INCH],
    ['1-1/4', 2.5 * INCH],
  ])('where the socket of %s fits, its washer lies flat', (name, washer) => {
    expect(wrenchRoom(diameterOf(name)).socket).toBeGreaterThan(washer);
  });

  test('a wide nut of M20 is 37.0 across its corners', () => {
    expect(wrenchRoom(20).corners).toBeCloseTo(37, 1);
  });

  test('a diameter that is no bolt of the library has no room that could pass', () => {
    expect(wrenchRoom(19).socket).toBeNaN();
  });
});
