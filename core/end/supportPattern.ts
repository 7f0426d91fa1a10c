import type { Facts, OnFace } from './facts.ts';

type Pattern = Pick<Facts, 'yp'> & {
  readonly supportBolts: Pick<Facts['supportBolts'], 'n' | 'lines' | 'p' | 'cc' | 'eTop'>;
};

/** Lines of bolts, across from the web's middle; the one line of a single cleat stands on its side, the near one. */
export const linesX = ({ supportBolts: { lines, cc } }: Pattern): number[] =>
  lines === 2 ? [-cc / 2, cc / 2] : lines === 1 ? [-cc / 2] : [];

/** Rows, below top of steel. */
export const rowsY = ({ yp, supportBolts: { n, p, eTop } }: Pattern): number[] =>
  Array.from({ length: n }, (_, i) => yp + eTop + i * p);

/** Line by line, each from the top. */
export const supportCentres = (it: Pattern): OnFace[] => linesX(it).flatMap((x) => rowsY(it).map((y) => ({ x, y })));
