import { showQuantity } from '../../core/units/printQuantity.ts';
import { toSystem } from '../../core/units/systems.ts';
import { choicesOf } from '../../core/words/choiceWords.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { SectionField } from '../field/SectionField.tsx';
import { Switch } from '../field/Switch.tsx';
import { entry, standard, units, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { isPly, plyPath } from './isPly.ts';
import { SteelField } from './SteelField.tsx';

/** The weld metal that is taken where none is given. */
const weldMetal = (): string => {
  const strength = standard.value?.materials.electrode;
  if (!strength) return '';
  return `${showQuantity(toSystem(strength, '-2,1', units.value), '-2,1', units.value)} assumed`;
};

const SupportFields = () => (
  <fieldset class="part">
    <legend class="unseen">Support</legend>
    <Choice path="support.kind" label="Face" options={choicesOf(words.value, 'support.kind')} />
    <SectionField path="support.section" label="Section" />
    <Field path="support.topOfSteel" label="Top above" empty="level, assumed" />
  </fieldset>
);

export const JointFields = () => {
  const ply = plyPath();
  return (
    <>
      <Choice path="joint.kind" label="Kind" options={choicesOf(words.value, 'joint.kind')} />
      <Field path={`${ply}.thickness`} label="Thickness" />
      <SteelField path={`${ply}.grade`} />
      <Field path={`${ply}.topEdge`} label="Top edge" />
      <Field path={`${ply}.bottomEdge`} label="Bottom edge" />
      <Field path={`${ply}.edge`} label="Free edge" />
      {!isPly() && <Field path="joint.weld.leg" label="Weld leg" />}
      {!isPly() && <Field path="joint.weld.electrode" label="Weld metal" empty={weldMetal()} />}
      <Switch path="support" label="Carried by a beam" off="" />
      {textOf(entry.value, 'support') === 'on' && <SupportFields />}
    </>
  );
};
