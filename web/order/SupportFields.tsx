import { choicesOf } from '../../core/words/choiceWords.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { SectionField } from '../field/SectionField.tsx';
import { entry, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { oppositeFits } from '../state/joined.ts';
import { OppositeFields } from './OppositeFields.tsx';
import { SteelField } from './SteelField.tsx';

/** What carries the end: its face, by section or by thickness, its steel, its level, and a beam on its other side. */
export const SupportFields = () => {
  const kind = textOf(entry.value, 'support.kind');
  return (
    <fieldset class="part">
      <legend class="unseen">Support</legend>
      <Choice path="support.kind" label="Face" options={choicesOf(words.value, 'support.kind')} />
      <SectionField path="support.section" label="Section" />
      <Field path="support.thickness" label="Thickness" empty="of the section" />
      <SteelField path="support.grade" />
      {kind === 'beam-web' && <Field path="support.topOfSteel" label="Top above" empty="level, assumed" />}
      {kind !== 'column-flange' && <Field path="support.otherReaction" label="Beam opposite" empty="none" />}
      {oppositeFits(entry.value) && <OppositeFields />}
    </fieldset>
  );
};
