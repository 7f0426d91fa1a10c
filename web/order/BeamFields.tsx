import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { SectionField } from '../field/SectionField.tsx';
import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { SteelField } from './SteelField.tsx';

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

export const BeamFields = () => (
  <>
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
    <SteelField path="beam.grade" />
  </>
);
