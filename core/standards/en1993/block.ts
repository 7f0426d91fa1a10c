import { copeLimits, intactFlange } from '../../end/gates.ts';
import { fu, fup, fy, fyp, mTop, V } from '../../end/given.ts';
import { type Block, plateBlock as plate, webBlock as web } from '../../end/tearPaths.ts';
import { over, plus, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { holeLimits } from './limits.ts';
import { seen } from './sources.ts';

const source = seen('1-8 3.10.2');

/** One block, N: `tension` of its net tension plane at rupture, its net shear plane at yield. */
export const blockOf = (
  { Anv, Ant }: Block,
  { fy, fu }: { readonly fy: Tree<Stress>; readonly fu: Tree<Stress> },
  gammaM2n: Tree<Pure>,
  tension: Tree<Pure> | 0.5 = 0.5,
): Tree<Force> =>
  plus(over(times(tension, fu, Ant) as Tree<Force>, gammaM2n), over(times(fy, Anv), times(root(3), gammaM0)));

/** Block under an eccentric load: half the net tension plane. */
const eccentric = (block: Block, fy: Tree<Stress>, fu: Tree<Stress>, gammaM2n: Tree<Pure>): Tree<Force> =>
  step('V_Rd,b', blockOf(block, { fy, fu }, gammaM2n), source);

/** Block tearing resistance of the coped web, columns inside the cope, N. */
export const webBlockOf = (gammaM2n: Tree<Pure>): Tree<Force> => eccentric(web, fy, fu, gammaM2n);

/** Block tearing, EN 1993-1-8 3.10.2(3). */
export const webBlock = (block: Tree<Force>): StrengthRule => ({
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: block,
      off: [intactFlange],
      limits: [...copeLimits, ...holeLimits],
    },
  ],
});

export const plateBlock = (gammaM2n: Tree<Pure>): StrengthRule => ({
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: eccentric(plate, fyp, fup, gammaM2n),
      limits: holeLimits,
    },
  ],
});

const planes = { clause: '1-8 3.10.2 planes', basis: 'practice' } as const;

/** The shear planes of 3.10.2 on both sides of each column inside the cope, without a tension plane: no clause of its own. */
export const webTearout: StrengthRule = {
  source: planes,
  ways: [
    {
      of: 'up',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_Rd', over(times(2, mTop, fy, web.Anv), times(root(3), gammaM0)), planes),
      off: [intactFlange],
      limits: holeLimits,
    },
  ],
};
