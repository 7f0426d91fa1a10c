import type { Facts } from '../../end/facts.ts';
import { capital } from '../../words/capital.ts';
import { lastColumnX } from '../bolts.ts';
import type { Area, Point, Stroke } from '../drawing.ts';
import { depthFields } from '../fields.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import { fitting, type PathMaker, path, tag, torn } from './pathMaker.ts';
import { copeRupture, cutOf, faceOf } from './shear.ts';

/** Width of the stress figure over its depth. */
const WIDE = 0.14;

/** V at arm e_c bends what is left at the cope's face. */
export const copeBending: PathMaker = (it, words, of) => {
  if (of.startsWith('rupture')) return copeRupture(it, words, of);
  const cut = cutOf(it, of);
  if (cut === null || cut.shape === null) return of === 'beside a long plate' ? webBesidePlate(it, words, of) : null;
  const [face, below] = faceOf(it, cut);
  const atBolts = of.endsWith('last column');
  const x = atBolts ? lastColumnX(it) : face.x;
  const where = atBolts ? 'last column of bolts' : `face of the ${words.cope}`;
  const [top, foot] = [
    { x, y: face.y },
    { x, y: below.y },
  ];
  const arm = level({ x: -it.g, y: foot.y - 0.14 * cut.depth }, x);
  return path(`What is left of the beam bends at the ${where}; the edges yield first.`, {
    strokes: [torn(top, foot), ...arm.strokes],
    areas: stressFigure(top, foot, cut.shape.centroid),
    tags: [tag(...arm.ends, `arm ${length(it.g + x, words.units)}`)],
    fields: ['setback', cut.c === it.ct ? 'top.length' : 'bottom.length', 'top.depth', 'bottom.depth'],
  });
};

/** Level planes above and below the bolts shear, and the upright one between the outer rows bends. */
const webBesidePlate: PathMaker = (it, words) => {
  const x = lastColumnX(it);
  const [top, foot] = [
    { x, y: it.y1 },
    { x, y: it.yn },
  ];
  const arm = level({ x: -it.g, y: (it.y1 + it.yn) / 2 }, x);
  return path('The web beside the plate bends between the outer rows and shears along them.', {
    strokes: [torn({ x: 0, y: it.y1 }, top, foot, { x: 0, y: it.yn }), ...arm.strokes],
    tags: [tag(...arm.ends, `arm ${length(it.g + x, words.units)}`)],
    fields: ['setback', 'joint.endDistance', 'joint.bolts.pitch'],
  });
};

/** V bends the plate, at the middle of the bolts; where a standard names a way of it, at the first column. */
export const plateBending: PathMaker = (it, words, of) => {
  const { left, top, bottom } = plateBox(it);
  const reach = it.n === 0 ? legWeldArm(it) : of === '' ? it.z : it.z1;
  const x = left + reach;
  const [head, foot] = [
    { x, y: top },
    { x, y: bottom },
  ];
  const arm = level({ x: left, y: bottom - 0.1 * (bottom - top) }, x);
  return path(`${capital(fitting(it, words))} bends; its edges yield first.`, {
    strokes: [torn(head, foot), ...arm.strokes],
    areas: stressFigure(head, foot, (top + bottom) / 2),
    tags: [tag(...arm.ends, `arm ${length(reach, words.units)}`)],
    fields: ['setback', 'joint.endDistance', ...depthFields(it)],
  });
};

/** From a cleat's heel to the middle of the weld around its web leg. */
const legWeldArm = ({ legWeb, weldReturn, hp }: Facts): number =>
  legWeb - (hp > 0 ? weldReturn ** 2 / (hp + 2 * weldReturn) : 0);

/** Two triangles on the section: pushed on one side of the centroid, pulled on the other. */
const stressFigure = (top: Point, foot: Point, centroid: number): Area[] => {
  const { x } = top;
  const most = Math.max(centroid - top.y, foot.y - centroid);
  const wide = WIDE * (foot.y - top.y);
  const at = (y: number): Point => ({ x: x + (wide * (y - centroid)) / most, y });
  const middle = { x, y: centroid };
  return [
    { fill: 'hatch', outline: [top, at(top.y), middle] },
    { fill: 'hatch', outline: [foot, at(foot.y), middle] },
  ];
};

/** The arm of the reaction, from the support's face to the section. */
export const level = (from: Point, x: number): { strokes: Stroke[]; ends: [Point, Point] } => {
  const to = { x, y: from.y };
  return {
    strokes: [
      { kind: 'narrow', from, to: [to], arrow: true },
      { kind: 'narrow', from: to, to: [from], arrow: true },
    ],
    ends: [from, to],
  };
};
