import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { isAssumed, shown } from '../state/fieldText.ts';
import { lineOf } from '../state/tradeOrder.ts';
import { FieldLink } from './FieldLink.tsx';
import { openLine } from './goTo.ts';

interface ValueProps {
  readonly path: string;
  /** How the value reads in the sentence; absent = as its field shows it. */
  readonly text?: string;
  /** What stands where there is no value. */
  readonly missing?: string;
}

/** Whole inches and their fraction stay on one line. */
const unbroken = (text: string): string => text.replace(/ (?=\d+\/)/, '\u00a0');

/** A value within a sentence of the order: touching it opens its field. Assumed values are marked until they are touched. */
export const Value = ({ path, text, missing }: ValueProps) => {
  const empty = text === undefined && textOf(entry.value, path) === '';
  const assumed = isAssumed(path);
  const open = openLine.value !== null && openLine.value === lineOf(path);
  return (
    <FieldLink path={path} kind="value" class={`${assumed ? 'assumed' : ''}${empty ? ' empty' : ''}`} skipped={open}>
      {empty ? (missing ?? '?') : (text ?? unbroken(shown(path)))}
      {assumed && <span class="unseen"> (assumed)</span>}
    </FieldLink>
  );
};
