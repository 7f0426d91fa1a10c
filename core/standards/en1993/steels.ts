import { namedIn, type Steel, type Steels } from '../materials.ts';

/** Strengths up to and including a thickness: mm, MPa, MPa. */
type Row = readonly [upTo: number, fy: number, fu: number];
type Table = Readonly<Record<string, readonly Row[]>>;

/** EN 1993-1-1:2005 Table 3.1, S355 as corrected in 2009; S460 the lesser of its deliveries. From memory, but S275, seen in the joint guide. */
const table31: Table = {
  S235: [
    [40, 235, 360],
    [80, 215, 360],
  ],
  S275: [
    [40, 275, 430],
    [80, 255, 410],
  ],
  S355: [
    [40, 355, 490],
    [80, 335, 470],
  ],
  S460: [
    [40, 460, 540],
    [80, 430, 530],
  ],
};

/** Product standards EN 10025, as the UK National Annex asks: least yield strength, lowest of the range of tensile strength. S460 from memory. */
const products: Table = {
  S235: [
    [16, 235, 360],
    [40, 225, 360],
    [100, 215, 360],
  ],
  S275: [
    [16, 275, 410],
    [40, 265, 410],
    [63, 255, 410],
    [80, 245, 410],
    [100, 235, 410],
  ],
  S355: [
    [16, 355, 470],
    [40, 345, 470],
    [63, 335, 470],
    [80, 325, 470],
    [100, 315, 470],
  ],
  S460: [
    [16, 460, 540],
    [40, 440, 540],
  ],
};

const grades = ['S235', 'S275', 'S355', 'S460'];

/** `S355` for `S355JR`, `S355J2+N` and the like: delivery and toughness do not change the strengths. */
const withoutSubgrade = (name: string): string =>
  name.replace(/^(S235|S275|S355|S460)(?:JR|J0|J2|K2|NL|N|ML|M)?(?:\+(?:AR|N|M))?$/, '$1');

const steelsOf = (table: Table, fromMemory: readonly string[]): Steels => ({
  grades,
  named: namedIn(grades, withoutSubgrade),
  strengthAt: (grade, thickness): Steel | undefined => {
    const row = thickness > 0 ? table[grade]?.find(([upTo]) => thickness <= upTo) : undefined;
    return row && { fy: row[1], fu: row[2] };
  },
  noteOf: (grade) => (fromMemory.includes(grade) ? 'memory-grade' : undefined),
});

export const recommendedSteels: Steels = steelsOf(table31, ['S235', 'S355', 'S460']);
export const ukSteels: Steels = steelsOf(products, ['S235', 'S460']);
