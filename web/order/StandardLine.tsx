import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { entry, standard } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { OrderLine } from './OrderLine.tsx';
import { Value } from './Value.tsx';

const chosenOptions = (): string[] =>
  Object.keys(standard.value?.options ?? {}).filter((key) => textOf(entry.value, `options.${key}`) !== '');

const Sentence = () => {
  const known = standard.value;
  const keys = chosenOptions();
  return (
    <>
      <Value path="standard" missing="standard?" {...(known && { text: `${known.title}:${known.edition}` })} />;{' '}
      {keys.length === 0
        ? 'its usual options (assumed)'
        : keys.map((key, at) => (
            <span key={key}>
              {at > 0 && ', '}
              {optionName(key).toLowerCase()}{' '}
              <Value path={`options.${key}`} text={optionValue(textOf(entry.value, `options.${key}`))} />
            </span>
          ))}
      .
    </>
  );
};

/** The design standard and its options. */
export const StandardLine = () => <OrderLine name="standard" title="Standard" stacked sentence={<Sentence />} />;
