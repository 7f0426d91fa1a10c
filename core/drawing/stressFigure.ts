import type { Facts } from '../end/facts.ts';
import type { Shape } from '../shape/shape.ts';
import { shearPeak, shearProfile } from '../shape/shearStress.ts';
import { roundedDown } from '../units/figures.ts';
import { toSystem } from '../units/systems.ts';
import type { Point } from './drawing.ts';
import { forceUnit, stress } from './sizes.ts';
import type { DrawingWords } from './words.ts';

/** The elastic shear stress V Q/(I t) down one section; heights in mm below top of steel, the stress as a share of the largest of all peaks. */
export interface StressProfile {
  readonly name: 'full' | 'rectangle' | 'tee';
  readonly title: string;
  readonly top: number;
  readonly bottom: number;
  /** x: the share, y: the level, from top to bottom. */
  readonly curve: readonly Point[];
  readonly peak: { readonly share: number; readonly at: number; readonly text: string };
  /** V / (t_w x depth). */
  readonly mean: { readonly share: number; readonly text: string };
  /** The standard's limiting stress, and the reaction at which the peak reaches it; absent where it has none. */
  readonly limit?: { readonly share: number; readonly text: string };
}

export interface StressFigure {
  readonly profiles: readonly StressProfile[];
}

/** Profiles of the full section and of what is left behind the copes (none of a cut channel). `limit`: the standard's limiting stress, MPa. */
export const stressFigure = (it: Facts, words: DrawingWords, limit: number | null): StressFigure => {
  const named: [StressProfile['name'], string, Shape | null][] = [
    ['full', it.channel ? 'full channel' : 'full I', it.whole],
    ['rectangle', 'cut web', it.channel ? null : it.rectangle.shape],
    ['tee', 'cut tee', it.channel ? null : it.tee.shape],
  ];
  const shapes = named.flatMap(([name, title, shape]) => (shape === null ? [] : [{ name, title, shape }]));
  const most = Math.max(...shapes.map(({ shape }) => shearPeak(shape).perNewton));
  return {
    profiles: shapes.map(({ name, title, shape }) => ({
      name,
      title,
      ...profile(it, words, shape, most),
      ...(limit === null ? {} : { limit: limitOf(it, words, shape, limit, most) }),
    })),
  };
};

/** Stresses are taken per newton, so that an end without load still has its figure. */
const profile = (
  it: Facts,
  words: DrawingWords,
  shape: Shape,
  most: number,
): Omit<StressProfile, 'name' | 'title' | 'limit'> => {
  const peak = shearPeak(shape);
  const mean = 1 / (it.tw * shape.depth);
  return {
    top: shape.top,
    bottom: shape.bottom,
    curve: shearProfile(shape, 1).map(([y, tau]) => ({ x: tau / most, y })),
    peak: { share: peak.perNewton / most, at: peak.at, text: stress(it.V * peak.perNewton, words.units) },
    mean: { share: mean / most, text: `mean ${stress(it.V * mean, words.units)}` },
  };
};

const limitOf = (
  it: Facts,
  words: DrawingWords,
  shape: Shape,
  limit: number,
  most: number,
): NonNullable<StressProfile['limit']> => {
  const { perNewton } = shearPeak(shape);
  const reached = roundedDown(toSystem(limit / perNewton, '0,1', words.units));
  return {
    share: it.V > 0 ? limit / (it.V * most) : Number.MAX_VALUE,
    text: `${stress(limit, words.units)} at ${reached} ${forceUnit(words.units)}`,
  };
};
