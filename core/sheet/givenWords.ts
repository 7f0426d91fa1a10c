import { lengthSize } from '../end/factsOf.ts';
import type { Joint } from '../end/schema.ts';
import type { Words } from '../words/words.ts';
import type { Context } from './context.ts';
import { sheetWords as say } from './sheetWords.ts';

/** A line of the data given: what it is, and its values. */
export type Row = readonly [label: string, value: string];

/** ` (assumed)` where the report says that nothing was given at this path. */
export const assumed = ({ input }: Context, path: string): string =>
  input.report.assumptions.some((one) => one.path === path) ? say.assumed : '';

/** Name of a grade, or the strengths given in its place. */
export const gradeName = ({ numbers }: Context, grade: string | { fy?: number; fu: number }): string => {
  if (typeof grade === 'string') return grade;
  return grade.fy === undefined ? `f_u ${numbers.load(grade.fu)}` : `f_y ${numbers.load(grade.fy)}`;
};

/** How holes were taken, as the report's assumption states it. */
export const holesAssumed = ({ input }: Context): string => {
  const note = input.report.assumptions.find(({ code }) => code === 'holes-assumed');
  return /punched/.test(note?.text ?? '') ? 'punched' : 'drilled';
};

/** Plate, ply, cleat or end plate in the region's words. */
export const fittingName = (words: Words, kind: Joint['kind']): string => {
  switch (kind) {
    case 'fin-plate':
      return words.finPlate;
    case 'web-bolts':
      return say.labels.ply.toLowerCase();
    case 'double-cleat':
    case 'single-cleat':
      return words.fields['joint.cleat'] ?? '';
    default:
      return say.labels.endPlate.toLowerCase();
  }
};

/** How far the support's top of steel stands below the beam's, after a comma; nothing where it is not told. */
export const levelText = ({ input, numbers }: Pick<Context, 'input' | 'numbers'>): string => {
  const { topOfSteel } = input.end.support ?? {};
  if (topOfSteel === undefined) return '';
  return `, ${topOfSteel === 0 ? say.topsLevel : `${say.topOfSteel} ${numbers.mm(topOfSteel * lengthSize(input.end))}`}`;
};

/** A symbol and its number stay on one line. */
export const kept = (value: string): string =>
  value.replace(/(?<![\p{L}\d_])(\p{L}(?:′?_[\w,]+)?′?) (?=\d)/gu, '$1\u00a0');
