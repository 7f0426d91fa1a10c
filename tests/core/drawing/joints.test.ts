import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { endOf } from '../../../core/drawing/arcs.ts';
import type { Line, View } from '../../../core/drawing/drawing.ts';
import { layoutDrawing } from '../../../core/drawing/layout.ts';
import { boxOfViews, layViews } from '../../../core/drawing/layViews.ts';
import { leastBox } from '../../../core/drawing/leastBox.ts';
import { drawOnSupport } from '../../../core/drawing/onSupport/drawOnSupport.ts';
import { sentences } from '../../../core/drawing/sentences.ts';
import { standards } from '../../../core/standards/index.ts';
import { changed } from '../../support/changed.ts';
import { goodEnds } from '../../support/published.ts';
import { viewsOf } from './goldenDrawings.ts';
import { drawable, endNamed, inTwoViews, type JointName, jointEnd, jointNames } from './jointEnds.ts';
import { collide, contains, pointsOf, textsOf } from './marks.ts';

const pens = [
  { values: 'gap', textHeight: 12.6 },
  { values: 'parallel', textHeight: 17.9 },
] as const;

const linesOf = ({ dimensions, callouts, weld, reaction }: View): Line[] => [
  ...dimensions.map((one) => one.line),
  ...callouts.flatMap((one) => one.variants[0]!),
  ...(weld === null ? [] : [weld.line]),
  ...(reaction ? [reaction] : []),
];

const fieldsOf = (view: View): string[] =>
  linesOf(view).flatMap((line) => line.flatMap((word) => (word.path === undefined ? [] : [word.path])));

const cope = ['top.depth', 'top.length', 'top.radius'];
const webBolts = ['joint.bolts.pitch', 'joint.endDistance', 'joint.firstRow'];
const supportBolts = ['joint.supportBolts.crossCentres', 'joint.supportBolts.pitch', 'joint.supportBolts.topEdge'];
const cleat = ['joint.cleat.legWeb', 'joint.cleat.thickness'];
const cleatEdges = ['joint.cleat.bottomEdge', 'joint.cleat.topEdge'];
const plate = ['joint.plate.depth', 'joint.plate.thickness', 'joint.plate.top', 'joint.webWeld.leg'];

/** The sizes of each good end that its two views carry. */
const expected: Partial<Record<JointName, readonly [side: readonly string[], onSupport: readonly string[]]>> = {
  'double-cleat': [
    [...cope, 'setback', ...webBolts, ...cleat, ...cleatEdges],
    ['joint.cleat.legSupport', ...supportBolts],
  ],
  'single-cleat': [
    [...cope, 'setback', ...webBolts, ...cleat, ...cleatEdges],
    ['joint.cleat.legSupport', ...supportBolts],
  ],
  'double-cleat-web-welded': [
    [...cope, 'setback', ...cleat, 'joint.cleat.depth', 'joint.cleat.top', 'joint.cleat.webWeld.leg'],
    ['joint.cleat.legSupport', ...supportBolts],
  ],
  'double-cleat-support-welded': [
    [...cope, 'setback', ...webBolts, ...cleat, ...cleatEdges],
    ['joint.cleat.legSupport', 'joint.cleat.supportWeld.leg', 'joint.cleat.supportWeld.return'],
  ],
  'end-plate': [
    [...cope, ...plate],
    ['joint.plate.width', ...supportBolts],
  ],
  'full-end-plate': [plate, ['joint.plate.width', ...supportBolts]],
};

describe('the drawing of cleats and end plates', () => {
  it('shows every size that is an input exactly once, in the view that shows it', () => {
    for (const name of inTwoViews) {
      const [side, support] = viewsOf(jointEnd(name));
      const [onSide, onSupport] = expected[name]!;
      expect(fieldsOf(side).sort(), name).toEqual([...onSide, 'reaction'].sort());
      expect(fieldsOf(support!).sort(), name).toEqual([...onSupport].sort());
    }
  });

  it('gives each dimension the value of its input; of one cleat the line stands at half the cross centres', () => {
    const values = (name: JointName) =>
      Object.fromEntries(
        viewsOf(jointEnd(name)).flatMap((view) => view.dimensions.map((one) => [one.path, one.value])),
      );
    expect(values('end-plate')).toMatchObject({
      'joint.plate.thickness': 10,
      'joint.plate.top': 60,
      'joint.plate.depth': 220,
      'joint.plate.width': 220,
      'joint.supportBolts.crossCentres': 140,
      'joint.supportBolts.pitch': 70,
      'joint.supportBolts.topEdge': 40,
    });
    expect(values('single-cleat')).toMatchObject({
      'joint.cleat.legWeb': 100,
      'joint.cleat.legSupport': 100,
      'joint.supportBolts.crossCentres': 140,
    });
    const across = viewsOf(jointEnd('single-cleat'))[1]!.dimensions.find((one) => one.path?.endsWith('crossCentres'));
    expect([across!.from.x, across!.to.x]).toEqual([-70, 0]);
    expect(across!.line.map((word) => word.text)).toEqual(['140', '/ 2']);
  });

  it('has a view on the support where something lies on it, and none for a plate on edge or a ply', () => {
    for (const name of jointNames) {
      const { facts, words } = jointEnd(name);
      expect(drawOnSupport(facts, words) !== null, name).toBe(inTwoViews.some((one) => one === name));
    }
  });

  it('stands a cleat on its heel at the support, before the end of the web, which it hides', () => {
    // Setback 10, leg 100: heel at -10, toe at 90; cleat from 90 - 40 = 50 to 270.
    const { strokes } = viewsOf(jointEnd('double-cleat'))[0];
    const leg = strokes.find((one) => one.closed);
    expect([leg!.from, ...leg!.to.map(endOf)]).toEqual([
      { x: -10, y: 50 },
      { x: 90, y: 50 },
      { x: 90, y: 270 },
      { x: -10, y: 270 },
    ]);
    const hidden = strokes.filter((one) => one.kind === 'hidden');
    expect(hidden.map(({ from, to }) => [from, endOf(to[0]!)])).toEqual([
      [
        { x: 0, y: 50 },
        { x: 0, y: 270 },
      ],
    ]);
  });

  it('fills the setback with an end plate', () => {
    const { strokes, face } = viewsOf(jointEnd('end-plate'))[0];
    expect(face!.x).toBe(-10);
    const edge = strokes.find((one) => one.closed);
    expect([edge!.from, endOf(edge!.to[1]!)]).toEqual([
      { x: -10, y: 60 },
      { x: 0, y: 280 },
    ]);
  });

  it('shows on the support what the copes leave of the beam, cut through, and the bolts at their cross centres', () => {
    const view = viewsOf(jointEnd('double-cleat'))[1]!;
    const outline = view.cuts[0]!.outline;
    expect(Math.min(...outline.map((p) => p.y))).toBe(45);
    const widthAt = (y: number) => Math.max(...outline.filter((p) => Math.abs(p.y - y) < 1e-9).map((p) => p.x));
    expect(widthAt(45)).toBeCloseTo(7.9 / 2, 9);
    expect(widthAt(406.4)).toBeCloseTo(177.9 / 2, 9);
    expect(view.cuts).toHaveLength(3);
    expect(view.holes.map((one) => [one.centre.x, one.centre.y, one.radius])).toEqual(
      [-70, 70].flatMap((x) => [90, 160, 230].map((y) => [x, y, 11])),
    );
    expect(viewsOf(jointEnd('single-cleat'))[1]!.holes.map((one) => one.centre.x)).toEqual([-70, -70, -70]);
  });

  it('draws what is behind the beam only where it can be seen', () => {
    const { strokes } = viewsOf(jointEnd('end-plate'))[1]!;
    const top = strokes.filter((one) => one.kind === 'outline' && one.from.y === 60 && endOf(one.to[0]!).y === 60);
    expect(top.map((one) => [one.from.x, endOf(one.to[0]!).x])).toEqual([
      [-110, -3.95],
      [3.95, 110],
    ]);
  });

  it('sets both views beside each other on the same levels, a title over each', () => {
    for (const name of inTwoViews) {
      const views = viewsOf(jointEnd(name));
      const laid = layViews(views, pens[0]);
      const [side, support] = views.map((view) => layoutDrawing(view, pens[0]));
      const levels = (of: typeof laid) => textsOf(of).map((one) => one.at.y);
      expect(levels(laid).slice(0, -2).sort()).toEqual([...levels(side!), ...levels(support!)].sort());
      expect(textsOf(laid).map((one) => one.text)).toEqual(expect.arrayContaining(['side view', 'on the support']));
      expect(laid.marks).toHaveLength(side!.marks.length + support!.marks.length + 2);
      const bare = boxOfViews(views);
      expect(laid.box.right - laid.box.left).toBeGreaterThan(bare.right - bare.left);
    }
  });
});

describe('the layout of cleats and end plates', () => {
  it('sets no two words on each other, in one view or two, on the bench or on paper', () => {
    for (const name of inTwoViews) {
      for (const standard of [standards['sans-10162-1']!, standards['aisc-360-lrfd']!]) {
        for (const pen of pens) {
          const texts = textsOf(layViews(viewsOf(jointEnd(name, standard)), pen));
          texts.forEach((a, i) => {
            for (const b of texts.slice(i + 1)) {
              expect(collide(a.box, b.box), `${name}, ${pen.values}: ${a.text} on ${b.text}`).toBe(false);
            }
          });
        }
      }
    }
  });

  it('keeps every line and word inside the box that it states, and fills at least the box that is foretold', () => {
    for (const name of inTwoViews) {
      for (const pen of pens) {
        const views = viewsOf(jointEnd(name));
        const laid = layViews(views, pen);
        for (const point of laid.marks.flatMap(pointsOf)) expect(contains(laid.box, point), name).toBe(true);
        for (const view of views) {
          const least = leastBox(view, pen);
          const { box } = layoutDrawing(view, pen);
          expect(box.left).toBeLessThanOrEqual(least.left + 1e-6);
          expect(box.top).toBeLessThanOrEqual(least.top + 1e-6);
          expect(box.right).toBeGreaterThanOrEqual(least.right - 1e-6);
          expect(box.bottom).toBeGreaterThanOrEqual(least.bottom - 1e-6);
        }
      }
    }
  });

  it('sets no two values of dimensions on each other, and stays finite, for ends of every size', () => {
    const between = (min: number, max: number) => fc.integer({ min, max });
    const sizes = fc.record({
      name: fc.constantFrom(...inTwoViews),
      rows: between(1, 5),
      pitch: between(50, 90),
      cc: between(80, 180),
      edge: between(20, 60),
      thickness: between(6, 25),
      leg: between(60, 150),
      setback: between(0, 30),
      cope: fc.option(fc.tuple(between(40, 200), between(10, 90)), { nil: null }),
    });
    let drawn = 0;
    fc.assert(
      fc.property(sizes, fc.constantFrom(...pens), (of, pen) => {
        const end = endNamed(of.name) as Record<string, Record<string, Record<string, unknown>>>;
        const { supportBolts: bolts, cleat: angle, plate: flat } = end.joint!;
        if (bolts) Object.assign(bolts, { rows: of.rows, pitch: of.pitch, crossCentres: of.cc, topEdge: of.edge });
        if (angle) Object.assign(angle, { thickness: of.thickness, legWeb: of.leg, legSupport: of.leg });
        if (flat) Object.assign(flat, { thickness: of.thickness, width: of.cc + 2 * of.edge });
        const top = of.cope && { length: of.cope[0], depth: of.cope[1], radius: 10 };
        const it = drawable({ ...end, setback: of.setback, top });
        if (it === null) return true;
        drawn += 1;
        const laid = layViews(viewsOf(it), pen);
        const values = textsOf(laid).filter((one) => one.layer === 'size');
        return (
          laid.marks.flatMap(pointsOf).every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y)) &&
          values.every((a, i) => values.slice(i + 1).every((b) => !collide(a.box, b.box)))
        );
      }),
      { numRuns: 30 },
    );
    expect(drawn).toBeGreaterThan(5);
  });
});

describe('the symbols of welds', () => {
  const american = standards['aisc-360-lrfd']!;
  const words = (name: JointName, standard = standards['sans-10162-1']!) =>
    viewsOf(jointEnd(name, standard))
      .flatMap((view) => textsOf(layoutDrawing({ ...view, dimensions: [], callouts: [] }, pens[0])))
      .filter((one) => one.layer === 'words')
      .map((one) => one.text);

  it('stand as the trade of the standard draws them', () => {
    const practice = Object.values(standards).map(({ id, weldSymbols }) => [id, weldSymbols]);
    expect(Object.fromEntries(practice)).toEqual({
      'sans-10162-1': 'iso',
      'csa-s16': 'aws',
      'aisc-360-lrfd': 'aws',
      'aisc-360-asd': 'aws',
      'en-1993': 'iso',
      'en-1993-uk': 'iso',
      'as-4100': 'aws',
      'is-800': 'iso',
    });
  });

  it('say z and the leg once by ISO 2553, and the leg on both sides of the line by AWS A2.4', () => {
    for (const name of ['fin-plate', 'end-plate'] as const) {
      const leg = name === 'fin-plate' ? '8' : '6';
      expect(
        words(name).filter((text) => text === 'z' || text === leg),
        name,
      ).toEqual(['z', leg]);
      expect(
        words(name, american).filter((text) => text === 'z' || text === leg),
        name,
      ).toEqual([leg, leg]);
    }
  });

  it('draw a fillet at one cleat on the side of the arrow, with the dashed line of the other side by ISO 2553, and say that each cleat has it', () => {
    const dashed = (name: JointName, standard = standards['sans-10162-1']!) =>
      viewsOf(jointEnd(name, standard)).flatMap((view) =>
        layoutDrawing(view, pens[0]).marks.filter(
          (one) => one.shape === 'run' && one.layer === 'words' && one.kind === 'hidden',
        ),
      );
    for (const name of ['double-cleat-web-welded', 'double-cleat-support-welded'] as const) {
      expect(dashed(name), name).toHaveLength(1);
      expect(dashed(name, american), name).toHaveLength(0);
      expect(words(name).slice(-3), name).toEqual(expect.arrayContaining(['z', '6', 'each cleat']));
      expect(words(name, american), name).toEqual(expect.arrayContaining(['6', 'each angle']));
    }
    expect(dashed('end-plate')).toHaveLength(0);
  });
});

describe('a beam opposite', () => {
  /** The end plate with bolts at 100, 170 and 240 down, lines at 140; the beam opposite has a fourth row, at 310. */
  const given = goodEnds().find(({ name }) => name === 'end-plate-opposite')!.end;
  const { facts, words } = drawable(given)!;

  it('shows those of its bolts that we do not share as thin circles, within the view', () => {
    const { holes, box } = drawOnSupport(facts, words)!;
    const thin = holes.filter(({ kind }) => kind === 'narrow').map(({ centre }) => centre);
    expect(thin).toEqual([
      { x: -70, y: 310 },
      { x: 70, y: 310 },
    ]);
    expect(holes.filter(({ kind }) => kind === 'outline')).toHaveLength(6);
    expect(box.bottom).toBeGreaterThanOrEqual(321);
    const plain = jointEnd('end-plate');
    expect(drawOnSupport(plain.facts, plain.words)!.holes.every(({ kind }) => kind === 'outline')).toBe(true);
  });

  it('leaves out bolts far off, which would shrink all else', () => {
    const far = changed(given, { support: { opposite: { firstRow: 5000, rows: 1 } } });
    const it = drawable(far)!;
    const view = drawOnSupport(it.facts, it.words)!;
    expect(view.holes).toHaveLength(6);
    expect(view.box.bottom).toBeLessThan(500);
  });

  it('is told in words', () => {
    expect(sentences(facts, words).join(' ')).toContain(
      'The beam opposite shares 6 of these bolts; 2 others stand, from the middle of the web and from top of steel, at 70 to the left, 310 down; 70 to the right, 310 down.',
    );
  });
});

describe('cleats and end plates in words', () => {
  const said = (name: JointName): string => {
    const { facts, words } = jointEnd(name);
    return sentences(facts, words).join(' ');
  };

  it('say what stands where', () => {
    expect(said('double-cleat')).toContain(
      "Two cleats, one on each side of the web: leg on the web 100, on the support 100, 10 thick and 220 deep, heel at the support's face; edge 40 above the first row, 40 below the last, 45 beyond the last column.",
    );
    expect(said('double-cleat')).toContain(
      '3 rows of M20 8.8 bolts into the support in two lines at cross centres 140, pitch 70: edge 40 above the first row, 40 below the last, 33.95 beside; holes 22 drilled.',
    );
    expect(said('single-cleat')).toContain('One cleat, on the near side of the web');
    expect(said('single-cleat')).toContain('in one line 70 from the middle of the web');
    expect(said('double-cleat-web-welded')).toContain(
      'The web leg is welded with a fillet of leg 6 along its toe and 80 back along its top and bottom.',
    );
    expect(said('double-cleat-support-welded')).toContain(
      'The leg on the support is welded with a fillet of leg 6 along its toe, returned 12 across its top.',
    );
    expect(said('end-plate')).toContain(
      'End plate 10 thick, 220 wide and 220 deep between support and beam, its top 60 below top of steel, welded to the web with two fillets of leg 6.',
    );
  });

  it('speak of no bolts through a web that has none', () => {
    for (const name of ['end-plate', 'full-end-plate', 'double-cleat-web-welded'] as const) {
      expect(said(name)).not.toMatch(/first column|middle of the bolts/);
    }
  });
});
