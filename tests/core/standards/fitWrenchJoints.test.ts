import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { changed } from '../../support/changed.ts';

type Json = Record<string, unknown>;

const goodEnd = (name: string): Json =>
  JSON.parse(readFileSync(new URL(`../../../fixtures/input/good/${name}.json`, import.meta.url), 'utf8')) as Json;

const wrenchOf = (name: string, change: Json = {}): Check => {
  const outcome = checkEnd(changed(goodEnd(name), change));
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  return outcome.report.checks.find(({ id }) => id === 'fit-wrench')!;
};

/** UB 406x178x60: t_w 7.9, t_f 12.8, r 10.2; M20, so that half the socket and the room beside it are 46/2 + 2 = 25 mm. */
describe('room for the wrench, cleats and end plates', () => {
  test('nuts of the web bolts at the level of the support bolts leave 30.05 mm of a pair at 140 cross centres, and not enough at 125', () => {
    // (140 − 7.9)/2 − 10 − 1.3 × 20 = 30.05; (125 − 7.9)/2 − 10 − 26 = 22.55
    expect(wrenchOf('double-cleat')).toMatchObject({ state: 'holds' });
    const near = wrenchOf('double-cleat', { joint: { supportBolts: { crossCentres: 125 } } });
    expect(near).toMatchObject({ state: 'refer', of: 'support bolts, web bolts', demand: 25 });
    expect(near.resistance).toBeCloseTo(22.55, 9);
  });

  test('rows that pass each other need no room for the other nut', () => {
    // Half a socket and 2 mm, 25, and half of 36.95 across the corners: 43.5 mm between the levels; rows of 100 stand 50 apart.
    const staggered = { firstRow: 90, bolts: { rows: 2, pitch: 100 }, cleat: { topEdge: 40, bottomEdge: 40 } };
    const inSupport = { rows: 1, crossCentres: 125, topEdge: 90 };
    expect(wrenchOf('double-cleat', { joint: { ...staggered, supportBolts: inSupport } }).state).toBe('holds');
    const level = { ...inSupport, topEdge: 60 };
    expect(wrenchOf('double-cleat', { joint: { ...staggered, supportBolts: level } }).state).toBe('refer');
  });

  test('a column of web bolts too near the leg on the support refers', () => {
    // z_1 − t = 10 + 24 − 10
    const near = { endDistance: 24, cleat: { legWeb: 90 } };
    expect(wrenchOf('double-cleat', { joint: near })).toMatchObject({
      state: 'refer',
      of: 'support leg',
      resistance: 24,
      demand: 25,
    });
  });

  test('the bolts of an end plate stand clear of the weld along the web', () => {
    // (90 − 7.9)/2 − 6 = 35.05; with a leg of 17: 24.05
    const narrow = { supportBolts: { crossCentres: 90 }, plate: { width: 180 } };
    expect(wrenchOf('end-plate', { joint: narrow }).state).toBe('holds');
    const thick = wrenchOf('end-plate', { joint: { ...narrow, webWeld: { leg: 17 } } });
    expect(thick).toMatchObject({ state: 'refer', of: 'support bolts, web' });
    expect(thick.resistance).toBeCloseTo(24.05, 9);
  });

  test("a shop's own socket takes the place of the usual one, and one that does not go over the nut is refused", () => {
    const own = (socket: number) => ({ joint: { supportBolts: { socket } } });
    expect(wrenchOf('double-cleat', own(58))).toMatchObject({
      state: 'refer',
      of: 'support bolts, web bolts',
      demand: 31,
    });
    const outcome = checkEnd(changed(goodEnd('double-cleat'), own(30)));
    expect('faults' in outcome && outcome.faults.map(({ code, path }) => [code, path])).toEqual([
      ['socket-below-nut', 'joint.supportBolts.socket'],
    ]);
  });
});
