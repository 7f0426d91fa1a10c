import { byKind, isEndPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate } from '../../end/gates.ts';
import { k, tw, V } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { legWeldForce, legWeldLength } from '../../end/weldGroup.ts';
import { over, pick, step, times } from '../../formula/tree.ts';
import { legAboveEdge } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { fyw } from './given.ts';
import { belowLeast, filletStrength, source } from './weld.ts';

const endPlate: Gate = { when: byKind('', isEndPlate, 'an end plate'), reason: 'covered' };

/** Two fillets of the end plate's depth share V; the C-shaped weld of a cleat's web leg holds it at its arm too. */
const force = step('v*', pick([[endPlate.when, over(V, times(2, plateOnWeb))]], legWeldForce), source);
const length = pick([[endPlate.when, plateOnWeb]], legWeldLength);

/**
 * Fillets along the beam's web, AS 4100:2020 cl. 9.6.3.10, N/mm of one fillet; behind the weld of a cleat's leg the web in shear yield too
 * (rational, both cleats of a pair pull on the same web). Beside an end plate the web has its own check.
 */
export const weldWeb: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v*',
      load: 'V',
      demand: force,
      resistance: filletStrength(length),
      limits: [fullDepthPlate, belowLeast, legAboveEdge],
    },
    {
      of: 'web',
      symbol: 'Σv*',
      load: 'V',
      demand: step('Σv*', times(k, legWeldForce), source),
      resistance: step('φv_y', times(phi, 0.6, fyw, tw), { clause: '5.11.4', basis: 'practice' }, 'yield in shear'),
      off: [endPlate],
      source: { clause: '5.11.4', basis: 'practice' },
    },
  ],
};
