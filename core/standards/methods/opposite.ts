import { type Gate, type Limit, noSupportBolts } from '../../end/gates.ts';
import { flag, opposite, supportBolts } from '../../end/given.ts';
import { atMost, below, constant, type Tree } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitPart } from '../standard.ts';

const noneApart: Gate = {
  when: flag('', (f) => f.opposite.apart.length === 0, 'no bolt of a beam opposite beside ours'),
  reason: 'no-beam-opposite',
};

/** A beam opposite that is told not to share every bolt: what either bears in one hole is not known. */
export const oppositeApart: Limit = {
  when: flag('a beam opposite that does not share every bolt', (f) => f.opposite.told && !f.opposite.all),
  reason: 'opposite-apart',
  always: true,
};

/** Its bolts that go through no hole of ours stand as far from ours as bolts of one line, `least`, mm; holes as wide as ours do not run together. */
export const besideOpposite = (least: Tree<Length>): FitPart => ({
  of: 'to bolts opposite',
  given: opposite.toBolt,
  least,
  off: [noSupportBolts, noneApart],
  clash: below(opposite.toBolt, supportBolts.d0),
});

/** Their heads, or nuts, stand on this side clear of what lies on the support, with `room` for the wrench, mm; under it there is no place for them. */
export const underFitting = (room: Tree<Length>): FitPart => ({
  of: 'bolts opposite, beside the fitting',
  given: opposite.toFitting,
  least: room,
  off: [noSupportBolts, noneApart],
  clash: atMost(opposite.toFitting, constant('0', 0, '1,0')),
});
