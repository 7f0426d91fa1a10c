import { entry } from '../state/bench.ts';
import { isFault, readField } from '../state/readField.ts';

/** More than one of them stands at a path, so that their distance matters. */
export const several = (path: string): boolean => {
  const reading = readField(entry.value, path);
  return reading !== undefined && !isFault(reading) && reading.value > 1;
};
