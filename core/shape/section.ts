/**
 * A rolled section as the mill list gives it. All lengths in mm.
 *
 * Range: h > 2 (t_f + r), b > t_w + 2 r for an I and b > t_w + r for a channel, every length > 0 but r, which may be 0; a toe radius
 * no larger than the flange is thick at its tip.
 * Whoever accepts a user's own size sees to that; the mechanics of this folder rely on it.
 */
export interface Section {
  /** An I has flanges on both sides of the web, a channel on one. */
  readonly family: 'I' | 'channel';
  /** Depth over the flanges. */
  readonly h: number;
  /** Flange width, the full one for a channel too. */
  readonly b: number;
  /** Flange thickness; of a tapered flange the mean one, met half way out along the outstand. */
  readonly tf: number;
  /** Web thickness. */
  readonly tw: number;
  /** Root radius between web and flange. */
  readonly r: number;
  /** Slope of the inner flange face in radians; absent for parallel flanges. */
  readonly slope?: number;
  /** Toe radius at the tip of the inner flange face; absent for a square tip. */
  readonly toe?: number;
}
