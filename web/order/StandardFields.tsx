import { listed } from '../../core/standards/listed.ts';
import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { Choice } from '../field/Choice.tsx';
import { standard } from '../state/bench.ts';
import { titled } from '../state/rules.ts';

const all = listed.map((one) => ({ value: one.id, label: titled(one) }));

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
  </>
);
