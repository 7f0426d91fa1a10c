import type { UnitSystem } from '../units/systems.ts';
import { unitOf } from '../units/systems.ts';
import { Figures } from './figures.ts';
import { type Form, formOf, type Remark, type Step } from './form.ts';
import { quantity, symbolsOf } from './line.ts';
import { Values } from './number.ts';
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
        const text = symbolsOf(one, values);
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
  private readonly written = new Map<Step, readonly WorkingRow[]>();
  private readonly figures: Figures;

  constructor(
    private readonly values: Values,
    private readonly system: UnitSystem,
  ) {
    this.figures = new Figures(values, system);
  }

  /** The steps that trees lean on, each once, before the trees' own. */
  rows(trees: readonly Tree[]): WorkingRow[] {
    return [...this.leadingTo(trees.flatMap((one) => (one.op === 'step' ? one : formOf(one, this.values).leads)))];
  }

  private leadingTo(steps: readonly Step[]): Set<WorkingRow> {
    const rows = new Set<WorkingRow>();
    for (const one of steps) for (const row of this.step(one)) rows.add(row);
    return rows;
  }

  private step(tree: Step): readonly WorkingRow[] {
    const known = this.written.get(tree);
    if (known) return known;
    const form = formOf(tree, this.values);
    const all = [...this.leadingTo(form.leads), this.row(tree, form)];
    this.written.set(tree, all);
    return all;
  }

  private row(tree: Step, form: Form): WorkingRow {
    const notes = this.notes(tree, form);
    const unit = unitOf(tree.dimension, this.system);
    return {
      symbol: tree.symbol,
      expression: form.symbols,
      numbers: this.figures.line(form),
      value: this.values.of(tree) / unit.size,
      unit: unit.name,
      clause: tree.source?.clause ?? '',
      basis: tree.source?.basis ?? '',
      ...(notes && { note: notes }),
    };
  }

  private notes({ note = '' }: Step, { remarks }: Form): string {
    if (remarks.length === 0) return note;
    return [...new Set([note, ...remarks.map((one) => this.remark(one))])].filter(Boolean).join('; ');
  }

  private remark(remark: Remark): string {
    if ('when' in remark) return said(remark.when, remark.met, this.values, this.system);
    // In inches and kips, a formula fitted in MPa takes its stress in MPa all the same: said where it does.
    return this.system === 'in-kip' ? `${symbolsOf(remark.stress, this.values)} in MPa` : '';
  }
}

/** Makes the writer of workings for one set of facts: it gives the steps of one or more results, in the order of use. */
export const workingsOf = (facts: object, system: UnitSystem): ((trees: readonly Tree[]) => WorkingRow[]) => {
  const writer = new Writer(new Values(facts as never), system);
  return (trees) => writer.rows(trees);
};

/** The working of one or more results from the same facts. */
export const workingOf = (trees: readonly Tree[], facts: object, system: UnitSystem): WorkingRow[] =>
  workingsOf(facts, system)(trees);
