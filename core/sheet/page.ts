/** Paper, the live window common to A4 and Letter, and the lines and type of the sheet. mm and pt. */

export type Paper = 'A4' | 'Letter';

export const papers: Readonly<Record<Paper, readonly [width: number, height: number]>> = {
  A4: [210, 297],
  Letter: [215.9, 279.4],
};

/** Left edge of the window (filing edge), its width, its top; it ends as far from the lower edge. */
export const LEFT = 20;
export const WIDTH = 180;
export const TOP = 10;
export const bottomOf = (paper: Paper): number => papers[paper][1] - TOP;

/** Zones that stand fast on every paper. */
export const VERDICT_TOP = 25.8;
export const FIGURE_TOP = 36.8;

/** Line widths: frames, outlines, thin lines, the thinnest. */
export const FRAME = 0.7;
export const WIDE = 0.5;
export const NARROW = 0.25;
export const HAIR = 0.18;
/** Rules between rows, black yet light. */
export const DOTTED = [0.18, 0.72] as const;

export const body = { size: 9 } as const;
export const table = { size: 9 } as const;
export const small = { size: 8 } as const;
export const foot = { size: 8.5 } as const;
export const LEADING = 3.65;
export const FOOT_LEADING = 3.45;
