/** How far a formula is held against numbers that the program did not make, by the report's word for it. The same in every region. */
export const verifiedWords = {
  published: 'held against published numbers',
  theory: 'held against theory',
  hand: 'held against numbers worked by hand',
  none: 'no outside number checks this formula',
} as const;
