import type { Check } from '../../../core/check/report.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

export type Json = Record<string, unknown>;

export const end = goodEnds().find(({ name }) => name === 'is-800-fin-plate')!.end;
export const report = (change: Json) => reportOf(changed(end, change));
export const checkOf = (change: Json, id: string): Check => report(change).checks.find((one) => one.id === id)!;
export const rowOf = (change: Json, id: string, symbol: string) =>
  checkOf(change, id).working!.find((row) => row.symbol === symbol)!.value;
export const stateOf = (change: Json, id: string) => {
  const { state, reason } = checkOf(change, id);
  return reason === undefined ? state : `${state}, ${reason}`;
};
export const notes = (change: Json) => report(change).notes.map(({ code }) => code);
export const bolts = (more: Json): Json => ({ joint: { bolts: more } });
export const plate = (more: Json): Json => ({ joint: { plate: more } });
export const own = (section: Json): Json => ({ beam: { section } });
export const iSection = { depth: 400, width: 140, flange: 16, web: 8.9, radius: 14 };
