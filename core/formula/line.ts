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
type ForceUnit = 'kN' | 'N';

const MPA_IN_KSI = KIP / INCH ** 2;
const raisedDigits = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const superscript = (exponent: number): string => [...String(exponent)].map((d) => raisedDigits[Number(d)]).join('');

const parenthesised = (line: Line, least: number): string => (line.binds >= least ? line.text : `(${line.text})`);

/** A value as a working states it, in the system's unit. */
export const quantity = (value: number, dimension: Dimension, system: UnitSystem, figures = LINE_FIGURES): string =>
  significant(value / unitOf(dimension, system).size, figures);

/** The leaves that stand in a line: steps count as leaves, untaken branches do not. */
const leavesOf = (tree: Tree, values: Values): readonly Tree[] => {
  switch (tree.op) {
    case 'literal':
    case 'constant':
    case 'given':
    case 'found':
    case 'step':
    case 'bare':
      return [tree];
    case 'pick':
      return leavesOf(values.taken(tree), values);
    default:
      return tree.of.flatMap((one) => leavesOf(one, values));
  }
};

const forceUnitOf = (tree: Tree, values: Values, result: Dimension): ForceUnit => {
  if (result !== '0,1' && result !== '1,1') return 'N';
  const carriers = leavesOf(tree, values).filter((leaf) => !leaf.dimension.endsWith(',0'));
  const alike = carriers.every((leaf) => leaf.dimension === '0,1') && (result === '0,1' || result === '1,1');
  const moments = carriers.every((leaf) => leaf.dimension === '1,1') && result === '1,1';
  return carriers.length > 0 && (alike || moments) ? 'kN' : 'N';
};

class Writer {
  constructor(
    private readonly values: Values,
    private readonly system: UnitSystem,
    private readonly mode: Mode,
    private readonly force: ForceUnit,
  ) {}

  write(tree: Tree): Line {
    switch (tree.op) {
      case 'literal':
        return { text: plain(tree.value, 6), binds: 4 };
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
    const value = this.values.of(tree) / this.sizeOf(tree.dimension);
    const text = significant(value, LINE_FIGURES);
    return { text, binds: value < 0 ? 1 : 4 };
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

/** Power of ten that takes a metric line's N and mm to the unit its value is stated in. */
const scaleOf = (force: ForceUnit, tree: Tree, values: Values, result: Dimension): string => {
  if (result !== '0,1' && result !== '1,1') return '';
  if (force === 'N') return result === '0,1' ? '10³' : '10⁶';
  const moments = leavesOf(tree, values).some((leaf) => leaf.dimension === '1,1');
  return result === '1,1' && !moments ? '10³' : '';
};

const choiceFree = new WeakMap<Tree, boolean>();

/** True where a line's symbols are the same whatever the facts. */
const isChoiceFree = (tree: Tree): boolean => {
  const known = choiceFree.get(tree);
  if (known !== undefined) return known;
  const leaf = tree.op === 'step' || !('of' in tree);
  const free = tree.op !== 'pick' && (leaf || (tree as { of: readonly Tree[] }).of.every(isChoiceFree));
  choiceFree.set(tree, free);
  return free;
};

const symbolLines = new WeakMap<Tree, Line>();

/** The formula in symbols, with the branches that the values take. */
export const symbolsOf = (tree: Tree, values: Values): Line => {
  const known = symbolLines.get(tree);
  if (known) return known;
  const line = new Writer(values, 'mm-kN', 'symbols', 'N').write(tree);
  if (isChoiceFree(tree)) symbolLines.set(tree, line);
  return line;
};

/** The formula with numbers in place; they work out to the system's unit of `result`. */
export const numbersOf = (tree: Tree, values: Values, system: UnitSystem, result: Dimension = tree.dimension): Line => {
  if (system === 'in-kip') return new Writer(values, system, 'numbers', 'N').write(tree);
  const force = forceUnitOf(tree, values, result);
  const line = new Writer(values, system, 'numbers', force).write(tree);
  const scale = scaleOf(force, tree, values, result);
  return scale ? { text: `${parenthesised(line, 2)} / ${scale}`, binds: 2 } : line;
};
