import type { Source } from '../../formula/tree.ts';

/** A clause of ANSI/AISC 360-22: numbers and formulas from memory. */
export const clause = (number: string): Source => ({ clause: number, basis: 'memory' });

/** A part of the Steel Construction Manual, 15th and 16th edition, from memory. */
export const manual = (part: number): Source => ({ clause: `Manual Part ${part}`, basis: 'memory' });
