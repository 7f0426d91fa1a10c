import { copeLimits, fullDepthPlate, noSupportBolts, noWebHoles } from '../../end/gates.ts';
import { dn, fu, fup, ho, hp, k, n, supportBolts, tp, tw, V } from '../../end/given.ts';
import { minus, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Pure } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';

/** Rupture in shear through one bolt column: the net-shear term of SANS 10162-1:2011 cl. 13.11 on its own. */
const source = { clause: '13.11', basis: 'memory' } as const;

export const webNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(0.6, phi, fu, tw, minus(ho, times(n, dn))), source),
      limits: copeLimits,
    },
  ],
};

export const plateNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(0.6, phi, fup, tp, minus(hp, times(n, dn))), source),
    },
  ],
};

const depthLeft = (rows: Tree<Pure>, hole: Tree<Length>): Tree<Length> => minus(hp, times(rows, hole));
const inSupport = depthLeft(supportBolts.n, supportBolts.dn);

const fitting = (of: string, count: Tree<Pure> | 2, left: Tree<Length>): Way => ({
  of,
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: step('V_r', times(count, 0.6, phi, fup, tp, left), source),
});

/** Through the bolts of each leg of the cleats. */
export const cleatNetShear: StrengthRule = {
  source,
  ways: [
    { ...fitting('web leg', k, depthLeft(n, dn)), off: [noWebHoles] },
    { ...fitting('support leg', k, inSupport), off: [noSupportBolts] },
  ],
};

/** Through both lines of bolts of an end plate. */
export const endPlateNetShear: StrengthRule = {
  source,
  ways: [{ ...fitting('', 2, inSupport), limits: [fullDepthPlate] }],
};
