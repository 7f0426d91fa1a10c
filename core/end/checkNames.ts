/** Ways of failing that are measured by the end reaction (or by the tie force): public names, the same in JSON, screen, test and sheet. */
export const strengthNames = [
  'web-gross-shear',
  'cope-shear',
  'web-net-shear',
  'web-block',
  'web-tearout',
  'cope-bending',
  'cope-buckling',
  'web-bearing',
  'web-tie',
  'stress-full',
  'stress-cope',
  'bolt-shear',
  'plate-bearing',
  'plate-tearout',
  'plate-gross-shear',
  'plate-net-shear',
  'plate-block',
  'plate-bending',
  'plate-buckling',
  'weld',
  'cleat-bearing',
  'cleat-tearout',
  'cleat-gross-shear',
  'cleat-net-shear',
  'cleat-block',
  'cleat-bending',
  'cleat-buckling',
  'endplate-bearing',
  'endplate-tearout',
  'endplate-gross-shear',
  'endplate-net-shear',
  'endplate-block',
  'endplate-web-shear',
  'weld-web',
  'support-bolt-shear',
  'support-bearing',
  'support-shear',
] as const;

/** Rules of geometry that carry no force. */
export const fitNames = [
  'fit-pitch',
  'fit-gauge',
  'fit-edge-web',
  'fit-edge-plate',
  'fit-end',
  'fit-plate-depth',
  'fit-cope-length',
  'fit-cope-depth',
  'fit-cope-radius',
  'fit-cope-clearance',
  'fit-setback',
  'fit-rotation',
  'fit-wrench',
] as const;

export type StrengthName = (typeof strengthNames)[number];
export type FitName = (typeof fitNames)[number];
export type CheckName = StrengthName | FitName;
/** What a check speaks of. */
export const partNames = ['web', 'bolts', 'plate', 'cleat', 'weld', 'support-bolts', 'support', 'end'] as const;
export type PartName = (typeof partNames)[number];
