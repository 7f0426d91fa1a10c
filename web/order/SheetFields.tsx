import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';

const ends = [
  { value: 'start', label: 'start' },
  { value: 'far', label: 'far' },
];
const papers = [
  { value: 'A4', label: 'A4' },
  { value: 'Letter', label: 'Letter' },
];
const decimals = [
  { value: '.', label: 'point' },
  { value: ',', label: 'comma' },
];

/** An empty field is an empty box to write in. */
export const SheetFields = () => (
  <>
    <Field path="mark" label="End mark" />
    <Field path="sheet.job" label="Job" />
    <Field path="sheet.drawing" label="Drawing" />
    <Field path="sheet.number" label="Sheet no." />
    <Field path="sheet.revision" label="Revision" />
    <Field path="sheet.reason" label="Reason" />
    <Field path="sheet.loadCase" label="Load case" />
    <Field path="sheet.date" label="Date" />
    <Field path="sheet.prepared" label="Prepared" />
    <Field path="sheet.checked" label="Checked" />
    <Field path="sheet.approved" label="Approved" />
    <Choice path="sheet.paper" label="Paper" options={papers} empty="A4" />
    <Choice path="sheet.decimal" label="Decimal sign" options={decimals} empty="point" />
    <Field path="piece" label="Piece" />
    <Choice path="end" label="End of piece" options={ends} empty="not said" />
    <Field path="quantity" label="Number off" />
  </>
);
