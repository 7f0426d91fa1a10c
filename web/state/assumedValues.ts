import { capital } from '../../core/words/capital.ts';
import { fieldName } from '../../core/words/words.ts';
import { entry, words } from './bench.ts';
import { shown } from './fieldText.ts';
import { lineOf } from './tradeOrder.ts';

/** A value that the bench put in and nobody has touched. */
export interface AssumedValue {
  readonly path: string;
  readonly text: string;
}

/** Whether a part is there, and the way in which a value is given, say themselves in the order's sentences. */
const speaksForItself = (path: string): boolean => /\.by$|^(top|bottom|support|joint\.kind)$/.test(path);

/** Values that the bench put in and nobody has touched, in words. */
export const assumedValues = (): AssumedValue[] =>
  entry.value.assumed
    .filter((path) => lineOf(path) !== undefined && !speaksForItself(path))
    .map((path) => ({ path, text: `${capital(fieldName(words.value, path))} ${shown(path)}` }));
