import { capital } from './capital.ts';

/** Plain words for the options of standards and their values. The same in every region. */
const optionWords: Record<string, string> = {
  'elastic-shear': 'Elastic shear stress',
  'bolt-group': 'Bolt group',
  'cope-shear': 'Shear at the cut',
  'web-block': 'Block tearing, web',
  'plate-block': 'Block tearing, plate',
  'web-net-shear': 'Net shear, web',
  'plate-edges': 'Plate edges',
  edges: 'Edges',
  weld: 'Weld',
  'cope-bending': 'Bending at the cut',
  'plate-bending': 'Plate bending',
  full: 'all of it',
  top: 'to the top one',
  limit: 'limits the plate',
  none: 'held by a slab so not checked',
  size: 'by its leg',
  strength: 'by its strength',
  report: 'for information',
  verdict: 'counts in the verdict',
  elastic: 'elastic',
  'instantaneous-centre': 'instantaneous centre',
  mean: 'mean stress',
  standard: 'as the clause',
  cautious: 'cautious',
  hand: 'sheared or cut by hand',
  sheared: 'sheared',
  cut: 'flame cut or sawn',
};

/** Puts words of further options at hand. */
export const admitOptions = (more: Readonly<Record<string, string>>): void => {
  Object.assign(optionWords, more);
};

const spaced = (key: string): string => key.replace(/-/g, ' ');

/** Name of an option, as it begins a line. */
export const optionName = (key: string): string => optionWords[key] ?? capital(spaced(key));
/** A value of an option, within a line. */
export const optionValue = (value: string): string => optionWords[value] ?? spaced(value);
