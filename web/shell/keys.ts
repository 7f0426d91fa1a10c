import { signal } from '@preact/signals';
import { turnTo } from '../order/goTo.ts';
import { carried } from '../state/carried.ts';
import { copes } from '../state/copes.ts';
import { redo, undo } from '../state/edits.ts';
import { lineNames } from '../state/tradeOrder.ts';
import { singleKeys } from './singleKeys.ts';

/** The list of keys is open. */
export const keysShown = signal(false);
/** The search for a field is open. */
export const finderShown = signal(false);

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
  if (key === 'c') return () => copes.value?.takeProposal();
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
