import { type Fault, fault } from '../end/fault.ts';
import { findSection, listSections } from '../steel/knownSections.ts';
import { nearest } from '../steel/nearest.ts';

/** Most sections and most counts of bolt rows of one card, and most bolt rows. */
export const MOST_SECTIONS = 400;
export const MOST_COLUMNS = 8;
export const MOST_ROWS = 30;

/** Counts of bolt rows where none are asked for. */
export const usualRows: readonly number[] = [2, 3, 4, 5, 6, 7, 8];

/** What a card is made from; the template is not yet read. */
export interface Asked {
  readonly template: unknown;
  /** Designations. */
  readonly sections: readonly string[];
  /** Ascending. */
  readonly rows: readonly number[];
}

const known: readonly string[] = ['end', 'family', 'sections', 'rows'];

const isList = (value: unknown): value is readonly unknown[] => Array.isArray(value);
const shown = (value: unknown): unknown =>
  typeof value === 'object' && value !== null ? (isList(value) ? 'a list' : 'an object') : shortened(value);
const shortened = (value: unknown): unknown => (typeof value === 'string' ? value.slice(0, 60) : value);

const ofFamily = (family: unknown, faults: Fault[]): readonly string[] => {
  const all = listSections();
  const found = all.find((one) => one.family === family);
  if (found) return found.designations;
  const names = all.map((one) => one.family);
  const near = typeof family === 'string' ? nearest(family, names, 3) : [];
  faults.push(fault('unknown-family', 'family', shown(family), near.length > 0 ? near : names));
  return [];
};

const ofList = (sections: unknown, faults: Fault[]): readonly string[] => {
  if (!isList(sections)) {
    faults.push(fault('wrong-kind', 'sections', shown(sections), 'array'));
    return [];
  }
  if (sections.length === 0 || sections.length > MOST_SECTIONS) {
    const limit = sections.length === 0 ? { least: 1 } : { most: MOST_SECTIONS };
    faults.push(fault('count-outside', 'sections', sections.length, limit));
    return [];
  }
  return sections.flatMap((one) => {
    const found = typeof one === 'string' ? findSection(one) : { nearest: [] };
    if ('section' in found) return [found.designation];
    faults.push(fault('unknown-section', 'sections', shown(one), found.nearest));
    return [];
  });
};

const isCount = (value: unknown): value is number =>
  typeof value === 'number' && Number.isInteger(value) && value >= 1 && value <= MOST_ROWS;

const rowsOf = (rows: unknown, faults: Fault[]): readonly number[] => {
  if (rows === undefined) return usualRows;
  if (!isList(rows)) {
    faults.push(fault('wrong-kind', 'rows', shown(rows), 'array'));
    return [];
  }
  for (const one of rows) {
    if (!isCount(one)) faults.push(fault('row-count', 'rows', shown(one), { least: 1, most: MOST_ROWS }));
  }
  const counts = [...new Set(rows.filter(isCount))].sort((a, b) => a - b);
  if (rows.length === 0 || counts.length > MOST_COLUMNS) {
    const limit = rows.length === 0 ? { least: 1 } : { most: MOST_COLUMNS };
    faults.push(fault('count-outside', 'rows', counts.length, limit));
  }
  return counts;
};

const sectionsOf = (family: unknown, sections: unknown, faults: Fault[]): readonly string[] => {
  if ((family === undefined) !== (sections === undefined)) {
    return family === undefined ? ofList(sections, faults) : ofFamily(family, faults);
  }
  faults.push(fault('family-or-sections', 'sections', null, null));
  return [];
};

/** Reads what a card is asked for, from parsed JSON: `end` the template, `family` or `sections`, `rows`. Never throws. */
export const readCard = (input: unknown): { readonly asked: Asked } | { readonly faults: readonly Fault[] } => {
  if (typeof input !== 'object' || input === null || isList(input))
    return { faults: [fault('not-a-card', '', null, null)] };
  const { end, family, sections, rows } = input as Readonly<Record<string, unknown>>;
  const faults = Object.entries(input)
    .filter(([key]) => !known.includes(key))
    .slice(0, 20)
    .map(([key, value]) => fault('unknown-card-field', key, shown(value), nearest(key, known, 2)));
  if (end === undefined) faults.push(fault('missing', 'end', null, null));
  else if (typeof end !== 'object' || end === null || isList(end))
    faults.push(fault('wrong-kind', 'end', shown(end), 'object'));
  const names = sectionsOf(family, sections, faults);
  const counts = rowsOf(rows, faults);
  return faults.length > 0
    ? { faults: faults.slice(0, 50) }
    : { asked: { template: end, sections: names, rows: counts } };
};
