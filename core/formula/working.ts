import type { UnitSystem } from '../units/systems.ts';
import { toSystem, unitOf } from '../units/systems.ts';
import { isSilent, quantity, symbolsOf } from './line.ts';
import { Values } from './number.ts';
import { NumberLines } from './numberLines.ts';
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
const said = (condition: Condition, met: boolean, values: Values, system: UnitSystem): string => {
  switch (condition.op) {
    case 'flag':
      return met ? condition.text : '';
    case 'not':
      return said(condition.of[0], !met, values, system);
    case 'all':
    case 'any':
      return condition.of
        .map((one) => said(one, values.met(one), values, system))
        .filter(Boolean)
        .join('; ');
    default: {
      const [left, right] = condition.of.map((one) => {
        const text = symbolsOf(one, values).text;
        const value = quantity(values.of(one), one.dimension, system);
        return one.op === 'literal' || one.op === 'constant' ? value : `${text} = ${value}`;
      });
      const sign = met ? relation[condition.op] : condition.op === 'atMost' ? '>' : '≥';
      return `${left} ${sign} ${right}`;
    }
  }
};

/** Writes workings from one set of facts: a step that several checks lean on is written once and shared. */
class Writer {
  /** By step: the rows that lead to it, in the order of use, and its own. */
  private readonly written = new Map<Tree, readonly WorkingRow[]>();
  private readonly lines: NumberLines;

  constructor(
    private readonly values: Values,
    private readonly system: UnitSystem,
  ) {
    this.lines = new NumberLines(values, system);
  }

  /** The steps that trees lean on, each once, before the trees' own. */
  rows(trees: readonly Tree[]): WorkingRow[] {
    const rows = new Set<WorkingRow>();
    for (const tree of trees) this.visit(tree, rows);
    return [...rows];
  }

  private visit(tree: Tree, rows: Set<WorkingRow>): void {
    switch (tree.op) {
      case 'literal':
      case 'constant':
      case 'given':
        return;
      case 'pick':
        this.visit(this.branch(tree, rows), rows);
        return;
      case 'step':
        for (const row of this.leadingTo(tree)) rows.add(row);
        return;
      default:
        for (const one of tree.of) this.visit(one, rows);
    }
  }

  /** The branch that the facts take; what its conditions compare is written first. */
  private branch(tree: Tree & { op: 'pick' }, rows: Set<WorkingRow>): Tree {
    for (const { when, then } of tree.branches) {
      for (const one of comparedIn(when)) this.visit(one, rows);
      if (this.values.met(when)) return then;
    }
    return tree.otherwise;
  }

  private leadingTo(tree: Tree & { op: 'step' }): readonly WorkingRow[] {
    const known = this.written.get(tree);
    if (known) return known;
    const rows = new Set<WorkingRow>();
    this.visit(tree.of[0], rows);
    rows.add(this.row(tree));
    const all = [...rows];
    this.written.set(tree, all);
    return all;
  }

  private notes({ note = '', of: [formula] }: Tree & { op: 'step' }): string {
    if (isSilent(formula)) return note;
    return [...new Set([note, ...this.choices(formula)])].filter(Boolean).join('; ');
  }

  private row(tree: Tree & { op: 'step' }): WorkingRow {
    const notes = this.notes(tree);
    return {
      symbol: tree.symbol,
      expression: symbolsOf(tree.of[0], this.values).text,
      numbers: this.lines.line(tree.of[0], tree.dimension).text,
      value: toSystem(this.values.of(tree), tree.dimension, this.system),
      unit: unitOf(tree.dimension, this.system).name,
      clause: tree.source?.clause ?? '',
      basis: tree.source?.basis ?? '',
      ...(notes && { note: notes }),
    };
  }

  /** In inches and kips, a formula fitted in MPa takes its stress in MPa all the same: said where it does. */
  private inMPa(stress: Tree): string[] {
    return this.system === 'in-kip' ? [`${symbolsOf(stress, this.values).text} in MPa`] : [];
  }

  /** The choices made within one step, in words and numbers. */
  private choices(tree: Tree): string[] {
    switch (tree.op) {
      case 'literal':
      case 'constant':
      case 'given':
      case 'step':
        return [];
      case 'bare':
        return this.inMPa(tree.of[0]);
      case 'pick': {
        const words: string[] = [];
        for (const { when, then } of tree.branches) {
          words.push(...comparedIn(when).flatMap((one) => this.choices(one)));
          const met = this.values.met(when);
          words.push(said(when, met, this.values, this.system));
          if (met) return [...words, ...this.choices(then)];
        }
        return [...words, ...this.choices(tree.otherwise)];
      }
      default:
        return tree.of.flatMap((one) => this.choices(one));
    }
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

/** Makes the writer of workings for one set of facts: it gives the steps of one or more results, in the order of use. */
export const workingsOf = (facts: object, system: UnitSystem): ((trees: readonly Tree[]) => WorkingRow[]) => {
  const writer = new Writer(new Values(facts as never), system);
  return (trees) => writer.rows(trees);
};

/** The working of one or more results from the same facts. */
export const workingOf = (trees: readonly Tree[], facts: object, system: UnitSystem): WorkingRow[] =>
  workingsOf(facts, system)(trees);
