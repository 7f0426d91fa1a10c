/** Reads the number of a tree from facts, in N and mm. */
export type NumberReader = (facts: never) => number;

/** Adds from left to right. */
export const sum = (of: readonly NumberReader[]): NumberReader => {
  const [a, b] = of as [NumberReader, NumberReader];
  if (of.length === 2) return (facts) => a(facts) + b(facts);
  return (facts) => {
    let value = 0;
    for (let i = 0; i < of.length; i += 1) value += of[i]!(facts);
    return value;
  };
};

/** The lesser of two; not a number where one of them is none. */
const lesser = (x: number, y: number): number => (x < y ? x : x >= y ? y : Number.NaN);
const greater = (x: number, y: number): number => (x > y ? x : x <= y ? y : Number.NaN);

export const leastOf = (of: readonly NumberReader[]): NumberReader => {
  const [a, b] = of as [NumberReader, NumberReader];
  if (of.length === 2) return (facts) => lesser(a(facts), b(facts));
  return (facts) => {
    let value = a(facts);
    for (let i = 1; i < of.length; i += 1) value = lesser(value, of[i]!(facts));
    return value;
  };
};

export const mostOf = (of: readonly NumberReader[]): NumberReader => {
  const [a, b] = of as [NumberReader, NumberReader];
  if (of.length === 2) return (facts) => greater(a(facts), b(facts));
  return (facts) => {
    let value = a(facts);
    for (let i = 1; i < of.length; i += 1) value = greater(value, of[i]!(facts));
    return value;
  };
};

type Solve = (facts: never, ...values: number[]) => number;

/** Hands a solver its values without gathering them in a list, up to five. */
export const solved = (of: readonly NumberReader[], solve: Solve): NumberReader => {
  const [a, b, c, d, e] = of as [NumberReader, NumberReader, NumberReader, NumberReader, NumberReader];
  switch (of.length) {
    case 0:
      return (facts) => solve(facts);
    case 1:
      return (facts) => solve(facts, a(facts));
    case 2:
      return (facts) => solve(facts, a(facts), b(facts));
    case 3:
      return (facts) => solve(facts, a(facts), b(facts), c(facts));
    case 4:
      return (facts) => solve(facts, a(facts), b(facts), c(facts), d(facts));
    case 5:
      return (facts) => solve(facts, a(facts), b(facts), c(facts), d(facts), e(facts));
    default:
      return (facts) => solve(facts, ...of.map((one) => one(facts)));
  }
};

/** A power; a square is a product. */
export const raised = (base: NumberReader, exponent: number): NumberReader => {
  if (exponent === 2) {
    return (facts) => {
      const value = base(facts);
      return value * value;
    };
  }
  return (facts) => base(facts) ** exponent;
};
