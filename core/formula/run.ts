import { greater, lesser } from './lesser.ts';
import type { Flag, Read, Solve } from './nodes.ts';

/** A solver and the cells of its values. */
export interface Solver {
  readonly solve: Solve;
  readonly of: readonly number[];
}

/** Formulas as a list of instructions over numbered cells. An instruction is four numbers: what to do, the cell to fill (or where to go on), two cells to read. */
export interface Program {
  readonly code: Int32Array;
  /** What stands in the cells: constants, facts, then what the instructions find. */
  readonly cells: Float64Array;
  /** Facts are read once a run, into the cells from `firstFact` on; a flag is 1 or 0. */
  readonly reads: readonly Read[];
  readonly flags: readonly Flag[];
  readonly firstFact: number;
  /** Cell of the quantity that may change after a run; before `firstFact` where no formula reads it. */
  readonly changing: number;
  readonly solvers: readonly Solver[];
  /** The run in which each solver last ran. */
  readonly solvedAt: Int32Array;
}

/** What an instruction does. */
export const does = {
  stop: 0,
  times: 1,
  over: 2,
  plus: 3,
  minus: 4,
  least: 5,
  most: 6,
  root: 7,
  square: 8,
  power: 9,
  atMost: 10,
  below: 11,
  not: 12,
  copy: 13,
  go: 14,
  goUnless: 15,
  solve: 16,
  gates: 17,
  solveAnew: 18,
} as const;

const solved = ({ solve, of }: Solver, cells: Float64Array, facts: never): number => {
  const [a, b, c, d, e, f] = of as [number, number, number, number, number, number];
  switch (of.length) {
    case 1:
      return solve(facts, cells[a]!);
    case 2:
      return solve(facts, cells[a]!, cells[b]!);
    case 4:
      return solve(facts, cells[a]!, cells[b]!, cells[c]!, cells[d]!);
    case 5:
      return solve(facts, cells[a]!, cells[b]!, cells[c]!, cells[d]!, cells[e]!);
    case 6:
      return solve(facts, cells[a]!, cells[b]!, cells[c]!, cells[d]!, cells[e]!, cells[f]!);
    default:
      return solve(facts, ...of.map((one) => cells[one]!));
  }
};

const readFacts = ({ cells, reads, flags, firstFact }: Program, facts: never): void => {
  let at = firstFact;
  for (let i = 0; i < reads.length; i += 1, at += 1) cells[at] = reads[i]!(facts);
  for (let i = 0; i < flags.length; i += 1, at += 1) cells[at] = flags[i]!(facts) ? 1 : 0;
};

let runs = 0;

/** Runs a program over new facts; its cells then hold what was asked for. */
export const run = (program: Program, facts: never): void => {
  readFacts(program, facts);
  runs = (runs + 1) | 0;
  follow(program, facts, 0);
};

/** Works out what is asked for after a run from these instructions on, at another value of the quantity that may change. */
export const runAgain = (program: Program, facts: never, from: number, value: number): void => {
  const { cells, changing, firstFact } = program;
  if (changing >= firstFact) cells[changing] = value;
  follow(program, facts, from);
};

const follow = ({ code, cells: cell, solvers, solvedAt }: Program, facts: never, from: number): void => {
  let at = from;
  for (;;) {
    const to = code[at + 1]!;
    const a = code[at + 2]!;
    const b = code[at + 3]!;
    switch (code[at]) {
      case 0:
        return;
      case 1:
        cell[to] = cell[a]! * cell[b]!;
        break;
      case 2:
        cell[to] = cell[a]! / cell[b]!;
        break;
      case 3:
        cell[to] = cell[a]! + cell[b]!;
        break;
      case 4:
        cell[to] = cell[a]! - cell[b]!;
        break;
      case 5:
        cell[to] = lesser(cell[a]!, cell[b]!);
        break;
      case 6:
        cell[to] = greater(cell[a]!, cell[b]!);
        break;
      case 7:
        cell[to] = Math.sqrt(cell[a]!);
        break;
      case 8:
        cell[to] = cell[a]! * cell[a]!;
        break;
      case 9:
        cell[to] = cell[a]! ** cell[b]!;
        break;
      case 10:
        cell[to] = cell[a]! <= cell[b]! ? 1 : 0;
        break;
      case 11:
        cell[to] = cell[a]! < cell[b]! ? 1 : 0;
        break;
      case 12:
        cell[to] = cell[a] === 0 ? 1 : 0;
        break;
      case 13:
        cell[to] = cell[a]!;
        break;
      case 14:
        at = to;
        continue;
      case 15:
        if (cell[a] === 0) {
          at = to;
          continue;
        }
        break;
      case 16:
        if (solvedAt[a] !== runs) {
          cell[to] = solved(solvers[a]!, cell, facts);
          solvedAt[a] = runs;
        }
        break;
      case 18:
        cell[to] = solved(solvers[a]!, cell, facts);
        break;
      case 17: {
        // From `a` on, `b` gates: the condition's cell, the gate's number, where to go on if it is met.
        let gate = a;
        const end = a + 3 * b;
        while (gate < end && cell[code[gate]!] === 0) gate += 3;
        if (gate < end) {
          cell[to] = code[gate + 1]!;
          at = code[gate + 2]!;
          continue;
        }
        cell[to] = -1;
        break;
      }
    }
    at += 4;
  }
};
