import { capital } from '../../core/words/capital.ts';
import { Field } from '../field/Field.tsx';
import { entry, words } from '../state/bench.ts';
import { joinedIn } from '../state/joined.ts';
import { BoltHoles, BoltSize } from './BoltFields.tsx';
import { several } from './several.ts';

const WebBolts = () => (
  <>
    <BoltSize path="joint.bolts" />
    <Field path="joint.bolts.rows" label="Rows" />
    {several('joint.bolts.rows') && <Field path="joint.bolts.pitch" label="Pitch" />}
    <Field path="joint.bolts.columns" label="Columns" empty="one, assumed" />
    {several('joint.bolts.columns') && <Field path="joint.bolts.gauge" label={capital(words.value.gauge)} />}
    <Field path="joint.firstRow" label="First row" />
    <Field path="joint.endDistance" label="End distance" />
    <BoltHoles path="joint.bolts" />
  </>
);

const SupportBolts = () => (
  <fieldset class="part">
    <legend>Into the support</legend>
    <BoltSize path="joint.supportBolts" />
    <Field path="joint.supportBolts.rows" label="Rows" />
    {several('joint.supportBolts.rows') && <Field path="joint.supportBolts.pitch" label="Pitch" />}
    <Field path="joint.supportBolts.crossCentres" label="Cross centres" />
    <Field path="joint.supportBolts.topEdge" label="Top edge" />
    <BoltHoles path="joint.supportBolts" />
  </fieldset>
);

export const BoltsFields = () => {
  const { webBolts, supportBolts } = joinedIn(entry.value);
  return (
    <>
      {webBolts && <WebBolts />}
      {supportBolts && <SupportBolts />}
    </>
  );
};
