import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import type { View } from '../../../core/drawing/drawing.ts';
import { layViews } from '../../../core/drawing/layViews.ts';
import { drawOnSupport } from '../../../core/drawing/onSupport/drawOnSupport.ts';
import { plainStyle, toSvg } from '../../../core/drawing/toSvg.ts';
import { standards } from '../../../core/standards/index.ts';
import { type Drawable, inTwoViews, jointEnd, jointNames } from './jointEnds.ts';

/** Every view of an end, the one from the side first. */
export const viewsOf = ({ facts, words }: Drawable): [View, ...View[]] => {
  const onSupport = drawOnSupport(facts, words);
  return [drawEnd(facts, words), ...(onSupport ? [onSupport] : [])];
};

const svgOf = (it: Drawable, title: string): string =>
  `${toSvg(layViews(viewsOf(it), { values: 'gap', textHeight: 12.6 }), plainStyle, title)}\n`;

/** Drawings that are kept to be looked at: each kind of joint, and the welded ones with the symbols of AWS A2.4. */
export const goldenDrawings = (): Map<string, string> => {
  const american = standards['csa-s16']!;
  const welded = ['fin-plate', ...inTwoViews.filter((name) => /weld|end-plate/.test(name))] as const;
  return new Map([
    ...jointNames.map((name): [string, string] => [name, svgOf(jointEnd(name), name)]),
    ...welded.map((name): [string, string] => [`${name}-aws`, svgOf(jointEnd(name, american), `${name}, AWS A2.4`)]),
  ]);
};
