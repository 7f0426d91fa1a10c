import { signal } from '@preact/signals';
import { turnTo } from '../order/goTo.ts';
import { carried } from '../state/carried.ts';
import { redo, undo } from '../state/edits.ts';
import { lineNames } from '../state/tradeOrder.ts';

/** The list of keys is open. */
export const keysShown = signal(false);
/** The search for a field is open. */
export const finderShown = signal(false);

const PLACE = 'copewright.keys';

const keptSwitch = (): boolean => {
  try {
    return localStorage.getItem(PLACE) !== 'off';
  } catch {
    return true;
  }
};

/** Keys of a single letter work while no field has focus; people who dictate may switch them off. */
export const singleKeys = signal(keptSwitch());

export const setSingleKeys = (on: boolean): void => {
  singleKeys.value = on;
  try {
    localStorage.setItem(PLACE, on ? 'on' : 'off');
  } catch {
    // Without storage the choice holds for this visit.
  }
};

const withControl: Readonly<Record<string, () => void>> = {
  z: undo,
  y: redo,
  s: () => void carried(({ saveFile }) => saveFile()),
};

const single = (key: string): (() => void) | undefined => {
  if (key === '/') {
    return () => {
      finderShown.value = true;
    };
  }
  if (key === '?') {
    return () => {
      keysShown.value = true;
    };
  }
  const line = /^[1-9]$/.test(key) ? lineNames[Number(key) - 1] : undefined;
  if (!line) return undefined;
  return () => turnTo(line);
};

const inField = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement && target.matches('input:not([type=checkbox]):not([type=radio]), select, textarea');

const inDialog = (): boolean => document.querySelector('dialog[open]') !== null;

const onKey = (event: KeyboardEvent): void => {
  if (event.defaultPrevented || event.altKey || inDialog()) return;
  const control = event.ctrlKey || event.metaKey;
  const key = event.key.toLowerCase();
  const action = control
    ? key === 'z' && event.shiftKey
      ? redo
      : withControl[key]
    : singleKeys.value && !inField(event.target)
      ? single(key)
      : undefined;
  if (!action) return;
  event.preventDefault();
  action();
};

/** Listens for the keys of the whole bench. */
export const listenForKeys = (): void => document.addEventListener('keydown', onKey);
