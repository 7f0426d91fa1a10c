import type { Check } from '../../../core/check/report.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

export type Json = Record<string, unknown>;

const named = (name: string): Json => goodEnds().find((one) => one.name === name)!.end;
/** W18x50 coped 4-3/4 x 1-3/4, three 3/4 A325, single plate 3/8 A36: a conventional plate. */
export const end = named('aisc-360-single-plate');
/** W16x36, 4 x 2 bolts, plate 1/2 x 12 A36, 9 in to the first column. */
export const long: Json = changed(named('aisc-360-asd-extended-plate'), {
  standard: 'aisc-360-lrfd',
  options: undefined,
});
export const twoCopes = named('aisc-360-two-copes');

export const checkOf = (change: Json, id: string, of: Json = end): Check =>
  reportOf(changed(of, change)).checks.find((one) => one.id === id)!;
export const stateOf = (change: Json, id: string, of: Json = end): string => {
  const { state, reason } = checkOf(change, id, of);
  return reason === undefined ? state : `${state}, ${reason}`;
};
export const rowOf = (change: Json, id: string, symbol: string, of: Json = end): number =>
  checkOf(change, id, of).working!.find((row) => row.symbol === symbol)!.value;
export const strengthOf = (change: Json, id: string, of: Json = end): number =>
  checkOf(change, id, of).reactionAtFailure!;
export const notesOf = (change: Json, of: Json = end): string[] =>
  reportOf(changed(of, change)).notes.map(({ code }) => code);
export const bolts = (more: Json): Json => ({ joint: { bolts: more } });
export const plate = (more: Json): Json => ({ joint: { plate: more } });
export const option = (key: string, value: string): Json => ({ options: { [key]: value } });
