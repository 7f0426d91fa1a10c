import { describe, expect, it } from 'vitest';
import { endOf } from '../../../core/drawing/arcs.ts';
import type { FailurePath } from '../../../core/drawing/drawing.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { layViews } from '../../../core/drawing/layViews.ts';
import { supportForces } from '../../../core/drawing/onSupport/supportForces.ts';
import { type CheckName, strengthNames } from '../../../core/end/checkNames.ts';
import { standards } from '../../../core/standards/index.ts';
import { viewsOf } from './goldenDrawings.ts';
import { type Drawable, inTwoViews, type JointName, jointEnd } from './jointEnds.ts';
import { collide, pointsOf, textsOf } from './marks.ts';

const pathOf = (name: JointName, id: CheckName, of = ''): FailurePath => {
  const { facts, words } = jointEnd(name);
  const path = failurePath(id, of, facts, words);
  expect(path, `${name}: ${id} ${of}`).not.toBeNull();
  return path as FailurePath;
};

const said = (path: FailurePath): string[] => path.tags.map((one) => one.text);

/** Highest and lowest level that the torn lines of a path reach. */
const span = ({ strokes }: FailurePath): [number, number] => {
  const levels = strokes.flatMap((one) => [one.from.y, ...one.to.map((step) => endOf(step).y)]);
  return [Math.min(...levels), Math.max(...levels)];
};

const strengthOf = ({ checks }: Drawable) =>
  checks.filter(({ id, state }) => strengthNames.some((name) => name === id) && state !== 'notApplicable');

describe('the path of a failure of a cleat or end plate', () => {
  it('is drawn for every check that gives a number, in the way that the report names, under every standard', () => {
    for (const standard of Object.values(standards)) {
      for (const name of inTwoViews) {
        const it = jointEnd(name, standard);
        for (const { id, of, reactionAtFailure } of strengthOf(it)) {
          if (reactionAtFailure === undefined || reactionAtFailure === null) continue;
          const path = failurePath(id as CheckName, of ?? '', it.facts, it.words);
          expect(path, `${standard.id}, ${name}: ${id} ${of}`).not.toBeNull();
          expect(JSON.stringify(path)).not.toContain('null');
        }
      }
    }
  });

  it.each(inTwoViews)('keeps its words off those of the drawing, finite, on the bench and on paper: %s', (name) => {
    const onBench = { values: 'gap', textHeight: 12.6 } as const;
    const onPaper = { values: 'parallel', textHeight: 17.9, pathStays: true } as const;
    const it = jointEnd(name);
    const views = viewsOf(it);
    strengthOf(it).forEach(({ id, of }, i) => {
      const path = failurePath(id as CheckName, of ?? '', it.facts, it.words);
      if (path === null) return;
      const laid = layViews(views, i % 2 === 0 ? onBench : onPaper, path);
      expect(
        laid.marks.some((one) => one.layer === 'path'),
        `${id} ${of}`,
      ).toBe(true);
      expect(laid.marks.flatMap(pointsOf).every(({ x, y }) => Number.isFinite(x + y))).toBe(true);
      const texts = textsOf(laid);
      for (const own of texts.filter((one) => one.layer === 'path')) {
        const under = texts.filter((other) => own !== other && collide(own.box, other.box));
        expect(under, `${id} ${of}`).toEqual([]);
      }
    });
  });

  it('runs down in the web leg and up in the support leg or end plate, to the nearer edge', () => {
    // Cleat from 50 to 270, rows at 90, 160 and 230: down from the first row to 270, up from the last to 50.
    expect(span(pathOf('double-cleat', 'cleat-block', 'web leg'))).toEqual([90, 270]);
    expect(span(pathOf('double-cleat', 'cleat-block', 'support leg'))).toEqual([50, 230]);
    expect(span(pathOf('double-cleat', 'cleat-tearout', 'web leg, down'))).toEqual([90, 270]);
    expect(span(pathOf('double-cleat', 'cleat-tearout', 'support leg, up'))).toEqual([50, 230]);
    // End plate from 60 to 280, rows at 100, 170 and 240.
    expect(span(pathOf('end-plate', 'endplate-block'))).toEqual([60, 240]);
    expect(span(pathOf('end-plate', 'endplate-tearout'))).toEqual([60, 240]);
  });

  it('says its lengths as the rules take them', () => {
    // L_gv = 40 + 2 x 70 = 180; L_gt = (220 - 140)/2 = 40; net 220 - 3 x 22 = 154.
    expect(said(pathOf('end-plate', 'endplate-block'))).toEqual(['2 × 180 in shear', '2 × 40 in tension']);
    expect(said(pathOf('end-plate', 'endplate-tearout'))).toEqual(['4 × 180 in shear']);
    expect(said(pathOf('end-plate', 'endplate-gross-shear'))).toEqual(['2 × 220 in shear']);
    expect(said(pathOf('end-plate', 'endplate-net-shear'))).toEqual(['2 × 154 net in shear']);
    expect(said(pathOf('end-plate', 'weld-web'))).toEqual(['2 × 220']);
    // Leg 100 from the web's face, line 70 from the web's middle: 100 - (140 - 7.9)/2 = 33.95.
    expect(said(pathOf('double-cleat', 'cleat-block', 'support leg'))).toEqual([
      '2 × 180 in shear',
      '2 × 33.95 in tension',
    ]);
    expect(said(pathOf('single-cleat', 'cleat-tearout', 'support leg, along'))).toEqual(['2 × 33.95 in shear']);
    expect(said(pathOf('double-cleat-web-welded', 'weld-web'))).toEqual(['220', '2 × 80']);
  });

  it('belongs to the view that shows it', () => {
    const views = (name: JointName, id: CheckName, of = '') => pathOf(name, id, of).view ?? 'side';
    expect(views('double-cleat', 'cleat-block', 'web leg')).toBe('side');
    expect(views('double-cleat', 'cleat-block', 'support leg')).toBe('support');
    expect(views('double-cleat-support-welded', 'weld')).toBe('support');
    expect(views('end-plate', 'weld-web')).toBe('side');
    expect(views('end-plate', 'endplate-web-shear')).toBe('side');
    expect(views('end-plate', 'support-bolt-shear')).toBe('support');
    expect(views('end-plate', 'support-shear')).toBe('support');
  });

  it('shares V evenly over two lines, and turns one cleat about its one line', () => {
    // Two lines: 165/6 = 27.5 kN. One line, V 70 at arm 70: V/3 = 23.33; H = 70 x 70 x 70/(2 x 70^2) = 35; together 42.06 kN.
    expect(said(pathOf('end-plate', 'support-bolt-shear'))).toEqual(Array.from({ length: 6 }, () => '27.5'));
    expect(said(pathOf('single-cleat', 'support-bolt-shear'))).toEqual(['42.1', '23.3', '42.1']);
    const [top, middle, low] = supportForces(jointEnd('single-cleat').facts);
    expect([top!.force.x, middle!.force.x, low!.force.x].map(Math.round)).toEqual([-35000, 0, 35000]);
    for (const one of [top!, middle!, low!]) expect(one.force.y).toBeCloseTo(-70000 / 3, 6);
  });

  it('halves the bearing of each bolt between two cleats, and cuts the bolts in two planes', () => {
    // As at the fin plate of the same bolts: 85.0 kN on the worst bolt at V 165, z 55.
    expect(said(pathOf('double-cleat', 'bolt-shear'))).toEqual(['85.0', '55.0', '85.0']);
    expect(pathOf('double-cleat', 'bolt-shear').caption).toContain('two planes');
    expect(said(pathOf('double-cleat', 'cleat-bearing', 'web leg'))).toEqual(['42.5']);
  });

  it('is left out where there are no bolts or welds of that kind', () => {
    const none = (name: JointName, id: CheckName, of = '') => {
      const { facts, words } = jointEnd(name);
      expect(failurePath(id, of, facts, words), `${name}: ${id} ${of}`).toBeNull();
    };
    none('end-plate', 'web-block');
    none('end-plate', 'bolt-shear');
    none('end-plate', 'weld');
    none('double-cleat', 'weld-web');
    none('double-cleat', 'endplate-block');
    none('double-cleat-support-welded', 'support-bolt-shear');
    none('double-cleat-support-welded', 'cleat-block', 'support leg');
    none('double-cleat-web-welded', 'cleat-block', 'web leg');
  });
});
