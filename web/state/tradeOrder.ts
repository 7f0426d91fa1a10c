/** The lines of the order. */
export const lineNames = ['beam', 'cut', 'bolts', 'joint', 'load', 'standard', 'sheet'] as const;
export type LineName = (typeof lineNames)[number];

/** Fields in the order of the trade, by the beginning of their path, and the line in which they stand. */
const fields: readonly (readonly [prefix: string, line: LineName])[] = [
  ['beam', 'beam'],
  ['top', 'cut'],
  ['bottom', 'cut'],
  ['setback', 'cut'],
  ['joint.bolts.size', 'bolts'],
  ['joint.bolts.grade', 'bolts'],
  ['joint.bolts.rows', 'bolts'],
  ['joint.bolts', 'bolts'],
  ['joint.firstRow', 'bolts'],
  ['joint.endDistance', 'bolts'],
  ['joint.supportBolts', 'bolts'],
  ['joint', 'joint'],
  ['support', 'joint'],
  ['reaction', 'load'],
  ['level', 'load'],
  ['tie', 'load'],
  ['standard', 'standard'],
  ['options', 'standard'],
  ['sheet.beside', 'standard'],
  ['sheet.words', 'standard'],
  ['mark', 'sheet'],
  ['sheet', 'sheet'],
  ['piece', 'sheet'],
  ['end', 'sheet'],
  ['quantity', 'sheet'],
];

const placeOf = (path: string): number =>
  fields.findIndex(([prefix]) => path === prefix || path.startsWith(`${prefix}.`));

/** The line in which a field stands; undefined for what is no field of the bench. */
export const lineOf = (path: string): LineName | undefined => fields[placeOf(path)]?.[1];

/** Puts what has a path into the order of the trade; what is no field comes first. */
export const inTradeOrder = <T extends { readonly path: string }>(list: readonly T[]): T[] =>
  [...list].sort((a, b) => placeOf(a.path) - placeOf(b.path));
