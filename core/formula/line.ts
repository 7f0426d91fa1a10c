import type { Dimension } from '../units/dimension.ts';
import { plain, significant } from '../units/figures.ts';
import { INCH, KIP, type UnitSystem, unitOf } from '../units/systems.ts';
import type { Values } from './number.ts';
import type { Tree } from './tree.ts';

/** Significant figures of the numbers put into a line, of the value that a line on the way gives, and of the result that closes a working. */
export const LINE_FIGURES = 6;
export const STEP_FIGURES = 5;
export const RESULT_FIGURES = 4;

/** A formula in one line of text, with how tightly it binds: sum 1, product 2, power 3, single term 4. */
export interface Line {
  readonly text: string;
  readonly binds: number;
}

type Mode = 'symbols' | 'numbers';
/** In metric lines, forces are written in kN when nothing else carries newtons; otherwise all is in N and mm. */
export type ForceUnit = 'kN' | 'N';

const MPA_IN_KSI = KIP / INCH ** 2;
const raisedDigits = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const superscript = (exponent: number): string => [...String(exponent)].map((d) => raisedDigits[Number(d)]).join('');

export const parenthesised = (line: Line, least: number): string =>
  line.binds >= least ? line.text : `(${line.text})`;

/** A value as a working states it, in the system's unit. */
export const quantity = (value: number, dimension: Dimension, system: UnitSystem, figures = LINE_FIGURES): string =>
  significant(value / unitOf(dimension, system).size, figures);

const literals = new WeakMap<Tree, Line>();

const literalLine = (tree: Tree & { op: 'literal' }): Line => {
  const known = literals.get(tree);
  if (known) return known;
  const line: Line = { text: plain(tree.value, 6), binds: 4 };
  literals.set(tree, line);
  return line;
};

/** Writes formulas as lines, in symbols or with the numbers of one end in place. */
export class LineWriter {
  /** Quantities stand in many lines of an end, with one figure in all. */
  private readonly leaves = new Map<Tree, Line>();

  constructor(
    private readonly values: Values,
    private readonly system: UnitSystem,
    private readonly mode: Mode,
    private readonly force: ForceUnit,
  ) {}

  write(tree: Tree): Line {
    switch (tree.op) {
      case 'literal':
        return literalLine(tree);
      case 'constant':
      case 'given':
      case 'step':
        return this.mode === 'symbols' ? { text: tree.symbol, binds: 4 } : this.leaf(tree);
      case 'found':
        return this.mode === 'symbols' ? { text: tree.method, binds: 4 } : this.leaf(tree);
      case 'times':
        return this.product(tree.of.map((one) => this.write(one)));
      case 'over': {
        const [a, b] = [this.write(tree.of[0]), this.write(tree.of[1])];
        const top = a.text.includes(' / ') ? parenthesised(a, 3) : parenthesised(a, 2);
        return { text: `${top} / ${parenthesised(b, 3)}`, binds: 2 };
      }
      case 'plus':
        return { text: tree.of.map((one) => parenthesised(this.write(one), 1)).join(' + '), binds: 1 };
      case 'minus': {
        const [a, b] = [this.write(tree.of[0]), this.write(tree.of[1])];
        return { text: `${parenthesised(a, 1)} − ${parenthesised(b, 2)}`, binds: 1 };
      }
      case 'least':
      case 'most': {
        const name = tree.op === 'least' ? 'min' : 'max';
        return { text: `${name}(${tree.of.map((one) => this.write(one).text).join('; ')})`, binds: 4 };
      }
      case 'root':
        return this.root(this.write(tree.of[0]));
      case 'power':
        return this.power(this.write(tree.of[0]), tree.exponent);
      case 'bare':
        return this.mode === 'symbols' ? this.write(tree.of[0]) : this.bare(tree);
      case 'stress':
        return this.stress(this.write(tree.of[0]));
      case 'pick':
        return this.write(this.values.taken(tree));
    }
  }

  private leaf(tree: Tree): Line {
    const known = this.leaves.get(tree);
    if (known) return known;
    const value = this.values.of(tree) / this.sizeOf(tree.dimension);
    const line: Line = { text: significant(value, LINE_FIGURES), binds: value < 0 ? 1 : 4 };
    this.leaves.set(tree, line);
    return line;
  }

  /** Size of the unit in which numbers of this dimension stand within the line. */
  private sizeOf(dimension: Dimension): number {
    if (this.system === 'in-kip' || this.force === 'kN') return unitOf(dimension, this.system).size;
    return 1;
  }

  private product(factors: readonly Line[]): Line {
    const parts = factors.map((one) => {
      const quotient = one.binds === 2 && one.text.includes(' / ');
      return parenthesised(one, quotient ? 3 : 2);
    });
    const numeric = (text: string) => /^[\d(]/.test(text) && !/[A-Za-zΑ-ω]/.test(text);
    const text = parts.reduce((left, right) =>
      this.mode === 'numbers' || numeric(right) ? `${left} × ${right}` : `${left} ${right}`,
    );
    return { text, binds: 2 };
  }

  private root(inner: Line): Line {
    return { text: inner.binds === 4 && /^[\d.]+$/.test(inner.text) ? `√${inner.text}` : `√(${inner.text})`, binds: 4 };
  }

  private power(base: Line, exponent: number): Line {
    const whole = Number.isInteger(exponent) && exponent > 0;
    const tight = parenthesised(base, 4);
    return { text: whole ? `${tight}${superscript(exponent)}` : `${tight}^${exponent}`, binds: 3 };
  }

  private bare(tree: Tree): Line {
    return { text: significant(this.values.of(tree), LINE_FIGURES), binds: 4 };
  }

  private stress(line: Line): Line {
    if (this.mode === 'symbols' || this.system === 'mm-kN') return line;
    const top = line.text.includes(' / ') ? parenthesised(line, 3) : parenthesised(line, 2);
    return { text: `${top} / ${significant(MPA_IN_KSI, LINE_FIGURES)}`, binds: 2 };
  }
}

/** Remembers what is so of a formula's own operations, steps and leaves left aside, whatever the facts. */
const ofOperations = (breaks: (tree: Tree) => boolean): ((tree: Tree) => boolean) => {
  const known = new WeakMap<Tree, boolean>();
  const holds = (tree: Tree): boolean => {
    const before = known.get(tree);
    if (before !== undefined) return before;
    const leaf = tree.op === 'step' || !('of' in tree);
    const found = !breaks(tree) && (leaf || (tree as { of: readonly Tree[] }).of.every(holds));
    known.set(tree, found);
    return found;
  };
  return holds;
};

/** True where a line's symbols are the same whatever the facts. */
export const isChoiceFree = ofOperations(({ op }) => op === 'pick');
/** True where a line needs no word beside it: no choice is made, no unit differs. */
export const isSilent = ofOperations(({ op }) => op === 'pick' || op === 'bare');

const symbolLines = new WeakMap<Tree, Line>();

/** The formula in symbols, with the branches that the values take. */
export const symbolsOf = (tree: Tree, values: Values): Line => {
  const known = symbolLines.get(tree);
  if (known) return known;
  const line = new LineWriter(values, 'mm-kN', 'symbols', 'N').write(tree);
  if (isChoiceFree(tree)) symbolLines.set(tree, line);
  return line;
};
