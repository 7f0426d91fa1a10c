import { constant } from '../formula/tree.ts';
import { INCH } from '../units/systems.ts';
import type { Region } from '../words/regions.ts';

const mm = (length: number) => constant(`${length} mm`, length, '1,0');
const halfInch = constant('1/2 in', INCH / 2, '1,0');

/** How the shops of a region cope a beam that meets another's flange; practice, no clause. */
interface CopePractice {
  /** Room between the face of a cope and the tip of the supporting flange. */
  readonly clearance: ReturnType<typeof mm>;
  /** From the outer face of the supporting flange to the cut edge, where flange and fillet do not ask for more; null where none is usual. */
  readonly usualDepth: ReturnType<typeof mm> | null;
  /** Of the re-entrant corner. */
  readonly radius: ReturnType<typeof mm>;
}

/**
 * Elsewhere than in North America: cut edge 50 mm from the face of the support, Steel Buildings in Europe, Multi-Storey Steel Buildings,
 * Part 5, joint guide for fin plates; clearance and radius from memory. North America: from memory.
 */
export const copePractice: Readonly<Record<Region, CopePractice>> = {
  commonwealth: { clearance: mm(10), usualDepth: mm(50), radius: mm(10) },
  'north-america': { clearance: halfInch, usualDepth: null, radius: halfInch },
};
