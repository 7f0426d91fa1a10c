import { touch } from '../ladder/touch.ts';
import { chosen } from '../state/bench.ts';
import type { Profile } from './profile.ts';

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
  const { title, check } = profile;
  const style = { left: `${left}px`, top: `${top}px`, width: `${width}px` };
  if (!check) {
    return (
      <span class="profile-name" style={style}>
        {title}
      </span>
    );
  }
  return (
    <button
      type="button"
      class="profile-name"
      style={style}
      id={`rung-${check.id}`}
      aria-label={`Elastic shear stress, ${title}`}
      aria-expanded={chosen.value === check.id}
      aria-controls={`working-${check.id}`}
      onClick={() => touch(check.id)}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && chosen.value === check.id) chosen.value = null;
      }}
    >
      {title}
    </button>
  );
};

/** What the lines of a profile stand for, with their numbers; said aloud in one sentence. */
export const ProfileCaption = ({ profile, width }: { profile: Profile; width: number }) => {
  const { title, peak, mean, limitText, firstYield } = profile;
  const limit = limitText && `limit ${limitText}`;
  const yields = firstYield && `first yield at ${firstYield}`;
  return (
    <p style={{ width: `${width}px` }}>
      <span class="unseen">
        {title}: {[`peak ${peak.text}`, mean.text, limit, yields].filter(Boolean).join(', ')}.
      </span>
      <span aria-hidden="true">
        <span class="key-mean" />
        {mean.text}
        <br />
        {limit && (
          <>
            <span class="key-limit" />
            {limit}
            <br />
          </>
        )}
        {firstYield && (
          <>
            first yield at
            <br />
            {firstYield}
          </>
        )}
      </span>
    </p>
  );
};
