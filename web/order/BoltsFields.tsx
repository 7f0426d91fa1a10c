import { boltSizeNames, findBoltSize } from '../../core/steel/bolts.ts';
import { showQuantity } from '../../core/units/printQuantity.ts';
import { toSystem, type UnitSystem } from '../../core/units/systems.ts';
import { capital } from '../../core/words/capital.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { GradeField } from '../field/GradeField.tsx';
import { entry, standard, units, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { several } from './several.ts';

const threads = [
  { value: 'in', label: 'in plane' },
  { value: 'out', label: 'out of plane' },
];

const made = [
  { value: 'drilled', label: 'drilled' },
  { value: 'punched', label: 'punched' },
];

/** The hole that the standard has for the bolt; empty where the bolt is not known. */
const standardHole = (): string => {
  const size = findBoltSize(textOf(entry.value, 'joint.bolts.size'));
  if ('nearest' in size || !standard.value) return '';
  const hole = toSystem(standard.value.materials.holeFor(size.diameter), '1,0', units.value);
  return showQuantity(hole, '1,0', units.value);
};

const isMetric = (name: string): boolean => name.startsWith('M');

/** All sizes, those of the system's own threads first. */
const sizesFor = (system: UnitSystem) =>
  [true, false]
    .flatMap((own) => boltSizeNames.filter((name) => (isMetric(name) === (system === 'mm-kN')) === own))
    .map((name) => ({ value: name, label: isMetric(name) ? name : `${name} in` }));

export const BoltsFields = () => {
  const hole = standardHole();
  return (
    <>
      <Choice path="joint.bolts.size" label="Size" options={sizesFor(units.value)} />
      <GradeField
        path="joint.bolts.grade"
        label="Class"
        names={standard.value?.materials.boltGrades ?? []}
        strengths={[{ name: 'fu', label: 'Tensile f_u' }]}
      />
      <Field path="joint.bolts.rows" label="Rows" />
      {several('joint.bolts.rows') && <Field path="joint.bolts.pitch" label="Pitch" />}
      <Field path="joint.bolts.columns" label="Columns" empty="one, assumed" />
      {several('joint.bolts.columns') && <Field path="joint.bolts.gauge" label={capital(words.value.gauge)} />}
      <Field path="joint.firstRow" label="First row" />
      <Field path="joint.endDistance" label="End distance" />
      <Choice
        path="joint.bolts.holes"
        label="Holes"
        options={made}
        empty={standard.value ? `${standard.value.materials.holesAssumed} (assumed)` : 'assumed'}
      />
      <Field path="joint.bolts.hole" label="Hole diameter" empty={hole && `${hole} by the standard`} />
      <Choice path="joint.bolts.threads" label="Threads" options={threads} empty="in plane (assumed)" />
    </>
  );
};
