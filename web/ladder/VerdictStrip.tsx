import { RichText } from './RichText.tsx';
import { Sign } from './Sign.tsx';
import { verdictShown } from './verdictShown.ts';

const toLadder = (): void => {
  document.getElementById('ladder-heading')?.scrollIntoView();
};

/** The verdict at the foot of a small screen; touching it goes to the ladder. */
export const VerdictStrip = () => {
  const verdict = verdictShown.value;
  if (!verdict) return null;
  return (
    <button type="button" class="verdict-strip" onClick={toLadder}>
      <Sign mark={verdict.mark} size={22} />
      <b>
        {verdict.word} {verdict.ratio}
      </b>
      <span>
        <RichText text={verdict.first} />
      </span>
      {verdict.others && (
        <small>
          <RichText text={verdict.others} />
        </small>
      )}
    </button>
  );
};
