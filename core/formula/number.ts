import { greater, lesser } from './lesser.ts';
import type { Condition, Tree } from './tree.ts';

const product = (x: number, y: number): number => x * y;
const sum = (x: number, y: number): number => x + y;

/**
 * Values of formulas from one set of facts, tree by tree, in N and mm: for workings and for a formula alone. A step is worked out once. Many
 * formulas on many ends are better written as a program, which gives the same bits.
 */
export class Values {
  private readonly known = new Map<Tree, number>();

  constructor(private readonly facts: never) {}

  of(tree: Tree): number {
    switch (tree.op) {
      case 'literal':
      case 'constant':
        return tree.value;
      case 'given':
        return tree.read(this.facts);
      case 'times':
        return this.joined(tree.of, product);
      case 'plus':
        return this.joined(tree.of, sum);
      case 'least':
        return this.joined(tree.of, lesser);
      case 'most':
        return this.joined(tree.of, greater);
      case 'over':
        return this.of(tree.of[0]) / this.of(tree.of[1]);
      case 'minus':
        return this.of(tree.of[0]) - this.of(tree.of[1]);
      case 'root':
        return Math.sqrt(this.of(tree.of[0]));
      case 'power': {
        const base = this.of(tree.of[0]);
        return tree.exponent === 2 ? base * base : base ** tree.exponent;
      }
      // N/mm2 is MPa, so both directions are the same number.
      case 'bare':
      case 'stress':
        return this.of(tree.of[0]);
      case 'pick':
        return this.of(this.taken(tree));
      case 'found':
      case 'step':
        return this.remembered(tree);
    }
  }

  /** Place of the branch that the facts take; past the last for what is taken otherwise. */
  branch({ branches }: Tree & { op: 'pick' }): number {
    let at = 0;
    while (at < branches.length && !this.met(branches[at]!.when)) at += 1;
    return at;
  }

  /** The branch that the facts take. */
  taken(pick: Tree & { op: 'pick' }): Tree {
    return pick.branches[this.branch(pick)]?.then ?? pick.otherwise;
  }

  met(condition: Condition): boolean {
    switch (condition.op) {
      case 'flag':
        return condition.read(this.facts);
      case 'atMost':
        return this.of(condition.of[0]) <= this.of(condition.of[1]);
      case 'below':
        return this.of(condition.of[0]) < this.of(condition.of[1]);
      case 'not':
        return !this.met(condition.of[0]);
      case 'all':
        return condition.of.every((one) => this.met(one));
      case 'any':
        return condition.of.some((one) => this.met(one));
    }
  }

  /** From left to right. */
  private joined(of: readonly Tree[], join: (x: number, y: number) => number): number {
    let value = this.of(of[0]!);
    for (let at = 1; at < of.length; at += 1) value = join(value, this.of(of[at]!));
    return value;
  }

  private remembered(tree: Tree & { op: 'found' | 'step' }): number {
    const known = this.known.get(tree);
    if (known !== undefined) return known;
    const value =
      tree.op === 'step' ? this.of(tree.of[0]) : tree.solve(this.facts, ...tree.of.map((one) => this.of(one)));
    this.known.set(tree, value);
    return value;
  }
}

/** The value of one formula, N and mm. */
export const numberOf = (tree: Tree, facts: object): number => new Values(facts as never).of(tree);
