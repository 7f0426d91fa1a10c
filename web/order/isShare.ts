import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';

/** The reaction is given as a share of the full section's shear; else as a force. */
export const isShare = (): boolean => textOf(entry.value, 'reaction.by') === 'share';
