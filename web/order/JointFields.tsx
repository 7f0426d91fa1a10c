import { showQuantity } from '../../core/units/printQuantity.ts';
import { toSystem } from '../../core/units/systems.ts';
import { choicesOf } from '../../core/words/choiceWords.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { Switch } from '../field/Switch.tsx';
import { entry, standard, units, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { fittingSizes, type Joined, joinedIn, LEGS, weldSizes } from '../state/joined.ts';
import { SteelField } from './SteelField.tsx';
import { SupportFields } from './SupportFields.tsx';

/** Labels of a fitting's sizes. */
const sizes: Readonly<Record<string, string>> = {
  width: 'Width',
  depth: 'Depth',
  top: 'Top down',
  topEdge: 'Top edge',
  bottomEdge: 'Bottom edge',
  edge: 'Free edge',
  legWeb: 'Leg on web',
  legSupport: 'Leg on support',
  radius: 'Root radius',
};

/** The weld metal that is taken where none is given. */
const weldMetal = (): string => {
  const strength = standard.value?.materials.electrode;
  if (!strength) return '';
  return `${showQuantity(toSystem(strength, '-2,1', units.value), '-2,1', units.value)} assumed`;
};

const WeldFields = ({ joined }: { readonly joined: Joined }) => (
  <>
    <Field path={`${joined.weld}.leg`} label="Weld leg" />
    <Field path={`${joined.weld}.electrode`} label="Weld metal" empty={weldMetal()} />
    {weldSizes(joined).includes('return') && (
      <Field
        path={`${joined.weld}.return`}
        label="Return"
        empty={joined.webBolts ? 'none counted' : 'all of the leg'}
      />
    )}
  </>
);

export const JointFields = () => {
  const joined = joinedIn(entry.value);
  const { fitting } = joined;
  return (
    <>
      <Choice path="joint.kind" label="Kind" options={choicesOf(words.value, 'joint.kind')} />
      {joined.cleat && <Choice path={LEGS} label="Legs" options={choicesOf(words.value, LEGS)} />}
      <Field path={`${fitting}.thickness`} label="Thickness" />
      <SteelField path={`${fitting}.grade`} />
      {fittingSizes(joined).map((name) => (
        <Field
          key={name}
          path={`${fitting}.${name}`}
          label={sizes[name] ?? name}
          {...(name === 'radius' && { empty: 'not told' })}
        />
      ))}
      {joined.weld !== '' && <WeldFields joined={joined} />}
      <Switch path="support" label="Support" off="" />
      {textOf(entry.value, 'support') === 'on' && <SupportFields />}
    </>
  );
};
