import type { Branch, Condition, Tree } from './tree.ts';

export type Read = (facts: never) => number;
export type Flag = (facts: never) => boolean;
export type Solve = (facts: never, ...values: number[]) => number;

type Leaf = 'literal' | 'given' | 'flag';
type Operation = 'times' | 'over' | 'plus' | 'minus' | 'least' | 'most' | 'root' | 'square' | 'power';
type Choice = 'pick' | 'atMost' | 'below' | 'not' | 'all' | 'any';

/** One operation of a formula; formulas that say the same are one node, wherever they stand. */
export interface Node {
  readonly op: Leaf | Operation | Choice | 'found';
  readonly of: readonly Node[];
  /** Its place among all. */
  readonly at: number;
  /** What a leaf is or reads, or a solver. */
  readonly is: number | Read | Flag | Solve | undefined;
  /** True where it leans on a solver, which costs much and must not run needlessly. */
  readonly solved: boolean;
  /** True where it leans on the quantity that may change after a run. */
  readonly changes: boolean;
  /** How many nodes lean on it. */
  uses: number;
}

const settled: Readonly<Partial<Record<Node['op'], (a: number, b: number) => number>>> = {
  times: (a, b) => a * b,
  over: (a, b) => a / b,
  plus: (a, b) => a + b,
  minus: (a, b) => a - b,
};

/** More than there are nodes; its cube is still a whole number that is told from the next. */
const PLACES = 2 ** 17;

/** Takes trees and conditions apart into nodes with at most three arguments each; the order of every sum and product is kept. */
export class Nodes {
  /** Each after those that it leans on. */
  readonly all: Node[] = [];
  private readonly made = new Map<Node['op'], Map<unknown, Node>>();
  private readonly seen = new Map<Tree | Condition, Node>();
  private readonly solvers = new Map<unknown, number>();

  /** `known`: the kind of all facts to come; `changing`: how the quantity that may change after a run is read. */
  constructor(
    private readonly known: string,
    private readonly changing?: Read,
  ) {}

  of(one: Tree | Condition): Node {
    const seen = this.seen.get(one);
    if (seen) return seen;
    const made = this.take(one);
    this.seen.set(one, made);
    return made;
  }

  /** Every node of one kind, in the order in which they were met. */
  kind(op: Node['op']): Node[] {
    return [...this.alike(op).values()];
  }

  literal(value: number): Node {
    return this.node('literal', [], value);
  }

  private take(one: Tree | Condition): Node {
    switch (one.op) {
      case 'literal':
      case 'constant':
        return this.literal(one.value);
      case 'given':
        return this.node(one.op, [], one.read);
      case 'flag': {
        const settled = one.beforehand?.(this.known);
        return settled === undefined ? this.node(one.op, [], one.read) : this.literal(Number(settled));
      }
      case 'bare':
      case 'stress':
      case 'step':
        // N/mm2 is MPa, so both directions are the same number.
        return this.of(one.of[0]);
      case 'power':
        if (one.exponent === 2) return this.node('square', [this.of(one.of[0])]);
        return this.node('power', [this.of(one.of[0]), this.literal(one.exponent)]);
      case 'pick':
        return this.choice(one.branches, one.otherwise);
      case 'found':
        return this.node('found', this.each(one.of), one.solve);
      case 'root':
        return this.node(one.op, this.each(one.of));
      case 'not': {
        const inner = this.of(one.of[0]);
        return typeof inner.is === 'number' ? this.literal(1 - inner.is) : this.node('not', [inner]);
      }
      case 'all':
      case 'any':
        return this.together(one.op, one.of);
      default:
        return this.each(one.of).reduce((a, b) => this.pair(one.op, a, b));
    }
  }

  /** Branches whose conditions are settled beforehand are taken or left out here. */
  private choice([first, ...rest]: readonly Branch[], otherwise: Tree): Node {
    if (!first) return this.of(otherwise);
    const when = this.of(first.when);
    if (when.is === 1) return this.of(first.then);
    if (when.is === 0) return this.choice(rest, otherwise);
    return this.node('pick', [when, this.of(first.then), this.choice(rest, otherwise)]);
  }

  private together(op: 'all' | 'any', conditions: readonly Condition[]): Node {
    const decides = op === 'all' ? 0 : 1;
    const open: Node[] = [];
    for (const one of conditions) {
      const node = this.of(one);
      if (node.is === decides) return node;
      if (typeof node.is !== 'number') open.push(node);
    }
    return open.length === 0 ? this.literal(1 - decides) : open.reduce((a, b) => this.node(op, [a, b]));
  }

  private each(of: readonly (Tree | Condition)[]): Node[] {
    return of.map((one) => this.of(one));
  }

  private pair(op: Node['op'], a: Node, b: Node): Node {
    const settle = settled[op];
    const fixed = settle && typeof a.is === 'number' && typeof b.is === 'number';
    return fixed ? this.literal(settle(a.is as number, b.is as number)) : this.node(op, [a, b]);
  }

  private node(op: Node['op'], of: readonly Node[], is?: Node['is']): Node {
    const alike = this.alike(op);
    const key = this.keyOf(of, is);
    const known = alike.get(key);
    if (known) return known;
    const solved = op === 'found' || of.some((one) => one.solved);
    const changes = (op === 'given' && is === this.changing) || of.some((one) => one.changes);
    const made: Node = { op, of, at: this.all.length, is, solved, changes, uses: 0 };
    for (const one of of) one.uses += 1;
    alike.set(key, made);
    this.all.push(made);
    return made;
  }

  /** Every node of one kind. */
  private alike(op: Node['op']): Map<unknown, Node> {
    let alike = this.made.get(op);
    if (!alike) {
      alike = new Map();
      this.made.set(op, alike);
    }
    return alike;
  }

  /** Tells one node from others of its kind: a leaf by what it is, a solver by itself and its places, an operation by up to three places. */
  private keyOf(of: readonly Node[], is: Node['is']): unknown {
    const [a, b, c] = of;
    if (!a) return Object.is(is, -0) ? '-0' : is;
    if (is === undefined) return a.at + PLACES * ((b ? b.at + 1 : 0) + PLACES * (c ? c.at + 1 : 0));
    let solver = this.solvers.get(is);
    if (solver === undefined) {
      solver = this.solvers.size;
      this.solvers.set(is, solver);
    }
    return `${solver} ${of.map(({ at }) => at).join(' ')}`;
  }
}
