import type { Facts } from '../end/facts.ts';
import { capital } from '../words/capital.ts';
import { plateBox } from './plate.ts';
import { forceUnit, length, reaction } from './sizes.ts';
import type { BoltWords, DrawingWords } from './words.ts';

/** The drawing said aloud: what stands where, from the section to the reaction. */
export const sentences = (it: Facts, words: DrawingWords): string[] => {
  const mm = (value: number): string => length(value, words.units);
  const unit = words.units === 'mm-kN' ? 'millimetres' : 'inches';
  const arm = it.n > 0 ? `, ${mm(it.z)} from the middle of the bolts` : '';
  return [
    `${words.section}, ${mm(it.h)} deep, web ${mm(it.tw)}, flange ${mm(it.tf)}, root radius ${mm(it.r)}. All sizes in ${unit}.`,
    `The beam runs to the right; its end stands ${mm(it.g)} off the support's face.`,
    cope('Top', it.ct, it.dt, it.rt, words),
    cope('Bottom', it.cb, it.db, it.rb, words),
    ...(it.ct > 0 || it.cb > 0 ? [`A depth of ${mm(it.ho)} is left at the end.`] : []),
    ...(it.n > 0 ? [boltSentence(it, words)] : []),
    ...fittingSentences(it, words),
    ...(words.inSupport && it.supportBolts.n > 0 ? [supportBoltSentence(it, words, words.inSupport)] : []),
    ...(it.opposite.apart.length > 0 ? [oppositeSentence(it, words)] : []),
    ...(it.support.here
      ? [
          `The support is a beam ${mm(it.support.h)} deep with a flange ${mm(it.support.b)} wide, its top ${levelOf(it, words)}.`,
        ]
      : []),
    `The end reaction is ${reaction(it.V, words.units)} ${forceUnit(words.units)} upward at the support's face${arm}.`,
  ];
};

const cope = (which: string, long: number, deep: number, radius: number, words: DrawingWords): string => {
  if (long === 0 || deep === 0) return `No ${which.toLowerCase()} ${words.cope}.`;
  const mm = (value: number): string => length(value, words.units);
  const corner = radius > 0 ? `corner radius ${mm(radius)}` : 'corner square';
  return `${which} ${words.cope} ${mm(long)} long and ${mm(deep)} deep, ${corner}.`;
};

const rowsOf = (n: number): string => (n === 1 ? 'One row' : `${n} rows`);

const boltSentence = (it: Facts, words: DrawingWords): string => {
  const mm = (value: number): string => length(value, words.units);
  const columns = it.m === 1 ? 'one column' : `${it.m} columns`;
  const spacing = [it.n > 1 ? `, pitch ${mm(it.p)}` : '', it.m > 1 ? `, ${words.gauge} ${mm(it.q)}` : ''].join('');
  return `${rowsOf(it.n)} of ${words.boltSize} ${words.boltGrade} bolts in ${columns}${spacing}; first row ${mm(it.y1)} below top of steel, first column ${mm(it.eEnd)} from the beam's end; holes ${mm(it.d0)} ${words.holes}.`;
};

const fittingSentences = (it: Facts, words: DrawingWords): string[] => {
  if (it.bp > 0) return [endPlateSentence(it, words)];
  return it.legWeb > 0 ? cleatSentences(it, words) : [plateSentence(it, words)];
};

const plateSentence = (it: Facts, words: DrawingWords): string => {
  const mm = (value: number): string => length(value, words.units);
  const { top, bottom } = plateBox(it);
  const weld = it.weldTo === 'support' ? `, welded to the support with two fillets of leg ${mm(it.leg)}` : '';
  return `${capital(words.plate)} ${mm(it.tp)} thick and ${mm(bottom - top)} deep on the far side: ${edges(it, words)}${weld}.`;
};

const edges = (it: Facts, { units }: DrawingWords): string => {
  const mm = (value: number): string => length(value, units);
  return `edge ${mm(it.eTop)} above the first row, ${mm(it.eBot)} below the last, ${mm(it.ex)} beyond the last column`;
};

const endPlateSentence = (it: Facts, words: DrawingWords): string => {
  const mm = (value: number): string => length(value, words.units);
  return `${capital(words.plate)} ${mm(it.tp)} thick, ${mm(it.bp)} wide and ${mm(it.hp)} deep between support and beam, its top ${mm(it.yp)} below top of steel, welded to the web with two fillets of leg ${mm(it.leg)}.`;
};

const cleatSentences = (it: Facts, words: DrawingWords): string[] => {
  const mm = (value: number): string => length(value, words.units);
  const [many, side] =
    it.k > 1 ? [`Two ${words.plate}s`, 'one on each side'] : [`One ${words.plate}`, 'on the near side'];
  const size = `leg on the web ${mm(it.legWeb)}, on the support ${mm(it.legSupport)}, ${mm(it.tp)} thick and ${mm(it.hp)} deep, heel at the support's face`;
  const place = it.n > 0 ? edges(it, words) : `top ${mm(it.yp)} below top of steel`;
  return [`${many}, ${side} of the web: ${size}; ${place}.`, ...legWelds(it, words)];
};

const legWelds = (it: Facts, words: DrawingWords): string[] => {
  const mm = (value: number): string => length(value, words.units);
  if (it.weldTo === 'web') {
    const returns = `${mm(it.weldReturn)} back along its top and bottom`;
    return [`The web leg is welded with a fillet of leg ${mm(it.leg)} along its toe and ${returns}.`];
  }
  if (it.weldTo !== 'support') return [];
  const returned = it.weldReturn > 0 ? `, returned ${mm(it.weldReturn)} across its top` : '';
  return [`The leg on the support is welded with a fillet of leg ${mm(it.leg)} along its toe${returned}.`];
};

const supportBoltSentence = (it: Facts, words: DrawingWords, bolt: BoltWords): string => {
  const mm = (value: number): string => length(value, words.units);
  const { n, lines, p, cc, eTop, eBot, eh, d0 } = it.supportBolts;
  const across =
    lines === 2 ? `two lines at cross centres ${mm(cc)}` : `one line ${mm(cc / 2)} from the middle of the web`;
  const pitch = n > 1 ? `, pitch ${mm(p)}` : '';
  return `${rowsOf(n)} of ${bolt.boltSize} ${bolt.boltGrade} bolts into the support in ${across}${pitch}: edge ${mm(eTop)} above the first row, ${mm(eBot)} below the last, ${mm(eh)} beside; holes ${mm(d0)} ${bolt.holes}.`;
};

const oppositeSentence = ({ opposite: { apart, shared } }: Facts, words: DrawingWords): string => {
  const places = apart.map(
    ({ x, y }) =>
      `${length(Math.abs(x), words.units)} to the ${x < 0 ? 'left' : 'right'}, ${length(y, words.units)} down`,
  );
  return `The beam opposite shares ${shared} of these bolts; ${apart.length === 1 ? 'another stands' : `${apart.length} others stand`}, from the middle of the web and from top of steel, at ${places.join('; ')}.`;
};

const levelOf = (it: Facts, words: DrawingWords): string => {
  const rise = it.support.topOfSteel;
  if (rise === 0) return 'level with top of steel';
  return `${length(Math.abs(rise), words.units)} ${rise > 0 ? 'above' : 'below'} top of steel`;
};
