import { australianPlates, australianSections } from '../../steel/australianGrades.ts';
import type { Materials } from '../materials.ts';
import { steelsOf } from '../methods/steelsOf.ts';
import { coreArea } from './coreArea.ts';

/** 300PLUS, and the grades with a promise of toughness, have the strengths of the grade itself. */
const readAs = (plain: string): string => plain.replace(/^300PLUS$/, '300').replace(/^(\d{3})L(?:0|15)$/, '$1');

/** Least tensile strength of a bolt of this property class and diameter, mm, in MPa. */
const boltStrength = (propertyClass: string, diameter: number): number | undefined => {
  switch (propertyClass) {
    case '4.6':
      return 400;
    case '8.8':
      return diameter < 16 ? 800 : 830;
    case '10.9':
      return 1040;
    default:
      return undefined;
  }
};

const rolled = steelsOf(australianSections, readAs);

/**
 * Materials of AS 4100:2020: sections and cleats of AS/NZS 3679.1, plates of AS/NZS 3678, bolts of property classes 4.6, 8.8 and 10.9 in every
 * category alike, holes 2 mm (up to M24) or 3 mm wider than the bolt; no allowance in net areas (9.1.10).
 */
export const materials: Materials = {
  sections: rolled,
  cleats: rolled,
  plates: steelsOf(australianPlates, readAs),
  webStrengthAt: ({ tw }) => tw,
  boltGrades: [...['4.6', '8.8', '10.9'], ...['4.6/S', '8.8/S', '8.8/TB', '8.8/TF', '10.9/S', '10.9/TB', '10.9/TF']],
  bolt: (grade, diameter) => {
    const listed = coreArea(diameter) > 0;
    const fub = typeof grade === 'number' ? grade : boltStrength(grade.replace(/\/.*$/, ''), diameter);
    return fub === undefined ? undefined : { fub, listed };
  },
  holeFor: (diameter) => diameter + (diameter <= 24 ? 2 : 3),
  netHole: (hole) => hole,
  holesAssumed: 'drilled',
  electrode: 490,
};
