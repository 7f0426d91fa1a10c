import { examineNumbers, regionOf } from '../check/examineNumbers.ts';
import type { Check, SaidFault } from '../check/report.ts';
import type { Facts } from '../end/facts.ts';
import { lengthSize } from '../end/factsOf.ts';
import { type Fault, fault } from '../end/fault.ts';
import type { End } from '../end/schema.ts';
import { numberOf } from '../formula/number.ts';
import { type WorkingRow, workingOf } from '../formula/working.ts';
import { standards } from '../standards/known.ts';
import { adviceWordsFor } from '../words/adviceWords.ts';
import { faultText } from '../words/words.ts';
import { wordsFor } from '../words/wordsFor.ts';
import { bestCopes, type CopeSizes, copeOf, type Place, places, type Size, type Sizes } from './bestCopes.ts';
import { copePractice } from './copePractice.ts';
import { type CopeRule, reachOf } from './copeSizes.ts';

/** One size of a proposed cope. */
export interface ProposedSize {
  /** The field of the end that it would stand in. */
  readonly field: `${Place}.${Size}`;
  /** In the end's own unit. */
  readonly value: number;
  readonly rule: CopeRule;
  readonly working: readonly WorkingRow[];
}

export interface ProposedCope {
  readonly cope: CopeSizes;
  readonly sizes: readonly ProposedSize[];
}

/** Copes that let an end in under the flanges of the beam that carries it. */
export interface CopeAdvice {
  /** Null where the beam clears that flange of its support, so that no cope is needed. */
  readonly top: ProposedCope | null;
  readonly bottom: ProposedCope | null;
  /** Rules on copes, and on the web above the holes, that the end breaks with these copes: no size met them all. */
  readonly unmet: readonly Check[];
  /** Why the end with these copes cannot be checked at all. */
  readonly faults: readonly SaidFault[];
}

/** The shop's step of lengths and depths: 5 mm or 1/4 in. */
const usualStep = { 'mm-kN': 5, 'in-kip': 1 / 4 } as const;

const isObject = (input: unknown): input is Record<string, unknown> => typeof input === 'object' && input !== null;

/** The same end without its copes and its reaction, neither of which a proposal leans on. */
const bare = (input: unknown): unknown => {
  if (!isObject(input)) return input;
  const { level: _, ...rest } = input;
  return { ...rest, reaction: 0, top: null, bottom: null };
};

/** mm: what clears in inches clears in mm. */
const NOISE = 1e-6;

/** Whether a flange of the support stands in the way of the beam. */
const meets = (place: Place, facts: Facts, clearance: number): boolean => {
  const { support, g } = facts;
  const overhang = (support.b - support.tw) / 2;
  return overhang + clearance > g + NOISE && numberOf(reachOf[place], facts) > NOISE;
};

const proposed = (place: Place, sizes: Sizes, facts: Facts, end: End): ProposedCope => {
  const cope = copeOf(sizes, facts, end);
  const sizeOf = (name: Size): ProposedSize => ({
    field: `${place}.${name}`,
    value: cope[name],
    rule: sizes[name].rule,
    working: workingOf([sizes[name].size], facts, end.units),
  });
  return { cope, sizes: [sizeOf('length'), sizeOf('depth'), sizeOf('radius')] };
};

/** What stands in the way of a proposal. */
const faultOf = (end: End, { support, h }: Facts, step: number): Fault | undefined => {
  if (!(step > 0 && Number.isFinite(step))) return fault('step-not-positive', 'step', step, { above: 0 });
  if (!support.here) return fault('no-supporting-beam', 'support.section', end.support?.section ?? null, 'beam-web');
  if (support.topOfSteel > -h + NOISE && support.topOfSteel < support.h - NOISE) return undefined;
  const k = lengthSize(end);
  const limit = { above: Number((-h / k).toPrecision(10)), below: Number((support.h / k).toPrecision(10)) };
  return fault('support-out-of-reach', 'support.topOfSteel', end.support?.topOfSteel, limit);
};

/**
 * Proposes the copes of an end, given as JSON, from the beam whose web carries it: a section of the library, `support.topOfSteel` above this
 * one. Lengths and depths are rounded up to `step`, in the end's own unit (absent: 5 mm or 1/4 in). What the proposal leans on is practice;
 * it is tried under the end's own standard, and shops are taken to cope as in that standard's market. The copes that the end has play no
 * part, nor does its reaction.
 */
export const copeFromSupport = (
  input: unknown,
  { step }: { readonly step?: number } = {},
): { readonly advice: CopeAdvice } | { readonly faults: readonly SaidFault[] } => {
  const found = examineNumbers(bare(input));
  if ('faults' in found) return found;
  const { end, facts } = found.examined;
  const standard = standards[end.standard]!;
  const multiple = step ?? usualStep[end.units];
  const wrong = faultOf(end, facts, multiple);
  if (wrong) {
    const words = regionOf(end, standard);
    return { faults: [{ ...wrong, text: faultText(wordsFor(words), adviceWordsFor(words).faults, wrong) }] };
  }
  const { region } = standard;
  const at = places.filter((place) => meets(place, facts, copePractice[region].clearance.value));
  const { choice, unmet, faults } = bestCopes(at, facts, end, { region, units: end.units, step: multiple });
  const of = (place: Place) => (choice[place] ? proposed(place, choice[place], facts, end) : null);
  return { advice: { top: of('top'), bottom: of('bottom'), unmet, faults } };
};

/** The end with the proposed copes in place of its own. */
export const withCopes = <E extends object>(end: E, { top, bottom }: CopeAdvice): E & Pick<End, 'top' | 'bottom'> => ({
  ...end,
  top: top?.cope ?? null,
  bottom: bottom?.cope ?? null,
});
