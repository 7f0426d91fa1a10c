import type { TargetedKeyboardEvent } from 'preact';
import { walk } from './walk.ts';

interface SegmentsProps<T extends string> {
  readonly name: string;
  /** Said aloud before the choices. */
  readonly title: string;
  readonly choices: readonly { readonly value: T; readonly label: string }[];
  readonly inForce: T;
  readonly set: (value: T) => void;
  /** Path of the field, where it is one of the end. */
  readonly path?: string;
}

const onKey = (event: TargetedKeyboardEvent<HTMLInputElement>): void => {
  if (event.key !== 'Enter' || event.currentTarget.dataset.field === undefined) return;
  event.preventDefault();
  walk(event.currentTarget, event.shiftKey);
};

/** A choice between few ways, all of them in sight. */
export const Segments = <T extends string>({ name, title, choices, inForce, set, path }: SegmentsProps<T>) => (
  <fieldset class="segments">
    <legend class="unseen">{title}</legend>
    {choices.map(({ value, label }) => (
      <label key={value}>
        <input
          type="radio"
          name={name}
          checked={inForce === value}
          data-field={inForce === value ? path : undefined}
          onChange={() => set(value)}
          onKeyDown={onKey}
        />
        <span>{label}</span>
      </label>
    ))}
  </fieldset>
);
