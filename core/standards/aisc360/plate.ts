import { byKind } from '../../end/byKind.ts';
import type { Gate } from '../../end/gates.ts';
import { flag, hp, tp, tw, V, z1 } from '../../end/given.ts';
import { plateNetPlastic } from '../../end/netSections.ts';
import { constant, cubed, over, pick, plus, root, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Moment } from '../../units/dimension.ts';
import { barFactor } from '../methods/plateBuckling.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { barMoment } from './bar.ts';
import { clause, manual } from './clauses.ts';
import { conventionalPlate } from './conventional.ts';
import { older } from './copeBending.ts';
import { Fup, Fyp, KSI } from './given.ts';
import { bending, type Method, rupture, shearYielding } from './method.ts';
import { plateYield } from './shear.ts';

const source = manual(10);
const ruptured = clause('J4.5');

/** The ply beyond the bolts is not described: how it bends has to be checked apart. */
const notDescribed: Gate = {
  when: byKind('', (kind) => kind === 'web-bolts', 'web bolts'),
  reason: 'ply-not-described',
};
const off = [notDescribed, conventionalPlate];

const moment = step('M', times(V, z1), source);
const plastic = step('M_p', over(times(Fyp, tp, squared(hp)), 4), source);
const netMoment = step('M_n', times(Fup, plateNetPlastic), ruptured);

/** Extended plates: bending with shear at the first bolt column, 10-5; rupture through its holes. */
export const plateBending = (method: Method): StrengthRule => {
  const Vc = step('V_c', plateYield(method), source);
  const Mc = step('M_c', method.available(plastic, bending, source, 'M_p'), source);
  return {
    source,
    ways: [
      {
        of: 'with shear',
        symbol: 'V',
        load: 'V',
        demand: V,
        resistance: step('V_a', over(1, root(plus(squared(over(1, Vc)), squared(over(z1, Mc))))), source),
        off,
      },
      {
        of: 'rupture',
        symbol: 'V z_1',
        load: 'V',
        demand: moment,
        resistance: method.available(netMoment, rupture, ruptured, 'M_n'),
        off,
        source: ruptured,
      },
    ],
  };
};

const bar = barMoment({ depth: hp, t: tp, Lb: z1, Cb: constant('C_b', 1.84), Fy: Fyp });
const olderMoment = step('M_n', over(times(barFactor(Fyp), Fyp, tp, squared(hp)), 6), source);
const barStrength: Tree<Moment> = pick([[older, olderMoment]], bar);
const unbraced = step(
  'R_n',
  over(times(constant('1500 ksi', 1500 * KSI, '-2,1'), constant('π', Math.PI), hp, cubed(tp)), squared(z1)),
  source,
);
const noTwist: Gate = {
  when: flag('', (f) => f.options['lap-torsion'] === 'none', 'option lap-torsion: none'),
  reason: 'held-against-twist',
};
const twist: Tree<Force> = step(
  'R_n',
  over(times(0.6, Fyp, hp, squared(tp)), plus(tw, times(2, tp))),
  source,
  'no share of the flange',
);

/** Extended plates without stiffeners: lateral buckling between weld and bolts, 10-6, twist of the lap, 10-7. */
export const plateBuckling = ({ available }: Method): StrengthRule => {
  const asReaction = (of: string, resistance: Tree<Force>, more: readonly Gate[] = []): Way => ({
    of,
    symbol: 'V',
    load: 'V',
    demand: V,
    resistance,
    off: [...off, ...more],
  });
  return {
    source,
    ways: [
      {
        of: 'bar',
        symbol: 'V z_1',
        load: 'V',
        demand: moment,
        resistance: available(barStrength, bending, source, 'M_n'),
        off,
      },
      asReaction('plate not stiffened', available(unbraced, bending, source)),
      asReaction('twist of the lap', available(twist, shearYielding, source), [noTwist]),
    ],
  };
};
