import { examineNumbers } from '../check/examineNumbers.ts';
import type { Check, SaidFault } from '../check/report.ts';
import type { CheckName } from '../end/checkNames.ts';
import type { Facts } from '../end/facts.ts';
import { lengthSize } from '../end/factsOf.ts';
import type { Cope, End } from '../end/schema.ts';
import { numberOf } from '../formula/number.ts';
import { type CopeManner, columnCut, depthsOf, lengthsOf, radiusOf, type SizeByRule } from './copeSizes.ts';

/** Which flange of the beam a cope cuts. */
export type Place = 'top' | 'bottom';
export const places: readonly Place[] = ['top', 'bottom'];

export type Size = keyof Cope;
/** As the end's JSON has it. */
export type CopeSizes = Readonly<Record<Size, number>>;

/** What a cope has to meet under the end's own standard: the rules on copes, and web enough above the holes. */
const judged: ReadonlySet<CheckName> = new Set<CheckName>([
  'fit-cope-length',
  'fit-cope-depth',
  'fit-cope-radius',
  'fit-cope-clearance',
  'fit-edge-web',
]);

/** A rule that the cope breaks; holes far from the edge above them are none of its doing. */
const broken = ({ id, state, reason }: Check): boolean =>
  judged.has(id) && (state === 'fails' || state === 'refer') && !(id === 'fit-edge-web' && reason === 'too-much');

/** A cope's sizes with the rule of each. */
export type Sizes = Readonly<Record<Size, SizeByRule>>;
/** What is proposed for each flange that is in the way. */
export type Choice = Readonly<Partial<Record<Place, Sizes>>>;

/** Copes worth trying, the most usual first: no face cuts a hole. */
const choicesOf = (at: readonly Place[], facts: Facts, manner: CopeManner): Choice[] => {
  const lengths = lengthsOf('c', manner);
  const clear = lengths.filter(({ size }) => {
    const length = numberOf(size, facts);
    return Number.isFinite(length) && Number.isNaN(columnCut(facts, length));
  });
  return depthsOf('d', 'top', manner).flatMap((_, deep) =>
    clear.map((found) =>
      Object.fromEntries(
        at.map((place) => {
          const letter = place === 'top' ? 't' : 'b';
          const length = lengthsOf(`c_${letter}`, manner)[lengths.indexOf(found)]!;
          const depth = depthsOf(`d_${letter}`, place, manner)[deep]!;
          return [place, { length, depth, radius: radiusOf(`ρ_${letter}`, manner) }];
        }),
      ),
    ),
  );
};

export interface Tried {
  readonly choice: Choice;
  readonly unmet: readonly Check[];
  readonly faults: readonly SaidFault[];
}

/** A size in the end's own unit, free of conversion noise. */
const inFile = ({ size }: SizeByRule, facts: Facts, end: End): number =>
  Number((numberOf(size, facts) / lengthSize(end)).toPrecision(10));

/** The sizes as the end's JSON has them. */
export const copeOf = ({ length, depth, radius }: Sizes, facts: Facts, end: End): CopeSizes => ({
  length: inFile(length, facts, end),
  depth: inFile(depth, facts, end),
  radius: inFile(radius, facts, end),
});

const tryOut = (choice: Choice, facts: Facts, end: End): Tried => {
  const copes = places.map((place) => [place, choice[place] ? copeOf(choice[place], facts, end) : null] as const);
  const found = examineNumbers({ ...end, ...Object.fromEntries(copes) });
  if ('faults' in found) return { choice, unmet: [], faults: found.faults };
  return { choice, unmet: found.examined.report.checks.filter(broken), faults: [] };
};

/** What a choice costs: rules on copes weigh more than the web above the holes, which other holes may mend. */
const costOf = ({ unmet, faults }: Tried): number =>
  faults.length > 0
    ? Number.POSITIVE_INFINITY
    : unmet.reduce((sum, { id }) => sum + (id === 'fit-edge-web' ? 1 : 10), 0);

/**
 * The copes for these flanges that break no rule of the end's own standard, the most usual first; else the first of those that break least.
 * What the end has for copes is left out.
 */
export const bestCopes = (at: readonly Place[], facts: Facts, end: End, manner: CopeManner): Tried => {
  const choices = at.length > 0 ? choicesOf(at, facts, manner) : [{}];
  let best: Tried | undefined;
  for (const choice of choices) {
    const tried = tryOut(choice, facts, end);
    if (!best || costOf(tried) < costOf(best)) best = tried;
    if (costOf(best) === 0) break;
  }
  return best!;
};
