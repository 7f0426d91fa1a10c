import { boltNotListed, type Limit, oneBolt, oneRow } from '../../end/gates.ts';
import { flag } from '../../end/given.ts';

/** Clearance beyond which a round hole is no oversize hole of EN 1090-2 any more, mm. From memory. */
const mostClearance = (d: number): number => (d <= 12 ? 3 : d <= 22 ? 4 : d <= 24 ? 6 : 8);

/** Holes wider than the rules for oversize holes cover. */
export const holeLimits: readonly Limit[] = [
  {
    when: flag('a hole wider than an oversize one', (f) => f.d0 > f.d + mostClearance(f.d) + 1e-9),
    reason: 'hole-above-oversize',
    always: false,
  },
];

/** What the joint guide's bolt groups cover: two rows or more, one column or two; one bolt alone has no number. */
export const groupLimits: readonly Limit[] = [
  { when: oneBolt, reason: 'rows-below-two', always: true, noNumber: true },
  { when: oneRow, reason: 'rows-below-two', always: true },
  { when: flag('more than two bolt columns', (f) => f.m > 2), reason: 'columns-above-two', always: true },
];

export const boltLimits: readonly Limit[] = [...groupLimits, boltNotListed, ...holeLimits];
