import { copeLimits, fullDepthPlate, noSupportBolts, noWebHoles } from '../../end/gates.ts';
import { dn, flag, fu, fup, h, ho, hp, k, n, supportBolts, tf, tp, tw, V } from '../../end/given.ts';
import { minus, most, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { nothing, ruptureShear } from './given.ts';

/**
 * Rupture in shear through one bolt column: what the note on holes of IS 800:2007 cl. 8.4.1.1 comes to, below V_d exactly where the note's
 * ratio of net to gross area is not met.
 */
const source = { clause: '8.4.1.1 note', basis: 'memory' } as const;

const net = (t: Tree<Length>, depth: Tree<Length>, fu: Tree<Stress>) =>
  step('V_dn', ruptureShear(most(times(t, depth), nothing), fu), source);

const both = flag('both flanges coped', (f) => f.dt > 0 && f.db > 0);
const one = flag('one flange coped', (f) => f.dt > 0 || f.db > 0);
/** Depth in shear, mm: a tee's without its flange. */
const depth = step(
  'd_v',
  pick(
    [
      [both, ho],
      [one, minus(ho, tf)],
    ],
    h,
  ),
  source,
);

export const webNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: net(tw, minus(depth, times(n, dn)), fu),
      limits: copeLimits,
    },
  ],
};

const ofPlate = net(tp, minus(hp, times(n, dn)), fup);
/** Beside the line of support bolts. */
const ofLine = net(tp, minus(hp, times(supportBolts.n, supportBolts.dn)), fup);

export const plateNetShear: StrengthRule = {
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: ofPlate }],
};

/** The cleats' legs, each through its own line of bolts. */
export const cleatNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: 'web leg',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣV_dn', times(k, ofPlate), source),
      off: [noWebHoles],
    },
    {
      of: 'support leg',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣV_dn', times(k, ofLine), source),
      off: [noSupportBolts],
    },
  ],
};

/** The end plate through both lines of bolts. */
export const endPlateNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣV_dn', times(2, ofLine), source),
      limits: [fullDepthPlate],
    },
  ],
};
