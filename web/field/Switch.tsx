import type { TargetedEvent, TargetedKeyboardEvent } from 'preact';
import { entry, focused } from '../state/bench.ts';
import { choose } from '../state/choose.ts';
import { textOf } from '../state/entry.ts';
import { walk } from './walk.ts';

interface SwitchProps {
  /** Path of a part of the end that may be there or not. */
  readonly path: string;
  readonly label: string;
  /** What is kept at the path while the part is not there. */
  readonly off: 'none' | '';
}

/** Says whether a part of the end is there. Its sizes are kept while it is not. */
export const Switch = ({ path, label, off }: SwitchProps) => {
  const id = `box-${path}`;
  return (
    <div class="field switch">
      <input
        id={id}
        type="checkbox"
        data-field={path}
        checked={textOf(entry.value, path) === 'on'}
        onChange={(event: TargetedEvent<HTMLInputElement>) => choose(path, event.currentTarget.checked ? 'on' : off)}
        onFocus={() => {
          focused.value = path;
        }}
        onKeyDown={(event: TargetedKeyboardEvent<HTMLInputElement>) => {
          if (event.key !== 'Enter') return;
          event.preventDefault();
          walk(event.currentTarget, event.shiftKey);
        }}
      />
      <label for={id}>{label}</label>
    </div>
  );
};
