import { room } from './figure.ts';

/** In wide columns a drawing is so much lower than the window that it stands whole under the head, within these bounds, px. */
const HEAD = 300;
const LEAST = 480;
const MOST = 760;
/** In narrow ones, where the page is one column and a window's height comes and goes, its height follows its width. */
const NARROW = 700;
const TALL = 1.55;

const heightFor = (width: number, narrow: boolean): number =>
  narrow ? Math.round(width * TALL) : Math.max(LEAST, Math.min(MOST, window.innerHeight - HEAD));

/** Keeps the room of the drawing at what its frame and the window give; gives back what ends it. */
export const measureRoom = (frame: HTMLElement): (() => void) => {
  const measure = (): void => {
    const width = Math.floor(frame.clientWidth);
    const narrow = window.innerWidth < NARROW;
    const height = heightFor(width, narrow);
    const before = room.value;
    if (width !== before.width || height !== before.height || narrow !== before.narrow)
      room.value = { width, height, narrow };
  };
  measure();
  const observer = new ResizeObserver(measure);
  observer.observe(frame);
  window.addEventListener('resize', measure);
  return () => {
    observer.disconnect();
    window.removeEventListener('resize', measure);
  };
};
