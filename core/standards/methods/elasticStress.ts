import { coped as endCoped, type Gate, isChannel, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, rectangle, tee, V, whole } from '../../end/given.ts';
import { all, not, over, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';

const informs = not(flag('option elastic-shear: verdict', (f) => f.options['elastic-shear'] === 'verdict'));
const copedChannel: Gate = { when: all(isChannel, endCoped), reason: 'channel-cope' };

/**
 * Elastic shear stress V Q/(I t) at its peak in the web, MPa, of the full section and behind each cope: for information, held to the
 * standard's limiting stress, where it has one, under option `elastic-shear: verdict`.
 */
export const elasticStress = (
  source: Source,
  resistance?: Tree<Stress>,
): { readonly stressFull: StrengthRule; readonly stressCope: StrengthRule } => {
  const way = (of: string, section: Pick<Cut, 'I' | 'Q' | 't'>, off: readonly Gate[]): Way => ({
    of,
    symbol: 'τ',
    load: 'V',
    demand: step('τ', over(times(V, section.Q), times(section.I, section.t)), source),
    ...(resistance && { resistance }),
    off,
    informs,
  });
  return {
    stressFull: { source, ways: [way('', whole, [])] },
    stressCope: {
      source,
      ways: [
        way('rectangle', rectangle, [copedChannel, uncoped, noRectangle]),
        way('tee', tee, [copedChannel, uncoped, noTee]),
      ],
    },
  };
};
