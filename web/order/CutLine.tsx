import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { joinedIn } from '../state/joined.ts';
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

/** How far the end is set back; an end plate fills that. */
const Setback = () => (
  <>
    ; set back <Value path="setback" missing="setback?" />
  </>
);

/** What is cut off the end: the copes, and how far it is set back. */
export const CutLine = () => (
  <OrderLine
    name="cut"
    title="Cut"
    sentence={
      <>
        <Said edge="top" />; <Said edge="bottom" />
        {!joinedIn(entry.value).endPlate && <Setback />}.
      </>
    }
  />
);
