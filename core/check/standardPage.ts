import type { CheckName } from '../end/checkNames.ts';
import { fitNames, strengthNames } from '../end/checkNames.ts';
import type { Gate } from '../end/gates.ts';
import { conditionText, type FormulaRow, formularyOf } from '../formula/formulary.ts';
import type { Basis } from '../formula/tree.ts';
import {
  type FitRule,
  isNoRule,
  type NoRule,
  type Standard,
  type StrengthRule,
  treesOf,
} from '../standards/standard.ts';
import type { Words } from '../words/words.ts';
import { wordsFor } from '../words/wordsFor.ts';
import type { Check } from './report.ts';

/** A condition under which a check says something else than a verdict: in symbols or words, and why. */
export interface Said {
  readonly when: string;
  readonly reason: string;
}

/** The formulas of one section, leg or edge of a check. */
export interface WayPage {
  /** Which one, in words; empty where a check has one only. */
  readonly of: string;
  readonly formulas: readonly FormulaRow[];
}

/** How a standard answers one check, in symbols. */
export interface CheckPage {
  readonly id: CheckName;
  readonly title: string;
  readonly clause: string;
  readonly basis: Basis | '';
  readonly verified: Check['verified'] | '';
  /** Why the standard has no such check; empty where it has. */
  readonly noRule: string;
  readonly ways: readonly WayPage[];
  readonly refers: readonly Said[];
  readonly notApplicable: readonly Said[];
}

/** All that a standard says, generated from the rules that run. */
export interface StandardPage {
  readonly id: string;
  readonly title: string;
  readonly edition: string;
  readonly level: Standard['level'];
  readonly factors: readonly { readonly symbol: string; readonly value: number }[];
  readonly options: Standard['options'];
  readonly grades: readonly string[];
  readonly plateGrades: readonly string[];
  readonly boltGrades: readonly string[];
  readonly checks: readonly CheckPage[];
}

const saidOf = (gates: readonly Gate[], words: Words): Said[] => {
  const all = gates.map(({ when, reason }) => ({ when: conditionText(when), reason: words.reasons[reason] ?? reason }));
  return all.filter(
    (one, at) => all.findIndex(({ when, reason }) => when === one.when && reason === one.reason) === at,
  );
};

/** What opens a rule's formulas: its ways or parts, with their trees, gates and limits. */
const insideOf = (rule: StrengthRule | FitRule) =>
  'ways' in rule
    ? rule.ways.map((way) => ({
        of: way.of,
        trees: treesOf(way),
        off: way.off ?? [],
        limits: [...(way.limits ?? []), ...(way.whereFirst ? [way.whereFirst] : [])],
      }))
    : rule.parts.map(({ of, given, least, most, off }) => ({
        of,
        trees: [given, least, most].filter((one) => one !== undefined),
        off: off ?? [],
        limits: [],
      }));

const checkPage = (
  id: CheckName,
  rule: StrengthRule | FitRule | NoRule,
  standard: Standard,
  words: Words,
): CheckPage => {
  const empty = { ways: [], refers: [], notApplicable: [] };
  const title = words.titles[id] ?? id;
  if (isNoRule(rule)) {
    const noRule = words.reasons[rule.covered ? 'covered' : 'no-rule'] ?? '';
    return { id, title, clause: '', basis: '', verified: '', noRule, ...empty };
  }
  const inside = insideOf(rule);
  return {
    id,
    title,
    ...rule.source,
    verified: standard.verified[id] ?? 'none',
    noRule: '',
    ways: inside.map(({ of, trees }) => ({ of: words.ways[of] ?? of, formulas: formularyOf(trees, standard.factors) })),
    refers: saidOf(
      inside.flatMap(({ limits }) => limits),
      words,
    ),
    notApplicable: saidOf(
      inside.flatMap(({ off }) => off),
      words,
    ),
  };
};

/** Edition, factors, options and every check of a standard with clause, basis and formula in symbols. */
export const standardPage = (standard: Standard): StandardPage => {
  const { id, title, edition, level, factors, options, materials } = standard;
  const words = wordsFor(standard.region);
  return {
    id,
    title,
    edition,
    level,
    factors: factors.map((one) => ({ symbol: one.symbol, value: one.value })),
    options,
    grades: materials.sections.grades,
    plateGrades: materials.plates.grades,
    boltGrades: materials.boltGrades,
    checks: [
      ...strengthNames.map((name) => checkPage(name, standard.strength[name], standard, words)),
      ...fitNames.map((name) => checkPage(name, standard.fit[name], standard, words)),
    ],
  };
};
