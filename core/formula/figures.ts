import { significant } from '../units/figures.ts';
import { type UnitSystem, unitOf } from '../units/systems.ts';
import type { ForceUnit, Form } from './form.ts';
import { LINE_FIGURES, rooted, type Slot } from './line.ts';
import type { Values } from './number.ts';
import type { Tree } from './tree.ts';

interface Figure {
  readonly text: string;
  readonly negative: boolean;
}

/** Puts the numbers of one end into lines; a quantity has one figure in all of them. */
export class Figures {
  private readonly known = { N: new Map<Tree, Figure>(), kN: new Map<Tree, Figure>() };

  constructor(
    private readonly values: Values,
    private readonly system: UnitSystem,
  ) {}

  /** A formula's line with the numbers in place; worked out, it gives the value in the system's unit. */
  line(form: Form): string {
    const { line, force } = form.numbers(this.system);
    let text = '';
    for (const part of line.parts) text += typeof part === 'string' ? part : this.inSlot(part, force);
    return text;
  }

  private inSlot({ of, wrapped, rooted: behindRoot }: Slot, force: ForceUnit): string {
    const { text, negative } = this.figure(of, force);
    if (behindRoot) return rooted(text);
    return wrapped && negative ? `(${text})` : text;
  }

  private figure(tree: Tree, force: ForceUnit): Figure {
    const known = this.known[force].get(tree);
    if (known) return known;
    const value = this.values.of(tree) / this.sizeOf(tree, force);
    const figure = { text: significant(value, LINE_FIGURES), negative: value < 0 };
    this.known[force].set(tree, figure);
    return figure;
  }

  /** Size of the unit in which a quantity stands within a line. */
  private sizeOf({ op, dimension }: Tree, force: ForceUnit): number {
    return op === 'bare' || force === 'N' ? 1 : unitOf(dimension, this.system).size;
  }
}
