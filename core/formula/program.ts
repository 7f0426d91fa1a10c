import { type Flag, type Node, Nodes, type Read, type Solve } from './nodes.ts';
import { does, type Program, type Solver } from './run.ts';
import type { Condition, Tree } from './tree.ts';

/** Formulas that stand behind the same gates. */
export interface Group {
  /** The first that is met is noted; where it closes, the formulas are not worked out. */
  readonly gates: readonly { readonly when: Condition; readonly closes: boolean }[];
  readonly of: readonly (Tree | Condition | undefined)[];
  /** Worked out whatever the gates say. */
  readonly always: readonly (Tree | Condition | undefined)[];
}

/** Cells in which a run leaves what a group comes to. */
export interface Place {
  /** Number of the first gate that is met; -1 where none is. */
  readonly gate: number;
  /** The formulas' values, in their order; of a condition 1 or 0. Of no meaning behind a closed gate. */
  readonly of: readonly (number | undefined)[];
  readonly always: readonly (number | undefined)[];
}

interface Asked {
  readonly gates: readonly { readonly when: Node; readonly closes: boolean }[];
  readonly of: readonly (Node | undefined)[];
  readonly always: readonly (Node | undefined)[];
}

/**
 * Writes groups of formulas as one program. What several lean on is worked out once, at the head; a solver runs when it is first needed, and
 * once a run; what only one leans on is worked out behind its gates and within the branch that the facts take.
 */
class Writer {
  private readonly nodes = new Nodes();
  private readonly cellOf = new Map<Node, number>();
  private readonly solverOf = new Map<Node, { readonly at: number; readonly cell: number }>();
  private readonly code: number[] = [];
  private readonly solvers: Solver[] = [];
  private cells = 0;

  write(groups: readonly Group[]): { readonly program: Program; readonly places: readonly Place[] } {
    const asked = groups.map(({ gates, of, always }) => ({
      always: always.map((one) => one && this.ask(one)),
      gates: gates.map(({ when, closes }) => ({ when: this.ask(when), closes })),
      of: of.map((one) => one && this.ask(one)),
    }));
    const most = Math.max(1, ...groups.map(({ gates }) => gates.length));
    for (let at = -1; at <= most; at += 1) this.nodes.literal(at);
    const leaves = (op: Node['op']): Node[] => {
      const found = this.nodes.all.filter((one) => one.op === op);
      for (const one of found) this.cellOf.set(one, this.newCell());
      return found;
    };
    const constants = leaves('literal').map(({ is }) => is as number);
    const reads = leaves('given').map(({ is }) => is as Read);
    const flags = leaves('flag').map(({ is }) => is as Flag);
    this.writeHead();
    const places = asked.map((one) => this.group(one));
    this.put(does.stop, 0);
    const cells = new Float64Array(this.cells);
    cells.set(constants);
    const { solvers } = this;
    const solvedAt = new Int32Array(solvers.length);
    const code = Int32Array.from(this.code);
    return { places, program: { code, cells, reads, flags, firstFact: constants.length, solvers, solvedAt } };
  }

  private ask(one: Tree | Condition): Node {
    const node = this.nodes.of(one);
    node.uses += 1;
    return node;
  }

  private newCell(): number {
    this.cells += 1;
    return this.cells - 1;
  }

  private put(what: number, to: number, a = 0, b = 0): number {
    return this.code.push(what, to, a, b) - 4;
  }

  /** Lets jumps written before go on from here. */
  private land(jumps: readonly number[]): void {
    for (const at of jumps) this.code[at + 1] = this.code.length;
  }

  private literal(value: number): number {
    return this.cellOf.get(this.nodes.literal(value))!;
  }

  private writeHead(): void {
    for (const one of this.nodes.all) {
      if (one.uses < 2 || one.solved || this.cellOf.has(one)) continue;
      const cell = this.newCell();
      this.fill(one, cell);
      this.cellOf.set(one, cell);
    }
  }

  private group({ gates, of, always }: Asked): Place {
    const free = always.map((one) => one && this.value(one));
    const gate = this.newCell();
    const closed: number[] = [];
    const open: number[] = [];
    gates.forEach(({ when, closes }, at) => {
      const past = this.go(when, false);
      this.put(does.copy, gate, this.literal(at));
      (closes ? closed : open).push(this.put(does.go, 0));
      this.land(past);
    });
    this.put(does.copy, gate, this.literal(-1));
    this.land(open);
    const cells = of.map((one) => one && this.value(one));
    this.land(closed);
    return { gate, of: cells, always: free };
  }

  /** The cell that holds a node's value from here on. */
  private value(node: Node): number {
    const known = this.cellOf.get(node);
    if (known !== undefined) return known;
    if (node.op === 'found') return this.solver(node);
    const cell = this.newCell();
    this.fill(node, cell);
    return cell;
  }

  private fillFrom(node: Node, cell: number): void {
    if (this.cellOf.has(node) || node.op === 'found') this.put(does.copy, cell, this.value(node));
    else this.fill(node, cell);
  }

  /** Works a node out into a cell. */
  private fill({ op, of }: Node, cell: number): void {
    const [a, b, c] = of as [Node, Node, Node];
    switch (op) {
      case 'pick':
        this.choose(
          a,
          () => this.fillFrom(b, cell),
          () => this.fillFrom(c, cell),
        );
        return;
      case 'atMost':
      case 'below':
      case 'not':
      case 'all':
      case 'any': {
        const node = { op, of } as Node;
        this.choose(
          node,
          () => this.put(does.copy, cell, this.literal(1)),
          () => this.put(does.copy, cell, this.literal(0)),
        );
        return;
      }
      default:
        this.put(does[op as 'times'], cell, this.value(a), b ? this.value(b) : 0);
    }
  }

  private choose(when: Node, then: () => void, otherwise: () => void): void {
    const no = this.go(when, false);
    then();
    const end = this.put(does.go, 0);
    this.land(no);
    otherwise();
    this.land([end]);
  }

  /** A solver's values stand in the same cells wherever it is needed first. */
  private solver(node: Node): number {
    let found = this.solverOf.get(node);
    if (!found) {
      const of = node.of.map((one) => this.cellOf.get(one) ?? this.newCell());
      found = { at: this.solvers.push({ solve: node.is as Solve, of }) - 1, cell: this.newCell() };
      this.solverOf.set(node, found);
    }
    const { of } = this.solvers[found.at]!;
    node.of.forEach((one, at) => {
      if (!this.cellOf.has(one)) this.fillFrom(one, of[at]!);
    });
    this.put(does.solve, found.cell, found.at);
    return found.cell;
  }

  /** Jumps to land, taken where the condition comes out as `met`. */
  private go(when: Node, met: boolean): number[] {
    const known = this.cellOf.get(when);
    if (known !== undefined) return [this.put(met ? does.goIf : does.goUnless, 0, known)];
    const [a, b] = when.of as [Node, Node];
    switch (when.op) {
      case 'atMost':
        return [this.put(met ? does.goIfAtMost : does.goUnlessAtMost, 0, this.value(a), this.value(b))];
      case 'below':
        return [this.put(met ? does.goIfBelow : does.goUnlessBelow, 0, this.value(a), this.value(b))];
      case 'not':
        return this.go(a, !met);
      default: {
        const decisive = when.op === 'any';
        if (met === decisive) return [...this.go(a, met), ...this.go(b, met)];
        const past = this.go(a, decisive);
        const out = this.go(b, met);
        this.land(past);
        return out;
      }
    }
  }
}

/** Writes groups of formulas as one program, and says where their values stand after a run. */
export const programOf = (groups: readonly Group[]): { readonly program: Program; readonly places: readonly Place[] } =>
  new Writer().write(groups);
