import { coped as endCoped, type Gate, isChannel, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, fy, rectangle, tee, V, whole } from '../../end/given.ts';
import { all, not, over, step, times } from '../../formula/tree.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';

/** Elastic shear stress V Q/(I t) at its peak in the web, held to 0.66 φ f_y where option `elastic-shear: verdict` asks for it. */
const source = { clause: '13.4 rational', basis: 'memory' } as const;
const informs = not(flag('option elastic-shear: verdict', (f) => f.options['elastic-shear'] === 'verdict'));
const resistance = step('τ_r', times(0.66, phi, fy), source);

const way = (of: string, section: Pick<Cut, 'I' | 'Q' | 't'>, off: readonly Gate[]): Way => ({
  of,
  symbol: 'τ',
  load: 'V',
  demand: step('τ', over(times(V, section.Q), times(section.I, section.t)), source),
  resistance,
  off,
  informs,
});

const coped: Gate = { when: all(isChannel, endCoped), reason: 'channel-cope' };

export const stressFull: StrengthRule = { source, ways: [way('', whole, [])] };
export const stressCope: StrengthRule = {
  source,
  ways: [way('rectangle', rectangle, [coped, uncoped, noRectangle]), way('tee', tee, [coped, uncoped, noTee])],
};
