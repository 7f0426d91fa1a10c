import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { faultAt, isAssumed, readAs } from '../state/fieldText.ts';

interface FieldNotesProps {
  readonly path: string;
  /** Id by which the field refers to its notes. */
  readonly id: string;
  /** What an empty field means. */
  readonly empty?: string;
}

/** What stands under a field: its fault, else how it was read, else that it is assumed. */
export const FieldNotes = ({ path, id, empty = '' }: FieldNotesProps) => {
  const fault = faultAt(path);
  const note = readAs(path) || (isAssumed(path) ? 'assumed' : textOf(entry.value, path) === '' ? empty : '');
  return (
    <span id={id} class="field-notes">
      {fault ? <span class="field-fault">{fault}</span> : note && <span class="field-note">{note}</span>}
    </span>
  );
};
