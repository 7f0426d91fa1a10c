import { signal } from '@preact/signals';
import { views } from '../piece/figure.ts';

/** Width of the column that piece and stress share, px; 0 until it is measured. */
export const shared = signal(0);

/** Width of a profile, px: beside the piece at least and at most, and under it at most. */
export const LEAST = 62;
const MOST = 92;
const UNDER = 150;
/** Width that the piece keeps, with the space between piece and profiles, px: in one view, and in several. */
const PIECE = { one: 425, several: 760 } as const;
/** Between profiles, and room for the peak's line left of them, px. */
export const GAP = 10;
export const LEFT = 8;

/** Width of each of so many profiles that share a width, px. */
const each = (whole: number, count: number): number => (whole - LEFT + GAP) / count - GAP;

/** What the piece leaves of the shared width, px. */
const besidePiece = (): number => shared.value - (views.value.length > 1 ? PIECE.several : PIECE.one);

/** True where so many profiles stand beside the piece; else they stand under it. */
export const isBeside = (count: number): boolean => each(besidePiece(), count) >= LEAST;

/** Width of each of so many profiles, px. */
export const profileWidth = (count: number): number =>
  isBeside(count) ? Math.min(MOST, each(besidePiece(), count)) : Math.min(UNDER, each(shared.value, count));

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
