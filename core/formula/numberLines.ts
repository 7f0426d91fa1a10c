import type { Dimension } from '../units/dimension.ts';
import type { UnitSystem } from '../units/systems.ts';
import { type ForceUnit, isChoiceFree, type Line, LineWriter, parenthesised } from './line.ts';
import type { Values } from './number.ts';
import type { Tree } from './tree.ts';

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

/** Power of ten that takes a metric line's N and mm to the unit its value is stated in. */
const scaleOf = (force: ForceUnit, tree: Tree, values: Values, result: Dimension): string => {
  if (result !== '0,1' && result !== '1,1') return '';
  if (force === 'N') return result === '0,1' ? '10³' : '10⁶';
  const moments = leavesOf(tree, values).some((leaf) => leaf.dimension === '1,1');
  return result === '1,1' && !moments ? '10³' : '';
};

/** How a metric line states forces, and what takes it to its value's unit. */
interface Units {
  readonly force: ForceUnit;
  readonly scale: string;
}

const unitsKnown = new WeakMap<Tree, Units>();

const metricUnits = (tree: Tree, values: Values, result: Dimension): Units => {
  const fixed = result === tree.dimension && isChoiceFree(tree);
  const known = fixed ? unitsKnown.get(tree) : undefined;
  if (known) return known;
  const force = forceUnitOf(tree, values, result);
  const units = { force, scale: scaleOf(force, tree, values, result) };
  if (fixed) unitsKnown.set(tree, units);
  return units;
};

/** Writes formulas with the numbers of one end in place. */
export class NumberLines {
  private readonly inN: LineWriter;
  private readonly inkN: LineWriter;

  constructor(
    private readonly values: Values,
    private readonly system: UnitSystem,
  ) {
    this.inN = new LineWriter(values, system, 'numbers', 'N');
    this.inkN = new LineWriter(values, system, 'numbers', 'kN');
  }

  /** A formula's line; its numbers work out to the system's unit of `result`. */
  line(tree: Tree, result: Dimension = tree.dimension): Line {
    if (this.system === 'in-kip') return this.inN.write(tree);
    const { force, scale } = metricUnits(tree, this.values, result);
    const line = (force === 'kN' ? this.inkN : this.inN).write(tree);
    return scale ? { text: `${parenthesised(line, 2)} / ${scale}`, binds: 2 } : line;
  }
}
