import { describe, expect, test } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { layoutDrawing } from '../../../core/drawing/layout.ts';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { drawingWords } from '../../../web/piece/drawingWords.ts';
import { withoutPath } from '../../../web/piece/withoutPath.ts';
import { demo } from '../ladder/demoEnds.ts';

const ends = {
  'one cope': demo(),
  'both copes, small words': demo({ bottom: { length: 100, depth: 30, radius: 10 } }),
} as const;

describe('a piece with a path over it', () => {
  test.each(Object.entries(ends))(
    '%s: it stands where it stands without the path, whichever rung is touched',
    (_, examined) => {
      const words = drawingWords(examined, commonwealth);
      const drawing = drawEnd(examined.facts, words);
      let drawn = 0;
      for (const { id, of = '', state } of examined.report.checks) {
        if (state === 'notApplicable') continue;
        const path = failurePath(id, of, examined.facts, words);
        if (!path) continue;
        drawn += 1;
        for (const textHeight of [9, 22, 60]) {
          const options = { values: 'gap', textHeight } as const;
          const plain = layoutDrawing(drawing, options);
          const bare = withoutPath(layoutDrawing(drawing, options, path));
          expect([id, bare.marks]).toEqual([id, plain.marks]);
          for (const side of ['left', 'top', 'right', 'bottom'] as const) {
            expect(bare.box[side]).toBeCloseTo(plain.box[side], 9);
          }
        }
      }
      expect(drawn).toBeGreaterThan(8);
    },
  );
});
