import type { SupportBoltFacts } from './facts.ts';
import type { FittingSizes } from './fittingSizes.ts';
import { supportBoltsOf } from './jointParts.ts';
import type { End } from './schema.ts';

/** What a standard says of such a bolt and its hole. */
export type SupportBoltGiven = Omit<SupportBoltFacts, 'n' | 'lines' | 'p' | 'cc' | 'eTop' | 'eBot' | 'ev' | 'eh'>;

const none: SupportBoltFacts = {
  n: 0,
  lines: 0,
  p: 0,
  cc: 0,
  d: 0,
  inch: false,
  As: 0,
  d0: 0,
  dStandard: 0,
  dn: 0,
  socket: 0,
  fub: 0,
  fnv: 0,
  boltListed: false,
  threadsIn: true,
  eTop: 0,
  eBot: 0,
  ev: 0,
  eh: 0,
};

/** Bolts into the support, with the edges of the leg or plate that they hold. mm; `k`: mm in one length unit of the file. */
export const supportBoltFacts = (
  { joint }: End,
  k: number,
  { hp, bp, legSupport }: FittingSizes,
  tw: number,
  bolt: SupportBoltGiven,
): SupportBoltFacts => {
  const given = supportBoltsOf(joint);
  if (!given) return none;
  const n = given.rows;
  const p = n > 1 ? (given.pitch ?? 0) * k : 0;
  const cc = given.crossCentres * k;
  const eTop = given.topEdge * k;
  const eBot = hp - eTop - (n - 1) * p;
  const eh = bp > 0 ? (bp - cc) / 2 : legSupport - (cc - tw) / 2;
  const lines = joint.kind === 'single-cleat' ? 1 : 2;
  return { ...bolt, n, lines, p, cc, eTop, eBot, ev: Math.min(eTop, eBot), eh };
};
