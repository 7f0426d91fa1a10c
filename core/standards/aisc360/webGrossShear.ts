import { flag, h, r, tf, tw, V } from '../../end/given.ts';
import { all, atMost, least, minus, over, pick, plus, root, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { clause } from './clauses.ts';
import { E, Fy } from './given.ts';
import { slenderFrom } from './limits.ts';
import { type Method, otherShear, shearYielding } from './method.ts';

const source = clause('G2.1');
const hw = step('h_w', minus(h, times(2, plus(tf, r))), source, 'clear of the fillets');
const slenderness = step('λ_w', over(hw, tw), source);
/** A section without root radius counts as welded; channels have the lower factor at any slenderness. */
const rolled = flag('rolled I-section', (f) => f.r > 0 && !f.channel);
const stocky = all(rolled, atMost(slenderness, times(2.24, root(over(E, Fy)))));
const Vn = step('V_n', times(0.6, Fy, h, tw), source);
const Cv = step('C_v1', least(1, over(slenderFrom, slenderness)), source);

/** Shear of the full I or channel, ANSI/AISC 360-22 G2.1: stocky rolled webs yield, all others by C_v1. */
export const webGrossShear = ({ available }: Method): StrengthRule => ({
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: pick(
        [[stocky, available(Vn, shearYielding, source, 'V_n')]],
        available(times(Vn, Cv), otherShear, source, 'V_n'),
      ),
    },
  ],
});
