import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { Check } from '../../core/check/report.ts';
import { dn, fu, fub, fup, fy, fyp, Xu } from '../../core/end/given.ts';
import { quantity } from '../../core/formula/line.ts';
import { numberOf } from '../../core/formula/number.ts';
import type { Tree } from '../../core/formula/tree.ts';
import { standards } from '../../core/standards/known.ts';
import { unitOf } from '../../core/units/systems.ts';

/** A symbol and what stands for it, with its unit. */
export interface InUse {
  readonly symbol: string;
  readonly value: string;
}

const strengths: readonly Tree[] = [fy, fu, fyp, fup, fub, Xu, dn];

const symbolOf = (tree: Tree): string => (tree.op === 'constant' || tree.op === 'given' ? tree.symbol : '');

/** Symbols of a formula: letters, primes, subscript. */
const symbols = /[A-Za-zΑ-ω]+′*(?:_[A-Za-z0-9]+(?:,[A-Za-z0-9]+)*)?/g;

/** Factors and strengths that a check's working leans on, with their values. */
export const inUse = ({ facts, report }: ExaminedNumbers, { working = [] }: Check): InUse[] => {
  const named = new Set(working.flatMap(({ expression }) => expression.match(symbols) ?? []));
  const factors = standards[report.standard.id]?.factors ?? [];
  return [...factors, ...strengths]
    .filter((tree) => named.has(symbolOf(tree)))
    .map((tree) => {
      const unit = unitOf(tree.dimension, report.units).name;
      const value = quantity(numberOf(tree, facts), tree.dimension, report.units);
      return { symbol: symbolOf(tree), value: unit ? `${value} ${unit}` : value };
    });
};
