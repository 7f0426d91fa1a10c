import { describe, expect, test } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';

type Json = Record<string, unknown>;

const threeBolts = { size: '3/4', grade: 'A325', threads: 'in', rows: 3, pitch: 3 };
/** W18x50 coped 4 x 2 at a W21x62; two angles 4 x 3-1/2 x 1/4 A36, three 3/4 A325 in each leg. */
const pair: Json = {
  standard: 'aisc-360-lrfd',
  units: 'in-kip',
  reaction: 20,
  beam: { section: 'W18x50', grade: 'A992' },
  top: { length: 4, depth: 2, radius: 0.5 },
  bottom: null,
  setback: 0.5,
  joint: {
    kind: 'double-cleat',
    firstRow: 3.25,
    endDistance: 1.75,
    bolts: { ...threeBolts, columns: 1 },
    cleat: { legWeb: 3.5, legSupport: 4, thickness: 0.25, grade: 'A36', topEdge: 1.25, bottomEdge: 1.25 },
    supportBolts: { ...threeBolts, crossCentres: 6, topEdge: 1.25 },
  },
  support: { kind: 'beam-web', section: 'W21x62', grade: 'A992', topOfSteel: 0 },
};
const one: Json = changed(pair, { joint: { kind: 'single-cleat', cleat: { thickness: 0.375 } } });
const supportWelded: Json = changed(pair, {
  joint: { supportBolts: undefined, cleat: { supportWeld: { leg: 0.1875, electrode: 70 } } },
});
const webWelded: Json = {
  ...pair,
  joint: {
    kind: 'double-cleat',
    cleat: {
      legWeb: 3,
      legSupport: 4,
      thickness: 0.3125,
      grade: 'A36',
      top: 2.5,
      depth: 8.5,
      webWeld: { leg: 0.25, electrode: 70 },
    },
    supportBolts: { ...threeBolts, crossCentres: 5.355, topEdge: 1.25 },
  },
};
const endPlate: Json = {
  ...pair,
  joint: {
    kind: 'end-plate',
    plate: { thickness: 0.25, width: 6, depth: 8.5, grade: 'A36', top: 2.25 },
    webWeld: { leg: 0.1875, electrode: 70 },
    supportBolts: { ...threeBolts, crossCentres: 3.5, topEdge: 1.25 },
  },
};
const fullPlate: Json = {
  ...endPlate,
  top: null,
  joint: {
    ...(endPlate.joint as Json),
    kind: 'full-end-plate',
    plate: { thickness: 0.25, width: 6, depth: 18.5, grade: 'A36', top: 0.1 },
    supportBolts: { ...threeBolts, crossCentres: 3.5, topEdge: 5 },
  },
  support: undefined,
};

const checkOf = (of: Json, id: string, change: Json = {}): Check =>
  reportOf(changed(of, change)).checks.find((it) => it.id === id)!;
const stateOf = (of: Json, id: string, change: Json = {}): string => {
  const { state, reason } = checkOf(of, id, change);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const strengthOf = (of: Json, id: string, change: Json = {}): number => checkOf(of, id, change).reactionAtFailure!;
const rowOf = (of: Json, id: string, symbol: string, change: Json = {}): number | undefined =>
  checkOf(of, id, change).working!.find((row) => row.symbol === symbol)?.value;
const notesOf = (of: Json, change: Json = {}): string[] => reportOf(changed(of, change)).notes.map(({ code }) => code);
const support = (more: Json): Json => ({ joint: { supportBolts: more } });

describe('angles bolted to the web', () => {
  test('a pair has its bolts in two planes: twice the shear of one angle', () => {
    expect(strengthOf(pair, 'bolt-shear') / strengthOf(one, 'bolt-shear')).toBeCloseTo(2, 12);
  });

  test('one column within 3 in carries V without an arm, and the sheet says so; 3 in exactly is within', () => {
    // 3 x 2 x 54 x 0.44179 x 0.75
    expect(strengthOf(pair, 'bolt-shear')).toBeCloseTo(107.35, 2);
    expect(notesOf(pair)).toContain('web-bolts-no-arm');
    const atThree = { setback: 1, joint: { endDistance: 2, cleat: { legWeb: 5 } } };
    expect(strengthOf(pair, 'bolt-shear', atThree)).toBeCloseTo(107.35, 2);
  });

  test('farther than 3 in, or with two columns, the bolts hold V at its arm and the weakest counts for all', () => {
    const far = { setback: 1, joint: { endDistance: 2.25, cleat: { legWeb: 5 } } };
    const two = { joint: { bolts: { columns: 2, gauge: 3 }, cleat: { legWeb: 7 } } };
    expect(strengthOf(pair, 'bolt-shear', far)).toBeLessThan(0.8 * 107.35);
    expect(rowOf(pair, 'bolt-shear', 'e', two)).toBeCloseTo(0.5 + 1.75 + 1.5, 9);
    for (const change of [far, two]) {
      expect(rowOf(pair, 'web-tearout', 'r_min', change)).toBeGreaterThan(0);
      expect(notesOf(pair, change)).not.toContain('web-bolts-no-arm');
    }
  });

  test('one bolt without an arm carries its shear; at an arm it refers without a number', () => {
    const single = { joint: { bolts: { rows: 1 }, supportBolts: { rows: 1 } } };
    expect(checkOf(pair, 'bolt-shear', single).resistance).toBeCloseTo(107.35 / 3, 2);
    const far = changed(single, { setback: 1, joint: { endDistance: 2.25, cleat: { legWeb: 5 } } });
    expect(stateOf(pair, 'bolt-shear', far)).toBe('refer, one-bolt');
  });

  test('the angles bear with every bolt at its weakest, the last row down to their foot', () => {
    // 0.75 (1.2 x 0.84375 x 0.355 x 65 + 2.4 x 0.75 x 0.355 x 65 + 1.2 x 0.84375 x 0.5 x 58)
    expect(checkOf(pair, 'cleat-bearing').of).toBe('web leg');
    expect(strengthOf(pair, 'cleat-bearing')).toBeCloseTo(70.696, 3);
    expect(strengthOf(pair, 'cleat-bearing', { joint: { cleat: { bottomEdge: 1.5 } } })).toBeGreaterThan(70.7);
  });

  test('holes and bolts outside the standard refer in either leg', () => {
    expect(stateOf(pair, 'bolt-shear', { joint: { bolts: { hole: 0.875 } } })).toBe('refer, hole-above-standard');
    const wide = { reaction: 900, ...support({ hole: 0.875 }) };
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      const { state, utilisation, reason } = checkOf(pair, id, wide);
      expect([id, state, reason]).toEqual([id, 'refer', 'hole-above-standard']);
      expect(utilisation).toBeGreaterThan(1);
    }
    expect(stateOf(pair, 'cleat-bearing', support({ hole: 0.875 }))).toBe('refer, hole-above-standard');
    expect(stateOf(pair, 'support-bolt-shear', support({ grade: { fu: 120 } }))).toBe('refer, bolt-not-listed');
    expect(stateOf(pair, 'cleat-bearing', support({ grade: { fu: 120 } }))).toBe('refer, bolt-not-listed');
  });
});

describe('the support side of a pair', () => {
  test('carries V evenly on two lines, its arm left out, and the sheet says so', () => {
    // 6 x 54 x 0.44179 x 0.75
    expect(strengthOf(pair, 'support-bolt-shear')).toBeCloseTo(107.35, 2);
    expect(strengthOf(pair, 'support-bolt-shear', support({ crossCentres: 5 }))).toBeCloseTo(107.35, 2);
    expect(notesOf(pair)).toContain('pair-no-arm');
    expect(stateOf(pair, 'cleat-bending')).toBe('notApplicable, pair-of-cleats');
  });

  test('is pushed up: its block runs to the top edge, not to the foot', () => {
    const block = (topEdge: number) =>
      rowOf(pair, 'cleat-block', 'A_gv', { joint: { cleat: { bottomEdge: 4 }, supportBolts: { topEdge } } });
    expect(checkOf(pair, 'cleat-block', { joint: { cleat: { bottomEdge: 4 } } }).of).toBe('support leg');
    expect(block(1.25)).toBeCloseTo(2 * 0.25 * 7.25, 9);
    expect(block(2)).toBeCloseTo(2 * 0.25 * 8, 9);
  });

  test('the support is looked at where thickness and grade are told', () => {
    expect(stateOf(pair, 'support-bearing')).toBe('holds');
    expect(stateOf(pair, 'support-bearing', { support: { grade: undefined } })).toBe('notApplicable, support-not-told');
    expect(stateOf(pair, 'support-bearing', { support: undefined })).toBe('notApplicable, no-support');
    expect(stateOf(pair, 'support-shear', { support: undefined })).toBe('notApplicable, no-support');
  });

  test('shear of the support has the holes of both lines out', () => {
    // 0.75 x 0.6 x 65 x 0.4 x 2 (8.5 - 3 x 0.875)
    expect(strengthOf(pair, 'support-shear')).toBeCloseTo(137.475, 9);
  });

  test('a thin support lowers what each bolt of the legs carries', () => {
    const thin = { joint: { cleat: { bottomEdge: 4 } }, support: { section: undefined, thickness: 0.1 } };
    // bearing of one bolt 2.4 x 0.75 x 0.1 x 65 = 11.7, below the leg's first row and the bolt's shear
    expect(strengthOf(pair, 'cleat-bearing', thin)).toBeCloseTo(0.75 * 6 * 11.7, 9);
  });

  test('a beam on the other side of the same web is added there; behind a column flange it is not', () => {
    const both = { support: { otherReaction: 60 } };
    for (const id of ['support-bearing', 'support-shear']) {
      expect(strengthOf(pair, id, both)).toBeCloseTo(strengthOf(pair, id) - 60, 9);
      expect(checkOf(pair, id, both).demand).toBeCloseTo(80, 9);
    }
    expect(notesOf(pair, both)).toContain('beam-opposite-added');
    const flange = { kind: 'column-flange', section: 'W14x90', topOfSteel: undefined };
    const apart = (more: Json) => strengthOf(pair, 'support-bearing', { support: { ...flange, ...more } });
    expect(apart({ otherReaction: 60 })).toBe(apart({}));
    expect(notesOf(pair, { support: { ...flange, otherReaction: 60 } })).not.toContain('beam-opposite-added');
  });

  test('a beam on the other side that alone uses up the web leaves nothing', () => {
    expect(stateOf(pair, 'support-bearing', { support: { otherReaction: 300 } })).toBe('fails, nothing-left');
  });

  test('a fin plate shares the web too', () => {
    const { cleat: _, supportBolts: __, ...bolts } = pair.joint as Json;
    const plate = { thickness: 0.375, grade: 'A36', topEdge: 1.25, bottomEdge: 1.25, edge: 1.5 };
    const fin = { ...pair, joint: { ...bolts, kind: 'fin-plate', plate, weld: { leg: 0.25, electrode: 70 } } };
    const both = { support: { otherReaction: 60 } };
    // 0.75 x 0.6 x 65 x 0.4 x 2 x 8.5 - 60
    expect(strengthOf(fin, 'support-shear', both)).toBeCloseTo(138.9, 9);
  });
});

describe('one angle', () => {
  test('hangs on one line at its arm from the middle of the web: C by the instantaneous centre, or elastically by option', () => {
    // C (3 rows, 3 in, arm 3 in) 1.7544; elastic 1/sqrt((3 x 3/18)² + (1/3)²) = 1.6641; one bolt 54 x 0.44179 x 0.75
    expect(strengthOf(one, 'support-bolt-shear')).toBeCloseTo(1.7544 * 17.8924, 2);
    const elastic = { options: { 'bolt-group': 'elastic' } };
    expect(strengthOf(one, 'support-bolt-shear', elastic)).toBeCloseTo(1.6641 * 17.8924, 2);
  });

  test('its line carries C times its weakest bolt, the side edge among them; by option C/n times all, without that edge', () => {
    expect(rowOf(one, 'cleat-bearing', 'r_le')).toBeCloseTo(20.13, 2);
    const sum = { options: { 'eccentric-bearing': 'sum' } };
    expect(strengthOf(one, 'cleat-bearing', sum)).toBeGreaterThan(strengthOf(one, 'cleat-bearing'));
    expect(rowOf(one, 'cleat-bearing', 'r_le', sum)).toBeUndefined();
  });

  test('its leg on the support bends under V at that arm', () => {
    const { demand, of } = checkOf(one, 'cleat-bending');
    expect([demand, of]).toEqual([expect.closeTo(60, 9), 'rupture']);
  });

  test('one row of support bolts, or a beam on the other side of the same web, refers', () => {
    const row = support({ rows: 1 });
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      expect(stateOf(one, id, row)).toBe('refer, one-bolt');
      expect(checkOf(one, id, row).resistance).toBeNull();
    }
    const both = { support: { otherReaction: 10 } };
    for (const id of ['support-bearing', 'cleat-bearing'])
      expect(stateOf(one, id, both)).toBe('refer, one-line-opposite');
  });

  test('is 3/8 in thick, 1/2 in for bolts above 7/8 in, or refers', () => {
    expect(stateOf(one, 'fit-rotation')).toBe('holds');
    expect(stateOf(one, 'fit-rotation', { joint: { cleat: { thickness: 0.25 } } })).toBe('refer, too-little');
    expect(stateOf(one, 'fit-rotation', support({ size: '1' }))).toBe('refer, too-little');
  });
});

describe('welded legs', () => {
  test('a leg below Table J2.4 fails by its size, and no strength is given for it', () => {
    const web = checkOf(webWelded, 'weld-web', { joint: { cleat: { webWeld: { leg: 0.125 } } } });
    expect([web.state, web.of, web.reactionAtFailure]).toEqual(['fails', 'least leg', undefined]);
    const toSupport = checkOf(supportWelded, 'weld', {
      joint: { cleat: { thickness: 0.5, supportWeld: { leg: 0.125 } } },
    });
    expect([toSupport.state, toSupport.of]).toEqual(['fails', 'least leg']);
    const plate = checkOf(endPlate, 'weld-web', { joint: { plate: { thickness: 0.3125 }, webWeld: { leg: 0.125 } } });
    expect([plate.state, plate.of]).toEqual(['fails', 'least leg']);
  });

  test('a leg too large for the edge of the angle refers', () => {
    expect(
      stateOf(webWelded, 'weld-web', { joint: { cleat: { webWeld: { leg: 0.375 } } }, beam: { section: 'W18x86' } }),
    ).toBe('refer, weld-above-edge');
    expect(stateOf(supportWelded, 'weld')).toBe('holds');
    expect(stateOf(supportWelded, 'weld', { joint: { cleat: { supportWeld: { leg: 0.3125 } } } })).toBe(
      'refer, weld-above-edge',
    );
  });

  test('the welds of both angles pull on one web', () => {
    const thin = checkOf(webWelded, 'weld-web');
    expect(thin.of).toBe('web');
    expect(checkOf(webWelded, 'weld-web', { joint: { cleat: { webWeld: { leg: 0.1875 } } } }).of).toBe(
      'toe and returns',
    );
  });

  test('a welded web leg has its support leg looked at with the bolts in the support', () => {
    expect(stateOf(webWelded, 'cleat-bearing')).toBe('notApplicable, no-web-holes');
    expect(checkOf(webWelded, 'support-bearing').of).toBe('support leg');
    expect(checkOf(pair, 'support-bearing').of).toBe('support');
    expect(checkOf(webWelded, 'cleat-net-shear').of).toBe('support leg');
  });

  test('a welded leg has no holes to break through', () => {
    expect(checkOf(supportWelded, 'cleat-net-shear').of).toBe('web leg');
    expect(checkOf(supportWelded, 'cleat-block').of).toBe('web leg');
    expect(stateOf(supportWelded, 'support-bolt-shear')).toBe('notApplicable, no-support-bolts');
    // gross: 0.75 x 0.6 x 65 x 0.4 x 2 x 8.5
    expect(strengthOf(supportWelded, 'support-shear')).toBeCloseTo(198.9, 9);
  });

  test('the weld of one angle to the support carries V at the far edge, without help from a second', () => {
    const single = changed(supportWelded, { joint: { kind: 'single-cleat' } });
    expect(strengthOf(single, 'weld')).toBeLessThan(0.5 * strengthOf(supportWelded, 'weld'));
    expect(checkOf(single, 'cleat-bending').demand).toBeCloseTo(20 * (4 + 0.355 / 2), 9);
  });
});

describe('end plates', () => {
  test('have no holes in the web, and their thickness for a setback', () => {
    for (const id of ['web-block', 'web-net-shear', 'web-bearing', 'web-tearout']) {
      expect(stateOf(endPlate, id)).toBe('notApplicable, no-web-holes');
    }
    expect(stateOf(endPlate, 'fit-setback')).toBe('notApplicable, fills-setback');
    expect(stateOf(endPlate, 'endplate-tearout')).toBe('notApplicable, covered');
  });

  test('their welds count one leg less at each end, and so does the web beside them', () => {
    // 0.75 x 2 x 0.6 x 70 x 0.1875/sqrt2 x 8.125; 0.75 x 0.6 x 65 x 0.355 x 8.125
    expect(strengthOf(endPlate, 'weld-web')).toBeCloseTo(67.866, 3);
    expect(strengthOf(endPlate, 'endplate-web-shear')).toBeCloseTo(84.368, 3);
  });

  test('above 3/8 in, or with lines nearer than 3-1/2 or farther than 5-1/2 in, they refer', () => {
    expect(stateOf(endPlate, 'fit-rotation')).toBe('holds');
    expect(stateOf(endPlate, 'fit-rotation', { joint: { plate: { thickness: 0.5 } } })).toBe('refer, too-much');
    expect(stateOf(endPlate, 'fit-rotation', support({ crossCentres: 3.25 }))).toBe('refer, too-little');
    expect(
      stateOf(endPlate, 'fit-rotation', { joint: { plate: { width: 9 }, supportBolts: { crossCentres: 6 } } }),
    ).toBe('refer, too-much');
  });

  test('stand on the cut web: above the cope or in a fillet they fail', () => {
    expect(stateOf(endPlate, 'fit-plate-depth')).toBe('holds');
    expect(stateOf(endPlate, 'fit-plate-depth', { joint: { plate: { top: 1.9 } } })).toBe('fails, too-little');
    const uncut = { top: null, joint: { plate: { top: 0.9 } } };
    expect(stateOf(endPlate, 'fit-plate-depth', uncut)).toBe('fails, too-little');
  });

  test('of the full depth are no simple joint: what holds refers, what fails fails', () => {
    const joint = ['endplate-gross-shear', 'endplate-net-shear', 'endplate-block', 'endplate-bearing', 'weld-web'];
    for (const id of [...joint, 'endplate-web-shear', 'support-bolt-shear']) {
      expect([id, stateOf(fullPlate, id)]).toEqual([id, 'refer, full-depth-plate']);
      expect(stateOf(fullPlate, id, { reaction: 2000 })).toBe('fails');
    }
    expect(stateOf(fullPlate, 'fit-rotation')).toBe('notApplicable, full-depth-plate');
    expect(stateOf(fullPlate, 'web-gross-shear')).toBe('holds');
    // welded to the web between the fillets: 18 - 2 x 0.972 - 2 x 0.1875
    expect(rowOf(fullPlate, 'weld-web', 'L')).toBeCloseTo(15.681, 9);
  });
});

describe('a tie force', () => {
  const tie = { tie: 15 };

  test('that bolts and web of bolted angles would hold refers, as it bends their legs and pulls at the support bolts; one that they do not fails', () => {
    for (const end of [pair, one]) {
      expect(stateOf(end, 'web-tie', tie)).toBe('refer, tie-bends-legs');
      expect(stateOf(end, 'web-tie', { tie: 500 })).toBe('fails');
      expect(notesOf(end, tie)).toContain('tie-in-web-only');
    }
  });

  test('refers with a welded leg or an end plate, and never passes by silence', () => {
    for (const end of [webWelded, endPlate, fullPlate]) {
      expect(stateOf(end, 'web-tie', tie)).toBe('refer, tie-not-covered');
      expect(stateOf(end, 'web-tie')).toBe('notApplicable, no-tie');
    }
    expect(stateOf(supportWelded, 'web-tie', tie)).toBe('refer, tie-bends-legs');
    expect(checkOf(endPlate, 'web-tie', tie).resistance).toBeNull();
    expect(checkOf(supportWelded, 'web-tie', tie).resistance).toBeGreaterThan(0);
  });
});

describe('fit of angles', () => {
  test('both legs keep pitch and edges', () => {
    expect(stateOf(pair, 'fit-pitch', support({ pitch: 1.9 }))).toBe('fails, too-little');
    expect(checkOf(pair, 'fit-pitch', support({ pitch: 1.9 })).of).toBe('support bolts');
    const near = checkOf(pair, 'fit-edge-plate', support({ topEdge: 0.9 }));
    expect([near.state, near.of]).toEqual(['refer', 'support bolts, top']);
    const side = checkOf(pair, 'fit-edge-plate', { joint: { cleat: { legSupport: 3.5 } } });
    expect([side.state, side.of]).toEqual(['fails', 'support bolts, side edge']);
  });

  test('above 5/8 in they are too stiff to turn with the beam and refer', () => {
    expect(stateOf(pair, 'fit-rotation', { joint: { cleat: { thickness: 0.625 } } })).toBe('holds');
    expect(stateOf(pair, 'fit-rotation', { joint: { cleat: { thickness: 0.75 } } })).toBe('refer, too-much');
  });

  test('the gap is 1 in at most, as of a conventional plate', () => {
    expect(stateOf(pair, 'fit-setback', { setback: 1.1, joint: { cleat: { legWeb: 5 } } })).toBe('refer, too-much');
  });

  test('above the edge of the cope, where the flange of the support is near, they refer', () => {
    // top of the angles 3.2 - 1.25 = 1.95, the cope 2 deep
    expect(stateOf(pair, 'fit-plate-depth', { joint: { firstRow: 3.2 } })).toBe('refer, too-little');
    expect(stateOf(pair, 'fit-plate-depth')).toBe('holds');
  });

  test('a leg that reaches farther than the cope stays clear of the fillet', () => {
    const placed = { firstRow: 2.1, supportBolts: { topEdge: 1.25 } };
    const high = { joint: placed, top: { depth: 0.8 }, support: undefined };
    expect(stateOf(pair, 'fit-plate-depth', high)).toBe('holds');
    const short = { ...high, top: { depth: 0.8, length: 2.5 } };
    expect(stateOf(pair, 'fit-plate-depth', short)).toBe('fails, too-little');
  });
});
