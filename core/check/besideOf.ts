import type { Facts } from '../end/facts.ts';
import { fault } from '../end/fault.ts';
import type { End } from '../end/schema.ts';
import { standards } from '../standards/known.ts';
import type { Standard } from '../standards/standard.ts';
import { nearest } from '../steel/nearest.ts';
import { plain } from '../units/figures.ts';
import { fromSystem, toSystem, unitOf } from '../units/systems.ts';
import { filled } from '../words/words.ts';
import { wordsFor } from '../words/wordsFor.ts';
import type { ExaminedNumbers } from './examined.ts';
import { listedIds, numbersOf, regionOf, said } from './examineNumbers.ts';
import { planOf } from './plan.ts';
import type { Check, Note, Numbers, SaidFault } from './report.ts';
import { resolve } from './resolve.ts';
import { withheld } from './withheld.ts';

/** The same end under a second standard. */
export interface Beside {
  readonly examined: ExaminedNumbers;
  /** False where that standard works at the other level and no reaction was given for it: strengths only, no line and no states. */
  readonly stated: boolean;
}

const isVerdict = ({ state }: Check): boolean => state === 'holds' || state === 'fails';

/** What a check says where the level is another: nothing of the tie force and, where no reaction is given, strengths alone. */
const atOtherLevel = (check: Check, stated: boolean, tied: boolean, text: string): Check => {
  if (check.id === 'web-tie' && tied) return { ...check, reason: 'tie-other-level', reasonText: text };
  if (stated || check.id.startsWith('fit-') || check.reactionAtFailure === undefined) return check;
  return { ...check, demand: null, utilisation: null, state: isVerdict(check) ? 'information' : check.state };
};

/** Notes about strengths and the reaction, which are the first standard's. */
const ofTheFirst: ReadonlySet<string> = new Set(['strength-given', 'memory-grade', 'reaction-from-share']);

const carriedNote = (examined: ExaminedNumbers, standard: Standard): Note => {
  const { end, facts, report } = examined;
  const unit = unitOf('-2,1', end.units).name;
  const stress = (value: number) => plain(toSystem(value, '-2,1', end.units), 1);
  const text = filled(wordsFor(regionOf(end, standard)).notes['strengths-carried'] ?? '', {
    from: report.standard.title,
    web: `${stress(facts.fy)}/${stress(facts.fu)}`,
    plate: `${stress(facts.fyp)}/${stress(facts.fup)}`,
    bolts: `${stress(facts.fub)} ${unit}`,
  });
  return { code: 'strengths-carried', text };
};

/** N: more than any web carries. */
const ANY_WEB = 1e12;

const besideUnder = (
  examined: ExaminedNumbers,
  standard: Standard,
  given: number | undefined,
): Beside | readonly SaidFault[] => {
  const { facts, report } = examined;
  const { options: _, level: __, ...rest } = examined.end;
  const sameLevel = standard.level === report.level;
  // The tie force and the beam opposite are given at the first standard's level.
  const alone = { tie: 0, ...(rest.support && { support: { ...rest.support, otherReaction: 0 } }) };
  const end: End = { ...rest, standard: standard.id, ...(!sameLevel && alone) };
  const found = resolve(end, standard, {
    web: { fy: facts.fy, fu: facts.fu },
    fyf: facts.fyf,
    plate: { fy: facts.fyp, fu: facts.fup },
    support: { fy: facts.fys, fu: facts.fus },
    fub: facts.fub,
    fubs: facts.supportBolts.fub,
  });
  const words = wordsFor(regionOf(end, standard));
  if ('faults' in found) return said(found.faults, words).faults;
  const stated = sameLevel || given !== undefined;
  const own = typeof end.reaction === 'number' ? end.reaction : report.reaction;
  const V = fromSystem(sameLevel ? own : (given ?? 0), '0,1', end.units);
  const tied = (examined.end.tie ?? 0) > 0;
  const { resolved } = found;
  const plan = planOf(standard, end.joint.kind);
  const of = (facts: Facts) => numbersOf(end, plan, { ...resolved, facts }, V);
  const numbers =
    sameLevel || facts.Vo === 0
      ? of(resolved.facts)
      : withheld(of(resolved.facts), of({ ...resolved.facts, Vo: ANY_WEB }), 'opposite-other-level', words);
  const told: Numbers = {
    ...numbers,
    checks: sameLevel
      ? numbers.checks
      : numbers.checks.map((one) => atOtherLevel(one, stated, tied, words.reasons['tie-other-level'] ?? '')),
    notes: [carriedNote(examined, standard), ...numbers.notes.filter(({ code }) => !ofTheFirst.has(code))],
  };
  return { examined: { end, facts: resolved.facts, designation: resolved.designation, report: told }, stated };
};

/**
 * The end under the second standard that its sheet names: strengths of steel and bolts carried over from the first, with the second's own
 * hole, net, factor and geometry rules and its options at their defaults. Null where no second standard is named.
 */
export const besideOf = (examined: ExaminedNumbers): Beside | { readonly faults: readonly SaidFault[] } | null => {
  const asked = examined.end.sheet?.beside;
  if (!asked) return null;
  const path = 'sheet.beside.standard';
  const standard = Object.hasOwn(standards, asked.standard) ? standards[asked.standard] : undefined;
  if (!standard) {
    return said([fault('unknown-standard', path, asked.standard, nearest(asked.standard, listedIds, 3))]);
  }
  if (standard.id === examined.end.standard) return said([fault('same-standard', path, asked.standard, null)]);
  const found = besideUnder(examined, standard, asked.reaction);
  return 'examined' in found ? found : { faults: found };
};
