import { J, N, xMax, yMax } from '../../end/boltGroup.ts';
import { flag, found, m, n, p, q } from '../../end/given.ts';
import { boltCurve, coefficientsBy, pureMoment } from '../../end/instantaneousCentre.ts';
import { over, pick, plus, root, squared, step, times } from '../../formula/tree.ts';
import { manual } from './clauses.ts';
import { concentric, e } from './conventional.ts';

const source = manual(7);
export const elastic = flag('option bolt-group: elastic', (f) => f.options['bolt-group'] === 'elastic');
/** C of a pattern at an arm. */
export const solved = coefficientsBy(boltCurve);

/** How many bolts' worth an eccentric group carries: instantaneous centre per R_ult, not rescaled; or the elastic vector sum. */
export const C = step(
  'C',
  pick(
    [
      [concentric, N],
      [
        elastic,
        over(1, root(plus(squared(over(times(e, yMax), J)), squared(plus(over(1, N), over(times(e, xMax), J)))))),
      ],
    ],
    found(
      '0,0',
      'instantaneous centre, R_i = R_ult (1 − e^(−3.4 ρ_i))^0.55, ρ_i = l_i/l_max',
      [n, m, p, q, e],
      (_, n, m, p, q, e) => solved(n!, m!, p!, q!, e!),
    ),
  ),
  source,
);

/** Moment that the group holds about its centroid over one bolt's strength, mm. */
export const Cmoment = step(
  'C′',
  found('1,0', 'Σ R_i l_i/R_ult about the centroid', [n, m, p, q], (_, n, m, p, q) =>
    pureMoment({ n: n!, m: m!, p: p!, q: q! }),
  ),
  source,
);
