import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { GradeField } from '../field/GradeField.tsx';
import { SectionField } from '../field/SectionField.tsx';
import { entry, standard } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { OrderLine } from './OrderLine.tsx';
import { spokenSection } from './spokenSection.ts';
import { Value } from './Value.tsx';

/** Yield and tensile strength asked for where a grade has no name. */
export const steelStrengths = [
  { name: 'fy', label: 'Yield f_y' },
  { name: 'fu', label: 'Tensile f_u' },
] as const;

/** A grade within a sentence: its name, or that its strengths are given. */
export const GradeValue = ({ path }: { readonly path: string }) => {
  const own = textOf(entry.value, `${path}.by`) === 'strength';
  return own ? <Value path={path} text="steel of own strength" /> : <Value path={path} missing="grade?" />;
};

const family = [
  { value: 'I', label: 'I section' },
  { value: 'channel', label: 'channel' },
];

const OwnSizes = () => (
  <>
    <Choice path="beam.section.family" label="Shape" options={family} empty="I section" />
    <Field path="beam.section.depth" label="Depth" />
    <Field path="beam.section.width" label="Flange width" />
    <Field path="beam.section.flange" label="Flange" />
    <Field path="beam.section.web" label="Web" />
    <Field path="beam.section.radius" label="Root radius" />
  </>
);

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
  >
    <Choice
      path="beam.section.by"
      label="Sizes"
      options={[{ value: 'sizes', label: 'own sizes' }]}
      empty="listed section"
    />
    {textOf(entry.value, 'beam.section.by') === 'sizes' ? (
      <OwnSizes />
    ) : (
      <SectionField path="beam.section" label="Section" />
    )}
    <GradeField
      path="beam.grade"
      label="Grade"
      names={standard.value?.materials.grades ?? []}
      strengths={steelStrengths}
    />
  </OrderLine>
);
