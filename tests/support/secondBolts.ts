import { sum } from './sum.ts';

/** Load at arm z over the force on the farthest bolt: instantaneous centre, halved to the end of the digits. */
export const centreCoefficient = (bolts: readonly (readonly [number, number])[], z: number): number => {
  const at = (r0: number) => {
    const arms = bolts.map(([x, y]) => Math.hypot(x + r0, y));
    const R = arms.map((arm) => (1 - Math.exp((-0.394 * 8.64 * arm) / Math.max(...arms))) ** 0.55);
    const up = sum(bolts.map(([x], i) => (arms[i]! > 0 ? (R[i]! * (x + r0)) / arms[i]! : 0)));
    return { up, spare: (z + r0) * up - sum(R.map((one, i) => one * arms[i]!)) };
  };
  let [near, far] = [1e-6, 1e7];
  for (let turn = 0; turn < 60; turn += 1) {
    const middle = Math.sqrt(near * far);
    if (at(middle).spare < 0) near = middle;
    else far = middle;
  }
  return at(far).up;
};

/** Least edge distances, mm: bolts up to this diameter, sheared edge, cut edge. */
export const edges: readonly (readonly [d: number, sheared: number, cut: number])[] = [
  [16, 28, 22],
  [20, 34, 26],
  [22, 38, 28],
  [24, 42, 30],
  [27, 48, 34],
  [30, 52, 38],
  [36, 64, 46],
];

/** Bolts, mm: outside of the socket, width of the wide nut across its flats. */
export const sockets: readonly (readonly [d: number, socket: number, flats: number])[] = [
  [12, 30, 22],
  [16, 38, 27],
  [20, 46, 32],
  [22, 50, 36],
  [24, 54, 41],
  [27, 61, 46],
  [30, 68, 50],
  [36, 82, 60],
];
