import { describe, expect, test } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { layoutDrawing } from '../../../core/drawing/layout.ts';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { drawingWords } from '../../../web/piece/drawingWords.ts';
import { penned } from '../../../web/piece/pen.ts';
import { demo } from '../ladder/demoEnds.ts';

const it = demo();
const words = drawingWords(it, commonwealth);
const drawing = drawEnd(it.facts, words);
const options = { textHeight: 12, values: 'gap' } as const;
const laid = layoutDrawing(drawing, options);

describe('pen of the screen', () => {
  test('lines of one kind are one path, so that a keystroke changes few elements', () => {
    const { lines } = penned(laid, 1.2, null);
    expect(new Set(lines.map(({ key }) => key)).size).toBe(lines.length);
    expect(lines.length).toBeLessThan(20);
    expect(lines.every(({ data }) => data.startsWith('M') && !/NaN|Infinity/.test(data))).toBe(true);
  });

  test('narrow level and upright lines stand on half pixels, where they are sharp', () => {
    const { lines } = penned(laid, 1.2, null);
    const hidden = lines.find(({ key }) => key === 'piece-hidden')!;
    const numbers = hidden.data.match(/-?\d+(\.\d+)?/g)!.map(Number);
    expect(numbers.length).toBeGreaterThan(4);
    for (const value of numbers) expect(Math.abs(value % 1)).toBe(0.5);
  });

  test('the dimension of the field in focus is drawn in the accent, and nothing else moves', () => {
    const plain = penned(laid, 1.2, null);
    const focus = penned(laid, 1.2, 'joint.bolts.pitch');
    expect(plain.lines.some(({ layer }) => layer === 'path')).toBe(false);
    expect(focus.lines.filter(({ layer }) => layer === 'path').length).toBe(1);
    const length = (lines: readonly { data: string }[]) => lines.reduce((sum, { data }) => sum + data.length, 0);
    expect(length(focus.lines)).toBe(length(plain.lines));
    expect(focus.words).toEqual(plain.words);
  });

  test('the path of a rung can be taken alone, with its words', () => {
    const path = failurePath('web-block', '', it.facts, words);
    const { lines, words: said } = penned(layoutDrawing(drawing, options, path), 1.2, null, 'path');
    expect(lines.every(({ layer }) => layer === 'path')).toBe(true);
    expect(said.map(({ text }) => text)).toEqual(['185 in shear', '45 in tension']);
  });
});
