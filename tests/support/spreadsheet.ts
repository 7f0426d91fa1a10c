import { numberOf } from '../../core/formula/number.ts';
import type { Condition, Tree } from '../../core/formula/tree.ts';

/** The same formulas as a spreadsheet row: input cells, and one formula cell for each step and result. */
export interface SheetRow {
  /** Readers of the input cells, in column order; flags are 0 or 1. */
  readonly inputs: readonly ((facts: never) => number)[];
  /** Formulas of the cells that follow the inputs; `{r}` stands for the row's number. */
  readonly formulas: readonly string[];
  /** Column of each result asked for. */
  readonly results: readonly number[];
}

const column = (at: number): string =>
  (at < 26 ? '' : column(Math.floor(at / 26) - 1)) + String.fromCharCode(65 + (at % 26));

/** Collects the inputs first, so that formula cells can follow them. */
class Builder {
  readonly inputs: ((facts: never) => number)[] = [];
  readonly formulas: string[] = [];
  private readonly places = new Map<unknown, number>();
  private readonly cells = new Map<Tree, number>();

  gather(tree: Tree): void {
    if (tree.op === 'given') this.input(tree, tree.read);
    else if (tree.op === 'found') {
      tree.of.map((one) => this.gather(one));
      const { solve, of } = tree;
      this.input(tree, (facts) => solve(facts, ...of.map((one) => evaluate(one, facts))));
    } else if (tree.op === 'pick') {
      for (const { when, then } of tree.branches) {
        this.gatherCondition(when);
        this.gather(then);
      }
      this.gather(tree.otherwise);
    } else if ('of' in tree) for (const one of tree.of as readonly Tree[]) this.gather(one);
  }

  private gatherCondition(condition: Condition): void {
    if (condition.op === 'flag') this.input(condition, (facts) => (condition.read(facts) ? 1 : 0));
    else for (const one of condition.of) 'dimension' in one ? this.gather(one) : this.gatherCondition(one);
  }

  private input(key: unknown, read: (facts: never) => number): void {
    if (this.places.has(key)) return;
    this.places.set(key, this.inputs.length);
    this.inputs.push(read);
  }

  cell(tree: Tree): number {
    const known = this.cells.get(tree);
    if (known !== undefined) return known;
    const text = `=${this.text(tree.op === 'step' ? tree.of[0] : tree)}`;
    const at = this.inputs.length + this.formulas.length;
    this.formulas.push(text);
    this.cells.set(tree, at);
    return at;
  }

  private ref(at: number): string {
    return `${column(at)}{r}`;
  }

  private text(tree: Tree): string {
    switch (tree.op) {
      case 'literal':
      case 'constant':
        return `(${tree.value})`;
      case 'given':
      case 'found':
        return this.ref(this.places.get(tree)!);
      case 'step':
        return this.ref(this.cell(tree));
      case 'times':
        return `(${tree.of.map((one) => this.text(one)).join('*')})`;
      case 'plus':
        return `(${tree.of.map((one) => this.text(one)).join('+')})`;
      case 'minus':
        return `(${this.text(tree.of[0])}-${this.text(tree.of[1])})`;
      case 'over':
        return `(${this.text(tree.of[0])}/${this.text(tree.of[1])})`;
      case 'least':
        return `MIN(${tree.of.map((one) => this.text(one)).join(',')})`;
      case 'most':
        return `MAX(${tree.of.map((one) => this.text(one)).join(',')})`;
      case 'root':
        return `SQRT(${this.text(tree.of[0])})`;
      case 'power':
        return `POWER(${this.text(tree.of[0])},${tree.exponent})`;
      case 'bare':
      case 'stress':
        return this.text(tree.of[0]);
      case 'pick':
        return tree.branches.reduceRight(
          (rest, { when, then }) => `IF(${this.test(when)},${this.text(then)},${rest})`,
          this.text(tree.otherwise),
        );
    }
  }

  private test(condition: Condition): string {
    switch (condition.op) {
      case 'flag':
        return `${this.ref(this.places.get(condition)!)}=1`;
      case 'atMost':
        return `${this.text(condition.of[0])}<=${this.text(condition.of[1])}`;
      case 'below':
        return `${this.text(condition.of[0])}<${this.text(condition.of[1])}`;
      case 'not':
        return `NOT(${this.test(condition.of[0])})`;
      case 'all':
        return `AND(${condition.of.map((one) => this.test(one)).join(',')})`;
      case 'any':
        return `OR(${condition.of.map((one) => this.test(one)).join(',')})`;
    }
  }
}

/** What a solver is given: its own number, as the solver is no formula of the sheet either. */
const evaluate = (tree: Tree, facts: never): number => numberOf(tree, facts);

/** Writes trees as the formulas of one spreadsheet row. */
export const sheetRow = (trees: readonly Tree[]): SheetRow => {
  const builder = new Builder();
  for (const tree of trees) builder.gather(tree);
  const results = trees.map((tree) => builder.cell(tree));
  return { inputs: builder.inputs, formulas: builder.formulas, results };
};
