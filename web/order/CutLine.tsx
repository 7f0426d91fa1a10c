import { Field } from '../field/Field.tsx';
import { Switch } from '../field/Switch.tsx';
import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { OrderLine } from './OrderLine.tsx';
import { Value } from './Value.tsx';

type Edge = 'top' | 'bottom';

const isOn = (edge: Edge): boolean => textOf(entry.value, edge) === 'on';

const Said = ({ edge }: { readonly edge: Edge }) => {
  const { cope } = words.value;
  if (!isOn(edge)) {
    return (
      <>
        <Value path={edge} text={edge === 'top' ? 'No' : 'no'} /> {edge} {cope}
      </>
    );
  }
  return (
    <>
      {edge === 'top' ? 'Top' : 'bottom'} {cope} <Value path={`${edge}.length`} missing="length?" /> by{' '}
      <Value path={`${edge}.depth`} missing="depth?" />, corner{' '}
      <span class="whole">
        R <Value path={`${edge}.radius`} missing="0" />
      </span>
    </>
  );
};

const Fields = ({ edge }: { readonly edge: Edge }) => {
  const title = `${edge === 'top' ? 'Top' : 'Bottom'} ${words.value.cope}`;
  return (
    <>
      <Switch path={edge} label={title} off="none" />
      {isOn(edge) && (
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

/** What is cut off the end: the copes, and how far it is set back. */
export const CutLine = () => (
  <OrderLine
    name="cut"
    title="Cut"
    sentence={
      <>
        <Said edge="top" />; <Said edge="bottom" />; set back <Value path="setback" missing="setback?" />.
      </>
    }
  >
    <Fields edge="top" />
    <Fields edge="bottom" />
    <Field path="setback" label="Setback" />
  </OrderLine>
);
