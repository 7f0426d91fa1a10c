import { boltSizeNames, findBoltSize } from '../../core/steel/bolts.ts';
import { wrenchRoom } from '../../core/steel/wrenchRoom.ts';
import { showQuantity } from '../../core/units/printQuantity.ts';
import { toSystem, type UnitSystem } from '../../core/units/systems.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { GradeField } from '../field/GradeField.tsx';
import { entry, standard, units } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';

type Path = 'joint.bolts' | 'joint.supportBolts';

const threads = [
  { value: 'in', label: 'in plane' },
  { value: 'out', label: 'out of plane' },
];

const made = [
  { value: 'drilled', label: 'drilled' },
  { value: 'punched', label: 'punched' },
];

/** A length that belongs to the bolt's size; empty where the bolt is not known. */
const ofSize = (path: Path, length: (diameter: number) => number): string => {
  const size = findBoltSize(textOf(entry.value, `${path}.size`));
  if ('nearest' in size) return '';
  return showQuantity(toSystem(length(size.diameter), '1,0', units.value), '1,0', units.value);
};

const isMetric = (name: string): boolean => name.startsWith('M');

/** All sizes, those of the system's own threads first. */
const sizesFor = (system: UnitSystem) =>
  [true, false]
    .flatMap((own) => boltSizeNames.filter((name) => (isMetric(name) === (system === 'mm-kN')) === own))
    .map((name) => ({ value: name, label: isMetric(name) ? name : `${name} in` }));

/** Size and class of the bolts at a path. */
export const BoltSize = ({ path }: { readonly path: Path }) => (
  <>
    <Choice path={`${path}.size`} label="Size" options={sizesFor(units.value)} />
    <GradeField
      path={`${path}.grade`}
      label="Class"
      names={standard.value?.materials.boltGrades ?? []}
      strengths={[{ name: 'fu', label: 'Tensile f_u' }]}
    />
  </>
);

/** Holes, threads and wrench of the bolts at a path. */
export const BoltHoles = ({ path }: { readonly path: Path }) => {
  const materials = standard.value?.materials;
  const hole = materials ? ofSize(path, materials.holeFor) : '';
  const socket = ofSize(path, (diameter) => wrenchRoom(diameter).socket);
  return (
    <>
      <Choice
        path={`${path}.holes`}
        label="Holes"
        options={made}
        empty={materials ? `${materials.holesAssumed} (assumed)` : 'assumed'}
      />
      <Field path={`${path}.hole`} label="Hole diameter" empty={hole && `${hole} by the standard`} />
      <Choice path={`${path}.threads`} label="Threads" options={threads} empty="in plane (assumed)" />
      <Field path={`${path}.socket`} label="Wrench socket" empty={socket && `${socket} by practice`} />
    </>
  );
};
