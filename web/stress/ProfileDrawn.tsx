import type { Report } from '../../core/check/report.ts';
import { type Profile, stressText } from './profile.ts';

interface Props {
  readonly profile: Profile;
  readonly report: Report;
  /** Left edge, width and the stress at its right end. */
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

/** The stress at a level, between the points of a profile. */
const stressAt = (points: Profile['points'], level: number): number => {
  const after = points.findIndex((one) => one.level >= level);
  const [a, b] = [points[after - 1], points[after]];
  if (!b) return 0;
  if (!a || b.level - a.level < 1e-9) return b.stress;
  return a.stress + ((b.stress - a.stress) * (level - a.level)) / (b.level - a.level);
};

const fillLines = (points: Profile['points'], x: (stress: number) => number, y: Props['y']): string => {
  const [top, bottom] = [points[0]!.level, points.at(-1)!.level];
  const step = (FILL * (bottom - top)) / Math.max(1, y(bottom) - y(top));
  let data = '';
  for (let level = top + step; level < bottom; level += step) {
    data += `M${two(x(0))} ${two(y(level))}H${two(x(stressAt(points, level)))}`;
  }
  return data;
};

/** Shear stress over the depth: the curve, its mean and limit as lines, its peak with the number. */
export const ProfileDrawn = ({ profile, report, left, width, reach, y }: Props) => {
  const { points, peak, mean, limit } = profile;
  const perStress = (width - NUMBER) / reach;
  const x = (stress: number): number => left + stress * perStress;
  const [top, bottom] = [y(points[0]!.level), y(points.at(-1)!.level)];
  const curve = points.map(({ level, stress }) => `L${two(x(stress))} ${two(y(level))}`).join('');
  const off = limit !== null && limit > reach;
  const limitAt = limit === null ? null : off ? left + width - OFF : x(limit);
  return (
    <g class="profile">
      <path class="profile-fill" d={fillLines(points, x, y)} />
      <path class="profile-curve" d={`M${two(left)} ${two(top)}${curve}L${two(left)} ${two(bottom)}`} />
      <path class="profile-base" d={`M${two(left)} ${two(top)}V${two(bottom)}`} />
      <path class="profile-mean" d={`M${two(x(mean))} ${two(top)}V${two(bottom)}`} />
      {limitAt !== null && <path class="profile-limit" d={`M${two(limitAt)} ${two(top)}V${two(bottom)}`} />}
      {limitAt !== null && off && (
        <path
          class="profile-off"
          d={`M${two(left)} ${two(bottom)}H${two(limitAt - 12)}l2 -4l3 8l2 -4H${two(limitAt)}`}
        />
      )}
      <path class="profile-peak" d={`M${two(left - 6)} ${two(y(peak.level))}H${two(x(peak.stress) + 4)}`} />
      <text class="profile-number" x={two(x(peak.stress) + 6)} y={two(y(peak.level) + 5)}>
        {stressText(peak.stress, report)}
      </text>
    </g>
  );
};
