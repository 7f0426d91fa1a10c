import { capital } from '../../core/words/capital.ts';
import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { shown, unitAt } from '../state/fieldText.ts';
import { isFault, readField } from '../state/readField.ts';
import { GradeValue } from './GradeValue.tsx';
import { isPly, plyPath } from './isPly.ts';
import { OrderLine } from './OrderLine.tsx';
import { spokenSection } from './spokenSection.ts';
import { Value } from './Value.tsx';

/** Where the support's top of steel lies to the beam's. */
const Level = () => {
  const path = 'support.topOfSteel';
  const reading = readField(entry.value, path);
  const above = reading === undefined || isFault(reading) ? 0 : reading.value;
  if (textOf(entry.value, path) === '' || above === 0) {
    return (
      <>
        <Value path={path} text="tops of steel level" />
        {textOf(entry.value, path) === '' && ' (assumed)'}
      </>
    );
  }
  const size = shown(path).replace(/^[-\u2212]/, '');
  return (
    <>
      its top <Value path={path} text={size} /> {above > 0 ? 'above' : 'below'} the beam's
    </>
  );
};

const Support = () => {
  if (textOf(entry.value, 'support') !== 'on') {
    return (
      <>
        {' '}
        <Value path="support" text="Support not given" />.
      </>
    );
  }
  const section = textOf(entry.value, 'support.section');
  return (
    <>
      {' '}
      On the web of a{' '}
      <Value path="support.section" missing="section?" {...(section !== '' && { text: spokenSection(section) })} />,{' '}
      <Level />.
    </>
  );
};

const Sentence = () => {
  const ply = plyPath();
  return (
    <>
      <Value path="joint.kind" text={isPly() ? 'Web bolted to a ply' : capital(words.value.finPlate)} />{' '}
      <Value path={`${ply}.thickness`} missing="thickness?" /> thick, <GradeValue path={`${ply}.grade`} />, edges{' '}
      <Value path={`${ply}.topEdge`} missing="top?" />, <Value path={`${ply}.bottomEdge`} missing="bottom?" /> and{' '}
      <Value path={`${ply}.edge`} missing="free?" />
      {isPly() ? (
        '.'
      ) : (
        <>
          ; two <Value path="joint.weld.leg" missing="leg?" /> {unitAt('joint.weld.leg')} fillets.
        </>
      )}
      <Support />
    </>
  );
};

/** What the web is joined with: the plate and its weld, or a ply; and what carries it. */
export const JointLine = () => <OrderLine name="joint" title="Joint" sentence={<Sentence />} />;
