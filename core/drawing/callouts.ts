import type { Facts } from '../end/facts.ts';
import { centres, lastColumnX, rowY } from './bolts.ts';
import type { Callout, Line, Point, Word } from './drawing.ts';
import { plateField } from './fields.ts';
import { bottomCut, type Cut, topCut } from './outline.ts';
import { plateBox } from './plate.ts';
import { length } from './sizes.ts';
import type { DrawingWords } from './words.ts';

/** Radii, bolts, plate and section: words with a leader to what they name. `right`: where the drawing stops. */
export const callouts = (it: Facts, words: DrawingWords, right: number): Callout[] => [
  ...radii(it, words),
  ...(it.n > 0 ? [bolts(it, words, right)] : []),
  plate(it, words, right),
  section(it, words, right),
];

export const note = (text: string): Word => ({ text, role: 'note' });
export const second = (text: string): Word => ({ text, role: 'second' });

const radii = (it: Facts, words: DrawingWords): Callout[] => {
  const radius = (cut: Cut, given: number, path: string, level: (y: number) => number): Callout[] => {
    if (cut.length === 0) return [];
    const onArc = cut.radius * (1 - Math.SQRT1_2);
    return [
      {
        name: path,
        targets: [{ x: cut.length - onArc, y: level(cut.depth - onArc) }],
        end: 'arrow',
        variants: [[[note('R'), { text: length(given, words.units), role: 'size', path }]]],
        near: { x: cut.length * 0.72, y: level(cut.depth * 0.55) },
        onBeam: false,
        align: 'end',
      },
    ];
  };
  return [
    ...radius(topCut(it), it.rt, 'top.radius', (y) => y),
    ...radius(bottomCut(it), it.rb, 'bottom.radius', (y) => it.h - y),
  ];
};

const bolts = (it: Facts, words: DrawingWords, right: number): Callout => {
  const x = lastColumnX(it);
  const r = it.d0 / 2;
  const middle = Math.floor((it.n - 1) / 2);
  const rows = Array.from({ length: it.n }, (_, i) => i).sort((a, b) => Math.abs(a - middle) - Math.abs(b - middle));
  const bolt = `${centres(it).length} × ${words.boltSize} ${words.boltGrade}`;
  const hole = `holes ${length(it.d0, words.units)} ${words.holes}`;
  return {
    name: 'bolts',
    targets: rows.map((i) => ({ x: x + r * Math.cos(0.25), y: rowY(it, i) - r * Math.sin(0.25) })),
    end: 'arrow',
    variants: [[[note(bolt)], [second(hole)]]],
    near: { x: (plateBox(it).right + right) / 2, y: rowY(it, middle) - (it.n > 1 ? 0.5 * it.p : it.d) },
    onBeam: true,
    align: 'start',
  };
};

const plate = (it: Facts, words: DrawingWords, right: number): Callout => {
  const { left, top, bottom, right: edge } = plateBox(it);
  const last = it.n > 0 ? lastColumnX(it) + it.d0 / 2 : left;
  const x = it.n > 0 ? last + Math.max(0, edge - last) * 0.75 : (left + edge) / 2;
  const spots = [0.62, 0.5, 0.74, 0.38, 0.86, 0.26];
  return {
    name: 'plate',
    targets: spots.map((s) => ({ x, y: top + (bottom - top) * s })),
    end: 'dot',
    variants: [plateLines(it, words)],
    near: { x: (edge + right) / 2, y: top + (bottom - top) * 0.55 },
    onBeam: true,
    align: 'start',
  };
};

/** Name and thickness with where it stands; an end plate's thickness is drawn, a cleat's is not. */
const plateLines = (it: Facts, words: DrawingWords): Line[] => {
  const thickness = length(it.tp, words.units);
  if (it.bp > 0) return [[note(words.plate)]];
  if (it.legWeb === 0) return [[note(`${words.plate} ${thickness}`)], [second('far side')]];
  const name = it.k > 1 ? `${it.k} ${words.plate}s` : words.plate;
  const size: Word = { text: thickness, role: 'size', path: plateField(it, 'thickness') };
  return [[note(name), size], [second(it.k > 1 ? 'both sides' : 'near side')]];
};

const section = (it: Facts, words: DrawingWords, right: number): Callout => {
  const size = (name: string, mm: number): string => `${name} ${length(mm, words.units)}`;
  const sizes = [size('web', it.tw), size('flange', it.tf), size('root', it.r)];
  const name: Line = [note(words.section)];
  const inner = it.h - it.tf - it.r;
  const near: Point = { x: right, y: inner };
  return {
    name: 'section',
    targets: [],
    end: 'none',
    variants: [
      [name, [second(sizes.join(', '))]],
      [name, [second(sizes.slice(0, 2).join(', '))], [second(sizes[2]!)]],
    ],
    near,
    onBeam: true,
    align: 'end',
  };
};
