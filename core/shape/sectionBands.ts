import { type Band, band, mirrored, straightBand } from './band.ts';
import type { Section } from './section.ts';

/** The bands of an uncut section from top to bottom, and the levels between which its web stands (root fillets included), mm. */
export interface SectionBands {
  readonly bands: readonly Band[];
  readonly webTop: number;
  readonly webBottom: number;
}

/**
 * Cuts a section into bands: flange, root fillets, web, root fillets, flange; a tapered flange has its sloping face and its toes between.
 *
 * The inner flange face falls toward the web at `slope` and passes through t_f half way out along the outstand. The root radius touches
 * that face and the web, the toe radius that face and the flange's edge.
 */
export const sectionBands = (section: Section): SectionBands => {
  const { h, b, tf, tw, r } = section;
  const sides = section.family === 'I' ? 2 : 1;
  const toe = section.toe ?? 0;
  const slope = section.slope ?? 0;
  const outstand = (b - tw) / sides;
  const [sin, cos] = [Math.sin(slope), Math.cos(slope)];
  const face = (out: number): number => tf + (outstand / 2 - out) * Math.tan(slope);

  const toeOut = outstand - toe + toe * sin;
  const toeEnd = face(toeOut);
  const toeCentre = toeEnd - toe * cos;
  const rootOut = r - r * sin;
  const rootStart = face(rootOut);
  const rootCentre = rootStart + r * cos;

  const upper: Band[] = [
    straightBand(0, toeCentre, b),
    band({
      top: toeCentre,
      bottom: toeEnd,
      base: tw + sides * (outstand - toe),
      grade: 0,
      factor: sides,
      radius: toe,
      centre: toeCentre,
    }),
    straightBand(toeEnd, rootStart, tw + sides * toeOut, tw + sides * rootOut),
    band({
      top: rootStart,
      bottom: rootCentre,
      base: tw + sides * r,
      grade: 0,
      factor: -sides,
      radius: r,
      centre: rootCentre,
    }),
  ].filter(hasDepth);
  const lower = upper.map((it) => mirrored(it, h)).reverse();
  return {
    bands: [...upper, straightBand(rootCentre, h - rootCentre, tw), ...lower],
    webTop: rootStart,
    webBottom: h - rootStart,
  };
};

/** Parallel flanges have no sloping face, square tips no toe, a section without root radius no fillets. */
const hasDepth = (it: Band): boolean => it.bottom > it.top;
