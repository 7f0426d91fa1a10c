import type { SupportBoltFacts } from './facts.ts';
import type { FittingSizes } from './fittingSizes.ts';
import { supportBoltsOf } from './jointParts.ts';
import type { End } from './schema.ts';

/** What a standard says of such a bolt and its hole. */
export type SupportBoltGiven = Omit<SupportBoltFacts, 'n' | 'lines' | 'p' | 'cc' | 'eTop' | 'eBot' | 'ev' | 'eh'>;

/** Bolts into the support, with the edges of the leg or plate that they hold. mm; `k`: mm in one length unit of the file. */
export const supportBoltFacts = (
  { joint }: End,
  k: number,
  { hp, bp, legSupport }: FittingSizes,
  tw: number,
  bolt: SupportBoltGiven,
): SupportBoltFacts => {
  const given = supportBoltsOf(joint);
  const n = given?.rows ?? 0;
  const p = n > 1 ? (given?.pitch ?? 0) * k : 0;
  const cc = (given?.crossCentres ?? 0) * k;
  const eTop = (given?.topEdge ?? 0) * k;
  const eBot = given ? hp - eTop - (n - 1) * p : 0;
  const eh = given ? (bp > 0 ? (bp - cc) / 2 : legSupport - (cc - tw) / 2) : 0;
  const lines = joint.kind === 'single-cleat' ? 1 : 2;
  return { ...bolt, n, lines: n > 0 ? lines : 0, p, cc, eTop, eBot, ev: Math.min(eTop, eBot), eh };
};
