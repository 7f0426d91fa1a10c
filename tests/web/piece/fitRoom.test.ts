import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import type { View } from '../../../core/drawing/drawing.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { drawOnSupport } from '../../../core/drawing/onSupport/drawOnSupport.ts';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { drawingWords } from '../../../web/piece/drawingWords.ts';
import { fitRoom, taken } from '../../../web/piece/fitRoom.ts';
import { inTwoViews, jointEnd } from '../../core/drawing/jointEnds.ts';
import { demo } from '../ladder/demoEnds.ts';

const viewsOf = (parts: Record<string, unknown> = {}): View[] => {
  const it = demo(parts);
  const words = drawingWords(it, commonwealth);
  return [drawEnd(it.facts, words), drawOnSupport(it.facts, words)].filter((view) => view !== null);
};

describe('the drawing in its room', () => {
  test('it never stands out of the room, whatever its width', () => {
    const views = viewsOf();
    fc.assert(
      fc.property(fc.integer({ min: 240, max: 1200 }), (width) => {
        const room = { width, height: 600, textSize: 14 };
        const fit = fitRoom(views, room);
        expect(taken(fit, room) * fit.shrink).toBeLessThanOrEqual(1 + 1e-9);
      }),
      { numRuns: 40 },
    );
  });

  test('on a desk the words keep their size and the piece fills the room one way', () => {
    const room = { width: 462, height: 600, textSize: 14.5 };
    const fit = fitRoom(viewsOf(), room);
    expect(fit.shrink).toBeGreaterThan(0.96);
    expect(taken(fit, room)).toBeGreaterThan(0.95);
  });

  test('a notch far longer than the beam is deep is still drawn whole', () => {
    const room = { width: 358, height: 550, textSize: 13 };
    const fit = fitRoom(viewsOf({ top: { length: 1500, depth: 45, radius: 10 } }), room);
    expect(taken(fit, room) * fit.shrink).toBeLessThanOrEqual(1 + 1e-9);
    expect(fit.scale * fit.shrink).toBeGreaterThan(0.05);
  });
});

describe('two views in their room', () => {
  const desk = { width: 664, height: 700, textSize: 14.5 };

  test.each(inTwoViews)('%s: neither stands out of the room, beside each other or below', (name) => {
    const { facts, words } = jointEnd(name);
    const views = [drawEnd(facts, words), drawOnSupport(facts, words)!];
    for (const room of [desk, { ...desk, width: 460 }, { width: 358, height: 555, textSize: 13, narrow: true }]) {
      const fit = fitRoom(views, room);
      expect(taken(fit, room) * fit.shrink).toBeLessThanOrEqual(1 + 1e-9);
    }
  });

  test('on a page of one column they stand one below the other, on a desk where the piece is larger so', () => {
    const { facts, words } = jointEnd('double-cleat');
    const views = [drawEnd(facts, words), drawOnSupport(facts, words)!];
    expect(fitRoom(views, desk).standing).toBe('beside');
    expect(fitRoom(views, { ...desk, width: 300, height: 1200 }).standing).toBe('below');
    expect(fitRoom(views, { width: 358, height: 555, textSize: 13, narrow: true }).standing).toBe('below');
  });

  test('a path runs in the view it belongs to, and moves nothing', () => {
    const { facts, words } = jointEnd('double-cleat');
    const views = [drawEnd(facts, words), drawOnSupport(facts, words)!];
    const plain = fitRoom(views, desk);
    const path = failurePath('support-bolt-shear', '', facts, words);
    const [side, support] = fitRoom(views, desk, path).views;
    expect(side!.over).toBeNull();
    expect(support!.over!.marks.some(({ layer }) => layer === 'path')).toBe(true);
    expect([side!.laid.marks, support!.laid.marks]).toEqual(plain.views.map(({ laid }) => laid.marks));
  });
});
