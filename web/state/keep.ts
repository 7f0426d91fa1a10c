import { effect, signal } from '@preact/signals';
import { entry } from './bench.ts';
import type { Entry } from './entry.ts';

const PLACE = 'copewright.bench';
/** Well inside a second after the last change, ms. */
const SOON = 400;

/** When the entry was last kept in this browser; null while it was not. */
export const keptAt = signal<Date | null>(null);
/** False where this browser keeps nothing. */
export const canKeep = signal(true);

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** An entry as it was kept, if it is one. */
export const entryFrom = (value: unknown): Entry | undefined => {
  if (!isRecord(value) || !isRecord(value.texts) || !Array.isArray(value.assumed)) return undefined;
  const { units, texts, assumed } = value;
  if (units !== 'mm-kN' && units !== 'in-kip') return undefined;
  if (![...Object.values(texts as object), ...assumed].every((one) => typeof one === 'string')) return undefined;
  return { units, texts: texts as Record<string, string>, assumed };
};

/** What this browser kept of the last work; undefined where there is nothing that can be read. */
export const readKept = (): Entry | undefined => {
  try {
    const text = localStorage.getItem(PLACE);
    return text === null ? undefined : entryFrom(JSON.parse(text));
  } catch {
    return undefined;
  }
};

const keep = (it: Entry): void => {
  try {
    localStorage.setItem(PLACE, JSON.stringify(it));
    keptAt.value = new Date();
  } catch {
    canKeep.value = false;
    keptAt.value = null;
  }
};

/** Keeps every change of the entry in this browser within a second, and at once when the page goes away. */
export const startKeeping = (): void => {
  let waiting: ReturnType<typeof setTimeout> | undefined;
  const flush = () => {
    if (waiting === undefined) return;
    clearTimeout(waiting);
    waiting = undefined;
    keep(entry.peek());
  };
  let first = true;
  effect(() => {
    void entry.value;
    if (first) {
      first = false;
      return;
    }
    clearTimeout(waiting);
    waiting = setTimeout(flush, SOON);
  });
  addEventListener('pagehide', flush);
  addEventListener('visibilitychange', flush);
};
