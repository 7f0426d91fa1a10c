/** Words that stand in place of others, each in lower case; sentences that begin with one keep their capital. */
export type Instead = readonly (readonly [said: string, instead: string])[];

const capitalised = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

const inText = (text: string, instead: Instead): string =>
  instead.reduce((said, [from, to]) => said.replaceAll(from, to).replaceAll(capitalised(from), capitalised(to)), text);

/** The same texts, lists and tables of texts, with some words in place of others. Keys stay. */
export const respoken = <T>(texts: T, instead: Instead): T => {
  if (typeof texts === 'string') return inText(texts, instead) as T;
  if (Array.isArray(texts)) return texts.map((one) => respoken(one, instead)) as T;
  if (typeof texts !== 'object' || texts === null) return texts;
  return Object.fromEntries(Object.entries(texts).map(([key, one]) => [key, respoken(one, instead)])) as T;
};
