import { type Condition, not } from '../formula/tree.ts';
import { byKind, isCleat, isEndPlate, isPlate, settledByKind } from './byKind.ts';
import type { Facts } from './facts.ts';
import { flag } from './given.ts';

/** A condition under which a check says something else than a number's verdict; `reason` is a code of core/words. */
export interface Gate {
  readonly when: Condition;
  readonly reason: string;
}

/** A limit beyond which a licensed engineer must decide. `always`: even where the number fails; else `fails` stays `fails`. */
export interface Limit extends Gate {
  readonly always: boolean;
  /** True where the formula's number would mean nothing, so that none is given. */
  readonly noNumber?: boolean;
}

export const coped = flag('the end is coped', (f) => f.rectangle.here || f.tee.here);
export const oneBolt = flag('one bolt alone', (f) => f.n === 1 && f.m === 1);
export const oneRow = flag('', (f) => f.n === 1, 'one bolt row');
export const oneColumn = flag('', (f) => f.m === 1, 'one bolt column');
export const noColumnInCope = flag('an intact flange lies above every column', (f) => f.mTop === 0);
export const isChannel = flag('a channel', (f) => f.channel);
const noTie = flag('no tie force', (f) => f.T === 0);

/** No such section at this end. */
export const noRectangle: Gate = {
  when: flag('', (f) => !f.rectangle.here, 'no section with both edges cut'),
  reason: 'no-cope',
};
export const noTee: Gate = { when: flag('', (f) => !f.tee.here, 'no tee'), reason: 'no-cope' };
/** A tee with its bottom cut: the cut edge is in tension. */
export const cutEdgeInTension: Gate = {
  when: flag('', (f) => f.tee.here && !f.tee.topCut, 'a tee cut at its bottom'),
  reason: 'cut-edge-in-tension',
};

/** Off where the end is not coped. */
export const uncoped: Gate = { when: not(coped), reason: 'no-cope' };
export const intactFlange: Gate = { when: noColumnInCope, reason: 'intact-flange' };
export const singleRow: Gate = { when: oneRow, reason: 'single-row' };
export const singleColumn: Gate = { when: oneColumn, reason: 'single-column' };
export const noTieForce: Gate = { when: noTie, reason: 'no-tie' };

// Cleats alone may be bolted or welded on either side.
const unlessCleats =
  (holds: (kind: Facts['kind']) => boolean) =>
  (kind: Facts['kind']): boolean | undefined =>
    isCleat(kind) ? undefined : holds(kind);
const noHoles = unlessCleats(isEndPlate);
const offTheWeb = unlessCleats(isPlate);
const offTheSupport = unlessCleats((kind) => kind !== 'fin-plate');
const supportUndrilled = unlessCleats(isPlate);
const neverOfPlates = (kind: Facts['kind']): boolean | undefined => (isPlate(kind) ? false : undefined);

/** The web is welded to its plate or cleat: nothing is drilled in it. */
export const noWebHoles: Gate = {
  when: settledByKind('', noHoles, (f) => f.n === 0, 'no bolts in the web'),
  reason: 'no-web-holes',
};
/** The web is bolted: no weld runs along it. */
export const noWebWeld: Gate = {
  when: settledByKind('', offTheWeb, (f) => f.weldTo !== 'web', 'no weld along the web'),
  reason: 'web-bolted',
};
/** No weld joins plate or cleat to the support. */
export const noSupportWeld: Gate = {
  when: settledByKind('', offTheSupport, (f) => f.weldTo !== 'support', 'no weld to the support'),
  reason: 'no-weld',
};
/** Plate or cleat is welded to the support. */
export const noSupportBolts: Gate = {
  when: settledByKind('', supportUndrilled, (f) => f.supportBolts.n === 0, 'no bolts in the support'),
  reason: 'no-support-bolts',
};
export const oneSupportRow: Gate = {
  when: settledByKind('', neverOfPlates, (f) => f.supportBolts.n === 1, 'one row of bolts in the support'),
  reason: 'single-row',
};
/** One angle alone: what it hangs on stands beside the web. */
export const pairOfCleats: Gate = {
  when: byKind('', (kind) => kind === 'double-cleat', 'a pair of cleats'),
  reason: 'pair-of-cleats',
};
/** An end plate of the beam's full depth is no simple joint: what would hold refers. */
export const fullDepthPlate: Limit = {
  when: byKind('an end plate of the full depth', (kind) => kind === 'full-end-plate'),
  reason: 'full-depth-plate',
  always: false,
};
/** A hole for a support bolt wider than the standard one. */
export const wideSupportHole: Limit = {
  when: flag('a support hole wider than the standard one', (f) => f.supportBolts.d0 > f.supportBolts.dStandard + 1e-9),
  reason: 'hole-above-standard',
  always: false,
};
/** A support bolt that the standard does not list. */
export const supportBoltNotListed: Limit = {
  when: flag('a support bolt that the standard does not list', (f) => !f.supportBolts.boltListed),
  reason: 'bolt-not-listed',
  always: true,
};

/** What no standard's formula for the end's own section covers, whatever the number says. */
export const copeLimits: readonly Limit[] = [
  { when: flag('a hole at the face of a cope', (f) => f.holeAtCopeFace), reason: 'hole-at-cope-face', always: true },
  { when: flag('a cope shallower than the flange', (f) => f.flangeLeft), reason: 'flange-left', always: true },
];
/** A hole wider than the standard one: slip and bearing then follow other rules. */
export const wideHole: Limit = {
  when: flag('a hole wider than the standard one', (f) => f.d0 > f.dStandard + 1e-9),
  reason: 'hole-above-standard',
  always: false,
};
/** A bolt, or a bolt size, that the standard does not list. */
export const boltNotListed: Limit = {
  when: flag('a bolt that the standard does not list', (f) => !f.boltListed),
  reason: 'bolt-not-listed',
  always: true,
};
/** One bolt alone holds no moment: no force on it can be stated. */
export const oneBoltRefers: Limit = { when: oneBolt, reason: 'one-bolt', always: true, noNumber: true };
export const channelCope: Limit = { when: isChannel, reason: 'channel-cope', always: true, noNumber: true };
