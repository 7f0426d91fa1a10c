import type { ExaminedNumbers } from '../check/examined.ts';
import { examineNumbers } from '../check/examineNumbers.ts';
import type { SaidFault, Verdict } from '../check/report.ts';
import { type StrengthName, strengthNames } from '../end/checkNames.ts';
import type { Cell, Why } from './card.ts';
import { cardEnd, type Place } from './cardEnd.ts';

/** A cell with what it was made from. */
export interface Looked {
  readonly cell: Cell;
  /** The end at the reaction of the cell, else without one; absent where its geometry cannot be. */
  readonly examined?: ExaminedNumbers;
  readonly faults: readonly SaidFault[];
}

/** Reactions a unit that are told apart: whole kN, tenths of a kip. */
const stepsOf = { 'mm-kN': 1, 'in-kip': 10 } as const;
/** A capacity that sits on a step up to rounding noise stays on it, if the end still holds there. */
const NOISE = 1e-9;

const because = ({ report }: ExaminedNumbers, verdict: Verdict): readonly Why[] =>
  report.checks
    .filter(({ state }) => state === verdict)
    .map(({ id, title, reasonText }) => ({ code: id, title, text: reasonText ?? '' }));

const isStrength = (id: string): id is StrengthName => (strengthNames as readonly string[]).includes(id);

const without = (examined: ExaminedNumbers, verdict: 'fails' | 'refer'): Looked => ({
  cell: { verdict, because: because(examined, verdict) },
  examined,
  faults: [],
});

/** At this reaction: the number and what comes next, or why there is none. */
const lookedAt = (examined: ExaminedNumbers, reaction: number): Looked => {
  const { verdict, governing } = examined.report;
  if (verdict !== 'holds') return without(examined, verdict);
  if (!isStrength(governing)) return without(examined, 'refer');
  return { cell: { verdict, reaction, governing }, examined, faults: [] };
};

/**
 * What the template's end carries in this section with so many rows. The number is a reaction at which a full check of that end holds: the capacity
 * rounded down, examined once more at that reaction.
 */
export const cellOf = (template: unknown, section: string, rows: number): Looked => {
  const at = (reaction: Place['reaction']) => examineNumbers(cardEnd(template, { section, rows, reaction }));
  const unloaded = at(0);
  if ('faults' in unloaded) {
    const { faults } = unloaded;
    return {
      cell: { verdict: 'fails', because: faults.map(({ code, text }) => ({ code, title: '', text })) },
      faults,
    };
  }
  const { examined } = unloaded;
  const { verdict, capacity, units } = examined.report;
  if (verdict !== 'holds') return without(examined, verdict);
  if (capacity === null) return without(examined, 'refer');
  const steps = Math.floor(capacity * stepsOf[units] + NOISE);
  let found = without(examined, 'fails');
  for (const step of [steps, steps - 1]) {
    const reaction = step / stepsOf[units];
    const loaded = reaction > 0 ? at(reaction) : unloaded;
    if (reaction <= 0 || 'faults' in loaded) return found;
    found = lookedAt(loaded.examined, reaction);
    if (found.cell.verdict !== 'fails') return found;
  }
  return found;
};
