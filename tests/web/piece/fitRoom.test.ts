import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import type { View } from '../../../core/drawing/drawing.ts';
import { drawOnSupport } from '../../../core/drawing/onSupport/drawOnSupport.ts';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { drawingWords } from '../../../web/piece/drawingWords.ts';
import { fitRoom, taken } from '../../../web/piece/fitRoom.ts';
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
