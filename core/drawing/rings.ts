/** A step away from a place, in text heights; `far` is its distance as the eye takes it. */
export interface Step {
  readonly x: number;
  readonly y: number;
  readonly far: number;
}

/** Step of the search, how far it is fine and how far it goes; in text heights. */
const STEP = 0.7;
const CLOSE = 5;
const REACH = 16;

/** Steps around a place, the nearest first, wider ones further off; a step upright counts more than one along, since words are wide. */
export const rings: readonly Step[] = (() => {
  const all: Step[] = [];
  const add = (step: number, from: number, to: number): void => {
    const count = Math.ceil(to / step / 0.8);
    for (let i = -count; i <= count; i++) {
      for (let j = -count; j <= count; j++) {
        const [x, y] = [i * step, j * step];
        const far = Math.hypot(x * 0.8, y);
        if (far >= from && far < to) all.push({ x, y, far });
      }
    }
  };
  add(STEP, 0, CLOSE);
  add(2 * STEP, CLOSE, REACH);
  return all.sort((a, b) => a.far - b.far || a.x - b.x || a.y - b.y);
})();
