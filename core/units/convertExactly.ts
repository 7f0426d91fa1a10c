/** Digits that people write; a result of so few is meant exactly. */
const WRITTEN = 9;
/** Relative noise of two multiplications. */
const NOISE = 2 ** -51;

/**
 * A value of one unit in another, both given as mm, N or MPa per unit, so that 3/4 in is 19.05 mm and 19.05 mm is 0.75 in. Of results that no
 * short decimal states, the one that comes back as the very value it stands for, so that a size which meets a bound exactly meets it in the
 * other unit too; where there is none, the nearest number.
 */
export const convertExactly = (value: number, from: number, to: number): number => {
  if (from === to) return value;
  const held = value * from;
  const result = held / to;
  for (let digits = 1; digits <= 17; digits += 1) {
    const short = Number(result.toPrecision(digits));
    const off = Math.abs(short * to - held);
    if (off === 0 || (digits <= WRITTEN && off <= Math.abs(held) * NOISE)) return short;
  }
  return result;
};
