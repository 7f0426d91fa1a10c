import { type Mark, POINT, type TextMark } from '../../../core/sheet/pen.ts';
import { boxOf, type FoundBox } from './readPdf.ts';

/** Room that a text takes on the page. */
export const boxOfText = (mark: TextMark): FoundBox =>
  boxOf({ ...mark, width: (mark.face.width(mark.text) * mark.size * POINT) / 1000 });

const shared = (a: FoundBox, b: FoundBox): boolean =>
  Math.min(a.right, b.right) - Math.max(a.left, b.left) > 0.1 &&
  Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top) > 0.1;

/** Texts, and the square code with them. */
const boxesOf = (page: readonly Mark[]): { text: string; box: FoundBox }[] =>
  page.flatMap((mark) => {
    if (mark.kind === 'text') return mark.text.trim() ? [{ text: mark.text, box: boxOfText(mark) }] : [];
    if (mark.kind !== 'grid') return [];
    const side = mark.rows.length * mark.module;
    const box = { left: mark.x, top: mark.y, right: mark.x + side, bottom: mark.y + side };
    return [{ text: 'square code', box }];
  });

/** Every text that stands on another, or on the square code. */
export const overprints = (page: readonly Mark[]): string[] => {
  const all = boxesOf(page);
  return all.flatMap((a, i) =>
    all.slice(i + 1).flatMap((b) => (shared(a.box, b.box) ? [`${a.text} on ${b.text}`] : [])),
  );
};
