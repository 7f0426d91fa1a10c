import type { Report } from '../../core/check/report.ts';
import { touch } from '../ladder/touch.ts';
import { chosen } from '../state/bench.ts';
import { type Profile, stressText } from './profile.ts';

/** Name of the section; where there is a working to it, a button that opens it. */
export const ProfileName = ({
  profile,
  left,
  top,
  width,
}: {
  profile: Profile;
  left: number;
  top: number;
  width: number;
}) => {
  const { name, check } = profile;
  const style = { left: `${left}px`, top: `${top}px`, width: `${width}px` };
  if (!check) {
    return (
      <span class="profile-name" style={style}>
        {name}
      </span>
    );
  }
  return (
    <button
      type="button"
      class="profile-name"
      style={style}
      id={`rung-${check.id}`}
      aria-expanded={chosen.value === check.id}
      aria-controls={`working-${check.id}`}
      onClick={() => touch(check.id)}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && chosen.value === check.id) chosen.value = null;
      }}
    >
      <span class="unseen">Elastic shear stress, </span>
      {name}
    </button>
  );
};

/** What the lines of a profile stand for, with their numbers. */
export const ProfileCaption = ({ profile, report, width }: { profile: Profile; report: Report; width: number }) => {
  const { name, peak, mean, limit, firstYield } = profile;
  return (
    <p style={{ width: `${width}px` }}>
      <span class="unseen">{`${name}: peak ${stressText(peak.stress, report)}, `}</span>
      <span class="key-mean" />
      mean {stressText(mean, report)}
      <span class="unseen">, </span>
      <br />
      {limit !== null && (
        <>
          <span class="key-limit" />
          limit {stressText(limit, report)}
          <span class="unseen">, </span>
          <br />
        </>
      )}
      first yield at
      <br />
      {firstYield}
    </p>
  );
};
