import fc from 'fast-check';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check } from '../../core/check/report.ts';
import type { Joint } from '../../core/end/schema.ts';
import { joints } from '../../core/joints/index.ts';
import type { Standard } from '../../core/standards/standard.ts';
import { jointEndOf, plausibleJoint } from './arbitraryJoint.ts';
import { goodEndsUnder } from './underStandard.ts';

/**
 * What a check does for one standard and kind of joint: `computes` a number with a verdict, gives `information` only, has `noRule`, or is
 * `outside` what the method covers, so that it never gives a number.
 */
export type Coverage = 'computes' | 'information' | 'noRule' | 'outside';
export type CoverageTable = Readonly<Record<string, Readonly<Record<string, Readonly<Record<string, Coverage>>>>>>;

const SAMPLES = 300;
const SEED = 20_110;

const hasNumber = ({ resistance, demand }: Check): boolean => resistance !== null || demand !== null;

const rank: Readonly<Record<Coverage, number>> = { computes: 3, information: 2, outside: 1, noRule: 0 };

const coverageOf = (check: Check): Coverage => {
  if (check.state === 'information') return 'information';
  if (check.state === 'notApplicable') {
    return check.reason === 'no-rule' || check.reason === 'covered' ? 'noRule' : 'outside';
  }
  return hasNumber(check) ? 'computes' : 'outside';
};

/** A tie force, a support that is told, and no option chosen. */
const told = (end: Record<string, unknown>): Record<string, unknown> => {
  const steel = (end.beam as Record<string, unknown>).grade;
  const support = { kind: 'beam-web', section: 'UB 610x229x125', grade: steel };
  return { ...end, options: {}, tie: 50, support };
};

/** The end with its fin plate as a ply of the support, or the other way round; undefined where it is joined in yet another way. */
const asKind = (end: Record<string, unknown>, kind: Joint['kind']): Record<string, unknown> | undefined => {
  const { plate, ply, weld, kind: own, ...rest } = end.joint as Record<string, unknown>;
  if (own === kind) return end;
  if (own === 'fin-plate' && kind === 'web-bolts') return { ...end, joint: { kind, ...rest, ply: plate } };
  if (own === 'web-bolts' && kind === 'fin-plate') {
    return { ...end, joint: { kind, ...rest, plate: ply, weld: weld ?? { leg: 8 } } };
  }
  return undefined;
};

/** What every check of a joint does under a standard, found by running good ends and some hundreds of random ones. */
export const coverageUnder = (standard: Standard, kind: Joint['kind']): Record<string, Coverage> => {
  const random = fc
    .sample(plausibleJoint, { numRuns: SAMPLES, seed: SEED })
    .map((one) => jointEndOf({ ...one, standard: standard.id }, kind) as Record<string, unknown>);
  const good = goodEndsUnder(standard)
    .map(({ end }) => asKind(end, kind))
    .filter((end) => end !== undefined);
  const best: Record<string, Coverage> = {};
  for (const end of [...good, ...random].flatMap((one) => [told(one), { ...one, options: {} }])) {
    const outcome = checkEnd(end);
    if ('faults' in outcome) continue;
    for (const check of outcome.report.checks) {
      const found = coverageOf(check);
      const known = best[check.id];
      if (known === undefined || rank[found] > rank[known]) best[check.id] = found;
    }
  }
  const { strength, fit } = joints[kind];
  return Object.fromEntries([...strength, ...fit].map(([id]) => [id, best[id] ?? 'outside']));
};
