import { entry, listing } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { unitAt } from '../state/fieldText.ts';
import { isShare } from './isShare.ts';
import { OrderLine } from './OrderLine.tsx';
import { Value } from './Value.tsx';

const Sentence = () => {
  const level = textOf(entry.value, 'level');
  const tie = textOf(entry.value, 'tie');
  const noTie = tie === '' || Number(tie) === 0;
  return (
    <>
      {isShare() ? (
        <>
          <Value path="reaction.ofWebShear" missing="share?" /> of the full section's shear
        </>
      ) : (
        <>
          <Value path="reaction" missing="reaction?" /> {unitAt('reaction')}
        </>
      )}{' '}
      up at the support face, <Value path="level" text={level || (listing.value?.level ?? 'level')} />
      {level === '' && ' (assumed)'}; {noTie ? <Value path="tie" text="no" /> : <Value path="tie" />}
      {noTie ? '' : ` ${unitAt('tie')}`} tie.
    </>
  );
};

/** The end reaction, its level, and the tie force. */
export const LoadLine = () => <OrderLine name="load" title="Load" sentence={<Sentence />} />;
