import { describe, expect, test } from 'vitest';
import { changed } from '../../support/changed.ts';
import { bolts, checkOf, iSection, notes, own, report, rowOf, stateOf } from './is800Ends.ts';

describe('the notch under IS 800', () => {
  test('a column at the face of the notch, and a notch shallower than the flange, refer', () => {
    const two = bolts({ columns: 2, gauge: 70 });
    const ids = ['web-block', 'web-net-shear', 'cope-shear', 'cope-bending', 'cope-buckling'];
    for (const id of ids) expect(stateOf(two, id)).toBe('refer, hole-at-cope-face');
    for (const id of ids) expect(stateOf({ top: { depth: 12 } }, id)).toBe('refer, flange-left');
  });

  test('a notch that ends before the bolts leaves the flange above them', () => {
    const short = { top: { length: 28 }, ...bolts({ columns: 2, gauge: 70 }) };
    for (const id of ['web-block', 'web-tearout']) expect(stateOf(short, id)).toBe('notApplicable, intact-flange');
  });

  test('a stem beyond 67 ε refers', () => {
    expect(stateOf(own({ ...iSection, depth: 680, width: 200 }), 'cope-shear')).toBe('refer, slender-cut');
    expect(stateOf({}, 'cope-shear')).toBe('holds');
  });

  test('net shear: the whole depth where not notched, h_o between two notches', () => {
    const net = (depth: number) => (0.9 * 0.41 * 8.9 * (depth - 66)) / (Math.sqrt(3) * 1.25);
    expect(checkOf({ top: null }, 'web-net-shear').resistance).toBeCloseTo(net(400), 9);
    const both = { bottom: { length: 110, depth: 45, radius: 10 } };
    expect(checkOf(both, 'web-net-shear').resistance).toBeCloseTo(net(310), 9);
  });

  test('a bottom notch alone: no web buckling, no block', () => {
    const bottom = { top: null, bottom: { length: 110, depth: 45, radius: 10 } };
    expect(stateOf(bottom, 'cope-buckling')).toBe('notApplicable, cut-edge-in-tension');
    expect(stateOf(bottom, 'web-block')).toBe('notApplicable, intact-flange');
    expect(checkOf(bottom, 'cope-bending').resistance).toBeCloseTo(42.67, 2);
  });

  test('a notched channel refers without a number', () => {
    const channel = own({ depth: 400, width: 100, flange: 15, web: 8.8, radius: 15, family: 'channel' });
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(stateOf(channel, id)).toBe('refer, channel-cope');
      expect(checkOf(channel, id).resistance).toBeNull();
    }
  });

  test('a long notch bends below the high shear: the moment alone counts', () => {
    const long = { top: { length: 500 } };
    expect(checkOf(long, 'cope-bending').resistance).toBeCloseTo((250 * 283.47) / 1100, 2);
  });

  test('option cope-bending: plastic takes the lesser of Z_p and 1.2 Z_e, and the shear still counts', () => {
    const options = { 'cope-bending': 'plastic' };
    expect(rowOf({ options }, 'cope-bending', 'Z')).toBeCloseTo(1.2 * 283_470, -1);
    expect(checkOf({ options, top: { length: 500 } }, 'cope-bending').resistance).toBeCloseTo(
      (1.2 * 250 * 283.47) / 1100,
      2,
    );
    expect(checkOf({ options }, 'cope-bending').resistance).toBeCloseTo(42.67, 2);
  });

  test('a corner below 10 mm is practice here: it refers', () => {
    expect(stateOf({ top: { radius: 9 } }, 'fit-cope-radius')).toBe('refer, too-little');
  });
});

describe('two columns inside the notch', () => {
  const two = { top: { length: 180 }, ...bolts({ columns: 2, gauge: 70 }) };
  const clause = { ...two, options: { 'web-block': 'standard' } };

  test('half of the tension plane counts, and is said to', () => {
    expect(checkOf(two, 'web-block').resistance).toBeCloseTo(308.442, 3);
    expect(notes(two)).toContain('half-tension-plane');
    expect(notes({})).not.toContain('half-tension-plane');
  });

  test('option web-block: standard takes the clause; the row refers only where it is the first to fail', () => {
    expect(report(clause).governing).not.toBe('web-block');
    expect(stateOf(clause, 'web-block')).toBe('holds');
    const strong = changed(clause, {
      joint: {
        firstRow: 95,
        bolts: { size: 'M24', grade: '10.9', rows: 4, pitch: 60, gauge: 60 },
        plate: { thickness: 20, grade: 'E450', topEdge: 50, bottomEdge: 60, edge: 60 },
        weld: { leg: 16, electrode: 570 },
      },
      beam: { section: { ...iSection, depth: 600, width: 200, flange: 20, web: 8 } },
      top: { length: 150 },
    });
    const first = report(strong);
    expect(first.governing).toBe('web-block');
    expect(stateOf(strong, 'web-block')).toBe('refer, block-as-clause');
    expect(first.verdict).toBe('refer');
    expect(stateOf(changed(strong, { options: { 'web-block': 'cautious' } }), 'web-block')).toBe('holds');
    expect(stateOf(changed(strong, { reaction: 2 * first.capacity! }), 'web-block')).toBe('fails');
  });

  test('one column is not concerned', () => {
    expect(checkOf({ options: { 'web-block': 'standard' } }, 'web-block').resistance).toBeCloseTo(278.101, 3);
    expect(stateOf({ options: { 'web-block': 'standard' } }, 'web-block')).toBe('holds');
  });
});

describe('a net area below nothing', () => {
  test('counts as nothing: gross shear alone, or gross tension alone, is left', () => {
    const tight = {
      reaction: 20,
      joint: { firstRow: 57, bolts: { rows: 1, holes: 'punched' }, plate: { topEdge: 12 } },
    };
    // a_t 12, d' 24: A_nv 0; 40 × 8.9 × 250/1.1
    expect(checkOf(tight, 'web-block').resistance).toBeCloseTo((40 * 8.9 * 0.25) / 1.1, 9);
    expect(stateOf(tight, 'web-tearout')).toBe('fails, nothing-left');
  });
});
