import type { Node, Solve } from './nodes.ts';
import { does, type Solver } from './run.ts';

/** Numbers that a gate takes in a row. */
const GATE = 3;

/** A condition, the number under which it is noted, and whether it closes. */
export interface NodeGate {
  readonly when: Node;
  readonly closes: boolean;
  readonly number: number;
}

/** Writes nodes as instructions over numbered cells. */
export class CodeWriter {
  /** Cells whose value stands wherever they are read. */
  readonly cellOf = new Map<Node, number>();
  readonly solvers: Solver[] = [];
  cells = 0;
  /** True while what leans on a value that changes after a run is worked out anew. */
  anew = false;
  private readonly code: number[] = [];
  private readonly solverOf = new Map<Node, { readonly at: number; readonly cell: number }>();
  /** Of each gate: the cell of its condition, its number, where to go on if it is met. */
  private readonly rows: number[] = [];

  constructor(private readonly literal: (value: number) => Node) {}

  /** Where the next instruction will stand. */
  get next(): number {
    return this.code.length;
  }

  newCell(): number {
    this.cells += 1;
    return this.cells - 1;
  }

  stop(): void {
    this.put(does.stop, 0);
  }

  /** All that was written; rows of gates stand behind the instructions. */
  finished(): Int32Array {
    const { code, rows } = this;
    for (let at = 0; at < code.length; at += 4) if (code[at] === does.gates) code[at + 2]! += code.length;
    const all = new Int32Array(code.length + rows.length);
    all.set(code);
    all.set(rows, code.length);
    return all;
  }

  /** Works out a node whose value stands from here on. */
  settle(node: Node): void {
    const cell = this.newCell();
    this.fill(node, cell);
    this.cellOf.set(node, cell);
  }

  /** Looks at gates, then writes what stands behind those that close. The cell for the number of the first that is met. */
  behind(gates: readonly NodeGate[], write: () => void): number {
    const gate = this.newCell();
    const ends: { readonly row: number; readonly closes: boolean }[] = [];
    let first = 0;
    gates.forEach(({ when, closes, number }, at) => {
      // What leans on a solver is looked at only where no gate before it is met.
      if (when.solved) {
        this.putGates(gate, at - first);
        first = at;
      }
      ends.push({ row: this.rows.push(this.value(when), number, 0) - 1, closes });
    });
    this.putGates(gate, gates.length - first);
    const open = this.next;
    write();
    for (const { row, closes } of ends) this.rows[row] = closes ? this.next : open;
    return gate;
  }

  /** The cell that holds a node's value from here on. */
  value(node: Node): number {
    const known = this.known(node);
    if (known !== undefined) return known;
    if (node.op === 'found') return this.solver(node);
    const cell = this.newCell();
    this.fill(node, cell);
    return cell;
  }

  private known(node: Node): number | undefined {
    return this.anew && node.changes && node.op !== 'given' ? undefined : this.cellOf.get(node);
  }

  private put(what: number, to: number, a = 0, b = 0): number {
    return this.code.push(what, to, a, b) - 4;
  }

  /** Looks at the gates written down last. */
  private putGates(gate: number, count: number): void {
    this.put(does.gates, gate, this.rows.length - GATE * count, count);
  }

  /** Lets a jump written before go on from here. */
  private land(jump: number): void {
    this.code[jump + 1] = this.next;
  }

  private fillFrom(node: Node, cell: number): void {
    if (this.known(node) !== undefined || node.op === 'found') this.put(does.copy, cell, this.value(node));
    else this.fill(node, cell);
  }

  /** Works a node out into a cell. */
  private fill({ op, of }: Node, cell: number): void {
    const [a, b, c] = of as [Node, Node, Node];
    const from = (node: Node) => () => this.fillFrom(node, cell);
    const bit = (value: number) => () => this.put(does.copy, cell, this.cellOf.get(this.literal(value))!);
    if (op === 'pick') this.choose(a, from(b), from(c));
    else if (op === 'all') this.choose(a, from(b), bit(0));
    else if (op === 'any') this.choose(a, bit(1), from(b));
    else this.put(does[op as 'times'], cell, this.value(a), b ? this.value(b) : 0);
  }

  private choose(when: Node, then: () => void, otherwise: () => void): void {
    const no = this.put(does.goUnless, 0, this.value(when));
    then();
    const end = this.put(does.go, 0);
    this.land(no);
    otherwise();
    this.land(end);
  }

  /** A solver's values stand in the same cells wherever it is needed first; one that is to run anew is another solver. */
  private solver(node: Node): number {
    const anew = this.anew && node.changes;
    let found = anew ? undefined : this.solverOf.get(node);
    if (!found) {
      const of = node.of.map((one) => this.known(one) ?? this.newCell());
      found = { at: this.solvers.push({ solve: node.is as Solve, of }) - 1, cell: this.newCell() };
      if (!anew) this.solverOf.set(node, found);
    }
    const { of } = this.solvers[found.at]!;
    node.of.forEach((one, at) => {
      if (this.known(one) === undefined) this.fillFrom(one, of[at]!);
    });
    this.put(anew ? does.solveAnew : does.solve, found.cell, found.at);
    return found.cell;
  }
}
