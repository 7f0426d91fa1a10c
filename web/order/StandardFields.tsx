import { standards } from '../../core/standards/known.ts';
import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { Choice } from '../field/Choice.tsx';
import { standard } from '../state/bench.ts';

const titled = Object.values(standards).map(({ id, title, edition }) => ({ value: id, label: `${title}:${edition}` }));

export const StandardFields = () => (
  <>
    <Choice path="standard" label="Standard" options={titled} />
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
