import { shearPeak } from '../../shape/shearStress.ts';
import { drawnLength } from '../drawnLength.ts';
import { plateBox } from '../plate.ts';
import { stress, stressUnit } from '../sizes.ts';
import { type PathMaker, path, tag } from './pathMaker.ts';
import { cutOf } from './shear.ts';

/** The level at which V Q/(I t) peaks in the full section, beyond copes and plate. */
export const stressFull: PathMaker = (it, words) => {
  const { at, perNewton } = shearPeak(it.whole);
  const left = Math.max(it.ct, it.cb, plateBox(it).right);
  const ends = [
    { x: left, y: at },
    { x: drawnLength(it, words), y: at },
  ] as const;
  return path('The elastic shear stress V Q/(I t) of the full section peaks at this level.', {
    strokes: [{ kind: 'centre', from: ends[0], to: [ends[1]] }],
    tags: [tag(...ends, `${stress(it.V * perNewton, words.units)} ${stressUnit(words.units)}`)],
  });
};

/** The level at which it peaks in what is left behind a cope. */
export const stressCope: PathMaker = (it, words, of) => {
  const cut = cutOf(it, of);
  if (cut === null || cut.shape === null) return null;
  const { at, perNewton } = shearPeak(cut.shape);
  const ends = [
    { x: 0, y: at },
    { x: cut.c, y: at },
  ] as const;
  return path(`The elastic shear stress V Q/(I t) behind the ${words.cope} peaks at this level.`, {
    strokes: [{ kind: 'centre', from: ends[0], to: [ends[1]] }],
    tags: [tag(...ends, `${stress(it.V * perNewton, words.units)} ${stressUnit(words.units)}`)],
    fields: ['top.depth', 'bottom.depth'],
  });
};
