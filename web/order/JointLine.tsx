import { capital } from '../../core/words/capital.ts';
import { choiceText } from '../../core/words/choiceWords.ts';
import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { shown, unitAt } from '../state/fieldText.ts';
import { type Joined, joinedIn, OPPOSITE, oppositeFits, oppositeTold } from '../state/joined.ts';
import { isFault, readField } from '../state/readField.ts';
import { GradeValue } from './GradeValue.tsx';
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

const places: Readonly<Record<string, string>> = {
  'beam-web': 'On the web of a',
  'column-flange': 'On the flange of a column',
  'column-web': 'On the web of a column',
};

const Opposite = () =>
  textOf(entry.value, 'support.otherReaction') === '' ? null : (
    <>
      , a beam opposite with <Value path="support.otherReaction" /> {unitAt('support.otherReaction')}
      {oppositeFits(entry.value) && oppositeTold(entry.value) && (
        <>
          , its bolts from <Value path={`${OPPOSITE}.firstRow`} missing="first row?" /> down
        </>
      )}
    </>
  );

const Support = () => {
  if (textOf(entry.value, 'support') !== 'on') {
    return (
      <>
        {' '}
        <Value path="support" text="Support not given" />.
      </>
    );
  }
  const kind = textOf(entry.value, 'support.kind') || 'beam-web';
  const section = textOf(entry.value, 'support.section');
  const thickness = textOf(entry.value, 'support.thickness');
  return (
    <>
      {' '}
      {places[kind] ?? 'On a'}{' '}
      {section === '' && thickness !== '' ? (
        <>
          part <Value path="support.thickness" /> thick
        </>
      ) : (
        <Value path="support.section" missing="section?" {...(section !== '' && { text: spokenSection(section) })} />
      )}
      {kind === 'beam-web' && (
        <>
          , <Level />
        </>
      )}
      <Opposite />.
    </>
  );
};

const Steel = ({ path }: { readonly path: string }) => (
  <>
    <Value path={`${path}.thickness`} missing="thickness?" /> thick, <GradeValue path={`${path}.grade`} />
  </>
);

const Edges = ({ path, free }: { readonly path: string; readonly free: boolean }) => (
  <>
    , edges <Value path={`${path}.topEdge`} missing="top?" />
    {free ? ', ' : ' and '}
    <Value path={`${path}.bottomEdge`} missing="bottom?" />
    {free && (
      <>
        {' '}
        and <Value path={`${path}.edge`} missing="free?" />
      </>
    )}
  </>
);

/** Top and depth of a fitting that no web bolt places. */
const Placed = ({ path }: { readonly path: string }) => (
  <>
    , <Value path={`${path}.depth`} missing="depth?" /> deep, its top <Value path={`${path}.top`} missing="level?" />{' '}
    down
  </>
);

/** The fillets of a plate, and of one leg: how many there are, and where. */
const Weld = ({ joined: { weld, kind, cleat } }: { readonly joined: Joined }) => {
  const legs = kind === 'double-cleat' ? 'each leg' : 'the leg';
  const places: Readonly<Record<string, string>> = {
    'joint.webWeld': ' to the web',
    'joint.cleat.webWeld': ` round ${legs} on the web`,
    'joint.cleat.supportWeld': ` along ${legs} on the support`,
  };
  return (
    <>
      ; {cleat ? 'a' : 'two'} <Value path={`${weld}.leg`} missing="leg?" /> {unitAt(`${weld}.leg`)}{' '}
      {cleat ? 'fillet' : 'fillets'}
      {places[weld]}
    </>
  );
};

const Fitting = ({ joined }: { readonly joined: Joined }) => {
  const { fitting, cleat, endPlate, webBolts } = joined;
  if (endPlate) {
    return (
      <>
        , <Value path="joint.plate.width" missing="width?" /> wide, <Steel path={fitting} />
        <Placed path={fitting} />
      </>
    );
  }
  if (!cleat) {
    return (
      <>
        {' '}
        <Steel path={fitting} />
        <Edges path={fitting} free />
      </>
    );
  }
  return (
    <>
      , <Value path="joint.cleat.legWeb" missing="leg?" /> on the web by{' '}
      <Value path="joint.cleat.legSupport" missing="leg?" /> on the support, <Steel path={fitting} />
      {webBolts ? <Edges path={fitting} free={false} /> : <Placed path={fitting} />}
    </>
  );
};

const Sentence = () => {
  const joined = joinedIn(entry.value);
  return (
    <>
      <Value path="joint.kind" text={capital(choiceText(words.value, 'joint.kind', joined.kind))} />
      <Fitting joined={joined} />
      {joined.weld !== '' && <Weld joined={joined} />}.
      <Support />
    </>
  );
};

/** What the web is joined with: the plate and its weld, or a ply; and what carries it. */
export const JointLine = () => <OrderLine name="joint" title="Joint" sentence={<Sentence />} />;
