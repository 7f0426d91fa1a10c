import { signal } from '@preact/signals';

/** A part of the program that the first view does without. */
export interface Later<T> {
  /** Null until it is there. Reading it asks for it. */
  readonly value: T | null;
  /** It was asked for and could not be loaded. */
  readonly failed: boolean;
}

interface Asked {
  readonly ask: () => void;
  readonly again: () => void;
}

const parts: Asked[] = [];

/** Names a part that is loaded when it is first read, or once the page stands. Where loading fails, the next reading asks again. */
export const later = <T>(load: () => Promise<T>): Later<T> => {
  const part = signal<{ readonly it: T } | null>(null);
  const failed = signal(false);
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
        failed.value = true;
      },
    );
  };
  const again = (): void => {
    failed.value = false;
  };
  parts.push({ ask, again });
  return {
    get value() {
      ask();
      return part.value?.it ?? null;
    },
    get failed() {
      return failed.value;
    },
  };
};

/** Loads every part that was named, so that it is there when it is wanted. */
export const loadTheRest = (): void => {
  for (const { ask } of parts) ask();
};

/** Lets what could not be loaded be asked for again. */
export const tryAgain = (): void => {
  for (const { again } of parts) again();
};
