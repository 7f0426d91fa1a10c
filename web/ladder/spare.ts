import { fixed } from '../../core/units/figures.ts';
import { verdictWords as say } from '../../core/words/verdictWords.ts';

/** What the reaction may still grow by, rounded down, or by how much it is too large, rounded up. */
export interface Spare {
  readonly short: boolean;
  readonly amount: string;
}

export const spareOf = (reaction: number, failsAt: number): Spare => {
  // Tenths that are whole up to rounding noise stay whole.
  const tenths = (failsAt - reaction) * 10;
  return tenths >= 0
    ? { short: false, amount: fixed(Math.floor(tenths + 1e-9) / 10, 1) }
    : { short: true, amount: fixed(Math.ceil(-tenths - 1e-9) / 10, 1) };
};

/** The same in words. */
export const spareText = (reaction: number, failsAt: number, force: string): string => {
  const { short, amount } = spareOf(reaction, failsAt);
  return `${amount} ${force} ${short ? say.short : say.toSpare}`;
};
