import { showQuantity } from '../../core/units/printQuantity.ts';
import { toSystem } from '../../core/units/systems.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { GradeField } from '../field/GradeField.tsx';
import { SectionField } from '../field/SectionField.tsx';
import { Switch } from '../field/Switch.tsx';
import { entry, standard, units } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { shown, unitAt } from '../state/fieldText.ts';
import { isFault, readField } from '../state/readField.ts';
import { GradeValue, steelStrengths } from './BeamLine.tsx';
import { OrderLine } from './OrderLine.tsx';
import { spokenSection } from './spokenSection.ts';
import { Value } from './Value.tsx';

const kinds = [
  { value: 'fin-plate', label: 'fin plate' },
  { value: 'web-bolts', label: 'web bolted to a ply' },
];

const supports = [{ value: 'beam-web', label: "beam's web" }];

const isPly = (): boolean => textOf(entry.value, 'joint.kind') === 'web-bolts';

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
  const ply = isPly() ? 'joint.ply' : 'joint.plate';
  return (
    <>
      <Value path="joint.kind" text={isPly() ? 'Web bolted to a ply' : 'Fin plate'} />{' '}
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

/** The weld metal that is taken where none is given. */
const weldMetal = (): string => {
  const strength = standard.value?.materials.electrode;
  if (!strength) return '';
  return `${showQuantity(toSystem(strength, '-2,1', units.value), '-2,1', units.value)} assumed`;
};

const SupportFields = () => (
  <fieldset class="part">
    <legend class="unseen">Support</legend>
    <Choice path="support.kind" label="Face" options={supports} />
    <SectionField path="support.section" label="Section" />
    <Field path="support.topOfSteel" label="Top above" empty="level, assumed" />
  </fieldset>
);

/** What the web is joined with: the plate and its weld, or a ply; and what carries it. */
export const JointLine = () => {
  const ply = isPly() ? 'joint.ply' : 'joint.plate';
  return (
    <OrderLine name="joint" title="Joint" sentence={<Sentence />}>
      <Choice path="joint.kind" label="Kind" options={kinds} />
      <Field path={`${ply}.thickness`} label="Thickness" />
      <GradeField
        path={`${ply}.grade`}
        label="Grade"
        names={standard.value?.materials.grades ?? []}
        strengths={steelStrengths}
      />
      <Field path={`${ply}.topEdge`} label="Top edge" />
      <Field path={`${ply}.bottomEdge`} label="Bottom edge" />
      <Field path={`${ply}.edge`} label="Free edge" />
      {!isPly() && <Field path="joint.weld.leg" label="Weld leg" />}
      {!isPly() && <Field path="joint.weld.electrode" label="Weld metal" empty={weldMetal()} />}
      <Switch path="support" label="Carried by a beam" off="" />
      {textOf(entry.value, 'support') === 'on' && <SupportFields />}
    </OrderLine>
  );
};
