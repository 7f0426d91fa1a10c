import type { Source } from '../../formula/tree.ts';

/** A clause of EN 1993 by its part, read in a published secondary source or remembered. */
export const seen = (clause: string): Source => ({ clause, basis: 'seen' });
export const memory = (clause: string): Source => ({ clause, basis: 'memory' });

/** Steel Buildings in Europe, Multi-Storey Steel Buildings, Part 5: Joint Design (2008): the simple-joint rules in their European form. */
export const guide: Source = seen('joint guide 2008');
