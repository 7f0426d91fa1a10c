import type { TargetedEvent, TargetedKeyboardEvent } from 'preact';
import { useLayoutEffect, useRef } from 'preact/hooks';
import { editing, focused } from '../state/bench.ts';
import { leave, revert, step, write } from '../state/edits.ts';
import { fieldAt } from '../state/fields.ts';
import { faultAt, isAssumed, shown, unitAt } from '../state/fieldText.ts';
import { afterPointer } from './afterPointer.ts';
import { FieldNotes } from './FieldNotes.tsx';
import { Stepper } from './Stepper.tsx';
import { walk } from './walk.ts';

export interface FieldProps {
  /** Path in the JSON of the end, such as `joint.bolts.pitch`. */
  readonly path: string;
  readonly label: string;
  /** Unit shown behind the field; absent = that of the field's quantity. */
  readonly unit?: string;
  /** Width in digits; absent = what the variant needs. */
  readonly width?: number;
  /** `box`: label, box, unit and steppers in a row. `drawn`: the number alone, on the drawing. */
  readonly variant?: 'box' | 'drawn';
  /** What an empty field means, said under it. */
  readonly empty?: string;
}

type InputKey = TargetedKeyboardEvent<HTMLInputElement>;

const onKey = (path: string, event: InputKey): void => {
  const { key, shiftKey, ctrlKey, metaKey, altKey } = event;
  if (ctrlKey || metaKey || altKey) return;
  const number = fieldAt(path).kind !== 'words';
  if (key === 'Enter') walk(event.currentTarget, shiftKey);
  else if (number && (key === 'ArrowUp' || key === 'ArrowDown')) step(path, key === 'ArrowUp' ? 1 : -1, shiftKey);
  else if (key === 'Escape' && editing.value === path) revert(path);
  else return;
  event.preventDefault();
  event.stopPropagation();
};

/** One input bound to a path of the end. Arrows step, Enter goes to the next field, Escape takes the typing back. */
export const Field = ({ path, label, unit = unitAt(path), width, variant = 'box', empty = '' }: FieldProps) => {
  const id = `${variant}-${path}`;
  const { kind } = fieldAt(path);
  const fault = faultAt(path);
  const text = shown(path);
  const input = useRef<HTMLInputElement>(null);
  // A value that changes under the cursor, by a step or a proposal, is typed over as a whole.
  useLayoutEffect(() => {
    if (editing.value === path || document.activeElement !== input.current) return;
    // Selecting makes the browser lay out the page: not before all of it is written.
    queueMicrotask(() => input.current?.select());
  }, [text]);
  const digits = width ?? (variant === 'drawn' ? Math.max(2, text.length) : undefined);
  const field = (
    <input
      ref={input}
      id={id}
      class={`input${isAssumed(path) ? ' assumed' : ''}`}
      type="text"
      inputMode={kind === 'quantity' ? 'decimal' : kind === 'count' ? 'numeric' : 'text'}
      autoComplete="off"
      spellcheck={false}
      data-field={path}
      value={text}
      style={digits === undefined ? undefined : { width: `calc(${digits}ch + var(--field-pad, 14px))` }}
      aria-label={variant === 'drawn' ? `${label}${unit && `, ${unit}`}` : undefined}
      aria-invalid={fault !== ''}
      aria-describedby={`${id}-notes`}
      onInput={(event: TargetedEvent<HTMLInputElement>) => {
        editing.value = path;
        write(path, event.currentTarget.value);
      }}
      onFocus={(event: TargetedEvent<HTMLInputElement>) => {
        focused.value = path;
        event.currentTarget.select();
      }}
      onBlur={() => {
        if (focused.value === path) focused.value = null;
        afterPointer(() => leave(path));
      }}
      onKeyDown={(event: InputKey) => onKey(path, event)}
    />
  );
  if (variant === 'drawn') {
    return (
      <span class={`field drawn${fault ? ' faulty' : ''}`}>
        {field}
        <FieldNotes path={path} id={`${id}-notes`} />
      </span>
    );
  }
  return (
    <div class={`field ${kind}${fault ? ' faulty' : ''}`}>
      <label for={id}>{label}</label>
      {field}
      {kind !== 'words' && <span class="unit">{unit}</span>}
      {kind !== 'words' && <Stepper path={path} label={label} />}
      <FieldNotes path={path} id={`${id}-notes`} empty={empty} />
    </div>
  );
};
