import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { layoutDrawing } from '../../../core/drawing/layout.ts';
import { leastBox } from '../../../core/drawing/leastBox.ts';
import { collide, contains, pointsOf, textsOf } from './marks.ts';
import { plausibleEnds } from './plausibleEnds.ts';
import { sampleFacts, sampleWords, variedEnds } from './sampleFacts.ts';

const draw = (name: string) => drawEnd(sampleFacts(variedEnds[name]), sampleWords);
/** Bench: 14.5 px at 1.15 px for one mm; paper: capitals of 2.5 mm at 1:5. */
const pens = [
  { values: 'gap', textHeight: 12.6 },
  { values: 'parallel', textHeight: 17.9 },
] as const;

describe('the layout of a drawing', () => {
  it('sets no two words on each other, on the bench or on paper, for twelve varied ends', () => {
    expect(Object.keys(variedEnds)).toHaveLength(12);
    for (const name of Object.keys(variedEnds)) {
      for (const pen of pens) {
        const texts = textsOf(layoutDrawing(draw(name), pen));
        texts.forEach((a, i) => {
          for (const b of texts.slice(i + 1)) {
            expect(collide(a.box, b.box), `${name}, ${pen.values}: ${a.text} on ${b.text}`).toBe(false);
          }
        });
      }
    }
  });

  it('keeps every line and word inside the box that it states', () => {
    for (const name of Object.keys(variedEnds)) {
      for (const pen of pens) {
        const laid = layoutDrawing(draw(name), pen);
        for (const point of laid.marks.flatMap(pointsOf)) expect(contains(laid.box, point), name).toBe(true);
      }
    }
  });

  it('sets each field once, with a box for its input', () => {
    for (const name of Object.keys(variedEnds)) {
      for (const pen of pens) {
        const fields = textsOf(layoutDrawing(draw(name), pen)).filter((one) => one.path !== undefined);
        const paths = fields.map((one) => one.path);
        expect(new Set(paths).size, name).toBe(paths.length);
        expect(paths).toEqual(expect.arrayContaining(['setback', 'joint.firstRow', 'joint.endDistance', 'reaction']));
        for (const { box } of fields) expect(box.right - box.left).toBeGreaterThan(0);
      }
    }
  });

  it('writes heights upright in their lines on the bench, and along them on paper', () => {
    const rotations = (pen: (typeof pens)[number]) =>
      textsOf(layoutDrawing(draw('K-207/L'), pen)).find((one) => one.path === 'joint.firstRow')!.rotation;
    expect(pens.map(rotations)).toEqual([0, -90]);
  });

  it('lays longer dimensions outside shorter ones', () => {
    const laid = layoutDrawing(draw('K-207/L'), pens[1]);
    const x = (text: string) => textsOf(laid).find((one) => one.text === text)!.at.x;
    expect(x('(361.4)')).toBeLessThan(x('90'));
    expect(x('90')).toBeLessThan(-10);
  });

  it('ends each extension line short of the piece and past the dimension line', () => {
    const laid = layoutDrawing(draw('uncoped, two rows'), pens[1]);
    const end = laid.marks.find(
      (one) => one.shape === 'run' && one.layer === 'size' && one.from.x === 0 && pointsOf(one).every((p) => p.x === 0),
    );
    const levels = pointsOf(end!).map((p) => p.y);
    expect(Math.max(...levels)).toBeLessThan(0);
    expect(Math.min(...levels)).toBeLessThan(-2 * 17.9);
  });

  it('moves nothing of the drawing when a path is laid over it', () => {
    const facts = sampleFacts();
    const drawing = drawEnd(facts, sampleWords);
    const bare = layoutDrawing(drawing, pens[0]);
    const path = failurePath('web-block', '', facts, sampleWords);
    const over = layoutDrawing(drawing, pens[0], path);
    expect(over.marks.filter((one) => one.layer !== 'path')).toEqual(bare.marks);
    expect(over.marks.some((one) => one.layer === 'path')).toBe(true);
  });

  it('fills at least the box that is foretold without a layout, with and without a path', () => {
    fc.assert(
      fc.property(plausibleEnds, fc.constantFrom(...pens), fc.boolean(), (sample, pen, shown) => {
        const facts = sampleFacts(sample);
        const drawing = drawEnd(facts, sampleWords);
        const path = shown ? failurePath('web-block', '', facts, sampleWords) : null;
        const { left, top, right, bottom } = leastBox(drawing, pen);
        const { box } = layoutDrawing(drawing, pen, path);
        const hair = 1e-9 * Math.max(right - left, bottom - top);
        expect(box.left).toBeLessThanOrEqual(left + hair);
        expect(box.top).toBeLessThanOrEqual(top + hair);
        expect(box.right).toBeGreaterThanOrEqual(right - hair);
        expect(box.bottom).toBeGreaterThanOrEqual(bottom - hair);
      }),
      { numRuns: 100 },
    );
  });

  it('is foretold so closely that words with leaders alone add to its height on paper', () => {
    for (const name of Object.keys(variedEnds)) {
      const drawing = { ...draw(name), callouts: [], weld: null };
      const least = leastBox(drawing, pens[1]);
      const { box } = layoutDrawing(drawing, pens[1]);
      expect(box.bottom - box.top - (least.bottom - least.top), name).toBeLessThan(3 * pens[1].textHeight);
    }
  });

  it('is the same every time', () => {
    expect(layoutDrawing(draw('two columns'), pens[0])).toEqual(layoutDrawing(draw('two columns'), pens[0]));
  });

  it('gives finite marks inside its box for whatever a half-filled form may hold', () => {
    fc.assert(
      fc.property(plausibleEnds, fc.constantFrom(...pens), (sample, pen) => {
        const laid = layoutDrawing(drawEnd(sampleFacts(sample), sampleWords), pen);
        const points = laid.marks.flatMap(pointsOf);
        return (
          points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y)) &&
          points.every((point) => contains(laid.box, point))
        );
      }),
      { numRuns: 60 },
    );
  });

  it('sets no two values of dimensions on each other for ends of every kind', () => {
    fc.assert(
      fc.property(plausibleEnds, fc.constantFrom(...pens), (sample, pen) => {
        const values = textsOf(layoutDrawing(drawEnd(sampleFacts(sample), sampleWords), pen)).filter(
          (one) => one.layer === 'size',
        );
        return values.every((a, i) => values.slice(i + 1).every((b) => !collide(a.box, b.box)));
      }),
      { numRuns: 60 },
    );
  });
});
