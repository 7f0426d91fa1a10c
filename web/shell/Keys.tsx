import type { TargetedEvent } from 'preact';
import { Dialog } from './Dialog.tsx';
import { keysShown } from './keys.ts';
import { setSingleKeys, singleKeys } from './singleKeys.ts';

const inFields = [
  ['Enter', 'next field; Shift + Enter: the one before'],
  ['↑ ↓', 'a step of 1 or 5 mm (1/16 or 1/4 in); with Shift 10 mm (1/2 in)'],
  ['Esc', 'takes back what was typed; then closes the line'],
  ['Ctrl + Z, Ctrl + Y', 'undo, redo'],
  ['Ctrl + S', 'save the end as a file'],
] as const;

const single = [
  ['/', 'go to a field by its name'],
  ['1 to 7', 'open a line of the order: beam, cut, bolts, joint, load, standard, sheet'],
  ['C', 'take the cut that is proposed from the support'],
  ['?', 'this list'],
] as const;

const List = ({ keys }: { readonly keys: readonly (readonly [key: string, does: string])[] }) => (
  <dl class="key-list">
    {keys.map(([key, does]) => (
      <div key={key}>
        <dt>{key}</dt>
        <dd>{does}</dd>
      </div>
    ))}
  </dl>
);

/** The keys of the bench. */
export const Keys = () => (
  <Dialog shown={keysShown} title="Keys">
    <h3>Anywhere</h3>
    <List keys={inFields} />
    <h3>While no field has focus</h3>
    <List keys={single} />
    <label class="single-keys">
      <input
        type="checkbox"
        checked={singleKeys.value}
        onChange={(event: TargetedEvent<HTMLInputElement>) => setSingleKeys(event.currentTarget.checked)}
      />
      <span>Single keys work</span>
    </label>
  </Dialog>
);
