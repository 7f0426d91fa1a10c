import { unitOf } from '../units/systems.ts';
import { comparedIn } from './comparedIn.ts';
import { quantity, symbolsOf } from './line.ts';
import type { Basis, Condition, Tree } from './tree.ts';

/** One case of a formula: what it says in symbols, and when it is taken; `when` is empty where it always is. */
export interface FormulaCase {
  readonly expression: string;
  readonly when: string;
}

/** A step of a formula in symbols, with every branch that it may take. */
export interface FormulaRow {
  readonly symbol: string;
  readonly cases: readonly FormulaCase[];
  /** The choice that leads to this step, where it stands in one branch only; else empty. */
  readonly under: string;
  readonly clause: string;
  readonly basis: Basis | '';
  readonly note: string;
}

type Step = Tree & { readonly op: 'step' };

const relation = { atMost: ['≤', '>'], below: ['<', '≥'] } as const;

/** A condition in symbols and words; empty where it has none. */
export const conditionText = (condition: Condition, met = true): string => {
  switch (condition.op) {
    case 'flag':
      return condition.called && (met ? condition.called : `not: ${condition.called}`);
    case 'not':
      return conditionText(condition.of[0], !met);
    case 'all':
    case 'any': {
      const word = (condition.op === 'all') === met ? ' and ' : ' or ';
      return condition.of
        .map((one) => conditionText(one, met))
        .filter(Boolean)
        .join(word);
    }
    default: {
      const [left, right] = condition.of.map((one) => {
        const first = variantsOf(one)[0]!.tree;
        return symbolsOf(first, undefined as never);
      });
      return `${left} ${relation[condition.op][met ? 0 : 1]} ${right}`;
    }
  }
};

interface Variant {
  readonly tree: Tree;
  readonly when: readonly string[];
}

/** The tree with each choice settled, branch by branch; steps are left as they are. */
const variantsOf = (tree: Tree): Variant[] => {
  if (tree.op === 'pick') {
    const taken = tree.branches.flatMap(({ when, then }) =>
      variantsOf(then).map((one) => ({ tree: one.tree, when: [conditionText(when), ...one.when] })),
    );
    return [
      ...taken,
      ...variantsOf(tree.otherwise).map((one) => ({ tree: one.tree, when: ['otherwise', ...one.when] })),
    ];
  }
  if (tree.op === 'step' || tree.op === 'found' || !('of' in tree)) return [{ tree, when: [] }];
  let all: { of: Tree[]; when: string[] }[] = [{ of: [], when: [] }];
  for (const one of tree.of) {
    const variants = variantsOf(one);
    all = all.flatMap(({ of, when }) =>
      variants.map((variant) => ({ of: [...of, variant.tree], when: [...when, ...variant.when] })),
    );
  }
  if (all.length === 1) return [{ tree, when: [] }];
  return all.map(({ of, when }) => ({ tree: { ...tree, of } as unknown as Tree, when }));
};

/** Named numbers of a formula that are no factor of the standard, with their values. */
const valuesIn = (tree: Tree, factors: ReadonlySet<Tree>): string[] => {
  if (tree.op === 'constant') {
    const said = factors.has(tree) || tree.symbol === 'π' || /^\d/.test(tree.symbol);
    const unit = unitOf(tree.dimension, 'mm-kN').name;
    const value = quantity(tree.value, tree.dimension, 'mm-kN');
    return said ? [] : [`${tree.symbol} = ${value}${unit && ` ${unit}`}`];
  }
  return tree.op === 'step' || tree.op === 'pick' || !('of' in tree)
    ? []
    : tree.of.flatMap((one) => valuesIn(one, factors));
};

const casesOf = (tree: Tree, factors: ReadonlySet<Tree>): FormulaCase[] => {
  const cases = variantsOf(tree).map(({ tree: one, when }) => ({
    expression: [symbolsOf(one, undefined as never), ...new Set(valuesIn(one, factors))].join(', '),
    when: [...new Set(when)].filter(Boolean).join('; '),
  }));
  const [first] = cases;
  return cases.every(({ expression }) => expression === first!.expression)
    ? [{ expression: first!.expression, when: '' }]
    : cases;
};

const rowOf = (tree: Step, under: string, factors: ReadonlySet<Tree>): FormulaRow => ({
  symbol: tree.symbol,
  cases: casesOf(tree.of[0], factors),
  under,
  clause: tree.source?.clause ?? '',
  basis: tree.source?.basis ?? '',
  note: tree.note ?? '',
});

/** Notes each step in the order of use, with the choice that leads to it; a step that several lead to stands under none. */
const visit = (tree: Tree, under: string, steps: Map<Step, string>): void => {
  if (tree.op === 'pick') {
    for (const { when, then } of tree.branches) {
      for (const one of comparedIn(when)) visit(one, under, steps);
      visit(then, conditionText(when) || under, steps);
    }
    visit(tree.otherwise, under, steps);
    return;
  }
  if ('of' in tree) for (const one of tree.of) visit(one, under, steps);
  if (tree.op === 'step') steps.set(tree, steps.has(tree) && steps.get(tree) !== under ? '' : under);
};

/**
 * Every step that formulas are made of, in symbols and in the order of use, whatever the end. Named numbers stand with their values but for
 * the standard's factors, which are listed apart.
 */
export const formularyOf = (trees: readonly Tree[], factors: readonly Tree[] = []): FormulaRow[] => {
  const apart = new Set(factors);
  const steps = new Map<Step, string>();
  for (const tree of trees) visit(tree, '', steps);
  return [...steps].map(([one, under]) => rowOf(one, under, apart));
};
