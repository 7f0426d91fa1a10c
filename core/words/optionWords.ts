import { capital } from './capital.ts';

/** Plain words for the options of standards and their values. The same in every region. */
const optionWords: Readonly<Record<string, string>> = {
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
  report: 'for information',
  verdict: 'counts in the verdict',
  elastic: 'elastic',
  'instantaneous-centre': 'instantaneous centre',
  mean: 'mean stress',
  plastic: 'plastic',
  standard: 'as the clause',
  cautious: 'cautious',
  uniform: 'even tension',
  'non-uniform': 'uneven tension',
  hand: 'sheared or cut by hand',
  machine: 'cut by machine',
  SP: 'structural purpose',
  GP: 'general purpose',
  sheared: 'sheared',
  cut: 'flame cut or sawn',
};

const spaced = (key: string): string => key.replace(/-/g, ' ');

/** Name of an option, as it begins a line. */
export const optionName = (key: string): string => optionWords[key] ?? capital(spaced(key));
/** A value of an option, within a line. */
export const optionValue = (value: string): string => optionWords[value] ?? spaced(value);
