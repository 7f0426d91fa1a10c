import { type Constant, constant } from '../../formula/tree.ts';
import type { Dimension, Pure } from '../../units/dimension.ts';

/** A bound of a rule: sizes and strengths that meet it exactly keep meeting it after conversion from inches and ksi. */
export const upTo = <D extends Dimension = Pure>(value: number, dimension?: D): Constant<D> =>
  constant(String(value), value * (1 + 1e-12), dimension);

/** The same for what has to reach a bound. */
export const from = (value: number): Constant<Pure> => constant(String(value), value * (1 - 1e-12));
