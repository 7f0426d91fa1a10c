/**
 * A slice of a cross-section between two levels in which the width follows one law:
 * width(y) = base + grade (y - top) + factor sqrt(radius² - (y - centre)²).
 *
 * Flanges and webs have grade and factor 0, a sloping flange face a grade, root fillets and toes an arc.
 * Levels in mm, measured down from top of steel. The integrals over the whole band are kept, since most cuts leave most bands whole.
 */
export interface Band {
  readonly top: number;
  readonly bottom: number;
  /** Width at the top of the band without its arc, mm. */
  readonly base: number;
  /** Change of width per mm downward. */
  readonly grade: number;
  /** Number of arcs side by side: negative where they are hollow (root fillets), positive where they bulge (toes), 0 for none. */
  readonly factor: number;
  /** Radius of the arcs, mm. */
  readonly radius: number;
  /** Level of the arcs' centres, mm. */
  readonly centre: number;
  readonly whole: Moments;
}

/** Integrals over the width: of dA (mm²), of y dA (mm³), of y² dA (mm⁴), about top of steel. */
export interface Moments {
  readonly area: number;
  readonly first: number;
  readonly second: number;
}

type Law = Omit<Band, 'whole'>;

/** The band that follows the given law of width. */
export const band = (law: Law): Band => ({ ...law, whole: integrals(law, law.top, law.bottom) });

/** A band with straight edges: width `widthTop` at its top, `widthBottom` at its bottom, mm. */
export const straightBand = (top: number, bottom: number, widthTop: number, widthBottom = widthTop): Band =>
  band({
    top,
    bottom,
    base: widthTop,
    grade: bottom > top ? (widthBottom - widthTop) / (bottom - top) : 0,
    factor: 0,
    radius: 0,
    centre: top,
  });

/** The same band seen upside down in a section of depth `depth`, mm. */
export const mirrored = (it: Band, depth: number): Band =>
  band({
    top: depth - it.bottom,
    bottom: depth - it.top,
    base: it.base + it.grade * (it.bottom - it.top),
    grade: -it.grade,
    factor: it.factor,
    radius: it.radius,
    centre: depth - it.centre,
  });

/** Width of the section at the level y of this band, mm. */
export const widthAt = (it: Band, y: number): number => {
  const straight = it.base + it.grade * (y - it.top);
  return it.factor === 0 ? straight : straight + it.factor * halfChord(it.radius, y - it.centre);
};

/** Change of width per mm downward at the level y; unbounded where an arc runs level. */
export const widthSlope = (it: Band, y: number): number => {
  if (it.factor === 0) return it.grade;
  const s = y - it.centre;
  return it.grade - (it.factor * s) / halfChord(it.radius, s);
};

/** Integrals of the part of the band between two levels, from <= to; the band's ends close it. */
export const moments = (it: Band, from: number, to: number): Moments =>
  from <= it.top && to >= it.bottom ? it.whole : integrals(it, Math.max(from, it.top), Math.min(to, it.bottom));

/** Half the width of a circle at the distance s from its centre; as a product, since near its top the squares differ by rounding only. */
const halfChord = (radius: number, s: number): number => Math.sqrt(Math.max(0, (radius - s) * (radius + s)));

const integrals = (law: Law, a: number, b: number): Moments => {
  const d = b - a;
  const wa = law.base + law.grade * (a - law.top);
  const wb = law.base + law.grade * (b - law.top);
  const area = (d * (wa + wb)) / 2;
  const first = (d * (wa * (2 * a + b) + wb * (a + 2 * b))) / 6;
  const second = (d * (wa * (3 * a * a + 2 * a * b + b * b) + wb * (a * a + 2 * a * b + 3 * b * b))) / 12;
  if (law.factor === 0) return { area, first, second };
  const { factor, centre } = law;
  const arc = arcIntegrals(law.radius, a - centre, b - centre);
  return {
    area: area + factor * arc.area,
    first: first + factor * (centre * arc.area + arc.first),
    second: second + factor * (centre * centre * arc.area + 2 * centre * arc.first + arc.second),
  };
};

/** Integrals of sqrt(r² - s²), and of it times s and s², from s = a to s = b. */
const arcIntegrals = (r: number, a: number, b: number): Moments => {
  const ha = halfChord(r, a);
  const hb = halfChord(r, b);
  const angle = Math.atan2(b, hb) - Math.atan2(a, ha);
  const rr = r * r;
  return {
    area: (b * hb - a * ha + rr * angle) / 2,
    first: (ha * ha * ha - hb * hb * hb) / 3,
    second: (b * (2 * b * b - rr) * hb - a * (2 * a * a - rr) * ha + rr * rr * angle) / 8,
  };
};
