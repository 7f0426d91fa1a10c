import type { Facts } from '../end/facts.ts';
import { d0, eEnd, found, g, h, m, q, r, support, tf } from '../end/given.ts';
import { symbolsOf } from '../formula/line.ts';
import { minus, most, over, plus, step, type Tree, times } from '../formula/tree.ts';
import type { Length } from '../units/dimension.ts';
import { plain } from '../units/figures.ts';
import { fromSystem, type UnitSystem, unitOf } from '../units/systems.ts';
import type { Region } from '../words/regions.ts';
import { copePractice } from './copePractice.ts';

/** By which rule a size is proposed; core/words has a sentence for each. */
export type CopeRule =
  | 'past-flange'
  | 'clear-of-hole'
  | 'past-last-column'
  | 'usual-depth'
  | 'past-fillets'
  | 'past-girder-k'
  | 'usual-radius';

/** A size that a cope may have, mm. */
export interface SizeByRule {
  readonly rule: CopeRule;
  readonly size: Tree<Length>;
}

/** What the sizes of copes are proposed from. */
export interface CopeManner {
  readonly region: Region;
  readonly units: UnitSystem;
  /** Lengths and depths come in whole multiples of this, in the unit of `units`. */
  readonly step: number;
}

const source = { clause: 'practice', basis: 'practice' } as const;
/** Share of a step: a size that meets one in inches meets it in mm. */
const NOISE = 1e-6;

/** Up to the next whole multiple of so many mm or inches. */
const roundedUp = (symbol: string, size: Tree<Length>, multiple: number, units: UnitSystem): Tree<Length> => {
  const mm = fromSystem(multiple, '1,0', units);
  const said = `${symbolsOf(size, undefined as never)} up to the next ${plain(multiple, 6)} ${unitOf('1,0', units).name}`;
  const next = found('1,0', said, [size], (_, x) => Math.ceil(x! / mm - NOISE) * mm);
  return step(symbol, next, source);
};

/** The column whose hole a cope's face at this length would cut, from the beam's end; not a number where it cuts none. */
export const columnCut = ({ eEnd, m, q, d0 }: Facts, length: number): number => {
  for (let j = 0; j < m; j += 1) {
    const x = eEnd + j * q;
    if (Math.abs(x - length) < d0 / 2 - NOISE) return x;
  }
  return Number.NaN;
};

/** Lengths of a cope, the most usual first: past the flange, past a hole that its face would cut, past every hole. */
export const lengthsOf = (symbol: string, { region, units, step: multiple }: CopeManner): SizeByRule[] => {
  const { clearance } = copePractice[region];
  const overhang = over(minus(support.b, support.tw), 2);
  const past = step('c_min', plus(minus(overhang, g), clearance), source, 'past the tip of the supporting flange');
  const plainly = roundedUp(symbol, past, multiple, units);
  const x = step(
    'x_j',
    found('1,0', 'column whose hole the face would cut', [plainly], (f, length) => columnCut(f, length!)),
    source,
  );
  const clear = step('c_h', plus(x, over(d0, 2)), source, 'past that hole');
  const last = step('c_n', plus(eEnd, times(minus(m, 1), q), over(d0, 2)), source, 'past the holes of the last column');
  return [
    { rule: 'past-flange', size: plainly },
    { rule: 'clear-of-hole', size: roundedUp(symbol, clear, multiple, units) },
    { rule: 'past-last-column', size: roundedUp(symbol, most(past, last), multiple, units) },
  ];
};

const own = step('t_f + r', plus(tf, r), source, 'flange and fillet of the beam itself');
const root = plus(support.tf, support.r);

/** How far the supporting beam's flanges with their fillets reach into the beam, from its top and from its foot, mm; none where below nothing. */
export const reachOf = {
  top: step('d_s', minus(root, support.above), source, 'flange and fillet of the support'),
  bottom: step('d_s', minus(plus(h, root, support.above), support.h), source, 'flange and fillet of the support'),
} as const;

/** Depths of a cope, the most usual first: the region's usual one, the least that clears both fillets. */
export const depthsOf = (
  symbol: string,
  place: 'top' | 'bottom',
  { region, units, step: multiple }: CopeManner,
): SizeByRule[] => {
  const { usualDepth } = copePractice[region];
  const least = most(reachOf[place], own);
  const deepEnough = roundedUp(symbol, least, multiple, units);
  if (!usualDepth) return [{ rule: 'past-girder-k', size: deepEnough }];
  const face =
    place === 'top' ? minus(usualDepth, support.above) : plus(minus(plus(h, support.above), support.h), usualDepth);
  const usual = step('d_u', face, source, 'usual, from the face of the supporting flange');
  return [
    { rule: 'usual-depth', size: roundedUp(symbol, most(usual, reachOf[place], own), multiple, units) },
    { rule: 'past-fillets', size: deepEnough },
  ];
};

/** Radius of the corner, to a whole mm or sixteenth of an inch. */
export const radiusOf = (symbol: string, { region, units }: CopeManner): SizeByRule => {
  const { radius } = copePractice[region];
  const fine = units === 'mm-kN' ? 1 : 1 / 16;
  const whole = Math.abs((radius.value / fromSystem(fine, '1,0', units)) % 1) < NOISE;
  return { rule: 'usual-radius', size: whole ? step(symbol, radius, source) : roundedUp(symbol, radius, fine, units) };
};
