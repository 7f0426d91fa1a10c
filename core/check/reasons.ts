const codes: string[] = [''];
const numbers = new Map<string, number>([['', 0]]);

/** The number under which a reason's code stands in a row; 0 for none. */
export const reasonNumber = (code: string): number => {
  const known = numbers.get(code);
  if (known !== undefined) return known;
  numbers.set(code, codes.length);
  return codes.push(code) - 1;
};

/** The code of a reason's number; empty for none. */
export const reasonCode = (number: number): string => codes[number]!;
