import type { Dimension } from '../units/dimension.ts';
import { plain, significant } from '../units/figures.ts';
import { INCH, KIP, type UnitSystem, unitOf } from '../units/systems.ts';
import type { Values } from './number.ts';
import type { Tree } from './tree.ts';

/** Significant figures of the numbers put into a line, of the value that a line on the way gives, and of the result that closes a working. */
export const LINE_FIGURES = 6;
export const STEP_FIGURES = 5;
export const RESULT_FIGURES = 4;

/** A place in a line for the number of a quantity. */
export interface Slot {
  readonly of: Tree;
  /** In parentheses where it is below zero. */
  readonly wrapped: boolean;
  /** Behind a root sign, which closes over all but plain digits. */
  readonly rooted: boolean;
}

type Part = string | Slot;

/** A formula in one line, its numbers still to be put in, with how tightly it binds: sum 1, product 2, power 3, single term 4. */
export interface Line {
  readonly parts: readonly Part[];
  readonly binds: number;
}

/** How the symbols of a line are written, and its numbers in either system. */
export type Mode = 'symbols' | UnitSystem;

const MPA_IN_KSI = KIP / INCH ** 2;
const raisedDigits = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const superscript = (exponent: number): string => [...String(exponent)].map((d) => raisedDigits[Number(d)]).join('');

const PLAIN_DIGITS = /^[\d.]+$/;

/** A number behind a root sign. */
export const rooted = (text: string): string => (PLAIN_DIGITS.test(text) ? `√${text}` : `√(${text})`);

/** The one place that a line consists of, as long as nothing is done to it. */
const bareSlot = ({ parts: [first, second] }: Line): Slot | undefined =>
  second === undefined && typeof first === 'object' && !first.rooted ? first : undefined;

const parenthesised = (line: Line, least: number): readonly Part[] => {
  const slot = bareSlot(line);
  if (slot) return least > 1 && slot.of.op !== 'bare' ? [{ ...slot, wrapped: true }] : line.parts;
  return line.binds >= least ? line.parts : ['(', ...line.parts, ')'];
};

const isSlashed = ({ parts }: Line): boolean => parts.some((one) => typeof one === 'string' && one.includes(' / '));

/** A line over a divisor written out already. */
const over = (top: Line, divisor: readonly Part[]): Line => ({
  parts: [...parenthesised(top, isSlashed(top) ? 3 : 2), ' / ', ...divisor],
  binds: 2,
});

/** A line over a power of ten. */
export const scaled = (line: Line, scale: string): Line => ({
  parts: [...parenthesised(line, 2), ' / ', scale],
  binds: 2,
});

/** A value as a working states it, in the system's unit. */
export const quantity = (value: number, dimension: Dimension, system: UnitSystem, figures = LINE_FIGURES): string =>
  significant(value / unitOf(dimension, system).size, figures);

const joined = (all: readonly (readonly Part[])[], sign: string): readonly Part[] =>
  all.flatMap((parts, at) => (at > 0 ? [sign, ...parts] : parts));

const isNumeric = (text: string): boolean => /^[\d(]/.test(text) && !/[A-Za-zΑ-ω]/.test(text);

/** Writes formulas as lines, with the branches that `taken` gives. */
class LineWriter {
  constructor(
    private readonly mode: Mode,
    private readonly taken: (tree: Tree & { op: 'pick' }) => Tree,
  ) {}

  write(tree: Tree): Line {
    switch (tree.op) {
      case 'literal':
        return { parts: [plain(tree.value, 6)], binds: 4 };
      case 'constant':
      case 'given':
      case 'step':
        return this.leaf(tree, tree.symbol);
      case 'found':
        return this.leaf(tree, tree.method);
      case 'times':
        return this.product(this.each(tree.of));
      case 'over':
        return over(this.write(tree.of[0]), parenthesised(this.write(tree.of[1]), 3));
      case 'plus':
        return {
          parts: joined(
            this.each(tree.of).map((one) => parenthesised(one, 1)),
            ' + ',
          ),
          binds: 1,
        };
      case 'minus': {
        const [a, b] = [this.write(tree.of[0]), this.write(tree.of[1])];
        return { parts: [...parenthesised(a, 1), ' − ', ...parenthesised(b, 2)], binds: 1 };
      }
      case 'least':
      case 'most': {
        const inner = joined(
          this.each(tree.of).map(({ parts }) => parts),
          '; ',
        );
        return { parts: [tree.op === 'least' ? 'min(' : 'max(', ...inner, ')'], binds: 4 };
      }
      case 'root':
        return this.root(this.write(tree.of[0]));
      case 'power':
        return this.power(this.write(tree.of[0]), tree.exponent);
      case 'bare':
        return this.mode === 'symbols' ? this.write(tree.of[0]) : this.leaf(tree, '');
      case 'stress':
        return this.stress(this.write(tree.of[0]));
      case 'pick':
        return this.write(this.taken(tree));
    }
  }

  private each(trees: readonly Tree[]): Line[] {
    return trees.map((one) => this.write(one));
  }

  private leaf(of: Tree, symbol: string): Line {
    return { parts: [this.mode === 'symbols' ? symbol : { of, wrapped: false, rooted: false }], binds: 4 };
  }

  private product(factors: readonly Line[]): Line {
    const all = factors.map((one) => parenthesised(one, one.binds === 2 && isSlashed(one) ? 3 : 2));
    if (this.mode !== 'symbols') return { parts: joined(all, ' × '), binds: 2 };
    const text = all
      .map((parts) => parts.join(''))
      .reduce((left, right) => `${left}${isNumeric(right) ? ' × ' : ' '}${right}`);
    return { parts: [text], binds: 2 };
  }

  private root(inner: Line): Line {
    const slot = bareSlot(inner);
    if (slot) return { parts: [{ ...slot, rooted: true }], binds: 4 };
    const [first, second] = inner.parts;
    const single = inner.binds === 4 && second === undefined && typeof first === 'string';
    return { parts: single ? [rooted(first)] : ['√(', ...inner.parts, ')'], binds: 4 };
  }

  private power(base: Line, exponent: number): Line {
    const raised = Number.isInteger(exponent) && exponent > 0 ? superscript(exponent) : `^${exponent}`;
    return { parts: [...parenthesised(base, 4), raised], binds: 3 };
  }

  private stress(line: Line): Line {
    return this.mode === 'in-kip' ? over(line, [significant(MPA_IN_KSI, LINE_FIGURES)]) : line;
  }
}

/** Neighbouring texts as one, so that a line is soon put together. */
const compact = ({ parts, binds }: Line): Line => {
  const all: Part[] = [];
  for (const part of parts) {
    const last = all.at(-1);
    if (typeof part === 'string' && typeof last === 'string') all[all.length - 1] = last + part;
    else all.push(part);
  }
  return { parts: all, binds };
};

/** A formula's line in symbols, or with places for its numbers in a system. */
export const lineOf = (tree: Tree, mode: Mode, taken: (tree: Tree & { op: 'pick' }) => Tree): Line =>
  compact(new LineWriter(mode, taken).write(tree));

/** Remembers what is so of a formula's own operations, steps and leaves left aside, whatever the facts. */
const isChoiceFree = (() => {
  const known = new WeakMap<Tree, boolean>();
  const holds = (tree: Tree): boolean => {
    const before = known.get(tree);
    if (before !== undefined) return before;
    const leaf = tree.op === 'step' || !('of' in tree);
    const found = tree.op !== 'pick' && (leaf || (tree as { of: readonly Tree[] }).of.every(holds));
    known.set(tree, found);
    return found;
  };
  return holds;
})();

const symbolLines = new WeakMap<Tree, string>();

/** The formula in symbols, with the branches that the values take. */
export const symbolsOf = (tree: Tree, values: Values): string => {
  const known = symbolLines.get(tree);
  if (known !== undefined) return known;
  const text = lineOf(tree, 'symbols', (pick) => values.taken(pick)).parts.join('');
  if (isChoiceFree(tree)) symbolLines.set(tree, text);
  return text;
};
