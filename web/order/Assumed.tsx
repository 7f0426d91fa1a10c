import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { type AssumedValue, assumedValues } from '../state/assumedValues.ts';
import { entry, lastGood, standard } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { FieldLink } from './FieldLink.tsx';

const bare = (text: string): string => text.replace(/ \(assumed\)\.?$/, '').replace(/\.$/, '');

/** What the core takes as true because it was not given. */
const taken = (): AssumedValue[] =>
  (lastGood.value?.report.assumptions ?? []).flatMap(({ path, text }) =>
    path !== undefined && textOf(entry.value, path) === '' ? [{ path, text: bare(text) }] : [],
  );

const options = (): AssumedValue[] =>
  Object.entries(standard.value?.options ?? {})
    .filter(([key]) => textOf(entry.value, `options.${key}`) === '')
    .map(([key, values]) => ({
      path: `options.${key}`,
      text: `${optionName(key)} ${optionValue(values[0])}`,
    }));

const unsupported = (): AssumedValue[] =>
  textOf(entry.value, 'support') === 'on' ? [] : [{ path: 'support', text: 'Support not given: not checked' }];

/** Everything that is taken as true though nobody said so; each leads to its field. */
export const Assumed = () => {
  const said = [...assumedValues(), ...taken(), ...options(), ...unsupported()];
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
