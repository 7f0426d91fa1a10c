import { byKind, isEndPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate } from '../../end/gates.ts';
import { fu, fup, k, tw, V } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { legWeldForce, legWeldLength } from '../../end/weldGroup.ts';
import { least, over, pick, root, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { gm0 } from './factors.ts';
import { countedOf, filletStrength, limitsOf, source } from './fillet.ts';
import { fuw, fyw } from './given.ts';

const yields = { clause: '8.4.1', basis: 'practice' } as const;
const endPlate: Gate = { when: byKind('', isEndPlate, 'an end plate'), reason: 'covered' };

const length = countedOf(pick([[endPlate.when, plateOnWeb]], legWeldLength));
const mild = step('f_u', least(fuw, fup, fu), source, 'weld metal, plate or web');
/**
 * Two fillets of the end plate's depth share V. The C-shaped weld of a cleat's web leg holds it at its arm too; its force, found on the whole
 * length, grows as the length that counts is shorter.
 */
const force = step(
  'q_e',
  pick([[endPlate.when, over(V, times(2, length))]], times(legWeldForce, over(legWeldLength, length))),
  source,
);

/**
 * Fillets along the beam's web, IS 800:2007 cl. 10.5, N/mm of one fillet; behind the weld of a cleat's leg the web in shear yield too
 * (rational, both cleats of a pair pull on the same web). Beside an end plate the web has its own check.
 */
export const weldWeb: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'q_e',
      load: 'V',
      demand: force,
      resistance: filletStrength(length, mild),
      limits: [...limitsOf(length), fullDepthPlate],
    },
    {
      of: 'web',
      symbol: 'Σq_w',
      load: 'V',
      demand: step('Σq_w', times(k, legWeldForce), source),
      resistance: step('q_y', over(times(fyw, tw), times(root(3), gm0)), yields, 'yield in shear'),
      off: [endPlate],
      source: yields,
    },
  ],
};
