import type { Dimension, Known, Over, Product, Pure, Root, Stress, Times } from '../units/dimension.ts';
import { dimensionOf, powersOf } from '../units/dimension.ts';

/** Where a formula comes from: read in a published secondary source, from memory of the standard, a published method that is no clause, common practice. */
export type Basis = 'seen' | 'memory' | 'research' | 'practice';

/** Clause (or method) and standing of a step. */
export interface Source {
  readonly clause: string;
  readonly basis: Basis;
}

/** One way that a choice may go. */
export interface Branch {
  readonly when: Condition;
  readonly then: Tree;
}

type Shape =
  | { readonly op: 'literal'; readonly value: number }
  | { readonly op: 'constant'; readonly symbol: string; readonly value: number }
  | { readonly op: 'given'; readonly symbol: string; readonly read: (facts: never) => number }
  | { readonly op: 'times' | 'plus' | 'least' | 'most'; readonly of: readonly Tree[] }
  | { readonly op: 'over' | 'minus'; readonly of: readonly [Tree, Tree] }
  | { readonly op: 'root'; readonly of: readonly [Tree] }
  | { readonly op: 'power'; readonly of: readonly [Tree]; readonly exponent: number }
  | { readonly op: 'bare' | 'stress'; readonly of: readonly [Tree] }
  | { readonly op: 'pick'; readonly branches: readonly Branch[]; readonly otherwise: Tree }
  | {
      readonly op: 'found';
      readonly of: readonly Tree[];
      readonly solve: (facts: never, ...values: number[]) => number;
      readonly method: string;
    }
  | {
      readonly op: 'step';
      readonly symbol: string;
      readonly of: readonly [Tree];
      readonly source?: Source;
      readonly note?: string;
    };

/** A quantity written as a formula; its dimension is part of its type, so that stress + area does not compile. */
export type Tree<D extends Dimension = Dimension> = Shape & { readonly dimension: D };

/** A named number, as a standard lists its factors. */
export type Constant<D extends Dimension = Dimension> = Tree<D> & { readonly op: 'constant' };

/** A choice that depends on the input. */
export type Condition =
  | { readonly op: 'atMost' | 'below'; readonly of: readonly [Tree, Tree] }
  | {
      readonly op: 'flag';
      readonly read: (facts: never) => boolean;
      readonly text: string;
      readonly called: string;
      /** What it comes to where no more than the kind of facts is known; undefined where they decide. */
      readonly beforehand?: (kind: string) => boolean | undefined;
    }
  | { readonly op: 'not'; readonly of: readonly [Condition] }
  | { readonly op: 'all' | 'any'; readonly of: readonly Condition[] };

export type Term = Tree | number;
type DimensionOf<T> = T extends number ? Pure : T extends Tree<infer D> ? D : never;
type DimensionsOf<T extends readonly Term[]> = { [K in keyof T]: DimensionOf<T[K]> };
/** What may be added to, or compared with, a term of this dimension. */
type Like<T> = DimensionOf<T> extends Pure ? Tree<Pure> | number : Tree<DimensionOf<T>>;

const make = <D extends Dimension>(shape: Shape, dimension: Dimension): Tree<D> =>
  ({ ...shape, dimension }) as unknown as Tree<D>;

/** A bare number counts as a pure ratio. */
const tree = (term: Term): Tree => (typeof term === 'number' ? make({ op: 'literal', value: term }, '0,0') : term);

const combined = (of: readonly Tree[], sign: 1 | -1 = 1): Dimension => {
  let length = 0;
  let force = 0;
  of.forEach((one, at) => {
    const [l, f] = powersOf(one.dimension);
    const s = at > 0 ? sign : 1;
    length += s * l;
    force += s * f;
  });
  return dimensionOf(length, force);
};

/** A named number fixed by a standard or a method, in N and mm. */
export const constant = <D extends Dimension = Pure>(symbol: string, value: number, dimension?: D): Constant<D> =>
  make<D>({ op: 'constant', symbol, value }, dimension ?? '0,0') as Constant<D>;

/** Makes the builder of quantities read from facts of one kind. */
export const givenOf =
  <F>() =>
  <D extends Dimension>(symbol: string, dimension: D, read: (facts: F) => number): Tree<D> =>
    make({ op: 'given', symbol, read: read as (facts: never) => number }, dimension);

/**
 * Makes the builder of yes-or-no facts of one kind; `text` says in words what is true when it holds and stands in workings. Where a working
 * need not say it, `text` is empty and `called` names the fact for lists of formulas.
 */
export const flagOf =
  <F>() =>
  (
    text: string,
    read: (facts: F) => boolean,
    called: string = text,
    beforehand?: (kind: string) => boolean | undefined,
  ): Condition => ({
    op: 'flag',
    text,
    called,
    read: read as (facts: never) => boolean,
    ...(beforehand && { beforehand }),
  });

export const times = <const T extends readonly Term[]>(...of: T): Tree<Known<Product<DimensionsOf<T>>>> => {
  const trees = of.map(tree);
  return make({ op: 'times', of: trees }, combined(trees));
};

export const over = <A extends Term, B extends Term>(a: A, b: B): Tree<Known<Over<DimensionOf<A>, DimensionOf<B>>>> => {
  const of = [tree(a), tree(b)] as const;
  return make({ op: 'over', of }, combined(of, -1));
};

const alike =
  (op: 'plus' | 'least' | 'most') =>
  <A extends Term>(first: A, ...rest: NoInfer<Like<A>>[]): Tree<DimensionOf<A>> => {
    const of = [tree(first), ...(rest as Term[]).map(tree)];
    return make({ op, of }, of[0]!.dimension);
  };

export const plus = alike('plus');
/** The least of several quantities. */
export const least = alike('least');
/** The greatest of several quantities. */
export const most = alike('most');

export const minus = <A extends Term>(a: A, b: NoInfer<Like<A>>): Tree<DimensionOf<A>> => {
  const of = [tree(a), tree(b as Term)] as const;
  return make({ op: 'minus', of }, of[0].dimension);
};

export const root = <A extends Term>(a: A): Tree<Known<Root<DimensionOf<A>>>> => {
  const of = [tree(a)] as const;
  const [length, force] = powersOf(of[0].dimension);
  return make({ op: 'root', of }, dimensionOf(length / 2, force / 2));
};

/** Square of a quantity. */
export const squared = <A extends Term>(a: A): Tree<Known<Times<DimensionOf<A>, DimensionOf<A>>>> => {
  const of = [tree(a)] as const;
  return make({ op: 'power', of, exponent: 2 }, combined([of[0], of[0]]));
};

/** Cube of a quantity. */
export const cubed = <A extends Term>(
  a: A,
): Tree<Known<Times<Times<DimensionOf<A>, DimensionOf<A>>, DimensionOf<A>>>> => {
  const of = [tree(a)] as const;
  return make({ op: 'power', of, exponent: 3 }, combined([of[0], of[0], of[0]]));
};

/** A pure ratio to a power that need not be whole. */
export const power = (a: Tree<Pure> | number, exponent: number): Tree<Pure> =>
  make({ op: 'power', of: [tree(a)], exponent }, '0,0');

/** A stress as the bare number of MPa: for formulas fitted in those units, such as 440 √(k/f_y). */
export const inMPa = (stress: Tree<Stress>): Tree<Pure> => make({ op: 'bare', of: [stress] }, '0,0');

/** The stress of which this pure number is the MPa. */
export const megapascals = (number: Tree<Pure>): Tree<Stress> => make({ op: 'stress', of: [number] }, '-2,1');

/** The first branch whose condition is met, else the last. */
export const pick = <A extends Tree>(
  branches: readonly (readonly [Condition, A])[],
  otherwise: NoInfer<Tree<DimensionOf<A>>>,
): Tree<DimensionOf<A>> =>
  make({ op: 'pick', branches: branches.map(([when, then]) => ({ when, then })), otherwise }, otherwise.dimension);

/** A quantity that a solver finds from others; `method` says in words how, and stands in the working. */
export const foundOf =
  <F>() =>
  <D extends Dimension>(
    dimension: D,
    method: string,
    of: readonly Tree[],
    solve: (facts: F, ...values: number[]) => number,
  ): Tree<D> =>
    make({ op: 'found', of, method, solve: solve as (facts: never, ...values: number[]) => number }, dimension);

/** A named line of the working. */
export const step = <D extends Dimension>(symbol: string, of: Tree<D>, source?: Source, note?: string): Tree<D> =>
  make({ op: 'step', symbol, of: [of], ...(source && { source }), ...(note && { note }) }, of.dimension);

export const atMost = <A extends Term>(a: A, b: NoInfer<Like<A>>): Condition => ({
  op: 'atMost',
  of: [tree(a), tree(b as Term)],
});
export const below = <A extends Term>(a: A, b: NoInfer<Like<A>>): Condition => ({
  op: 'below',
  of: [tree(a), tree(b as Term)],
});
export const not = (one: Condition): Condition => ({ op: 'not', of: [one] });
export const all = (...of: Condition[]): Condition => ({ op: 'all', of });
export const any = (...of: Condition[]): Condition => ({ op: 'any', of });
