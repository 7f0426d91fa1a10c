/**
 * Tees of two plain rectangles, as handbooks tabulate the section behind a single cope: flange b x t_f, stem t_w thick, `depth` over all,
 * root fillets left out. mm; depth > t_f.
 */

/** Elastic modulus to the free edge of the stem, mm³. */
export const plainTeeModulus = (b: number, tf: number, tw: number, depth: number): number => {
  const stem = depth - tf;
  const [flangeArea, stemArea] = [b * tf, tw * stem];
  const centroid = (flangeArea * (tf / 2) + stemArea * (tf + stem / 2)) / (flangeArea + stemArea);
  const inertia =
    (flangeArea * tf ** 2 + stemArea * stem ** 2) / 12 +
    flangeArea * (centroid - tf / 2) ** 2 +
    stemArea * (tf + stem / 2 - centroid) ** 2;
  return inertia / (depth - centroid);
};

/** Plastic modulus, mm³. */
export const plainTeePlasticModulus = (b: number, tf: number, tw: number, depth: number): number => {
  const stem = depth - tf;
  const half = (b * tf + tw * stem) / 2;
  if (half <= b * tf) {
    const axis = half / b;
    return (b * (axis ** 2 + (tf - axis) ** 2)) / 2 + tw * stem * (tf + stem / 2 - axis);
  }
  const below = half / tw;
  return (tw * (below ** 2 + (stem - below) ** 2)) / 2 + b * tf * (stem - below + tf / 2);
};
