import { fieldName, filled } from '../../core/words/words.ts';
import { entry, lastGood, standard, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { shown } from '../state/fieldText.ts';
import { lineOf } from '../state/tradeOrder.ts';
import { FieldLink } from './FieldLink.tsx';
import { optionName, optionValue } from './optionWords.ts';

interface Said {
  readonly path: string;
  readonly text: string;
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
const bare = (text: string): string => text.replace(/ \(assumed\)\.?$/, '').replace(/\.$/, '');

/** Values that the bench put in and nobody has touched. */
const proposed = (): Said[] =>
  entry.value.assumed
    .filter((path) => lineOf(path) !== undefined && !/\.by$|^(top|bottom|support|joint\.kind)$/.test(path))
    .map((path) => ({ path, text: `${capital(fieldName(words.value, path))} ${shown(path)}` }));

/** What the core takes as true because it was not given. */
const taken = (): Said[] =>
  (lastGood.value?.report.assumptions ?? []).flatMap(({ path, text }) =>
    path !== undefined && textOf(entry.value, path) === '' ? [{ path, text: bare(text) }] : [],
  );

const options = (): Said[] =>
  Object.entries(standard.value?.options ?? {})
    .filter(([key]) => textOf(entry.value, `options.${key}`) === '')
    .map(([key, values]) => ({
      path: `options.${key}`,
      text: filled('{name} {value}', { name: optionName(key), value: optionValue(values[0]) }),
    }));

const unsupported = (): Said[] =>
  textOf(entry.value, 'support') === 'on' ? [] : [{ path: 'support', text: 'Support not given: not checked' }];

/** Everything that is taken as true though nobody said so; each leads to its field. */
export const Assumed = () => {
  const said = [...proposed(), ...taken(), ...options(), ...unsupported()];
  if (said.length === 0) return null;
  return (
    <section class="assumed-list" aria-labelledby="assumed-title">
      <h3 id="assumed-title">Assumed until you say otherwise</h3>
      <p>
        {said.map(({ path, text }) => (
          <span key={path}>
            <FieldLink path={path} kind="plain">
              {text}
            </FieldLink>
            .{' '}
          </span>
        ))}
      </p>
    </section>
  );
};
