import { type Constant, constant, over, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Dimension } from '../../units/dimension.ts';

/** A resistance factor φ and the safety factor Ω that stands for it in allowable strength design. From memory of ANSI/AISC 360-22. */
export interface Pair {
  readonly phi: Constant;
  readonly omega: Constant;
}

const pair = (sub: string, phi: number, omega: number): Pair => ({
  phi: constant(`φ${sub}`, phi),
  omega: constant(`Ω${sub}`, omega),
});

/** Yielding in shear, J4.2(a); webs of rolled I-shapes that cannot buckle, G2.1(a). */
export const shearYielding = pair('_v', 1, 1.5);
/** Shear of all other webs, G1. */
export const otherShear = pair('_v', 0.9, 1.67);
/** Bending, F1. */
export const bending = pair('_b', 0.9, 1.67);
/** Yielding in tension, J4.1(a). */
export const tensionYielding = pair('_t', 0.9, 1.67);
/** Rupture, block shear, bolts, bearing, welds: J2 to J4. */
export const rupture = pair('', 0.75, 2);

/** Load and resistance factor design, or allowable strength design: how a nominal strength becomes the available one. */
export interface Method {
  readonly id: 'aisc-360-lrfd' | 'aisc-360-asd';
  /** Factors of the method, for print. */
  readonly factors: readonly Constant[];
  /** φ R_n or R_n/Ω; `nominal` is the symbol of the nominal strength, R_n where not given. */
  readonly available: <D extends Dimension>(strength: Tree<D>, by: Pair, source: Source, nominal?: string) => Tree<D>;
}

const printed = [shearYielding, bending, tensionYielding, rupture];

export const lrfd: Method = {
  id: 'aisc-360-lrfd',
  factors: printed.map(({ phi }) => phi),
  available: <D extends Dimension>(strength: Tree<D>, { phi }: Pair, source: Source, nominal = 'R_n') =>
    step(`φ${nominal}`, times(phi, strength) as Tree as Tree<D>, source),
};

export const asd: Method = {
  id: 'aisc-360-asd',
  factors: printed.map(({ omega }) => omega),
  available: <D extends Dimension>(strength: Tree<D>, { omega }: Pair, source: Source, nominal = 'R_n') =>
    step(`${nominal}/Ω`, over(strength, omega) as Tree as Tree<D>, source),
};
