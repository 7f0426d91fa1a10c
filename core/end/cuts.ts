import type { Section } from '../shape/section.ts';
import { cutShape, type Shape, thickness } from '../shape/shape.ts';
import { shearPeak } from '../shape/shearStress.ts';
import type { CutFacts } from './facts.ts';

/** Copes of one end, mm; a length and depth of 0 means none. */
export interface Copes {
  readonly g: number;
  readonly ct: number;
  readonly dt: number;
  readonly cb: number;
  readonly db: number;
}

/** The section that an end has not got. */
export const noCut: CutFacts = {
  here: false,
  shape: null,
  topCut: false,
  depth: 0,
  c: 0,
  dc: 0,
  ec: 0,
  A: 0,
  I: 0,
  W: 0,
  Q: 0,
  t: 0,
};

/** Elastic modulus to the cut edge; with both edges cut, to the farther. */
const modulusOf = ({ modulusTop, modulusBottom }: Shape, cut: 'top' | 'bottom' | 'both'): number =>
  cut === 'both' ? Math.min(modulusTop, modulusBottom) : cut === 'top' ? modulusTop : modulusBottom;

const cutAt = (shape: Shape, cut: 'top' | 'bottom' | 'both', c: number, dc: number, g: number): CutFacts => {
  const { at, Q } = shearPeak(shape);
  return {
    here: true,
    shape,
    topCut: cut !== 'bottom',
    depth: shape.depth,
    c,
    dc,
    ec: g + c,
    A: shape.area,
    I: shape.inertia,
    W: modulusOf(shape, cut),
    Q,
    t: thickness(shape, at),
  };
};

const teeTopCut = (section: Section, { g, ct, dt }: Copes): CutFacts =>
  cutAt(cutShape(section, dt, 0), 'top', ct, dt, g);
const teeBottomCut = (section: Section, { g, cb, db }: Copes): CutFacts =>
  cutAt(cutShape(section, 0, db), 'bottom', cb, db, g);

/**
 * The sections behind the copes: a tee behind a single cope; the web cut at both edges at the shorter cope's face,
 * and the tee beyond it at the longer one's where the lengths differ.
 */
export const cutsOf = (section: Section, copes: Copes): { rectangle: CutFacts; tee: CutFacts } => {
  const { g, ct, dt, cb, db } = copes;
  if (dt > 0 && db > 0) {
    const [c, dc] = ct <= cb ? [ct, dt] : [cb, db];
    const rectangle = cutAt(cutShape(section, dt, db), 'both', c, dc, g);
    if (ct === cb) return { rectangle, tee: noCut };
    return { rectangle, tee: ct > cb ? teeTopCut(section, copes) : teeBottomCut(section, copes) };
  }
  if (dt > 0) return { rectangle: noCut, tee: teeTopCut(section, copes) };
  if (db > 0) return { rectangle: noCut, tee: teeBottomCut(section, copes) };
  return { rectangle: noCut, tee: noCut };
};
