import { findBoltSize } from '../../steel/bolts.ts';
import type { BoltSteel, Materials, Steels } from '../materials.ts';

/** Bolt classes of EN 1993-1-8 Table 3.1: f_ub in MPa, and α_v of Table 3.4 with threads in the plane. From memory; 4.6, 8.8, 10.9 seen. */
const classes: Readonly<Record<string, readonly [fub: number, alphaV: number]>> = {
  '4.6': [400, 0.6],
  '4.8': [400, 0.5],
  '5.6': [500, 0.6],
  '5.8': [500, 0.5],
  '6.8': [600, 0.5],
  '8.8': [800, 0.6],
  '10.9': [1000, 0.5],
};

/** Out of the thread α_v is 0.6 for every class. */
const boltSteel = (fub: number, alphaV: number, listed: boolean): BoltSteel => ({
  fub,
  shear: { in: alphaV * fub, out: 0.6 * fub },
  listed,
});

const isMetric = (diameter: number): boolean => 'tensileArea' in findBoltSize(`M${diameter}`);

/** A strength of its own tells no class, so that it stands with the lower α_v and refers; inch sizes refer too. */
const bolt: Materials['bolt'] = (grade, diameter) => {
  if (typeof grade === 'number') return boltSteel(grade, 0.5, false);
  const [fub, alphaV] = classes[grade] ?? [];
  return fub && alphaV ? boltSteel(fub, alphaV, isMetric(diameter)) : undefined;
};

/** Materials, bolts and holes of EN 1993-1-8 and EN 1090-2; every strength of a rolled section by its thickest part. */
export const materialsWith = (steels: Steels): Materials => ({
  sections: steels,
  plates: steels,
  webStrengthAt: ({ tf, tw }) => Math.max(tf, tw),
  boltGrades: Object.keys(classes),
  bolt,
  holeFor: (diameter) => diameter + (diameter <= 24 ? 2 : 3),
  netHole: (hole) => hole,
  holesAssumed: 'drilled',
  electrode: 0,
});
