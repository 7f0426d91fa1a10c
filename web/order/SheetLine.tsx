import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { OrderLine } from './OrderLine.tsx';
import { Value } from './Value.tsx';

const Sentence = () => {
  const revision = textOf(entry.value, 'sheet.revision');
  return (
    <>
      End <Value path="mark" missing="mark?" /> of <Value path="sheet.job" missing="job?" />
      {revision === '' ? (
        <>
          , <Value path="sheet.revision" text="no revision" />
        </>
      ) : (
        <>
          , revision <Value path="sheet.revision" />
        </>
      )}
      .
    </>
  );
};

/** What the sheet says beside the numbers. */
export const SheetLine = () => <OrderLine name="sheet" title="Sheet" stacked sentence={<Sentence />} />;
