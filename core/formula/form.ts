import type { Dimension } from '../units/dimension.ts';
import type { UnitSystem } from '../units/systems.ts';
import { comparedIn } from './comparedIn.ts';
import { type Line, lineOf, scaled } from './line.ts';
import type { Values } from './number.ts';
import type { Condition, Tree } from './tree.ts';

type Pick = Tree & { readonly op: 'pick' };
export type Step = Tree & { readonly op: 'step' };

/** In metric lines, forces are written in kN when nothing else carries newtons; otherwise all is in N and mm. */
export type ForceUnit = 'kN' | 'N';

/** What has to be said beside a line: a condition that was looked at, or a stress that a fitted formula takes in MPa. */
export type Remark = { readonly when: Condition; readonly met: boolean } | { readonly stress: Tree };

/** Which branch each choice takes, by its place; past the last for what is taken otherwise. */
type Choices = ReadonlyMap<Tree, number>;

const branchAt = ({ branches, otherwise }: Pick, at: number): Tree => branches[at]?.then ?? otherwise;

/** Conditions that are looked at until a branch is taken. */
const lookedAt = ({ branches }: Pick, at: number): readonly Condition[] =>
  branches.slice(0, at + 1).map(({ when }) => when);

/** Goes through a formula's own operations in the order of use, steps and leaves last; false from `visit` ends it. */
const through = (tree: Tree, choices: Choices, visit: (one: Tree) => boolean): boolean => {
  if (!visit(tree)) return false;
  if (tree.op === 'pick') {
    const at = choices.get(tree)!;
    const compared = lookedAt(tree, at).flatMap(comparedIn);
    return [...compared, branchAt(tree, at)].every((one) => through(one, choices, visit));
  }
  return tree.op === 'step' || !('of' in tree) || tree.of.every((one) => through(one, choices, visit));
};

/** The first choice that is not made yet. */
const openChoice = (tree: Tree, choices: Choices): Pick | undefined => {
  let open: Pick | undefined;
  through(tree, choices, (one) => {
    if (one.op === 'pick' && !choices.has(one)) open = one;
    return open === undefined;
  });
  return open;
};

const leadsOf = (tree: Tree, choices: Choices): readonly Step[] => {
  const leads = new Set<Step>();
  through(tree, choices, (one) => {
    if (one.op === 'step') leads.add(one);
    return true;
  });
  return [...leads];
};

const remarksOf = (tree: Tree, choices: Choices): readonly Remark[] => {
  if (tree.op === 'step') return [];
  if (tree.op === 'bare') return [{ stress: tree.of[0] }];
  if (tree.op !== 'pick') return 'of' in tree ? tree.of.flatMap((one) => remarksOf(one, choices)) : [];
  const at = choices.get(tree)!;
  const looked = lookedAt(tree, at).flatMap((when, place): readonly Remark[] => [
    ...comparedIn(when).flatMap((one) => remarksOf(one, choices)),
    { when, met: place === at },
  ]);
  return [...looked, ...remarksOf(branchAt(tree, at), choices)];
};

/** The quantities that stand in a line: steps count as leaves, untaken branches do not. */
const leavesOf = (tree: Tree, choices: Choices): readonly Tree[] => {
  if (tree.op === 'pick') return leavesOf(branchAt(tree, choices.get(tree)!), choices);
  const leaf = tree.op === 'step' || tree.op === 'found' || tree.op === 'bare' || !('of' in tree);
  return leaf ? [tree] : tree.of.flatMap((one) => leavesOf(one, choices));
};

const forceUnitOf = (leaves: readonly Tree[], result: Dimension): ForceUnit => {
  if (result !== '0,1' && result !== '1,1') return 'N';
  const carriers = leaves.filter(({ dimension }) => !dimension.endsWith(',0'));
  const alike = carriers.every(({ dimension }) => dimension === '0,1');
  const moments = carriers.every(({ dimension }) => dimension === '1,1') && result === '1,1';
  return carriers.length > 0 && (alike || moments) ? 'kN' : 'N';
};

/** Power of ten that takes a metric line's N and mm to the unit its value is stated in. */
const scaleOf = (force: ForceUnit, leaves: readonly Tree[], result: Dimension): string => {
  if (result !== '0,1' && result !== '1,1') return '';
  if (force === 'N') return result === '0,1' ? '10³' : '10⁶';
  const moments = leaves.some(({ dimension }) => dimension === '1,1');
  return result === '1,1' && !moments ? '10³' : '';
};

/** A line, and the unit in which it states forces. */
interface NumberLine {
  readonly line: Line;
  readonly force: ForceUnit;
}

/** The form that a formula, or that of a step, takes once its choices are made: all of its working but the numbers. */
export class Form {
  /** The steps that it leans on, in the order of use. */
  readonly leads: readonly Step[];
  readonly remarks: readonly Remark[];
  private inSymbols: string | undefined;
  private readonly inNumbers: { [system in UnitSystem]?: NumberLine } = {};

  constructor(
    private readonly formula: Tree,
    private readonly result: Dimension,
    private readonly choices: Choices,
  ) {
    this.leads = leadsOf(formula, choices);
    this.remarks = remarksOf(formula, choices);
  }

  get symbols(): string {
    this.inSymbols ??= this.line('symbols').parts.join('');
    return this.inSymbols;
  }

  /** The line whose numbers work out to the system's unit of the result. */
  numbers(system: UnitSystem): NumberLine {
    this.inNumbers[system] ??= this.laidOut(system);
    return this.inNumbers[system];
  }

  private laidOut(system: UnitSystem): NumberLine {
    const line = this.line(system);
    // Every quantity stands in the system's own unit, as in a metric line whose forces are in kN.
    if (system === 'in-kip') return { line, force: 'kN' };
    const leaves = leavesOf(this.formula, this.choices);
    const force = forceUnitOf(leaves, this.result);
    const scale = scaleOf(force, leaves, this.result);
    return { line: scale ? scaled(line, scale) : line, force };
  }

  private line(mode: 'symbols' | UnitSystem): Line {
    return lineOf(this.formula, mode, (pick) => branchAt(pick, this.choices.get(pick)!));
  }
}

/** A choice, and what follows from each branch, as far as ends have taken it. */
interface Fork {
  readonly pick: Pick;
  readonly choices: Choices;
  readonly next: Map<number, Fork | Form>;
}

const forms = new WeakMap<Tree, Fork | Form>();

const begun = (tree: Tree, choices: Choices): Fork | Form => {
  const [formula, result] = tree.op === 'step' ? [tree.of[0], tree.dimension] : [tree, tree.dimension];
  const pick = openChoice(formula, choices);
  return pick ? { pick, choices, next: new Map() } : new Form(formula, result, choices);
};

/** The form of a formula under the choices that the values make; kept, so that it is worked out once for all ends that make the same. */
export const formOf = (tree: Tree, values: Values): Form => {
  let at = forms.get(tree);
  if (!at) {
    at = begun(tree, new Map());
    forms.set(tree, at);
  }
  while (!(at instanceof Form)) {
    const { pick, choices, next }: Fork = at;
    const branch = values.branch(pick);
    let then = next.get(branch);
    if (!then) {
      then = begun(tree, new Map([...choices, [pick, branch]]));
      next.set(branch, then);
    }
    at = then;
  }
  return at;
};
