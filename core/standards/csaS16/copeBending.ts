import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, rectangle, tee, V } from '../../end/given.ts';
import { step, times } from '../../formula/tree.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';
import { Fy } from './given.ts';

/** Bending of what remains at each cope's face under V e_c: first yield of the cut edge, holes not taken off. */
const source = { clause: 'elastic', basis: 'memory' } as const;

const way = (of: 'rectangle' | 'tee', cut: Cut, off: Gate): Way => ({
  of,
  symbol: 'V e_c',
  load: 'V',
  demand: step('M', times(V, cut.ec), source),
  resistance: step('M_r', times(phi, Fy, cut.W), source),
  off: [uncoped, off],
  limits: [channelCope, ...copeLimits],
});

export const copeBending: StrengthRule = {
  source,
  ways: [way('rectangle', rectangle, noRectangle), way('tee', tee, noTee)],
};
