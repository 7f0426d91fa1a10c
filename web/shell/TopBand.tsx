import type { TargetedEvent } from 'preact';
import { useRef } from 'preact/hooks';
import { Segments } from '../field/Segments.tsx';
import { timeline, units } from '../state/bench.ts';
import { carried } from '../state/carried.ts';
import { redo, setUnits, undo } from '../state/edits.ts';
import { notice } from '../state/notice.ts';
import { beginEmpty } from './beginEmpty.ts';
import { keysShown } from './keys.ts';
import { Pages } from './Pages.tsx';

const systems = [
  { value: 'mm-kN', label: 'mm · kN' },
  { value: 'in-kip', label: 'in · kip' },
] as const;

const UnitsSwitch = () => (
  <Segments name="units" title="Units of the whole end" choices={systems} inForce={units.value} set={setUnits} />
);

const OpenButton = () => {
  const picker = useRef<HTMLInputElement>(null);
  const onPick = (event: TargetedEvent<HTMLInputElement>) => {
    const input = event.currentTarget;
    const file = input.files?.[0];
    if (file) void carried(({ openFile }) => openFile(file));
    input.value = '';
  };
  return (
    <>
      <button type="button" onClick={() => picker.current?.click()}>
        Open
      </button>
      <input
        ref={picker}
        type="file"
        accept=".json,application/json,.pdf,application/pdf"
        hidden
        aria-label="A file of an end, or its sheet"
        onChange={onPick}
      />
    </>
  );
};

const spoken = (word: string, step: string | undefined): string => (step === undefined ? word : `${word}: ${step}`);

const Undoing = () => {
  const { done, undone } = timeline.value;
  const last = done.at(-1)?.name;
  const next = undone.at(-1)?.name;
  return (
    <>
      <button type="button" disabled={last === undefined} title={last} aria-label={spoken('Undo', last)} onClick={undo}>
        Undo
      </button>
      <button type="button" disabled={next === undefined} title={next} aria-label={spoken('Redo', next)} onClick={redo}>
        Redo
      </button>
    </>
  );
};

/** The band across the top: where one is, what can be done with the whole end, and its units. */
export const TopBand = () => (
  <header class="top-band">
    <b class="brand">Copewright</b>
    <Pages />
    <div class="whole-end" role="toolbar" aria-label="The whole end">
      <Undoing />
      <button type="button" onClick={beginEmpty}>
        New
      </button>
      <OpenButton />
      <button type="button" onClick={() => void carried(({ saveFile }) => saveFile())}>
        Save
      </button>
      <button type="button" onClick={() => void carried(({ copyLink }) => copyLink())}>
        Link
      </button>
      <button
        type="button"
        onClick={() => {
          keysShown.value = true;
        }}
      >
        Keys
      </button>
    </div>
    <p class="told" role="status">
      {notice.value?.kind === 'done' && notice.value.title}
    </p>
    <UnitsSwitch />
  </header>
);
