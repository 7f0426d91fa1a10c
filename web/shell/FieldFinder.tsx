import { useSignal } from '@preact/signals';
import type { TargetedEvent, TargetedKeyboardEvent } from 'preact';
import { useEffect, useRef } from 'preact/hooks';
import { fieldName, type Words } from '../../core/words/words.ts';
import { goTo } from '../order/goTo.ts';
import { entry, words } from '../state/bench.ts';
import type { Entry } from '../state/entry.ts';
import { numberFields } from '../state/fields.ts';
import { isThere } from '../state/isThere.ts';
import { Dialog } from './Dialog.tsx';
import { finderShown } from './keys.ts';

const MOST = 9;

const others = [
  'beam.section',
  'beam.grade',
  'top',
  'bottom',
  'joint.bolts.size',
  'joint.bolts.grade',
  'joint.bolts.holes',
  'joint.bolts.threads',
  'joint.supportBolts.size',
  'joint.supportBolts.grade',
  'joint.supportBolts.holes',
  'joint.supportBolts.threads',
  'joint.kind',
  'joint.cleat.legs',
  'joint.cleat.grade',
  'joint.plate.grade',
  'joint.ply.grade',
  'support',
  'support.kind',
  'support.section',
  'support.grade',
  'level',
  'standard',
  'sheet.beside.standard',
  'sheet.words',
  'mark',
  'sheet.date',
  'sheet.paper',
];

/** Fields of own sizes and strengths are reached through the list that turns to them; others are no fields of the bench yet. */
const isOwn = (path: string): boolean => /^beam\.section\.|\.grade\.f[yu]$|ofWebShear$/.test(path);

const found = (it: Entry, of: Words, text: string): { readonly path: string; readonly name: string }[] => {
  const wanted = text.trim().toLowerCase();
  return [...others, ...Object.keys(numberFields)]
    .filter((path) => !isOwn(path) && isThere(it, path))
    .map((path) => ({ path, name: fieldName(of, path) }))
    .filter(({ name }) => name.toLowerCase().includes(wanted))
    .sort((a, b) => Number(b.name.startsWith(wanted)) - Number(a.name.startsWith(wanted)))
    .slice(0, MOST);
};

const Finder = () => {
  const input = useRef<HTMLInputElement>(null);
  const text = useSignal('');
  const at = useSignal(0);
  const names = found(entry.value, words.value, text.value);
  useEffect(() => input.current?.focus(), []);
  const go = (path: string | undefined) => {
    if (path === undefined) return;
    finderShown.value = false;
    goTo(path);
  };
  const onKey = (event: TargetedKeyboardEvent<HTMLInputElement>) => {
    const by = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (by !== undefined && names.length > 0) at.value = (at.value + by + names.length) % names.length;
    else if (event.key === 'Enter') go(names[at.value]?.path);
    else return;
    event.preventDefault();
  };
  return (
    <div class="finder">
      <label for="finder">Name of a field</label>
      <input
        ref={input}
        id="finder"
        class="input"
        type="text"
        role="combobox"
        aria-expanded="true"
        aria-controls="finder-names"
        aria-autocomplete="list"
        aria-activedescendant={names.length > 0 ? `finder-${at.value}` : undefined}
        autoComplete="off"
        spellcheck={false}
        value={text.value}
        onInput={(event: TargetedEvent<HTMLInputElement>) => {
          text.value = event.currentTarget.value;
          at.value = 0;
        }}
        onKeyDown={onKey}
      />
      <div id="finder-names" class="names" role="listbox" aria-label="Fields">
        {names.map(({ path, name }, index) => (
          // biome-ignore lint/a11y/useKeyWithClickEvents: the keys are those of the input, which keeps focus
          <div
            key={path}
            id={`finder-${index}`}
            role="option"
            tabIndex={-1}
            aria-selected={index === at.value}
            onClick={() => go(path)}
          >
            {name}
          </div>
        ))}
      </div>
    </div>
  );
};

/** Goes to a field by its name. */
export const FieldFinder = () => (
  <Dialog shown={finderShown} title="Go to a field">
    <Finder />
  </Dialog>
);
