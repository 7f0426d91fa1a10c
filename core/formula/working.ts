import type { UnitSystem } from '../units/systems.ts';
import { toSystem, unitOf } from '../units/systems.ts';
import { type Line, lineOf, quantity } from './line.ts';
import { newRun, numberOf, testOf } from './number.ts';
import type { Basis, Condition, Tree } from './tree.ts';

/** One line of a working: symbol = expression = numbers = value unit. */
export interface WorkingRow {
  readonly symbol: string;
  /** The formula in symbols. */
  readonly expression: string;
  /** The same with the numbers in place; worked out, it gives `value` to its printed figures. */
  readonly numbers: string;
  /** In `unit`, unrounded. */
  readonly value: number;
  readonly unit: string;
  readonly clause: string;
  readonly basis: Basis | '';
  readonly note?: string;
}

const relation = { atMost: '≤', below: '<' } as const;

/** A condition in words and numbers, for the branch that it opened or closed. */
const said = (condition: Condition, met: boolean, facts: never, system: UnitSystem): string => {
  switch (condition.op) {
    case 'flag':
      return met ? condition.text : '';
    case 'not':
      return said(condition.of[0], !met, facts, system);
    case 'all':
    case 'any':
      return condition.of
        .map((one) => said(one, testOf(one)(facts), facts, system))
        .filter(Boolean)
        .join('; ');
    default: {
      const [left, right] = condition.of.map((one) => {
        const text = lineOf(one, facts, system, 'symbols').text;
        const value = quantity(numberOf(one)(facts), one.dimension, system);
        return one.op === 'literal' || one.op === 'constant' ? value : `${text} = ${value}`;
      });
      const sign = met ? relation[condition.op] : condition.op === 'atMost' ? '>' : '≥';
      return `${left} ${sign} ${right}`;
    }
  }
};

class Reader {
  readonly rows: WorkingRow[] = [];
  private readonly seen = new Set<Tree>();

  constructor(
    private readonly facts: never,
    private readonly system: UnitSystem,
  ) {}

  /** Writes the steps that a tree leans on, each once, before the tree's own. */
  visit(tree: Tree, notes: string[]): void {
    switch (tree.op) {
      case 'literal':
      case 'constant':
      case 'given':
        return;
      case 'pick':
        this.visitPick(tree, notes);
        return;
      case 'step':
        this.visitStep(tree);
        return;
      case 'found':
        for (const one of tree.of) this.visit(one, notes);
        return;
      default:
        for (const one of tree.of) this.visit(one, notes);
    }
  }

  private visitPick(tree: Tree & { op: 'pick' }, notes: string[]): void {
    for (const { when, then } of tree.branches) {
      const met = testOf(when)(this.facts);
      for (const one of comparedIn(when)) this.visit(one, []);
      const words = said(when, met, this.facts, this.system);
      if (words) notes.push(words);
      if (met) {
        this.visit(then, notes);
        return;
      }
    }
    this.visit(tree.otherwise, notes);
  }

  private visitStep(tree: Tree & { op: 'step' }): void {
    if (this.seen.has(tree)) return;
    this.seen.add(tree);
    const notes: string[] = tree.note ? [tree.note] : [];
    this.visit(tree.of[0], notes);
    const symbols: Line = lineOf(tree.of[0], this.facts, this.system, 'symbols');
    const numbers: Line = lineOf(tree.of[0], this.facts, this.system, 'numbers', tree.dimension);
    this.rows.push({
      symbol: tree.symbol,
      expression: symbols.text,
      numbers: numbers.text,
      value: toSystem(numberOf(tree)(this.facts), tree.dimension, this.system),
      unit: unitOf(tree.dimension, this.system).name,
      clause: tree.source?.clause ?? '',
      basis: tree.source?.basis ?? '',
      ...(notes.length > 0 && { note: [...new Set(notes)].join('; ') }),
    });
  }
}

const comparedIn = (condition: Condition): readonly Tree[] => {
  switch (condition.op) {
    case 'flag':
      return [];
    case 'atMost':
    case 'below':
      return condition.of;
    default:
      return (condition.of as readonly Condition[]).flatMap(comparedIn);
  }
};

/** The working of one or more results from the same facts: every step once, in the order of use. */
export const workingOf = (trees: readonly Tree[], facts: object, system: UnitSystem): WorkingRow[] => {
  newRun();
  const reader = new Reader(facts as never, system);
  for (const tree of trees) reader.visit(tree, []);
  return reader.rows;
};
