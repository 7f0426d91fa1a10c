/** A column of equal holes: level of the first, pitch, number, diameter, mm; levels down from top of steel or from the plate's own top. */
export interface Holes {
  readonly first: number;
  readonly pitch: number;
  readonly count: number;
  readonly diameter: number;
}

/** An I of plain rectangles of which what lies between two levels is left, mm. A level inside the section means that its flange is gone. */
export interface PlainCut {
  readonly h: number;
  readonly b: number;
  readonly tf: number;
  readonly tw: number;
  readonly from: number;
  readonly to: number;
}

/** Level at which the i-th hole begins and ends; holes that run into one another count once, what lies outside the section not at all. */
const holeTop = ({ first, pitch, diameter }: Holes, i: number, before: number): number =>
  Math.max(first + i * pitch - diameter / 2, before);
const holeFoot = ({ first, pitch, diameter }: Holes, i: number, most: number): number =>
  Math.min(first + i * pitch + diameter / 2, most);

/** Area, first and second moment about the section's top of what was laid so far. */
interface Moments {
  area: number;
  first: number;
  second: number;
}

/** Lays a rectangle of that width between two levels; a negative width takes it out. */
const lay = (sum: Moments, width: number, a: number, z: number): void => {
  const part = width * (z - a);
  sum.area += part;
  sum.first += (part * (z + a)) / 2;
  sum.second += (part * (z * z + z * a + a * a)) / 3;
};

/** Elastic modulus of a cut I with a column of holes out of its web, to the farther edge, mm³; 0 where the holes leave nothing. */
export const netModulus = ({ h, b, tf, tw, from, to }: PlainCut, holes: Holes): number => {
  const sum = { area: 0, first: 0, second: 0 };
  const [webTop, webFoot] = [from > 0 ? from : tf, to < h ? to : h - tf];
  if (from === 0) lay(sum, b, 0, tf);
  if (to === h) lay(sum, b, h - tf, h);
  lay(sum, tw, webTop, webFoot);
  let before = webTop;
  for (let i = 0; i < holes.count; i += 1) {
    const [a, z] = [holeTop(holes, i, before), holeFoot(holes, i, webFoot)];
    if (z <= a) continue;
    lay(sum, -tw, a, z);
    before = z;
  }
  const { area, first, second } = sum;
  if (!(area > 0)) return 0;
  const centroid = first / area;
  return Math.max(0, second - first * centroid) / Math.max(centroid - from, to - centroid);
};

/** Plastic modulus of a plate with a column of holes at their own heights, mm³; 0 where the holes leave nothing. */
export const netPlasticModulus = (thickness: number, depth: number, holes: Holes): number => {
  const solid: number[] = [];
  let [left, before] = [0, 0];
  for (let i = 0; i <= holes.count; i += 1) {
    const end = i === holes.count ? depth : Math.min(holeTop(holes, i, before), depth);
    if (end > before) {
      solid.push(before, end);
      left += end - before;
    }
    if (i < holes.count) before = Math.max(before, holeFoot(holes, i, depth));
  }
  let [missing, axis] = [left / 2, depth];
  for (let at = 0; at < solid.length; at += 2) {
    const long = solid[at + 1]! - solid[at]!;
    if (long >= missing) {
      axis = solid[at]! + missing;
      break;
    }
    missing -= long;
  }
  const upTo = (y: number): number => ((y - axis) * Math.abs(y - axis)) / 2;
  let modulus = 0;
  for (let at = 0; at < solid.length; at += 2) modulus += upTo(solid[at + 1]!) - upTo(solid[at]!);
  return thickness * modulus;
};
