import { capital } from '../../core/words/capital.ts';
import { fieldName, type Words } from '../../core/words/words.ts';
import { type Entry, textOf } from './entry.ts';

/** What a step did, such as `Pitch 70 → 80` or `Bottom notch added`. */
export const stepName = (words: Words, before: Entry, after: Entry, path: string): string => {
  const name = capital(fieldName(words, path.replace(/\.by$/, '')));
  const old = textOf(before, path);
  const fresh = textOf(after, path);
  if (fresh === 'on') return `${name} added`;
  if (old === 'on') return `${name} removed`;
  if (old === fresh) return `${name}: sizes proposed`;
  return `${name} ${old || 'empty'} → ${fresh || 'empty'}`;
};
