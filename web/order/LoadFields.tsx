import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { listing } from '../state/bench.ts';
import { isShare } from './isShare.ts';

const levels = [
  { value: 'factored', label: 'factored' },
  { value: 'service', label: 'service' },
];

export const LoadFields = () => (
  <>
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
      empty={listing.value ? `${listing.value.level} (assumed)` : 'assumed'}
    />
    <Field path="tie" label="Tie force" empty="none, assumed" />
  </>
);
