import { describe, expect, it } from 'vitest';
import { endOf, isArc, swept } from '../../../core/drawing/arcs.ts';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import type { Arc, Point, Stroke } from '../../../core/drawing/drawing.ts';
import { sentences } from '../../../core/drawing/sentences.ts';
import { sampleFacts, sampleSupport, sampleWords, variedEnds } from './sampleFacts.ts';

const draw = (name: string) => drawEnd(sampleFacts(variedEnds[name]), sampleWords);

const outlineOf = (strokes: readonly Stroke[]): Stroke =>
  strokes.find((it) => it.kind === 'outline' && it.to.length > 2) as Stroke;

/** The arcs of a run with the point each starts from. */
const arcsOf = ({ from, to }: Stroke): [Point, Arc][] =>
  to.flatMap((step, i): [Point, Arc][] => (isArc(step) ? [[i === 0 ? from : endOf(to[i - 1]!), step]] : []));

describe('the drawing of one end', () => {
  it('is drawn as far beyond cope and plate as words need, and never less than without them', () => {
    const facts = sampleFacts();
    const right = (beyond?: number) =>
      drawEnd(facts, { ...sampleWords, ...(beyond !== undefined && { beyond }) }).beam.right;
    const usual = right();
    expect(right(0)).toBe(usual);
    expect(right(50)).toBe(usual);
    expect(right(400) - right(300)).toBeCloseTo(100, 9);
    const [at] = drawEnd(facts, { ...sampleWords, beyond: 400 }).breaks;
    expect(at!.x).toBe(right(400));
  });

  it('has an outline that runs from the break round the end and back to the break, for every end', () => {
    for (const name of Object.keys(variedEnds)) {
      const { strokes, breaks } = draw(name);
      const { from, to } = outlineOf(strokes);
      const { x, top, bottom } = breaks[0]!;
      expect(from, name).toEqual({ x, y: top });
      expect(endOf(to.at(-1)!), name).toEqual({ x, y: bottom });
    }
  });

  it('cuts each cope to its length and depth', () => {
    const { from, to } = outlineOf(draw('two copes, top the longer').strokes);
    const points = [from, ...to.map(endOf)];
    for (const corner of [
      { x: 140, y: 0 },
      { x: 0, y: 40 },
      { x: 0, y: 346.4 },
      { x: 90, y: 406.4 },
    ]) {
      const nearest = Math.min(...points.map((p) => Math.hypot(p.x - corner.x, p.y - corner.y)));
      expect(nearest).toBeCloseTo(0, 9);
    }
  });

  it('rounds the corner of a cope inside the cut, tangent to both its edges', () => {
    const arcs = arcsOf(outlineOf(draw('two copes, top the longer').strokes));
    expect(arcs).toHaveLength(2);
    const [top, bottom] = arcs.map(([from, arc]) => swept(from, arc)!);
    expect(top!.centre).toEqual({ x: 130, y: 30 });
    expect(bottom!.centre.x).toBeCloseTo(80, 9);
    expect(bottom!.centre.y).toBeCloseTo(356.4, 9);
    for (const arc of [top!, bottom!]) expect(Math.abs(arc.sweep)).toBeCloseTo(Math.PI / 2, 9);
  });

  it('draws a sharp corner for radius 0 and cuts down a radius that does not fit', () => {
    const sharp = outlineOf(drawEnd(sampleFacts({ top: [70, 30, 0] }), sampleWords).strokes);
    expect(arcsOf(sharp)).toHaveLength(0);
    const wide = outlineOf(drawEnd(sampleFacts({ top: [70, 30, 80] }), sampleWords).strokes);
    expect(arcsOf(wide).map(([, arc]) => arc.radius)).toEqual([30]);
  });

  it('shows every size that is an input exactly once, and says of the copes only those that are there', () => {
    const fields = (name: string): string[] => {
      const { dimensions, callouts, weld, reaction } = draw(name);
      const lines = [
        ...dimensions.map((one) => one.line),
        ...callouts.flatMap((one) => one.variants[0]!),
        ...(weld === null ? [] : [weld.line]),
        reaction,
      ];
      return lines.flatMap((line) => line.flatMap((word) => (word.path === undefined ? [] : [word.path]))).sort();
    };
    const always = ['joint.endDistance', 'joint.firstRow', 'reaction', 'setback'];
    const plate = ['joint.plate.bottomEdge', 'joint.plate.edge', 'joint.plate.topEdge', 'joint.weld.leg'];
    const top = ['top.depth', 'top.length', 'top.radius'];
    const bottom = ['bottom.depth', 'bottom.length', 'bottom.radius'];
    expect(fields('K-207/L')).toEqual([...always, ...plate, ...top, 'joint.bolts.pitch'].sort());
    expect(fields('two copes, top the longer')).toEqual(
      [...always, ...plate, ...top, ...bottom, 'joint.bolts.pitch'].sort(),
    );
    expect(fields('one bolt')).toEqual([...always, ...plate, ...top].sort());
    expect(fields('two columns')).toEqual(
      [...always, ...plate, ...top, 'joint.bolts.pitch', 'joint.bolts.gauge'].sort(),
    );
    const ply = ['joint.ply.bottomEdge', 'joint.ply.edge', 'joint.ply.topEdge'];
    expect(fields('channel on a ply')).toEqual([...always, ...ply, 'joint.bolts.pitch'].sort());
  });

  it('gives each dimension the value of its input, and counts the spaces of a repeated one', () => {
    const values = Object.fromEntries(
      draw('K-207/L').dimensions.map((one) => [one.path ?? one.line[0]!.text, one.value]),
    );
    expect(values).toMatchObject({
      setback: 10,
      'top.length': 110,
      'top.depth': 45,
      'joint.firstRow': 90,
      'joint.bolts.pitch': 70,
      'joint.endDistance': 45,
      'joint.plate.topEdge': 40,
      'joint.plate.edge': 50,
    });
    const pitch = draw('K-207/L').dimensions.find((one) => one.path === 'joint.bolts.pitch')!;
    expect(pitch.line.map((word) => word.text)).toEqual(['2 ×', '70']);
  });

  it('writes the depth of the beam and what is left of it in brackets, as no fields', () => {
    const derived = draw('K-207/L').dimensions.filter((one) => one.path === undefined);
    expect(derived.map((one) => one.line[0]!.text).sort()).toEqual(['(361.4)', '(406.4)']);
    expect(draw('uncoped, two rows').dimensions.filter((one) => one.path === undefined)).toHaveLength(1);
  });

  it('dashes the plate where the web hides it and draws it in full between the end and the support', () => {
    const { strokes } = draw('K-207/L');
    const level = strokes.filter((one) => one.from.y === 50 && endOf(one.to[0]!).y === 50);
    expect(level.map((one) => [one.kind, one.from.x, endOf(one.to[0]!).x])).toEqual([
      ['outline', -10, 0],
      ['hidden', 0, 95],
    ]);
  });

  it('has a weld for a fin plate and none where the web is bolted to a ply', () => {
    expect(draw('K-207/L').weld?.line.map((word) => word.text)).toEqual(['z', '8']);
    expect(draw('channel on a ply').weld).toBeNull();
  });

  it("outlines the supporting beam behind its web's face", () => {
    const support = { ...sampleSupport, h: 454.6 };
    const { strokes, box, face } = drawEnd(sampleFacts({ support, g: 12 }), sampleWords);
    expect(strokes.filter((one) => one.kind === 'neighbour')).toHaveLength(3);
    expect(face).toMatchObject({ x: -12, top: 0, bottom: 454.6 });
    expect(box).toMatchObject({ bottom: 454.6 });
    expect(box.left).toBeCloseTo(-12 - 10.1, 9);
  });

  it('breaks off a supporting beam that reaches far below the end, whose sizes then stand under the end', () => {
    const support = { ...sampleSupport, h: 911.4 };
    const facts = sampleFacts({ support, g: 12 });
    const { strokes, box, face } = drawEnd(facts, sampleWords);
    expect(strokes.filter((one) => one.kind === 'neighbour')).toHaveLength(2);
    const across = strokes.find((one) => one.kind === 'break')!;
    expect(across.from.x).toBeLessThan(-12 - 10.1);
    expect(across.from.y).toBe(box.bottom);
    expect(box.bottom).toBeGreaterThan(facts.h);
    expect(box.bottom).toBeLessThan(1.1 * facts.h);
    expect(face).toMatchObject({ bottom: box.bottom });
  });

  it('writes inches as the shop does where the file speaks inches', () => {
    const inch = 25.4;
    const facts = sampleFacts({ g: inch / 2, top: [4.5 * inch, 2 * inch, 0.5 * inch], y1: 3 * inch, p: 3 * inch });
    const texts = drawEnd(facts, { ...sampleWords, units: 'in-kip' }).dimensions.map((one) => one.line.at(-1)!.text);
    expect(texts).toEqual(expect.arrayContaining(['1/2', '4\u00a01/2', '2', '3']));
  });

  it('says the drawing in sentences for those who cannot see it', () => {
    expect(sentences(sampleFacts(variedEnds['K-207/L']), sampleWords)).toEqual([
      'UB 406 × 178 × 60, 406.4 deep, web 7.9, flange 12.8, root radius 10.2. All sizes in millimetres.',
      "The beam runs to the right; its end stands 10 off the support's face.",
      'Top notch 110 long and 45 deep, corner radius 10.',
      'No bottom notch.',
      'A depth of 361.4 is left at the end.',
      "3 rows of M20 8.8 bolts in one column, pitch 70; first row 90 below top of steel, first column 45 from the beam's end; holes 22 drilled.",
      'Fin plate 10 thick and 220 deep on the far side: edge 40 above the first row, 40 below the last, 50 beyond the last column, welded to the support with two fillets of leg 8.',
      "The end reaction is 165 kN upward at the support's face, 55 from the middle of the bolts.",
    ]);
  });
});
