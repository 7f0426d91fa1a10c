import type { TargetedEvent, TargetedKeyboardEvent } from 'preact';
import { entry, focused } from '../state/bench.ts';
import { choose } from '../state/choose.ts';
import { textOf } from '../state/entry.ts';
import { faultAt, isAssumed } from '../state/fieldText.ts';
import { FieldNotes } from './FieldNotes.tsx';
import { walk } from './walk.ts';

export interface Option {
  readonly value: string;
  readonly label: string;
}

interface ChoiceProps {
  readonly path: string;
  readonly label: string;
  readonly options: readonly Option[];
  /** What an empty field means; absent = one of the options must be chosen. */
  readonly empty?: string;
}

type SelectKey = TargetedKeyboardEvent<HTMLSelectElement>;

/** A short list bound to a path. A value that is not in the list stays, and its fault stands beside it. */
export const Choice = ({ path, label, options, empty }: ChoiceProps) => {
  const id = `box-${path}`;
  const value = textOf(entry.value, path);
  const known = value === '' || options.some((one) => one.value === value);
  return (
    <div class={`field choice${faultAt(path) ? ' faulty' : ''}`}>
      <label for={id}>{label}</label>
      <select
        id={id}
        class={`input${isAssumed(path) ? ' assumed' : ''}`}
        data-field={path}
        value={value}
        aria-invalid={faultAt(path) !== ''}
        aria-describedby={`${id}-notes`}
        onChange={(event: TargetedEvent<HTMLSelectElement>) => choose(path, event.currentTarget.value)}
        onFocus={() => {
          focused.value = path;
        }}
        onBlur={() => {
          if (focused.value === path) focused.value = null;
        }}
        onKeyDown={(event: SelectKey) => {
          if (event.key !== 'Enter') return;
          event.preventDefault();
          walk(event.currentTarget, event.shiftKey);
        }}
      >
        {(empty !== undefined || value === '') && <option value="">{empty ?? 'choose'}</option>}
        {!known && <option value={value}>{value}</option>}
        {options.map((one) => (
          <option key={one.value} value={one.value}>
            {one.label}
          </option>
        ))}
      </select>
      <FieldNotes path={path} id={`${id}-notes`} />
    </div>
  );
};
