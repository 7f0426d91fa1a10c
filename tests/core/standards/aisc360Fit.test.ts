import { describe, expect, test } from 'vitest';
import { bolts, checkOf, end, long, plate, stateOf } from './aisc360Ends.ts';

describe('fit', () => {
  test('edges below Table J3.4 refer, below the bolt diameter fail', () => {
    expect(stateOf(plate({ topEdge: 0.9375 }), 'fit-edge-plate')).toBe('refer, too-little');
    expect(stateOf(plate({ topEdge: 0.7 }), 'fit-edge-plate')).toBe('fails, too-little');
    expect(stateOf({ joint: { endDistance: 0.7 } }, 'fit-end')).toBe('fails, too-little');
    expect(stateOf({ joint: { endDistance: 6.5 } }, 'fit-end')).toBe('refer, too-much');
  });

  test('bolts closer than 2-2/3 d fail, farther apart than 24 t refer', () => {
    expect(stateOf(bolts({ pitch: 1.9 }), 'fit-pitch')).toBe('fails, too-little');
    const wide = {
      beam: { section: 'W27x84' },
      joint: { bolts: { pitch: 9.5, rows: 2 }, plate: { thickness: 0.375 } },
    };
    expect(stateOf(wide, 'fit-pitch')).toBe('refer, too-much');
  });

  test('a corner of 1/2 in holds, from 3/8 in or not stated refers, below fails', () => {
    const corner = (radius: number | undefined) => stateOf({ top: { radius } }, 'fit-cope-radius');
    expect([0.5, 0.4, undefined, 0.3].map(corner)).toEqual([
      'holds',
      'refer, too-little',
      'refer, too-little',
      'fails, too-little',
    ]);
  });

  test('copes clear the flanges of the supporting beam or fail', () => {
    // W21x62: t_f 0.615, k 1.12; (8.24 - 0.4)/2 - 0.5 + 0.5 = 3.92 in.
    expect(stateOf({}, 'fit-cope-clearance')).toBe('holds');
    expect(stateOf({ top: { depth: 1 }, joint: { firstRow: 2.5 } }, 'fit-cope-clearance')).toBe('fails, too-little');
    expect(stateOf({ top: { length: 3.9 } }, 'fit-cope-clearance')).toBe('fails, too-little');
    expect(stateOf({ top: null }, 'fit-cope-clearance')).toBe('fails, too-little');
    expect(stateOf({ setback: 5 }, 'fit-cope-clearance')).toBe('notApplicable, clear-of-support');
  });

  test('a plate shorter than half the clear web, or in the fillet, fails; a cope takes the flange out of its way', () => {
    expect(stateOf(bolts({ rows: 2 }), 'fit-plate-depth')).toBe('fails, too-little');
    expect(stateOf({ top: null, support: undefined, joint: { firstRow: 2.3 } }, 'fit-plate-depth')).toBe(
      'fails, too-little',
    );
    expect(stateOf({ joint: { firstRow: 3 } }, 'fit-plate-depth')).toBe('holds');
  });

  test('the gap is 1/4 to 1 in, of extended plates without upper limit', () => {
    expect([0.2, 0.25, 1, 1.1].map((setback) => stateOf({ setback }, 'fit-setback'))).toEqual([
      'refer, too-little',
      'holds',
      'holds',
      'refer, too-much',
    ]);
    expect(stateOf({}, 'fit-setback', long)).toBe('holds');
  });

  test('an extended plate turns by ploughing, or is thinner than its bolts are strong, or fails', () => {
    const thick = { beam: { section: 'W18x86' }, joint: { endDistance: 1.6, plate: { thickness: 0.75 } } };
    expect(stateOf(thick, 'fit-rotation')).toBe('fails, too-much');
    const far = { ...end, setback: 3 };
    expect(checkOf({}, 'fit-rotation', far).of).toBe('ply');
    expect(stateOf({}, 'fit-rotation', far)).toBe('holds');
    expect(checkOf({}, 'fit-rotation', long).of).toBe('plate');
  });

  test('rows without holes inside a cope say why nothing is checked', () => {
    expect(stateOf({ top: null, support: undefined }, 'cope-bending')).toBe('notApplicable, no-cope');
    expect(stateOf({ top: null, support: undefined }, 'fit-edge-web')).toBe('notApplicable, intact-flange');
  });
});
