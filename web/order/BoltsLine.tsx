import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { type Joined, joinedIn } from '../state/joined.ts';
import { OrderLine } from './OrderLine.tsx';
import { several } from './several.ts';
import { Value } from './Value.tsx';

const rows = (count: string): string => (count === '1' ? 'row' : 'rows');
const columns = (count: string): string => (count === '1' || count === '' ? 'column' : 'columns');

const ClassValue = ({ path }: { readonly path: string }) => {
  const own = textOf(entry.value, `${path}.by`) === 'strength';
  return own ? <Value path={path} text="of own strength" /> : <Value path={path} missing="class?" />;
};

/** So many rows of a bolt, at a pitch. */
const Rows = ({ path }: { readonly path: string }) => (
  <>
    <Value path={`${path}.rows`} missing="how many?" /> {rows(textOf(entry.value, `${path}.rows`))} of{' '}
    <Value path={`${path}.size`} missing="size?" /> <ClassValue path={`${path}.grade`} />
    {several(`${path}.rows`) && (
      <>
        {' '}
        at <Value path={`${path}.pitch`} missing="pitch?" />
      </>
    )}
  </>
);

const InWeb = () => {
  const down = textOf(entry.value, 'joint.bolts.columns');
  return (
    <>
      <Rows path="joint.bolts" /> in <Value path="joint.bolts.columns" missing="1" /> {columns(down)}
      {several('joint.bolts.columns') && (
        <>
          {' '}
          at <Value path="joint.bolts.gauge" missing={`${words.value.gauge}?`} />
        </>
      )}
      ; first row <Value path="joint.firstRow" missing="level?" /> down,{' '}
      <Value path="joint.endDistance" missing="distance?" /> from the end.
    </>
  );
};

const tops: Readonly<Record<string, string>> = { 'double-cleat': "the cleats'", 'single-cleat': "the cleat's" };

const InSupport = ({ kind }: Joined) => (
  <>
    Into the support <Rows path="joint.supportBolts" />
    {kind === 'single-cleat' ? ' in one line, cross centres ' : ' in two lines, '}
    <Value path="joint.supportBolts.crossCentres" missing="how far?" />
    {kind !== 'single-cleat' && ' apart'}; first row <Value path="joint.supportBolts.topEdge" missing="edge?" /> below{' '}
    {tops[kind] ?? "the plate's"} top.
  </>
);

const Sentence = () => {
  const joined = joinedIn(entry.value);
  const { webBolts, supportBolts } = joined;
  return (
    <>
      {webBolts && <InWeb />}
      {supportBolts && (
        <>
          {webBolts && ' '}
          <InSupport {...joined} />
        </>
      )}
    </>
  );
};

/** The bolts through the web and into the support: size, class, pattern, place and holes. */
export const BoltsLine = () => <OrderLine name="bolts" title="Bolts" sentence={<Sentence />} />;
