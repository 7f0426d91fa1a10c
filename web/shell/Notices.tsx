import type { TargetedEvent } from 'preact';
import { newVersion, otherTab } from '../state/network.ts';
import { notice } from '../state/notice.ts';

const dismiss = (): void => {
  notice.value = null;
};

const Refused = () => {
  const it = notice.value;
  if (it?.kind !== 'refused') return null;
  return (
    <div class="notice refused" role="alert">
      <div>
        <p>{it.title}</p>
        {it.lines && it.lines.length > 0 && (
          <ul>
            {it.lines.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        )}
      </div>
      <button type="button" class="button" onClick={dismiss}>
        Close
      </button>
    </div>
  );
};

/** A text that the browser did not copy, to be copied by hand. */
const ToCopy = () => {
  const it = notice.value;
  if (it?.copy === undefined) return null;
  return (
    <div class="notice">
      <input
        class="input"
        readOnly
        aria-label={it.title}
        value={it.copy}
        onFocus={(event: TargetedEvent<HTMLInputElement>) => event.currentTarget.select()}
      />
      <button type="button" class="button" onClick={dismiss}>
        Close
      </button>
    </div>
  );
};

/** What the bench has to tell beside the end: what was refused, another tab, a new version. */
export const Notices = () => (
  <div class="notices">
    <Refused />
    <ToCopy />
    {otherTab.value && (
      <p class="notice">
        The bench is open in another tab too. Each tab has its own end; what is kept on this device is the one changed
        last.
      </p>
    )}
    {newVersion.value && (
      <p class="notice">
        A new version is ready.
        <button type="button" class="button" onClick={newVersion.value}>
          Load it
        </button>
      </p>
    )}
  </div>
);
