import { type Entry, textOf, withProposals } from './entry.ts';

const distances: Readonly<Record<string, string>> = {
  'joint.bolts.rows': 'joint.bolts.pitch',
  'joint.supportBolts.rows': 'joint.supportBolts.pitch',
  'joint.bolts.columns': 'joint.bolts.gauge',
};

/** The entry with a distance proposed where a second row or column at `path` needs one. */
export const withSpacing = (entry: Entry, path: string): Entry => {
  const distance = distances[path];
  if (distance === undefined || !(Number(textOf(entry, path)) > 1)) return entry;
  return withProposals(entry, { [distance]: entry.units === 'mm-kN' ? '70' : '3' });
};
