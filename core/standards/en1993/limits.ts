import { byKind } from '../../end/byKind.ts';
import {
  boltNotListed,
  fullDepthPlate,
  type Limit,
  oneBolt,
  oneRow,
  oneSupportRow,
  supportBoltNotListed,
} from '../../end/gates.ts';
import { flag } from '../../end/given.ts';

/** Clearance beyond which a round hole is no oversize hole of EN 1090-2 any more, mm. From memory. */
const mostClearance = (d: number): number => (d <= 12 ? 3 : d <= 22 ? 4 : d <= 24 ? 6 : 8);

const above = (d0: number, d: number): boolean => d0 > d + mostClearance(d) + 1e-9;

/** Holes wider than the rules for oversize holes cover. */
export const holeLimits: readonly Limit[] = [
  {
    when: flag('a hole wider than an oversize one', (f) => above(f.d0, f.d)),
    reason: 'hole-above-oversize',
    always: false,
  },
];

/** The same of the holes for the bolts into the support, in leg or plate; an end plate of the full depth is outside the joint guide. */
export const supportHoleLimits: readonly Limit[] = [
  {
    when: flag('a support hole wider than an oversize one', (f) => above(f.supportBolts.d0, f.supportBolts.d)),
    reason: 'hole-above-oversize',
    always: false,
  },
  fullDepthPlate,
];

/** What the joint guide's bolt groups cover: two rows or more, one column or two; one bolt alone has no number. */
export const groupLimits: readonly Limit[] = [
  { when: oneBolt, reason: 'rows-below-two', always: true, noNumber: true },
  { when: oneRow, reason: 'rows-below-two', always: true },
  { when: flag('more than two bolt columns', (f) => f.m > 2), reason: 'columns-above-two', always: true },
];

export const boltLimits: readonly Limit[] = [...groupLimits, boltNotListed, ...holeLimits];

/** With threads in the plane a size whose tensile stress area is not listed has no strength in shear. */
export const noStressArea: Limit = {
  ...boltNotListed,
  when: flag('no tensile stress area is listed', (f) => f.threadsIn && f.As === 0),
  noNumber: true,
};

/** The line of bolts of one cleat alone stands beside the web: the joint guide has pairs and end plates only. */
export const oneCleat: Limit = {
  when: byKind('one cleat alone', (kind) => kind === 'single-cleat'),
  reason: 'one-cleat',
  always: true,
  noNumber: true,
};

/** What the joint guide's two lines of support bolts cover. */
export const twoLineLimits: readonly Limit[] = [
  { when: oneSupportRow.when, reason: 'rows-below-two', always: true },
  supportBoltNotListed,
  ...supportHoleLimits,
];
export const supportBoltLimits: readonly Limit[] = [oneCleat, ...twoLineLimits];

/** The same of the bolts into the support, in shear; and in tension, threads as they may lie. */
export const noSupportStressArea: Limit = {
  ...supportBoltNotListed,
  when: flag('no tensile stress area is listed', ({ supportBolts: { threadsIn, As } }) => threadsIn && As === 0),
  noNumber: true,
};
export const noSupportTensileArea: Limit = {
  ...supportBoltNotListed,
  when: flag('no tensile stress area is listed', (f) => f.supportBolts.As === 0),
  noNumber: true,
};
