import { signal } from '@preact/signals';
import type { CheckName } from '../../core/end/checkNames.ts';
import { chosen } from '../state/bench.ts';

/** The rung that the Tab key comes to; arrow keys go on from there. Null: the weakest. */
export const reached = signal<CheckName | null>(null);

/** Opens a rung, or closes it where it is open. */
export const touch = (id: CheckName): void => {
  reached.value = id;
  chosen.value = chosen.value === id ? null : id;
};

const rungsIn = (list: HTMLElement): HTMLButtonElement[] => [
  ...list.querySelectorAll<HTMLButtonElement>('button[data-rung]'),
];

const steps: Readonly<Record<string, (at: number, count: number) => number>> = {
  ArrowUp: (at) => at - 1,
  ArrowDown: (at) => at + 1,
  Home: () => 0,
  End: (_, count) => count - 1,
};

/** Arrow keys, Home and End go from rung to rung; Escape closes the open one. */
export const onRungKey = (event: KeyboardEvent): void => {
  const list = event.currentTarget as HTMLElement;
  if (event.key === 'Escape' && chosen.value !== null) {
    const open = list.querySelector<HTMLElement>('button[data-rung][aria-expanded="true"]');
    chosen.value = null;
    open?.focus();
    event.stopPropagation();
    return;
  }
  const step = steps[event.key];
  const all = rungsIn(list);
  const at = all.indexOf(event.target as HTMLButtonElement);
  if (!step || at < 0 || event.altKey || event.ctrlKey || event.metaKey) return;
  const next = all[step(at, all.length)];
  if (!next) return;
  event.preventDefault();
  next.focus();
};
