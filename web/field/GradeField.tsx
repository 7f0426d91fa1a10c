import type { TargetedEvent, TargetedKeyboardEvent } from 'preact';
import { entry } from '../state/bench.ts';
import { choose } from '../state/choose.ts';
import { textOf } from '../state/entry.ts';
import { faultAt, isAssumed } from '../state/fieldText.ts';
import { Field } from './Field.tsx';
import { FieldNotes } from './FieldNotes.tsx';
import { walk } from './walk.ts';

interface GradeFieldProps {
  /** Path of a steel grade or of a bolt's class. */
  readonly path: string;
  readonly label: string;
  readonly names: readonly string[];
  /** Strengths asked for where no name is given. */
  readonly strengths: readonly { readonly name: string; readonly label: string }[];
}

const OWN = '(own)';

/** A grade by its name, or by its strengths. */
export const GradeField = ({ path, label, names, strengths }: GradeFieldProps) => {
  const id = `box-${path}`;
  const own = textOf(entry.value, `${path}.by`) === 'strength';
  const value = textOf(entry.value, path);
  const pick = (picked: string) => {
    if (picked === OWN) choose(`${path}.by`, 'strength');
    else choose(path, picked, { [`${path}.by`]: '' });
  };
  return (
    <>
      <div class={`field choice${faultAt(path) ? ' faulty' : ''}`}>
        <label for={id}>{label}</label>
        <select
          id={id}
          class={`input${isAssumed(path) ? ' assumed' : ''}`}
          data-field={path}
          value={own ? OWN : value}
          aria-invalid={faultAt(path) !== ''}
          aria-describedby={`${id}-notes`}
          onChange={(event: TargetedEvent<HTMLSelectElement>) => pick(event.currentTarget.value)}
          onKeyDown={(event: TargetedKeyboardEvent<HTMLSelectElement>) => {
            if (event.key !== 'Enter') return;
            event.preventDefault();
            walk(event.currentTarget, event.shiftKey);
          }}
        >
          {value === '' && !own && <option value="">choose</option>}
          {value !== '' && !names.includes(value) && <option value={value}>{value}</option>}
          {names.map((name) => (
            <option key={name} value={name}>
              {name}
            </option>
          ))}
          <option value={OWN}>own strength</option>
        </select>
        <FieldNotes path={path} id={`${id}-notes`} />
      </div>
      {own && strengths.map(({ name, label: of }) => <Field key={name} path={`${path}.${name}`} label={of} />)}
    </>
  );
};
