/** The lesser of two; not a number where one of them is none. */
export const lesser = (x: number, y: number): number => (x < y ? x : x >= y ? y : Number.NaN);
/** The greater of two; not a number where one of them is none. */
export const greater = (x: number, y: number): number => (x > y ? x : x <= y ? y : Number.NaN);
