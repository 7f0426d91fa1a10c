import { noSupportBolts, pairOfCleats } from '../../end/gates.ts';
import { found, hp, supportBolts, tp, V } from '../../end/given.ts';
import { supportArm } from '../../end/supportGroup.ts';
import { supportLegArm } from '../../end/weldGroup.ts';
import { over, pick, squared, step, times } from '../../formula/tree.ts';
import { netPlasticModulus } from '../../shape/netSection.ts';
import type { StrengthRule } from '../standard.ts';
import { clause, manual } from './clauses.ts';
import { Fup, Fyp } from './given.ts';
import { bending, type Method, rupture } from './method.ts';

const source = manual(10);
const ruptured = clause('J4.5');

/** From the middle of the web to what holds the leg on the support: its line of bolts, or the weld along its toe, mm. */
export const cleatArm = pick([[noSupportBolts.when, supportLegArm]], supportArm);

const plastic = step('M_n', over(times(Fyp, tp, squared(hp)), 4), source);
const { eTop, n, p, dn } = supportBolts;
const net = step(
  'Z_net',
  found(
    '3,0',
    'halves of equal area, holes d′ out at their heights',
    [tp, hp, eTop, n, p, dn],
    (_, tp, hp, eTop, n, p, dn) => netPlasticModulus(tp!, hp!, { first: eTop!, pitch: p!, count: n!, diameter: dn! }),
  ),
);
const netMoment = step('M_n', times(Fup, net), ruptured);

/** The leg of one angle on the support, bent in its plane by V at its arm: yielding of its depth, rupture through the bolts. */
export const cleatBending = ({ available }: Method): StrengthRule => {
  const way = { symbol: 'V e_s', load: 'V', demand: step('M', times(V, cleatArm), source) } as const;
  return {
    source,
    ways: [
      { ...way, of: 'yield', resistance: available(plastic, bending, source, 'M_n'), off: [pairOfCleats] },
      {
        ...way,
        of: 'rupture',
        resistance: available(netMoment, rupture, ruptured, 'M_n'),
        off: [pairOfCleats, noSupportBolts],
        source: ruptured,
      },
    ],
  };
};
