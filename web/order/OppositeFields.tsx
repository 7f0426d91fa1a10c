import { Field } from '../field/Field.tsx';
import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { OPPOSITE, oppositeTold } from '../state/joined.ts';

/** Where the bolts of the beam on the other side of the same web stand; while none of it is told they are taken as shared. */
export const OppositeFields = () => {
  const empty = oppositeTold(entry.value) ? '' : 'as here, assumed';
  const one = textOf(entry.value, `${OPPOSITE}.rows`) === '1';
  return (
    <>
      <Field path={`${OPPOSITE}.firstRow`} label="Its first row" empty={empty} />
      <Field path={`${OPPOSITE}.rows`} label="Its rows" empty={empty} />
      {!one && <Field path={`${OPPOSITE}.pitch`} label="Its pitch" empty={empty} />}
      <Field path={`${OPPOSITE}.gauge`} label="Its cross centres" empty={empty} />
    </>
  );
};
