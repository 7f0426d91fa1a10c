import type { Facts } from '../end/facts.ts';
import { plateBox } from './plate.ts';
import { forceUnit, length, reaction } from './sizes.ts';
import type { DrawingWords } from './words.ts';

/** The drawing said aloud: what stands where, from the section to the reaction. */
export const sentences = (it: Facts, words: DrawingWords): string[] => {
  const mm = (value: number): string => length(value, words.units);
  const unit = words.units === 'mm-kN' ? 'millimetres' : 'inches';
  return [
    `${words.section}, ${mm(it.h)} deep, web ${mm(it.tw)}, flange ${mm(it.tf)}, root radius ${mm(it.r)}. All sizes in ${unit}.`,
    `The beam runs to the right; its end stands ${mm(it.g)} off the support's face.`,
    cope('Top', it.ct, it.dt, it.rt, words),
    cope('Bottom', it.cb, it.db, it.rb, words),
    ...(it.ct > 0 || it.cb > 0 ? [`A depth of ${mm(it.ho)} is left at the end.`] : []),
    boltSentence(it, words),
    plateSentence(it, words),
    ...(it.support.here
      ? [
          `The support is a beam ${mm(it.support.h)} deep with a flange ${mm(it.support.b)} wide, its top ${levelOf(it, words)}.`,
        ]
      : []),
    `The end reaction is ${reaction(it.V, words.units)} ${forceUnit(words.units)} upward at the support's face, ${mm(it.z)} from the middle of the bolts.`,
  ];
};

const cope = (which: string, long: number, deep: number, radius: number, words: DrawingWords): string => {
  if (long === 0 || deep === 0) return `No ${which.toLowerCase()} ${words.cope}.`;
  const mm = (value: number): string => length(value, words.units);
  const corner = radius > 0 ? `corner radius ${mm(radius)}` : 'corner square';
  return `${which} ${words.cope} ${mm(long)} long and ${mm(deep)} deep, ${corner}.`;
};

const boltSentence = (it: Facts, words: DrawingWords): string => {
  const mm = (value: number): string => length(value, words.units);
  const rows = it.n === 1 ? 'One row' : `${it.n} rows`;
  const columns = it.m === 1 ? 'one column' : `${it.m} columns`;
  const spacing = [it.n > 1 ? `, pitch ${mm(it.p)}` : '', it.m > 1 ? `, ${words.gauge} ${mm(it.q)}` : ''].join('');
  return `${rows} of ${words.boltSize} ${words.boltGrade} bolts in ${columns}${spacing}; first row ${mm(it.y1)} below top of steel, first column ${mm(it.eEnd)} from the beam's end; holes ${mm(it.d0)} ${words.holes}.`;
};

const plateSentence = (it: Facts, words: DrawingWords): string => {
  const mm = (value: number): string => length(value, words.units);
  const { top, bottom } = plateBox(it);
  const name = words.plate.charAt(0).toUpperCase() + words.plate.slice(1);
  const weld = it.kind === 'fin-plate' ? `, welded to the support with two fillets of leg ${mm(it.leg)}` : '';
  return `${name} ${mm(it.tp)} thick and ${mm(bottom - top)} deep on the far side: edge ${mm(it.eTop)} above the first row, ${mm(it.eBot)} below the last, ${mm(it.ex)} beyond the last column${weld}.`;
};

const levelOf = (it: Facts, words: DrawingWords): string => {
  const rise = it.support.topOfSteel;
  if (rise === 0) return 'level with top of steel';
  return `${length(Math.abs(rise), words.units)} ${rise > 0 ? 'above' : 'below'} top of steel`;
};
