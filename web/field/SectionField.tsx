import { useSignal } from '@preact/signals';
import type { TargetedEvent, TargetedKeyboardEvent } from 'preact';
import { editing, focused } from '../state/bench.ts';
import { leave, revert, write } from '../state/edits.ts';
import { faultAt, isAssumed, shown } from '../state/fieldText.ts';
import { afterPointer } from './afterPointer.ts';
import { FieldNotes } from './FieldNotes.tsx';
import { suggestSections } from './suggest.ts';
import { walk } from './walk.ts';

interface SectionFieldProps {
  readonly path: string;
  readonly label: string;
}

/** Free text for a section, with the nearest names offered while typing. */
export const SectionField = ({ path, label }: SectionFieldProps) => {
  const id = `box-${path}`;
  const open = useSignal(false);
  const at = useSignal(-1);
  const offered = open.value ? suggestSections(shown(path)) : [];
  const pick = (name: string) => {
    write(path, name);
    editing.value = null;
    open.value = false;
  };
  const move = (by: number) => {
    open.value = true;
    const { length } = suggestSections(shown(path));
    if (length > 0) at.value = (Math.max(at.value, by < 0 ? 0 : -1) + by + length) % length;
  };
  const onKey = (event: TargetedKeyboardEvent<HTMLInputElement>) => {
    const choice = offered[at.value];
    if (event.key === 'ArrowDown') move(1);
    else if (event.key === 'ArrowUp') move(-1);
    else if (event.key === 'Enter') {
      if (choice !== undefined) pick(choice);
      open.value = false;
      walk(event.currentTarget, event.shiftKey);
    } else if (event.key === 'Escape' && (open.value || editing.value === path)) {
      if (!open.value) revert(path);
      open.value = false;
    } else return;
    event.preventDefault();
    event.stopPropagation();
  };
  return (
    <div class={`field words section${faultAt(path) ? ' faulty' : ''}`}>
      <label for={id}>{label}</label>
      <input
        id={id}
        class={`input${isAssumed(path) ? ' assumed' : ''}`}
        type="text"
        role="combobox"
        aria-expanded={offered.length > 0}
        aria-controls={`${id}-names`}
        aria-autocomplete="list"
        aria-activedescendant={offered[at.value] === undefined ? undefined : `${id}-name-${at.value}`}
        aria-invalid={faultAt(path) !== ''}
        aria-describedby={`${id}-notes`}
        autoComplete="off"
        spellcheck={false}
        data-field={path}
        value={shown(path)}
        onInput={(event: TargetedEvent<HTMLInputElement>) => {
          editing.value = path;
          open.value = true;
          at.value = -1;
          write(path, event.currentTarget.value);
        }}
        onFocus={(event: TargetedEvent<HTMLInputElement>) => {
          focused.value = path;
          event.currentTarget.select();
        }}
        onBlur={() => {
          if (focused.value === path) focused.value = null;
          open.value = false;
          afterPointer(() => leave(path));
        }}
        onKeyDown={onKey}
      />
      <div id={`${id}-names`} class="names" role="listbox" aria-label={`${label}: names`} hidden={offered.length === 0}>
        {offered.map((name, index) => (
          // biome-ignore lint/a11y/useKeyWithClickEvents: the keys are those of the input, which keeps focus
          <div
            key={name}
            id={`${id}-name-${index}`}
            role="option"
            tabIndex={-1}
            aria-selected={index === at.value}
            onMouseDown={(event: Event) => event.preventDefault()}
            onClick={() => pick(name)}
          >
            {name}
          </div>
        ))}
      </div>
      <FieldNotes path={path} id={`${id}-notes`} />
    </div>
  );
};
