import { found, supportBolts, tp, ts } from '../../end/given.ts';
import { oneLine, oneRowOfSupport, supportArm, supportSquares, supportYMax } from '../../end/supportGroup.ts';
import { least, minus, over, pick, plus, root, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import { either } from './bearingShares.ts';
import { elastic, solved } from './boltGroup.ts';
import { clause, manual } from './clauses.ts';
import { Fnvs, Fup, Fus } from './given.ts';
import { inOnePlane, shank } from './shearOfBolt.ts';

/** Nominal strengths of one bolt into the support, N: in shear, J3.7; in bearing and tear-out, J3.11. The bolts push the leg or end plate up. */
const { n, p, d, d0, eTop, eh } = supportBolts;
const bearing = clause('J3.11');

export const rvs = step('r_v', inOnePlane(Fnvs, shank(d), n, p), clause('J3.7'));

const half = over(d0, 2);
/** Bearing, and tear-out to the next hole above. */
const inner = (symbol: string, t: Tree<Length>, Fu: Tree<Stress>, note: string): Tree<Force> =>
  step(
    symbol,
    either(({ borne, torn }) =>
      pick([[oneRowOfSupport, borne(d, t, Fu)]], least(borne(d, t, Fu), torn(minus(p, d0), t, Fu))),
    ),
    bearing,
    note,
  );

export const rLeg = inner('r_l', tp, Fup, 'bolt in angle or end plate');
export const rLegTop = step(
  'r_l1',
  either(({ borne, torn }) => least(borne(d, tp, Fup), torn(minus(eTop, half), tp, Fup))),
  bearing,
  'first row, to the top of angle or end plate',
);
/** One angle's line pulls at its side edge too. */
export const rLegSide = step(
  'r_le',
  either(({ torn }) => torn(minus(eh, half), tp, Fup)),
  bearing,
  "to the angle's side edge",
);
export const rSupport = inner('r_s', ts, Fus, 'bolt in the support');

/** How many bolts' worth the line of one angle carries, V at the arm from the web's middle to the line. */
export const Cs = step(
  'C',
  pick(
    [
      [
        elastic,
        over(1, root(plus(squared(over(times(supportArm, supportYMax), supportSquares)), squared(over(1, n))))),
      ],
    ],
    found(
      '0,0',
      'instantaneous centre, R_i = R_ult (1 − e^(−3.4 ρ_i))^0.55, ρ_i = l_i/l_max',
      [n, p, supportArm],
      (_, n, p, e) => solved(n!, 1, p!, 0, e!),
    ),
  ),
  manual(7),
);

/** Of bolts that are all alike: two lines carry V evenly, one line as C. */
export const alike = (r: Tree<Force>): Tree<Force> => pick([[oneLine, times(Cs, r)]], times(supportBolts.lines, n, r));
