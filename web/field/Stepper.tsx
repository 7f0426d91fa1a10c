import { step } from '../state/edits.ts';

interface StepperProps {
  readonly path: string;
  readonly label: string;
}

/** Minus and plus beside a size: what the arrow keys do, for hands without a keyboard. */
export const Stepper = ({ path, label }: StepperProps) => (
  <span class="stepper">
    <button type="button" tabIndex={-1} aria-label={`${label} less`} onClick={() => step(path, -1)}>
      −
    </button>
    <button type="button" tabIndex={-1} aria-label={`${label} more`} onClick={() => step(path, 1)}>
      +
    </button>
  </span>
);
