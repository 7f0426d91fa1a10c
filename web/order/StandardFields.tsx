import { listed } from '../../core/standards/listed.ts';
import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { regions } from '../../core/words/regions.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { Choice } from '../field/Choice.tsx';
import { Field } from '../field/Field.tsx';
import { Segments } from '../field/Segments.tsx';
import { entry, region, standard } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { titled } from '../state/rules.ts';
import { otherLevel } from '../state/secondStandard.ts';
import { setRegion } from '../state/setRegion.ts';

const all = listed.map((one) => ({ value: one.id as string, label: titled(one) }));

/** The second standard, with a reaction of its own where it works at the other level. */
const BesideFields = () => {
  const first = textOf(entry.value, 'standard');
  return (
    <>
      <Choice
        path="sheet.beside.standard"
        label="Beside it"
        options={all.filter(({ value }) => value !== first)}
        empty="no other standard"
      />
      {otherLevel.value && <Field path="sheet.beside.reaction" label={`Its reaction, ${otherLevel.value}`} />}
    </>
  );
};

const tongues = [...regions].reverse().map((value) => ({ value, label: wordsFor(value).cope }));

/** Whose trade words are spoken, by the word for what is cut off. */
const WordsField = () => (
  <div class="field words-field">
    <span>Trade words</span>
    <Segments
      name="words"
      title="Trade words"
      path="sheet.words"
      choices={tongues}
      inForce={region.value}
      set={setRegion}
    />
  </div>
);

export const StandardFields = () => (
  <>
    <Choice path="standard" label="Standard" options={all} />
    {Object.entries(standard.value?.options ?? {}).map(([key, values]) => (
      <Choice
        key={key}
        path={`options.${key}`}
        label={optionName(key)}
        options={values.map((value) => ({ value, label: optionValue(value) }))}
        empty={`${optionValue(values[0])} (assumed)`}
      />
    ))}
    <BesideFields />
    <WordsField />
  </>
);
