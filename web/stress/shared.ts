import { computed, signal } from '@preact/signals';

/** Width of the column that piece and stress share, px; 0 until it is measured. */
export const shared = signal(0);

/** The profiles stand beside the piece; else under it. */
export const isBeside = computed(() => shared.value >= 600);

/** Width of a profile, px: beside the piece, where that must keep its own width, and under it. */
const BESIDE = { least: 62, most: 92, piece: 400 } as const;
const UNDER = 150;
/** Between profiles, and room for the peak's line left of them, px. */
export const GAP = 10;
export const LEFT = 8;

/** Width of each of so many profiles, px. */
export const profileWidth = (count: number): number => {
  const { least, most, piece } = BESIDE;
  const each = (whole: number): number => (whole - LEFT) / count - GAP;
  return isBeside.value
    ? Math.max(least, Math.min(most, each(shared.value - piece)))
    : Math.min(UNDER, each(shared.value));
};

/** Keeps the shared width at that of the column a section stands in; gives back what ends it. */
export const measureShared = (section: HTMLElement): (() => void) => {
  const column = section.parentElement ?? section;
  const measure = (): void => {
    shared.value = column.clientWidth;
  };
  measure();
  const observer = new ResizeObserver(measure);
  observer.observe(column);
  return () => observer.disconnect();
};
