import { intactFlange } from '../../end/gates.ts';
import { fu, V } from '../../end/given.ts';
import { webTearUp } from '../../end/tearPaths.ts';
import { least, most, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { fyw, nothing, ruptureShear, yieldShear } from './given.ts';

const source = { clause: '6.4.1 planes', basis: 'practice' } as const;
const { t, columns, Lgv, Lnv } = webTearUp;

/** Two planes beside each bolt column up to the cut edge: the shear terms of IS 800:2007 cl. 6.4.1 applied rationally, no clause of its own. */
export const webTearout: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step(
        'V_t',
        times(columns, least(yieldShear(times(2, t, Lgv), fyw), ruptureShear(most(times(2, t, Lnv), nothing), fu))),
        source,
      ),
      off: [intactFlange],
    },
  ],
};
