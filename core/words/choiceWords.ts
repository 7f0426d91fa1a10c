/** Plain words for values that are chosen from a list, by the path of their field. The same in every region. */
export const choiceWords: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  'joint.kind': { 'fin-plate': 'fin plate', 'web-bolts': 'web bolted to a ply' },
  'support.kind': { 'beam-web': "beam's web" },
};

/** The list of a field's values with their words. */
export const choicesOf = (path: string): { readonly value: string; readonly label: string }[] =>
  Object.entries(choiceWords[path] ?? {}).map(([value, label]) => ({ value, label }));
