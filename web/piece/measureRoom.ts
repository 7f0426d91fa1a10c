import { room } from './figure.ts';

/** A drawing is at most this high, px: in wide columns, and as a share of the width in narrow ones. */
const HEIGHT = 600;
const TALL = 1.55;

/** Keeps the room of the drawing at the width of its frame; gives back what ends it. */
export const measureRoom = (frame: HTMLElement): (() => void) => {
  const measure = (): void => {
    const width = Math.floor(frame.clientWidth);
    if (width === room.value.width) return;
    room.value = { width, height: Math.min(HEIGHT, Math.round(width * TALL)) };
  };
  measure();
  const observer = new ResizeObserver(measure);
  observer.observe(frame);
  return () => observer.disconnect();
};
