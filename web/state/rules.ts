import { admit, standards } from '../../core/standards/known.ts';
import { type Listed, listed } from '../../core/standards/listed.ts';
import { sans10162 } from '../../core/standards/sans10162/index.ts';
import type { Standard } from '../../core/standards/standard.ts';
import { later } from './later.ts';

admit(sans10162);

const fetch = async (id: string): Promise<Standard> => {
  const { standardFolders } = await import('./standardFolders.ts');
  const rules = await standardFolders[id]!();
  admit(rules);
  return rules;
};

const fetched = new Map(
  listed.filter(({ id }) => !Object.hasOwn(standards, id)).map(({ id }) => [id as string, later(() => fetch(id))]),
);

/** What is listed of a standard; undefined where this version does not have it. */
export const listedAs = (id: string): Listed | undefined => listed.find((one) => one.id === id);

/** How a standard is named where it is chosen, with its edition. */
export const titled = ({ title, edition }: Pick<Listed, 'title' | 'edition'>): string => `${title}:${edition}`;

/**
 * The rules of a standard; asked for here where they are not at hand. `coming`: on their way; `missed`: they could not be loaded; undefined
 * where this version does not have the standard.
 */
export const rulesOf = (id: string): Standard | 'coming' | 'missed' | undefined => {
  const part = fetched.get(id);
  if (!part) return Object.hasOwn(standards, id) ? standards[id] : undefined;
  return part.failed ? 'missed' : (part.value ?? 'coming');
};
