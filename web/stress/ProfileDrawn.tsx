import type { Profile } from './profile.ts';

interface Props {
  readonly profile: Profile;
  /** Left edge and width, px, and the share of the largest peak that stands at its right end. */
  readonly left: number;
  readonly width: number;
  readonly reach: number;
  /** px of a level in mm. */
  readonly y: (level: number) => number;
}

/** Distance of the fine lines that fill a profile, px. */
const FILL = 6;
/** Room for the number at the peak, and for a limit off the scale, px. */
const NUMBER = 34;
const OFF = 14;

const two = (value: number): string => value.toFixed(2);

/** The share at a level, between the points of a curve. */
const shareAt = (curve: Profile['curve'], level: number): number => {
  const after = curve.findIndex((one) => one.y >= level);
  const [a, b] = [curve[after - 1], curve[after]];
  if (!b) return 0;
  if (!a || b.y - a.y < 1e-9) return b.x;
  return a.x + ((b.x - a.x) * (level - a.y)) / (b.y - a.y);
};

const fillLines = ({ curve, top, bottom }: Profile, x: (share: number) => number, y: Props['y']): string => {
  const step = (FILL * (bottom - top)) / Math.max(1, y(bottom) - y(top));
  let data = '';
  for (let level = top + step; level < bottom; level += step) {
    data += `M${two(x(0))} ${two(y(level))}H${two(x(shareAt(curve, level)))}`;
  }
  return data;
};

/** Shear stress over the depth: the curve, its mean and limit as lines, its peak with the number. */
export const ProfileDrawn = ({ profile, left, width, reach, y }: Props) => {
  const { curve, peak, mean, limit } = profile;
  const x = (share: number): number => left + (share * (width - NUMBER)) / reach;
  const [top, bottom] = [two(y(profile.top)), two(y(profile.bottom))];
  const line = curve.map((one) => `L${two(x(one.x))} ${two(y(one.y))}`).join('');
  const off = limit !== undefined && limit.share > reach;
  const limitAt = limit === undefined ? null : off ? left + width - OFF : x(limit.share);
  return (
    <g>
      <path class="profile-fill" d={fillLines(profile, x, y)} />
      <path class="profile-curve" d={`M${two(left)} ${top}${line}L${two(left)} ${bottom}`} />
      <path class="profile-base" d={`M${two(left)} ${top}V${bottom}`} />
      <path class="profile-mean" d={`M${two(x(mean.share))} ${top}V${bottom}`} />
      {limitAt !== null && <path class="profile-limit" d={`M${two(limitAt)} ${top}V${bottom}`} />}
      {limitAt !== null && off && (
        <path d={`M${two(left)} ${bottom}H${two(limitAt - 12)}l2 -4l3 8l2 -4H${two(limitAt)}`} />
      )}
      <path class="profile-peak" d={`M${two(left - 6)} ${two(y(peak.at))}H${two(x(peak.share) + 4)}`} />
      <text class="profile-number" x={two(x(peak.share) + 6)} y={two(y(peak.at) + 5)}>
        {peak.text}
      </text>
    </g>
  );
};
