/** Digits that survive a conversion; what lies beyond is noise of the arithmetic. */
const DIGITS = 12;

/**
 * A value of one unit in another, both given as mm, N or MPa per unit. The result is the shortest decimal that comes back as the very value
 * it stands for, so that a size which meets a bound exactly meets it in the other unit too; where there is none, it is rounded to 12 digits.
 */
export const convertExactly = (value: number, from: number, to: number): number => {
  if (from === to) return value;
  const held = Number((value * from).toPrecision(DIGITS));
  const result = held / to;
  for (let digits = 1; digits <= 17; digits += 1) {
    const short = Number(result.toPrecision(digits));
    if (short * to === held) return short;
  }
  return Number(result.toPrecision(DIGITS));
};
