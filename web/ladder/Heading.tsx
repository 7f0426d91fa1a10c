import type { ComponentChildren } from 'preact';
import { shown, stale } from './shown.ts';

interface Props {
  readonly id: string;
  readonly level: 2 | 3;
  readonly title: string;
  /** What stands behind the title, smaller. */
  readonly children?: ComponentChildren;
}

/** A heading of the bench. While a field is half typed it says, in the place of its note, that what stands under it is of before. */
export const Heading = ({ id, level, title, children }: Props) => {
  const H = `h${level}` as const;
  const note = stale.value ? (
    <span class="stale-note">{shown.value ? 'as last complete' : 'nothing yet'}</span>
  ) : (
    children
  );
  return (
    <H id={id}>
      {title} {note && <small>{note}</small>}
    </H>
  );
};
