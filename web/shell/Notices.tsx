import { notice } from '../state/notice.ts';
import { otherTab } from '../state/tabs.ts';
import { newVersion, takeNewVersion } from './offline.ts';

const dismiss = (): void => {
  notice.value = null;
};

const Told = () => {
  const it = notice.value;
  if (!it) return null;
  return (
    <div class={`notice ${it.kind}`} role={it.kind === 'refused' ? 'alert' : 'status'}>
      <div>
        <p>{it.title}</p>
        {it.lines && it.lines.length > 0 && (
          <ul>
            {it.lines.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        )}
        {it.copy !== undefined && (
          <input
            class="input"
            readOnly
            aria-label="Link"
            value={it.copy}
            onFocus={(event) => event.currentTarget.select()}
          />
        )}
      </div>
      <button type="button" class="button" onClick={dismiss}>
        Close
      </button>
    </div>
  );
};

/** What the bench has to tell beside the end: what was done or refused, another tab, a new version. */
export const Notices = () => (
  <div class="notices">
    <Told />
    {otherTab.value && (
      <p class="notice">
        The bench is open in another tab too. Each tab has its own end; what is kept on this device is the one changed
        last.
      </p>
    )}
    {newVersion.value && (
      <p class="notice">
        A new version is ready.
        <button type="button" class="button" onClick={takeNewVersion}>
          Load it
        </button>
      </p>
    )}
  </div>
);
