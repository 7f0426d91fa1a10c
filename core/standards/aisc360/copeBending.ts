import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, rectangle, tee, tw, V } from '../../end/given.ts';
import { netRectangle, netTee, noNetRectangle, noNetTee, plainTee } from '../../end/netSections.ts';
import { least, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Moment } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { clause, manual } from './clauses.ts';
import { Fu, Fy } from './given.ts';
import { bending, type Method, rupture } from './method.ts';

const source = manual(9);
const ruptured = clause('J4.5');

/** Option of the 14th edition: first yield. */
export const older = flag('option cope-method: older', (f) => f.options['cope-method'] === 'older');
const topCut = flag('top cope', (f) => f.tee.topCut);

/** Moduli of the web between two copes. */
export const plainRectangle = {
  S: step('S', over(times(tw, squared(rectangle.depth)), 6), source),
  Z: step('Z', over(times(tw, squared(rectangle.depth)), 4), source),
};

const ofRectangle = step('M_n', pick([[older, times(Fy, plainRectangle.S)]], times(Fy, plainRectangle.Z)), source);
const ofTee = step(
  'M_n',
  pick(
    [
      [older, times(Fy, plainTee.S)],
      [topCut, times(Fy, plainTee.Z)],
    ],
    least(times(Fy, plainTee.Z), times(1.6, Fy, plainTee.S)),
  ),
  source,
);
const ruptureOf = (net: typeof netTee): Tree<Moment> =>
  step('M_n', times(Fu, net.S), ruptured, 'no equation in the standard: elastic net section');

const inside = (none: Gate['when']): Gate => ({ when: none, reason: 'no-hole-in-cope' });
const limits = [channelCope, ...copeLimits];

/** Bending of what is left under the reaction: yield at each cope's face, rupture at the bolt columns inside a cope. */
export const copeBending = ({ available }: Method): StrengthRule => {
  const way = (of: string, arm: Tree<Length>, symbol: string, resistance: Tree<Moment>, off: Gate): Way => ({
    of,
    symbol: `V ${symbol}`,
    load: 'V',
    demand: step('M', times(V, arm), source),
    resistance,
    off: [uncoped, off],
    limits,
  });
  const yields = (of: string, cut: Cut, strength: Tree<Moment>, off: Gate): Way =>
    way(of, cut.ec, 'e_c', available(strength, bending, source, 'M_n'), off);
  const ruptures = (of: string, net: typeof netTee, none: Gate['when']): Way => ({
    ...way(of, net.arm, 'e_j', available(ruptureOf(net), rupture, ruptured, 'M_n'), inside(none)),
    source: ruptured,
  });
  return {
    source,
    ways: [
      yields('rectangle', rectangle, ofRectangle, noRectangle),
      yields('tee', tee, ofTee, noTee),
      ruptures('rupture, rectangle', netRectangle, flag('', noNetRectangle, 'no hole between two copes')),
      ruptures('rupture, tee', netTee, flag('', noNetTee, 'no hole in the tee')),
    ],
  };
};
