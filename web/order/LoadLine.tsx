import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { entry, standard } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { unitAt } from '../state/fieldText.ts';
import { OrderLine } from './OrderLine.tsx';
import { Value } from './Value.tsx';

const levels = [
  { value: 'factored', label: 'factored' },
  { value: 'service', label: 'service' },
];

const isShare = (): boolean => textOf(entry.value, 'reaction.by') === 'share';

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
      up at the support face, <Value path="level" text={level || (standard.value?.level ?? 'level')} />
      {level === '' && ' (assumed)'}; {noTie ? <Value path="tie" text="no" /> : <Value path="tie" />}
      {noTie ? '' : ` ${unitAt('tie')}`} tie.
    </>
  );
};

/** The end reaction, its level, and the tie force. */
export const LoadLine = () => (
  <OrderLine name="load" title="Load" sentence={<Sentence />}>
    <Choice
      path="reaction.by"
      label="Given as"
      options={[{ value: 'share', label: 'share of web shear' }]}
      empty="force"
    />
    {isShare() ? <Field path="reaction.ofWebShear" label="Share" /> : <Field path="reaction" label="Reaction" />}
    <Choice
      path="level"
      label="Level"
      options={levels}
      empty={standard.value ? `${standard.value.level} (assumed)` : 'assumed'}
    />
    <Field path="tie" label="Tie force" empty="none, assumed" />
  </OrderLine>
);
