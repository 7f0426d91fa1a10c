import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { entry, listing } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { unitAt } from '../state/fieldText.ts';
import { titled } from '../state/rules.ts';
import { otherLevel, secondListing } from '../state/secondStandard.ts';
import { OrderLine } from './OrderLine.tsx';
import { Value } from './Value.tsx';

const chosenOptions = (): string[] =>
  Object.keys(entry.value.texts).flatMap((path) =>
    path.startsWith('options.') ? [path.slice('options.'.length)] : [],
  );

/** The second standard, and its reaction where it needs one of its own. */
const Beside = () => {
  const id = textOf(entry.value, 'sheet.beside.standard');
  if (id === '') return null;
  const known = secondListing.value;
  const path = 'sheet.beside.reaction';
  return (
    <>
      {' '}
      Beside it <Value path="sheet.beside.standard" text={known ? titled(known) : id} />
      {otherLevel.value && (
        <>
          , <Value path={path} missing="reaction?" /> {unitAt(path)} {otherLevel.value}
        </>
      )}
      .
    </>
  );
};

const Sentence = () => {
  const known = listing.value;
  const keys = chosenOptions();
  return (
    <>
      <Value path="standard" missing="standard?" {...(known && { text: titled(known) })} />;{' '}
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
      <Beside />
    </>
  );
};

/** The design standard and its options. */
export const StandardLine = () => <OrderLine name="standard" title="Standard" stacked sentence={<Sentence />} />;
