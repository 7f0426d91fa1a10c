import type { Examined } from '../../../core/check/examine.ts';
import { sheetPdf } from '../../../core/sheet/sheet.ts';
import { boxOf, type FoundBox, type FoundText, textsOf } from './readPdf.ts';

export const A4 = { width: 210, height: 297 };
export const LETTER = { width: 215.9, height: 279.4 };
/** Filing edge 20 mm; 180 mm wide; 10 mm above and below. */
export const windowOf = ({ height }: { height: number }): FoundBox => ({
  left: 20,
  right: 200,
  top: 10,
  bottom: height - 10,
});

/** Text and marks may touch the edge of the window, not cross it; coordinates are whole fortieths of a mm. */
export const EDGE = 0.4;
export const outside = (texts: readonly FoundText[], window: FoundBox): string[] =>
  texts
    .filter((one) => {
      const { left, right, top, bottom } = boxOf(one);
      return (
        left < window.left - EDGE ||
        right > window.right + EDGE ||
        top < window.top - EDGE ||
        bottom > window.bottom + EDGE
      );
    })
    .map(({ text }) => text);

/** Pairs of texts that cover each other by more than a hair. */
export const covering = (texts: readonly FoundText[]): string[] => {
  const boxes = texts.map((one) => ({ ...boxOf(one), text: one.text }));
  const found: string[] = [];
  boxes.forEach((a, i) => {
    for (const b of boxes.slice(i + 1)) {
      const wide = Math.min(a.right, b.right) - Math.max(a.left, b.left);
      const high = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top);
      if (wide > 0.1 && high > 0.1) found.push(`${a.text} | ${b.text}`);
    }
  });
  return found;
};

export const pagesOf = async (input: Examined, workings: 'governing' | 'all' = 'governing') =>
  textsOf(await sheetPdf(input, { workings }));
