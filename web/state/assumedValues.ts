import { capital } from '../../core/words/capital.ts';
import { choiceText } from '../../core/words/choiceWords.ts';
import { fieldName } from '../../core/words/words.ts';
import { entry, words } from './bench.ts';
import { textOf } from './entry.ts';
import { shown, unitAt } from './fieldText.ts';
import { isThere } from './isThere.ts';
import { lineOf } from './tradeOrder.ts';

/** A value that the bench put in and nobody has touched. */
export interface AssumedValue {
  readonly path: string;
  readonly text: string;
}

/** That a part is there, and the way in which a value is given, show themselves in the values. */
const showsItself = (path: string): boolean => path.endsWith('.by') || textOf(entry.value, path) === 'on';

const said = (path: string): string => {
  const value = shown(path);
  return [capital(fieldName(words.value, path)), choiceText(words.value, path, value), unitAt(path)]
    .filter(Boolean)
    .join(' ');
};

/** Values of the end that the bench put in and nobody has touched, in words. */
export const assumedValues = (): AssumedValue[] =>
  entry.value.assumed
    .filter((path) => lineOf(path) !== undefined && !showsItself(path) && isThere(entry.value, path))
    .map((path) => ({ path, text: said(path) }));
