import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, found, given, rectangle, tee, tw, V } from '../../end/given.ts';
import { least, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import { plasticModulus } from '../../shape/plasticModulus.ts';
import type { Force, Modulus } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { rectangleShear, teeShear } from './copeShear.ts';
import { gm0 } from './factors.ts';
import { fyb } from './given.ts';
import { withShear } from './withShear.ts';

const source = { clause: '8.2.1, 9.2.2', basis: 'memory' } as const;
const plastic = flag('option cope-bending: plastic', (f) => f.options['cope-bending'] === 'plastic');

interface Face {
  readonly cut: Cut;
  /** Elastic modulus to the cut edge, and plastic modulus. */
  readonly Ze: Tree<Modulus>;
  readonly Zp: Tree<Modulus>;
  readonly Vd: Tree<Force>;
  readonly off: Gate;
}

const way = (of: 'rectangle' | 'tee', { cut, Ze, Zp, Vd, off }: Face): Way => {
  const Z = step('Z', pick([[plastic, least(Zp, times(1.2, Ze))]], Ze), source, 'to the cut edge');
  const Mp = step('M_p', over(times(fyb, Zp), gm0), source);
  return {
    of,
    symbol: 'V e_c',
    load: 'V',
    demand: step('M', times(V, cut.ec), source),
    resistance: step('M_d', least(over(times(fyb, Z), gm0), times(cut.ec, withShear(Vd, cut.ec, Mp))), source),
    off: [uncoped, off],
    limits: [channelCope, ...copeLimits],
  };
};

/**
 * Bending of what remains at each cope's face under V e_c, IS 800:2007 cl. 8.2.1 and 9.2.2: first yield of the cut edge, as stems are slender
 * by the table of classes (option `cope-bending: plastic`: the lesser of Z_p and 1.2 Z_e), less where the shear is high. Holes not taken off.
 */
export const copeBending: StrengthRule = {
  source,
  ways: [
    way('rectangle', {
      cut: rectangle,
      Ze: given('Z_e', '3,0', (f) => f.rectangle.W),
      Zp: step('Z_p', over(times(tw, squared(rectangle.depth)), 4), source),
      Vd: rectangleShear,
      off: noRectangle,
    }),
    way('tee', {
      cut: tee,
      Ze: given('Z_e', '3,0', (f) => f.tee.W),
      Zp: step(
        'Z_p',
        found('3,0', 'plastic modulus of the tee', [], ({ tee: { shape } }) => (shape ? plasticModulus(shape) : 0)),
        source,
      ),
      Vd: teeShear,
      off: noTee,
    }),
  ],
};
