/** Scales of drawings in the series 1, 2, 5 (ISO 5455), the largest first; the last takes a piece of any length that a file may hold. */
export const standardScales: readonly number[] = Array.from(
  { length: 24 },
  (_, i) => [1, 2, 5][i % 3]! * 10 ** Math.floor(i / 3),
);
