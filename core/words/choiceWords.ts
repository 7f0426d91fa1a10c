import type { Words } from './words.ts';

/** Plain words for values that are chosen from a list, by the path of their field. */
const choiceWords = (words: Words): Readonly<Record<string, Readonly<Record<string, string>>>> => ({
  'joint.kind': {
    'fin-plate': words.finPlate,
    'double-cleat': 'two cleats',
    'single-cleat': 'one cleat',
    'end-plate': 'end plate',
    'full-end-plate': 'full end plate',
    'web-bolts': 'web bolted to a ply',
  },
  'joint.cleat.legs': {
    bolted: 'both bolted',
    'web-welded': 'web leg welded',
    'support-welded': 'support leg welded',
  },
  'support.kind': { 'beam-web': "beam's web", 'column-flange': "column's flange", 'column-web': "column's web" },
});

/** A value of a field in plain words; the value itself where it has none. */
export const choiceText = (words: Words, path: string, value: string): string =>
  choiceWords(words)[path]?.[value] ?? value;

/** The list of a field's values with their words. */
export const choicesOf = (words: Words, path: string): { readonly value: string; readonly label: string }[] =>
  Object.entries(choiceWords(words)[path] ?? {}).map(([value, label]) => ({ value, label }));
