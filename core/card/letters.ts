import type { StrengthName } from '../end/checkNames.ts';

/**
 * The letter of each check, the same on every card: A to L the beam, M the bolts, N to U the plate, W the weld, X the support. I and O are
 * left out, since they read as figures; V is the reaction.
 */
export const letters: Readonly<Record<StrengthName, string>> = {
  'web-gross-shear': 'A',
  'web-net-shear': 'B',
  'web-block': 'C',
  'web-tearout': 'D',
  'web-bearing': 'E',
  'web-tie': 'F',
  'cope-shear': 'G',
  'cope-bending': 'H',
  'cope-buckling': 'J',
  'stress-full': 'K',
  'stress-cope': 'L',
  'bolt-shear': 'M',
  'plate-gross-shear': 'N',
  'plate-net-shear': 'P',
  'plate-block': 'Q',
  'plate-tearout': 'R',
  'plate-bearing': 'S',
  'plate-bending': 'T',
  'plate-buckling': 'U',
  weld: 'W',
  'support-shear': 'X',
};
