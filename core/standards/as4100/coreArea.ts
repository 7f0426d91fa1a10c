/** Core areas of bolts by their diameter, mm2 (AS 1275, from memory). */
const areas: ReadonlyMap<number, number> = new Map([
  [12, 76.2],
  [16, 144],
  [20, 225],
  [22, 282],
  [24, 324],
  [27, 427],
  [30, 519],
  [36, 759],
]);

/** Core area of a bolt, mm2; 0 for a diameter, mm, that is not listed. */
export const coreArea = (diameter: number): number => areas.get(diameter) ?? 0;
