import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { endOf } from '../../../core/drawing/arcs.ts';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import type { FailurePath, Point, Stroke } from '../../../core/drawing/drawing.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { layoutDrawing } from '../../../core/drawing/layout.ts';
import { boltForces } from '../../../core/drawing/paths/boltForces.ts';
import { type CheckName, fitNames, strengthNames } from '../../../core/end/checkNames.ts';
import type { Facts } from '../../../core/end/facts.ts';
import { finPlate } from '../../../core/joints/finPlate.ts';
import { collide, pointsOf, textsOf } from './marks.ts';
import { plausibleEnds } from './plausibleEnds.ts';
import { sampleFacts, sampleWords, variedEnds } from './sampleFacts.ts';

const pathOf = (id: CheckName, of: string, facts: Facts): FailurePath => {
  const path = failurePath(id, of, facts, sampleWords);
  expect(path, `${id} ${of}`).not.toBeNull();
  return path as FailurePath;
};

const torn = (path: FailurePath): Stroke[] => path.strokes.filter((one) => one.kind === 'path');

/** Length of a run of straight lines that stand upright, and of those that lie level. */
const lengths = (strokes: readonly Stroke[]): { upright: number; level: number } => {
  let [upright, level] = [0, 0];
  for (const { from, to } of strokes) {
    let last: Point = from;
    for (const step of to.map(endOf)) {
      upright += Math.abs(step.y - last.y);
      level += Math.abs(step.x - last.x);
      last = step;
    }
  }
  return { upright, level };
};

const texts = (path: FailurePath): string[] => path.tags.map((one) => one.text);

/** Ways of a check in the rules, one each. */
const ways: Readonly<Record<string, readonly string[]>> = {
  'web-tearout': ['up', 'along'],
  'plate-tearout': ['down', 'along'],
  'cope-shear': ['rectangle', 'tee'],
  'cope-bending': ['rectangle', 'tee'],
  'cope-buckling': ['rectangle', 'tee'],
  'stress-cope': ['rectangle', 'tee'],
  'web-tie': [
    'bolts',
    'bearing, web',
    'block, web',
    'net tension, web',
    'gross tension, web',
    'bearing, plate',
    'block, plate',
    'net tension, plate',
    'weld',
  ],
};

describe('the path of a failure', () => {
  it('is drawn for every strength check of a coped fin plate, and for no rule of fit', () => {
    const both = sampleFacts(variedEnds['two copes, top the longer']);
    for (const [id] of finPlate.strength) for (const of of ways[id] ?? ['']) pathOf(id, of, both);
    for (const id of fitNames) expect(failurePath(id, '', both, sampleWords)).toBeNull();
  });

  it('is left out where the end has no such path', () => {
    const none = (id: CheckName, of: string, name: string) =>
      expect(failurePath(id, of, sampleFacts(variedEnds[name]), sampleWords), `${id}, ${name}`).toBeNull();
    none('web-block', '', 'uncoped, two rows');
    none('web-tearout', 'up', 'uncoped, two rows');
    none('cope-shear', 'tee', 'uncoped, two rows');
    none('cope-shear', 'rectangle', 'K-207/L');
    none('cope-buckling', 'tee', 'bottom cope alone');
    none('weld', '', 'channel on a ply');
    none('web-tearout', 'along', 'one bolt');
    none('web-tie', 'block, web', 'one bolt');
  });

  it('tears the web’s block up to the cut edge and along to the beam’s end: L_gv = a_t + (n-1) p, L_gt = e_end + (m-1) q', () => {
    // K-207/L: a_t = 90 - 45 = 45, L_gv = 45 + 2 x 70 = 185, L_gt = 45.
    const one = pathOf('web-block', '', sampleFacts());
    expect(lengths(torn(one))).toEqual({ upright: 185, level: 45 });
    expect(texts(one)).toEqual(['185 in shear', '45 in tension']);
    // Two columns 60 apart, first at 40: L_gt = 100.
    const two = pathOf('web-block', '', sampleFacts(variedEnds['two columns']));
    expect(lengths(torn(two))).toEqual({ upright: 185, level: 100 });
  });

  it('takes only the columns inside the cope into the web’s block', () => {
    const facts = sampleFacts({ m: 2, q: 60, eEnd: 40, top: [70, 45, 10] });
    expect(facts.mTop).toBe(1);
    expect(lengths(torn(pathOf('web-block', '', facts)))).toEqual({ upright: 185, level: 40 });
    expect(torn(pathOf('web-tearout', 'up', facts))).toHaveLength(2);
    expect(torn(pathOf('plate-tearout', 'down', facts))).toHaveLength(4);
  });

  it('tears the plate’s block down to its bottom edge and along to its free edge, the shear plane next to the support', () => {
    // L_gv = e_bot + (n-1) p = 40 + 140 = 180, L_gt = e_x + (m-1) q = 40 + 60 = 100.
    const facts = sampleFacts(variedEnds['two columns']);
    const path = pathOf('plate-block', '', facts);
    expect(lengths(torn(path))).toEqual({ upright: 180, level: 100 });
    const points = torn(path).flatMap((one) => [one.from, ...one.to.map(endOf)]);
    expect(points).toEqual([
      { x: 140, y: 90 },
      { x: 40, y: 90 },
      { x: 40, y: 270 },
    ]);
  });

  it('tears out beside each column from the farthest bolt to the edge, web up and plate down', () => {
    const facts = sampleFacts();
    expect(texts(pathOf('web-tearout', 'up', facts))).toEqual(['2 × 185 in shear']);
    expect(texts(pathOf('plate-tearout', 'down', facts))).toEqual(['2 × 180 in shear']);
    expect(lengths(torn(pathOf('web-tearout', 'up', facts))).upright).toBeCloseTo(2 * 185, 9);
  });

  it('tears the first row alone out of the web, and the net section at the last column inside the cope', () => {
    // K-207/L: a_t = 90 - 45 = 45; net depth 361.4 - 3 x 22 = 295.4.
    const facts = sampleFacts();
    const first = pathOf('web-tearout', 'first row', facts);
    expect(texts(first)).toEqual(['45 in shear']);
    expect(lengths(torn(first)).upright).toBeCloseTo(2 * 45, 9);
    const rupture = pathOf('cope-bending', 'rupture, tee', facts);
    expect(texts(rupture)).toEqual(['295.4 net']);
    for (const { from } of torn(rupture)) expect(from.x).toBe(facts.eEnd);
    expect(failurePath('cope-bending', 'rupture, rectangle', facts, sampleWords)).toBeNull();
  });

  it('bends the plate at the middle of the bolts, or at the first column where a standard names a way of it', () => {
    const facts = sampleFacts(variedEnds['two columns']);
    expect(texts(pathOf('plate-bending', '', facts))).toEqual([`arm ${facts.z}`]);
    expect(texts(pathOf('plate-bending', 'rupture', facts))).toEqual([`arm ${facts.z1}`]);
  });

  it('tears along the lowest row, where the bolts push the web to its end and the plate to its free edge', () => {
    const facts = sampleFacts();
    const low = boltForces(facts).at(-1)!;
    expect(low.at.y).toBe(facts.yn);
    expect(low.force.x).toBeLessThan(0);
    for (const [id, edge] of [
      ['web-tearout', 45],
      ['plate-tearout', 50],
    ] as const) {
      const path = pathOf(id, 'along', facts);
      expect(lengths(torn(path))).toEqual({ upright: 0, level: 2 * edge });
      for (const { from } of torn(path)) expect(Math.abs(from.y - facts.yn)).toBe(facts.d0 / 2);
    }
  });

  it('tears along to the next hole where that is the shorter net length', () => {
    // e_end - d'/2 = 60 - 11 = 49; q - d' = 54 - 22 = 32.
    const facts = sampleFacts({ m: 2, q: 54, eEnd: 60, top: [180, 45, 10] });
    expect(texts(pathOf('web-tearout', 'along', facts))).toEqual(['2 × 54 in shear']);
  });

  it('leaves the holes out of a net line, and says the net length', () => {
    // h_o - n d' = 361.4 - 3 x 22 = 295.4; h_p - n d' = 220 - 66 = 154.
    const facts = sampleFacts();
    const web = pathOf('web-net-shear', '', facts);
    expect(lengths(torn(web)).upright).toBeCloseTo(295.4, 9);
    expect(texts(web)).toEqual(['295.4 net in shear']);
    expect(lengths(torn(pathOf('plate-net-shear', '', facts))).upright).toBeCloseTo(154, 9);
    expect(lengths(torn(pathOf('plate-gross-shear', '', facts))).upright).toBeCloseTo(220, 9);
  });

  it('cuts the tee at the longer cope’s face and the rectangle at the shorter one’s', () => {
    const facts = sampleFacts(variedEnds['two copes, top the longer']);
    const x = (of: string) => torn(pathOf('cope-shear', of, facts))[0]!.from.x;
    expect([x('tee'), x('rectangle')]).toEqual([140, 90]);
    expect(lengths(torn(pathOf('cope-shear', 'tee', facts))).upright).toBeCloseTo(406.4 - 40, 9);
    expect(lengths(torn(pathOf('cope-shear', 'rectangle', facts))).upright).toBeCloseTo(406.4 - 100, 9);
  });

  it('shows each bolt’s force on the web: V shared evenly and V z turned about the bolts', () => {
    // K-207/L: V/n = 55.0; V z y/J = 165 x 55 x 70/9800 = 64.82; together 85.01 kN.
    const path = pathOf('bolt-shear', '', sampleFacts());
    expect(texts(path)).toEqual(['85.0', '55.0', '85.0']);
    expect(path.circles).toHaveLength(3);
    const [top, middle, low] = path.strokes.map(({ from, to }) => ({
      x: endOf(to[0]!).x - from.x,
      y: endOf(to[0]!).y - from.y,
    }));
    expect(top!.x).toBeGreaterThan(0);
    expect(low!.x).toBeCloseTo(-top!.x, 9);
    expect(middle!.x).toBeCloseTo(0, 9);
    for (const one of [top!, middle!, low!]) expect(one.y).toBeLessThan(0);
  });

  it('holds the bolt forces in balance with the reaction at the support’s face', () => {
    fc.assert(
      fc.property(plausibleEnds, (sample) => {
        const facts = sampleFacts(sample);
        const forces = boltForces(facts);
        const sum = (of: (it: (typeof forces)[number]) => number) => forces.reduce((total, one) => total + of(one), 0);
        const size = Math.max(1, facts.V);
        expect(sum((one) => one.force.x) / size).toBeCloseTo(0, 6);
        expect(sum((one) => one.force.y) / size).toBeCloseTo(-facts.V / size, 6);
        if (forces.length === 1) return;
        // About the point where the face meets the level of the bolts' middle, V itself has no arm.
        const [x0, y0] = [-facts.g, (facts.y1 + facts.yn) / 2];
        const turn = sum(({ at, force }) => (at.x - x0) * force.y - (at.y - y0) * force.x);
        expect(turn / (size * facts.z)).toBeCloseTo(0, 6);
      }),
      { numRuns: 60 },
    );
  });

  it('presses web and plate on opposite sides of each hole', () => {
    const facts = sampleFacts();
    const middle = (id: CheckName): Point => {
      const { outline } = pathOf(id, '', facts).areas[1]!;
      const [x, y] = [0, 1].map((k) => outline.reduce((sum, p) => sum + (k === 0 ? p.x : p.y), 0) / outline.length);
      return { x: x!, y: y! };
    };
    expect(middle('web-bearing').y).toBeLessThan(160);
    expect(middle('plate-bearing').y).toBeGreaterThan(160);
  });

  it('stands the peak of the stress on its level, with its value', () => {
    // Derived in the rules of SANS 10162-1: 58.00 MPa full section, 78.92 MPa behind the cope at V = 165 kN.
    const facts = sampleFacts();
    expect(texts(pathOf('stress-full', '', facts))).toEqual(['58.0 MPa']);
    expect(texts(pathOf('stress-cope', 'tee', facts))).toEqual(['78.9 MPa']);
    expect(pathOf('stress-full', '', facts).strokes[0]!.from.y).toBeCloseTo(203.2, 9);
    expect(pathOf('stress-cope', 'tee', facts).strokes[0]!.from.y).toBeCloseTo(facts.tee.shape!.centroid, 9);
  });

  it('says force in kip and length in inches where the file does', () => {
    const facts = sampleFacts();
    const inch = { ...sampleWords, units: 'in-kip' } as const;
    expect(failurePath('bolt-shear', '', facts, inch)!.tags[1]!.text).toBe('12.4');
    expect(failurePath('bolt-shear', '', facts, inch)!.caption).toContain('kip');
  });

  it('stays finite, and its words off those of the drawing, for ends of every kind', () => {
    fc.assert(
      fc.property(plausibleEnds, fc.constantFrom(...strengthNames), fc.nat(7), (sample, id, k) => {
        const facts = sampleFacts(sample);
        const list = ways[id] ?? [''];
        const path = failurePath(id, list[k % list.length]!, facts, sampleWords);
        if (path === null) return;
        const laid = layoutDrawing(drawEnd(facts, sampleWords), { values: 'gap', textHeight: 12.6 }, path);
        const points = laid.marks.flatMap(pointsOf);
        expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
        const texts = textsOf(laid);
        for (const own of texts.filter((one) => one.layer === 'path')) {
          expect(texts.filter((other) => own !== other && collide(own.box, other.box))).toEqual([]);
        }
      }),
      { numRuns: 100 },
    );
  });
});
