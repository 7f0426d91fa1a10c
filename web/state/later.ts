import { signal } from '@preact/signals';

/** A part of the program that the first view does without; null until it is there. Reading it asks for it. */
export interface Later<T> {
  readonly value: T | null;
}

const asks: (() => void)[] = [];

/** Names a part that is loaded when it is first read, or once the page stands. Where loading fails, the next reading asks again. */
export const later = <T>(load: () => Promise<T>): Later<T> => {
  const part = signal<{ readonly it: T } | null>(null);
  let asked = false;
  const ask = (): void => {
    if (asked) return;
    asked = true;
    load().then(
      (it) => {
        part.value = { it };
      },
      () => {
        asked = false;
      },
    );
  };
  asks.push(ask);
  return {
    get value() {
      ask();
      return part.value?.it ?? null;
    },
  };
};

/** Loads every part that was named, so that it is there when it is wanted. */
export const loadTheRest = (): void => {
  for (const ask of asks) ask();
};
