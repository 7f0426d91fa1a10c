import { byKind, isCleat, isEndPlate, settledByKind } from '../../end/byKind.ts';
import type { Facts } from '../../end/facts.ts';
import { fullDepthPlate, type Gate, noWebWeld } from '../../end/gates.ts';
import { db, dt, flag, g, h, hp, r, tf, yp } from '../../end/given.ts';
import { all, minus, not, over, plus, step, times } from '../../formula/tree.ts';
import { onBeamWeb } from '../methods/supportOutline.ts';
import type { FitRule } from '../standard.ts';
import { manual } from './clauses.ts';
import { extended } from './conventional.ts';
import { inches } from './given.ts';

const source = manual(10);

/** mm: sizes that meet in inches meet in mm. */
const NOISE = 1e-9;
/** A cope takes the flange out of the way of all that stands beside the web; an angle may reach farther than the cope. */
const clears = ({ g, legWeb }: Facts, c: number, depth: number): boolean => depth > 0 && legWeb <= g + c + NOISE;
const gate = (called: string, reason: string, when: (f: Facts) => boolean): Gate => ({
  when: flag('', when, called),
  reason,
});
const copedAbove = gate('coped above', 'coped-above', (f) => clears(f, f.ct, f.dt));
const copedBelow = gate('coped below', 'coped-below', (f) => clears(f, f.cb, f.db));
const notCopedAbove = gate('not coped above', 'no-top-cope', (f) => f.dt === 0);
const notCopedBelow = gate('not coped below', 'no-bottom-cope', (f) => f.db === 0);

const notBoltedAngle: Gate = {
  when: settledByKind(
    '',
    (kind) => (isCleat(kind) ? undefined : true),
    (f) => f.legWeb === 0 || f.n === 0,
    'no angle bolted to the web',
  ),
  reason: 'no-cleat',
};

const root = step('t_f + r', plus(tf, r), source);
const foot = step('y_q', minus(h, plus(yp, hp)), source, 'foot of the plate, from below');

/** A plate of half the clear web's depth at least, between the fillets where the flanges stand; what is welded to the web on the cut web.
 * An angle bolted to the web that stands past a cope's edge comes near the support's flange: it refers. */
export const fitPlateDepth: FitRule = {
  source,
  breach: 'fails',
  parts: [
    {
      of: 'depth',
      given: hp,
      least: step('h_min', over(minus(h, times(2, plus(tf, r))), 2), source, 'half the clear web'),
      off: [fullDepthPlate],
    },
    { of: 'top', given: yp, least: root, off: [fullDepthPlate, copedAbove] },
    { of: 'bottom', given: foot, least: root, off: [fullDepthPlate, copedBelow] },
    { of: 'top', given: yp, least: dt, off: [fullDepthPlate, noWebWeld, notCopedAbove] },
    { of: 'bottom', given: foot, least: db, off: [fullDepthPlate, noWebWeld, notCopedBelow] },
    { of: 'top', given: yp, least: dt, off: [notBoltedAngle, notCopedAbove], breach: 'refer' },
    { of: 'bottom', given: foot, least: db, off: [notBoltedAngle, notCopedBelow], breach: 'refer' },
    ...onBeamWeb,
  ],
};

const longPlate: Gate = {
  when: all(extended, not(byKind('', isCleat, 'angles'))),
  reason: 'extended-plate',
};
const fills: Gate = { when: byKind('', isEndPlate, 'an end plate'), reason: 'fills-setback' };

/** Gap between support and beam; long plates have no upper limit. */
export const fitSetback: FitRule = {
  source: { clause: 'practice', basis: 'practice' },
  breach: 'refer',
  parts: [
    { of: '', given: g, least: inches('1/4', 1 / 4), off: [fills] },
    { of: '', given: g, most: inches('1', 1), off: [fills, longPlate] },
  ],
};
