import type { Facts } from '../end/facts.ts';
import { plateBox } from './plate.ts';
import type { DrawingWords } from './words.ts';

/** Beam drawn beyond the last cope or the plate: this share of its depth, and no less than the length in mm. */
const BEYOND = 0.28;
const LEAST_BEYOND = 110;
/** Words need as much beside an end plate, which takes nothing of the web's length. */
const BESIDE_END_PLATE = 0.25;

/** Length of beam that is drawn beyond the last cope or the plate where no more is asked for, mm. */
export const usualBeyond = ({ h }: Facts): number => Math.max(BEYOND * h, LEAST_BEYOND);

/** Length of beam that is drawn, mm from its end. */
export const drawnLength = (it: Facts, { beyond = 0 }: DrawingWords): number =>
  Math.max(it.ct, it.cb, plateBox(it).right, it.bp > 0 ? BESIDE_END_PLATE * it.h : 0) +
  Math.max(usualBeyond(it), beyond);
