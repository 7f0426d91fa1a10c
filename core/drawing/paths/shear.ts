import type { CutFacts, Facts } from '../../end/facts.ts';
import { capital } from '../../words/capital.ts';
import { columnX, rowY } from '../bolts.ts';
import type { FailurePath, Stroke } from '../drawing.ts';
import { drawnLength } from '../drawnLength.ts';
import { depthFields } from '../fields.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { fitting, type PathMaker, path, tag, torn } from './pathMaker.ts';

/** Through the full depth, beyond copes and plate. */
export const webGrossShear: PathMaker = (it, words) => {
  const x = Math.max(it.ct, it.cb, plateBox(it).right);
  const [top, foot] = [
    { x, y: 0 },
    { x, y: it.h },
  ];
  return path('The full section shears beyond the end.', {
    strokes: [torn(top, foot)],
    tags: [tag(top, foot, `${length(it.h, words.units)} in shear`)],
    slide: 0.94 * (drawnLength(it, words) - x),
  });
};

/** Through what is left behind a cope, at that cope's face. */
export const copeShear: PathMaker = (it, words, of) => {
  const cut = cutOf(it, of);
  if (cut === null) return null;
  const [top, foot] = faceOf(it, cut);
  return path(`What is left of the beam shears at the face of the ${words.cope}.`, {
    strokes: [torn(top, foot)],
    tags: [tag(top, foot, `${length(cut.depth, words.units)} in shear`)],
    fields: ['top.depth', 'bottom.depth'],
  });
};

/** From cut edge to cut edge through the holes of the first column. */
export const webNetShear: PathMaker = (it, words) => {
  const [top, foot] = [it.dt, it.h - it.db];
  return netLine(it, words, { top, foot, name: 'web', how: 'shears', in: 'net in shear' });
};

/** Between the support and the first column. */
export const plateGrossShear: PathMaker = (it, words) => {
  const { left, top, bottom } = plateBox(it);
  const x = left + 0.45 * (columnX(it, 0) - it.d0 / 2 - left);
  const [head, foot] = [
    { x, y: top },
    { x, y: bottom },
  ];
  return path(`${capital(fitting(it, words))} shears beside the support.`, {
    strokes: [torn(head, foot)],
    tags: [tag(head, foot, `${length(bottom - top, words.units)} in shear`)],
    fields: depthFields(it),
  });
};

export const plateNetShear: PathMaker = (it, words) => {
  const { top, bottom } = plateBox(it);
  return netLine(it, words, { top, foot: bottom, name: words.plate, how: 'shears', in: 'net in shear' });
};

/** The same lines, pulled apart by the tie force. */
export const webNetTension: PathMaker = (it, words) => {
  const [top, foot] = [it.dt, it.h - it.db];
  return netLine(it, words, { top, foot, name: 'web', how: 'is pulled apart', in: 'net in tension' });
};

export const plateNetTension: PathMaker = (it, words) => {
  const { top, bottom } = plateBox(it);
  return netLine(it, words, { top, foot: bottom, name: words.plate, how: 'is pulled apart', in: 'net in tension' });
};

/** What a coped section bends at where its holes tear: the column inside the cope farthest from the support. */
export const copeRupture: PathMaker = (it, words, of) => {
  const both = of.endsWith('rectangle');
  const column = both ? Math.min(it.mTop, it.mBottom) : Math.max(it.mTop, it.mBottom);
  if (column === 0) return null;
  const top = it.mTop >= column ? it.dt : 0;
  const foot = it.mBottom >= column ? it.h - it.db : it.h;
  return netLine(it, words, { column: column - 1, top, foot, name: 'web', how: 'bends until it tears', in: 'net' });
};

/** Pulled apart through the depth that is left, before the bolts. */
export const webGrossTension: PathMaker = (it, words) => {
  const x = columnX(it, 0) / 2;
  const [top, foot] = [
    { x, y: it.dt },
    { x, y: it.h - it.db },
  ];
  return path('The web yields in tension.', {
    strokes: [torn(top, foot)],
    tags: [tag(top, foot, `${length(it.ho, words.units)} in tension`)],
    fields: ['top.depth', 'bottom.depth'],
  });
};

interface Net {
  readonly column?: number;
  readonly top: number;
  readonly foot: number;
  readonly name: string;
  readonly how: string;
  readonly in: string;
}

const netLine = (it: Facts, words: DrawingWords, { column = 0, top, foot, name, how, in: said }: Net): FailurePath => {
  const x = columnX(it, column);
  const r = it.d0 / 2;
  const edges = [top, ...Array.from({ length: it.n }, (_, i) => [rowY(it, i) - r, rowY(it, i) + r]).flat(), foot];
  const strokes: Stroke[] = [];
  for (let i = 0; i < edges.length; i += 2) {
    strokes.push(torn({ x, y: edges[i]! }, { x, y: edges[i + 1]! }));
  }
  const net = length(Math.max(0, foot - top - it.n * it.dn), words.units);
  return path(`The ${name} ${how} through the holes of a column.`, {
    strokes,
    tags: [tag({ x, y: top }, { x, y: foot }, `${net} ${said}`)],
    fields: ['top.depth', 'bottom.depth'],
  });
};

/** The cut section a check speaks of; by itself the rectangle, else the tee. */
export const cutOf = (it: Facts, of: string): CutFacts | null => {
  const named = of.startsWith('tee')
    ? it.tee
    : of.startsWith('rectangle')
      ? it.rectangle
      : it.rectangle.here
        ? it.rectangle
        : it.tee;
  return named.here ? named : null;
};

/** Ends of the cut at the face of a cope. */
export const faceOf = (it: Facts, cut: CutFacts): [{ x: number; y: number }, { x: number; y: number }] => {
  const both = cut === it.rectangle;
  const top = both || cut.topCut ? it.dt : 0;
  const foot = both || !cut.topCut ? it.h - it.db : it.h;
  return [
    { x: cut.c, y: top },
    { x: cut.c, y: foot },
  ];
};
