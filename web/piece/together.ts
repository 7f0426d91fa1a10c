import type { Box } from '../../core/drawing/drawing.ts';

/** How views stand: beside each other, each on the levels of the others, or one below the other. */
export type Standing = 'beside' | 'below';

/** What views take together, mm of the piece. */
export interface Together {
  readonly width: number;
  readonly height: number;
}

export const together = (boxes: readonly Box[], standing: Standing): Together => {
  const widths = boxes.map(({ left, right }) => right - left);
  const heights = boxes.map(({ top, bottom }) => bottom - top);
  return standing === 'below'
    ? { width: Math.max(...widths), height: sum(heights) }
    : {
        width: sum(widths),
        height: Math.max(...boxes.map(({ bottom }) => bottom)) - Math.min(...boxes.map(({ top }) => top)),
      };
};

const sum = (values: readonly number[]): number => values.reduce((all, one) => all + one, 0);
