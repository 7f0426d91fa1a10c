import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { OrderLine } from './OrderLine.tsx';
import { several } from './several.ts';
import { Value } from './Value.tsx';

const rows = (count: string): string => (count === '1' ? 'row' : 'rows');
const columns = (count: string): string => (count === '1' || count === '' ? 'column' : 'columns');

const ClassValue = () => {
  const path = 'joint.bolts.grade';
  const own = textOf(entry.value, `${path}.by`) === 'strength';
  return own ? <Value path={path} text="of own strength" /> : <Value path={path} missing="class?" />;
};

const Sentence = () => {
  const down = textOf(entry.value, 'joint.bolts.columns');
  return (
    <>
      <Value path="joint.bolts.rows" missing="how many?" /> {rows(textOf(entry.value, 'joint.bolts.rows'))} of{' '}
      <Value path="joint.bolts.size" missing="size?" /> <ClassValue />
      {several('joint.bolts.rows') && (
        <>
          {' '}
          at <Value path="joint.bolts.pitch" missing="pitch?" />
        </>
      )}{' '}
      in <Value path="joint.bolts.columns" missing="1" /> {columns(down)}
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

/** The bolts through the web: size, class, pattern, place and holes. */
export const BoltsLine = () => <OrderLine name="bolts" title="Bolts" sentence={<Sentence />} />;
