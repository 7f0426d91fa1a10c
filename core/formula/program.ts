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

/** Numbers that a gate takes in a row. */
const GATE = 3;

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
  /** Of each gate: the cell of its condition, its number, where to go on if it is met. */
  private readonly rows: number[] = [];
  private cells = 0;

  write(groups: readonly Group[]): { readonly program: Program; readonly places: readonly Place[] } {
    const asked = groups.map(({ gates, of, always }) => ({
      always: always.map((one) => one && this.ask(one)),
      gates: gates.map(({ when, closes }) => ({ when: this.askGate(when), closes })),
      of: of.map((one) => one && this.ask(one)),
    }));
    this.nodes.literal(0);
    this.nodes.literal(1);
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
    const code = this.codeWithRows();
    return { places, program: { code, cells, reads, flags, firstFact: constants.length, solvers, solvedAt } };
  }

  /** Rows of gates stand behind the instructions. */
  private codeWithRows(): Int32Array {
    const { code, rows } = this;
    for (let at = 0; at < code.length; at += 4) if (code[at] === does.gates) code[at + 2]! += code.length;
    return Int32Array.from([...code, ...rows]);
  }

  private ask(one: Tree | Condition): Node {
    const node = this.nodes.of(one);
    node.uses += 1;
    return node;
  }

  /** A gate is looked at in a row with others, so its condition is settled at the head. */
  private askGate(when: Condition): Node {
    const node = this.ask(when);
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

  /** Lets a jump written before go on from here. */
  private land(jump: number): void {
    this.code[jump + 1] = this.code.length;
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
    const ends: { readonly row: number; readonly closes: boolean }[] = [];
    let first = 0;
    gates.forEach(({ when, closes }, at) => {
      // What leans on a solver is looked at only where no gate before it is met.
      if (when.solved) {
        this.putGates(gate, at - first);
        first = at;
      }
      ends.push({ row: this.rows.push(this.value(when), at, 0) - 1, closes });
    });
    this.putGates(gate, gates.length - first);
    const open = this.code.length;
    const cells = of.map((one) => one && this.value(one));
    for (const { row, closes } of ends) this.rows[row] = closes ? this.code.length : open;
    return { gate, of: cells, always: free };
  }

  /** Looks at the gates written down last. */
  private putGates(gate: number, count: number): void {
    this.put(does.gates, gate, this.rows.length - GATE * count, count);
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
      case 'all':
        this.choose(
          a,
          () => this.fillFrom(b, cell),
          () => this.put(does.copy, cell, this.literal(0)),
        );
        return;
      case 'any':
        this.choose(
          a,
          () => this.put(does.copy, cell, this.literal(1)),
          () => this.fillFrom(b, cell),
        );
        return;
      default:
        this.put(does[op as 'times'], cell, this.value(a), b ? this.value(b) : 0);
    }
  }

  private choose(when: Node, then: () => void, otherwise: () => void): void {
    const no = this.put(does.goUnless, 0, this.value(when));
    then();
    const end = this.put(does.go, 0);
    this.land(no);
    otherwise();
    this.land(end);
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
}

/** Writes groups of formulas as one program, and says where their values stand after a run. */
export const programOf = (groups: readonly Group[]): { readonly program: Program; readonly places: readonly Place[] } =>
  new Writer().write(groups);
