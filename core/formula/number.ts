import { leastOf, mostOf, type NumberReader, raised, solved, sum } from './readers.ts';
import { isShared } from './shared.ts';
import type { Condition, Tree } from './tree.ts';

export type { NumberReader } from './readers.ts';

type Test = (facts: never) => boolean;

/** Most steps that all standards and joints together may have. */
const CELLS = 1 << 14;

/** Shared steps are computed once a run, however many checks lean on them: the run in which each was computed, and its value. */
const ranAt = new Int32Array(CELLS);
const kept = new Float64Array(CELLS);
let cells = 0;
let run = 0;

/** Starts a run over new facts: what the last run kept is forgotten. */
export const newRun = (): void => {
  run = (run + 1) | 0;
};

const newCell = (): number => {
  if (cells === CELLS) throw new RangeError('more steps than there are cells');
  cells += 1;
  return cells - 1;
};

const readers = new WeakMap<Tree, NumberReader>();
/** Composes a tree into closures, once; the same tree always gives the same reader. */
export const numberOf = (tree: Tree): NumberReader => {
  const known = readers.get(tree);
  if (known) return known;
  const made = compose(tree);
  readers.set(tree, made);
  return made;
};

const compose = (tree: Tree): NumberReader => {
  switch (tree.op) {
    case 'literal':
    case 'constant': {
      const { value } = tree;
      return () => value;
    }
    case 'given':
      return tree.read;
    case 'times':
      return product(tree.of);
    case 'plus':
      return sum(tree.of.map(numberOf));
    case 'least':
      return leastOf(tree.of.map(numberOf));
    case 'most':
      return mostOf(tree.of.map(numberOf));
    case 'over': {
      const [a, b] = [numberOf(tree.of[0]), numberOf(tree.of[1])];
      return (facts) => a(facts) / b(facts);
    }
    case 'minus': {
      const [a, b] = [numberOf(tree.of[0]), numberOf(tree.of[1])];
      return (facts) => a(facts) - b(facts);
    }
    case 'root': {
      const a = numberOf(tree.of[0]);
      return (facts) => Math.sqrt(a(facts));
    }
    case 'power':
      return raised(numberOf(tree.of[0]), tree.exponent);
    // N/mm2 is MPa, so both directions are the same number.
    case 'bare':
    case 'stress':
      return numberOf(tree.of[0]);
    case 'pick':
      return chosen(tree.branches, numberOf(tree.otherwise));
    case 'found':
      return solved(tree.of.map(numberOf), tree.solve);
    case 'step':
      return isShared(tree) ? remembered(numberOf(tree.of[0])) : numberOf(tree.of[0]);
  }
};

const remembered = (inner: NumberReader): NumberReader => {
  const cell = newCell();
  return (facts) => {
    if (ranAt[cell] === run) return kept[cell]!;
    const value = inner(facts);
    ranAt[cell] = run;
    kept[cell] = value;
    return value;
  };
};

/** Multiplies from left to right; constants that lead are multiplied once, in the same order, so no bit changes. */
const product = (of: readonly Tree[]): NumberReader => {
  let leading = 1;
  let at = 0;
  for (; at < of.length; at += 1) {
    const one = of[at]!;
    if (one.op !== 'literal' && one.op !== 'constant') break;
    leading *= one.value;
  }
  const rest = of.slice(at).map(numberOf);
  const k = leading;
  const [a, b, c, d] = rest as [NumberReader, NumberReader, NumberReader, NumberReader];
  switch (rest.length) {
    case 0:
      return () => k;
    case 1:
      return (facts) => k * a(facts);
    case 2:
      return (facts) => k * a(facts) * b(facts);
    case 3:
      return (facts) => k * a(facts) * b(facts) * c(facts);
    case 4:
      return (facts) => k * a(facts) * b(facts) * c(facts) * d(facts);
    default:
      return (facts) => {
        let value = k;
        for (let i = 0; i < rest.length; i += 1) value *= rest[i]!(facts);
        return value;
      };
  }
};

const chosen = (branches: readonly { when: Condition; then: Tree }[], otherwise: NumberReader): NumberReader => {
  const tests = branches.map(({ when }) => testOf(when));
  const values = branches.map(({ then }) => numberOf(then));
  const [firstTest, firstValue] = [tests[0]!, values[0]!];
  if (tests.length === 1) return (facts) => (firstTest(facts) ? firstValue(facts) : otherwise(facts));
  return (facts) => {
    for (let at = 0; at < tests.length; at += 1) if (tests[at]!(facts)) return values[at]!(facts);
    return otherwise(facts);
  };
};

/** Composes a condition into a closure. */
export const testOf = (condition: Condition): Test => {
  switch (condition.op) {
    case 'flag':
      return condition.read;
    case 'atMost': {
      const [a, b] = [numberOf(condition.of[0]), numberOf(condition.of[1])];
      return (facts) => a(facts) <= b(facts);
    }
    case 'below': {
      const [a, b] = [numberOf(condition.of[0]), numberOf(condition.of[1])];
      return (facts) => a(facts) < b(facts);
    }
    case 'not': {
      const one = testOf(condition.of[0]);
      return (facts) => !one(facts);
    }
    case 'all': {
      return combined(condition.of, false);
    }
    case 'any': {
      return combined(condition.of, true);
    }
  }
};

/** All or any of several conditions: the first that comes out as `decisive` settles it. */
const combined = (conditions: readonly Condition[], decisive: boolean): Test => {
  const tests = conditions.map(testOf);
  return (facts) => {
    for (let at = 0; at < tests.length; at += 1) if (tests[at]!(facts) === decisive) return decisive;
    return !decisive;
  };
};
