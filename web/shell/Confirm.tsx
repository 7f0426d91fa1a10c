import type { TargetedMouseEvent } from 'preact';
import { goTo } from '../order/goTo.ts';
import { assumedValues } from '../state/assumedValues.ts';
import { confirmAll, confirmShown } from '../state/confirming.ts';
import { page } from './address.ts';
import { Dialog } from './Dialog.tsx';

const onConfirm = (event: TargetedMouseEvent<HTMLButtonElement>): void => {
  event.currentTarget.closest('dialog')?.close();
  confirmAll();
};

const onField = (path: string): void => {
  confirmShown.value = false;
  if (page.value !== 'bench') location.hash = '#bench';
  goTo(path);
};

/** What the bench put in and nobody has touched is confirmed before it leaves as if it had been given. */
export const Confirm = () => (
  <Dialog shown={confirmShown} title="Confirm what the bench put in">
    <p>Nobody has touched these values. Who gets the sheet or the link reads them as given.</p>
    <ul class="to-confirm">
      {assumedValues().map(({ path, text }) => (
        <li key={path}>
          <button type="button" class="inline-button" onClick={() => onField(path)}>
            {text}
          </button>
        </li>
      ))}
    </ul>
    <button type="button" class="button" onClick={onConfirm}>
      Confirm all
    </button>
  </Dialog>
);
