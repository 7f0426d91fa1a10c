import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { Value } from './Value.tsx';

/** A grade within a sentence: its name, or that its strengths are given. */
export const GradeValue = ({ path }: { readonly path: string }) => {
  const own = textOf(entry.value, `${path}.by`) === 'strength';
  return own ? <Value path={path} text="steel of own strength" /> : <Value path={path} missing="grade?" />;
};
