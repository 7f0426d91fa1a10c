import type { PowerSums } from './powerSums.ts';

/** Powers that occur in the formulas of this subject, from 1/mm4 to mm6. */
export type Power = '-6' | '-5' | '-4' | '-3' | '-2' | '-1' | '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8';

/** Dimension of a quantity as text: power of length (mm), power of force (N). */
export type Dimension = `${Power},${Power}`;

export type Pure = '0,0';
/** mm */
export type Length = '1,0';
/** mm2 */
export type Area = '2,0';
/** mm3: section modulus, first moment of area */
export type Modulus = '3,0';
/** mm4 */
export type Inertia = '4,0';
/** N */
export type Force = '0,1';
/** N/mm2 */
export type Stress = '-2,1';
/** N mm */
export type Moment = '1,1';
/** N/mm: force per length of weld */
export type LineForce = '-1,1';
/** 1/mm2: share of a force that acts on each unit of area */
export type PerArea = '-2,0';

type Negative = {
  '-6': '6';
  '-5': '5';
  '-4': '4';
  '-3': '3';
  '-2': '2';
  '-1': '1';
  '0': '0';
  '1': '-1';
  '2': '-2';
  '3': '-3';
  '4': '-4';
  '5': '-5';
  '6': '-6';
  '7': never;
  '8': never;
};

type AddPower<A extends Power, B extends Power> = B extends keyof PowerSums[A] ? PowerSums[A][B] : never;

type LengthOf<D extends Dimension> = D extends `${infer L extends Power},${Power}` ? L : never;
type ForceOf<D extends Dimension> = D extends `${Power},${infer F extends Power}` ? F : never;

/** Holds the compiler to a dimension where it works on types not yet known. */
export type Known<T> = T extends Dimension ? T : never;

/** The dimension of these powers. */
type Of<L, F> = L extends Power ? (F extends Power ? `${L},${F}` : never) : never;

/** Dimension of a product. */
export type Times<A extends Dimension, B extends Dimension> = Of<
  AddPower<LengthOf<A>, LengthOf<B>>,
  AddPower<ForceOf<A>, ForceOf<B>>
>;

/** Dimension of a quotient. */
export type Over<A extends Dimension, B extends Dimension> = Times<A, Of<Negative[LengthOf<B>], Negative[ForceOf<B>]>>;

/** Dimension of a product of several factors. */
export type Product<T extends readonly Dimension[], Sum extends Dimension = Pure> = T extends readonly [
  infer Head extends Dimension,
  ...infer Rest extends readonly Dimension[],
]
  ? Product<Rest, Times<Sum, Head>>
  : Sum;

type Halves = { '-6': '-3'; '-4': '-2'; '-2': '-1'; '0': '0'; '2': '1'; '4': '2'; '6': '3'; '8': '4' };
type HalfPower<P extends Power> = P extends keyof Halves ? Halves[P] : never;

/** Dimension of a square root; odd powers have none. */
export type Root<D extends Dimension> = Of<HalfPower<LengthOf<D>>, HalfPower<ForceOf<D>>>;

/** Powers of length and force as numbers. */
export const powersOf = (dimension: Dimension): [length: number, force: number] => {
  const [length, force] = dimension.split(',');
  return [Number(length), Number(force)];
};

/** The dimension with these powers of length and force. */
export const dimensionOf = (length: number, force: number): Dimension => `${length},${force}` as Dimension;
