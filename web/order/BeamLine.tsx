import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { GradeValue } from './GradeValue.tsx';
import { OrderLine } from './OrderLine.tsx';
import { spokenSection } from './spokenSection.ts';
import { Value } from './Value.tsx';

const SectionValue = () => {
  if (textOf(entry.value, 'beam.section.by') !== 'sizes') {
    const name = textOf(entry.value, 'beam.section');
    return <Value path="beam.section" missing="section?" {...(name !== '' && { text: spokenSection(name) })} />;
  }
  return (
    <>
      section of own sizes, <Value path="beam.section.depth" missing="depth?" /> deep,{' '}
      <Value path="beam.section.web" missing="web?" /> web,
    </>
  );
};

/** The beam: its section and its steel. */
export const BeamLine = () => (
  <OrderLine
    name="beam"
    title="Beam"
    sentence={
      <>
        A <SectionValue /> in <GradeValue path="beam.grade" />.
      </>
    }
  />
);
