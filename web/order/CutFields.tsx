import { Field } from '../field/Field.tsx';
import { Switch } from '../field/Switch.tsx';
import { entry, words } from '../state/bench.ts';
import { copes } from '../state/copes.ts';
import { textOf } from '../state/entry.ts';
import { joinedIn } from '../state/joined.ts';

const Cope = ({ edge }: { readonly edge: 'top' | 'bottom' }) => {
  const title = `${edge === 'top' ? 'Top' : 'Bottom'} ${words.value.cope}`;
  return (
    <>
      <Switch path={edge} label={title} off="none" />
      {textOf(entry.value, edge) === 'on' && (
        <fieldset class="part">
          <legend class="unseen">{title}</legend>
          <Field path={`${edge}.length`} label="Length" />
          <Field path={`${edge}.depth`} label="Depth" />
          <Field path={`${edge}.radius`} label="Corner R" empty="sharp, assumed" />
        </fieldset>
      )}
    </>
  );
};

const Proposed = () => {
  const parts = copes.value;
  return parts && <parts.CopeProposal />;
};

export const CutFields = () => (
  <>
    <Cope edge="top" />
    <Cope edge="bottom" />
    {!joinedIn(entry.value).endPlate && <Field path="setback" label="Setback" />}
    <Proposed />
  </>
);
