import { useEffect } from 'preact/hooks';
import { RichText } from './RichText.tsx';
import { Sign } from './Sign.tsx';
import { sayVerdict, verdictShown } from './verdictShown.ts';

/** The verdict over the ladder: sign, word and number, what comes first, and what else does not hold. */
export const Verdict = () => {
  useEffect(sayVerdict, []);
  const verdict = verdictShown.value;
  return (
    <div class="verdict">
      {verdict && (
        <>
          <p class={`verdict-word verdict-is-${verdict.mark}`}>
            <Sign mark={verdict.mark} size={26} />
            <span>{verdict.word}</span> <span class="verdict-ratio">{verdict.ratio}</span>
          </p>
          <p class="verdict-first">
            <span>
              <RichText text={verdict.lead + verdict.first} />
            </span>
            {verdict.close && <span class="verdict-close">close</span>}
          </p>
          <p class="verdict-others">
            <RichText text={[verdict.spare, verdict.others].filter(Boolean).join('. ') || '\u00a0'} />
          </p>
        </>
      )}
    </div>
  );
};
