import type { UnitSystem } from '../../core/units/systems.ts';

/**
 * What stands in the fields of the bench, as it was typed or chosen, by the path of the end's JSON; a path is absent where nothing stands.
 *
 * Beside the paths of the JSON there are a few of the bench's own: `top`, `bottom` (`on` or `none`) and `support` (`on`) say whether that part
 * is there, and a path ending in `.by` says which of two ways a value is given (`beam.section.by`: `name` or `sizes`; a grade's: `name` or
 * `strength`; `reaction.by`: `force` or `share`). Fields of a part that is off, or of another joint, stay in the entry and out of the end.
 */
export interface Entry {
  readonly units: UnitSystem;
  readonly texts: Readonly<Record<string, string>>;
  /** Paths that the bench filled in and nobody has touched since. */
  readonly assumed: readonly string[];
}

export const textOf = (entry: Entry, path: string): string => entry.texts[path] ?? '';

/** An end of which nothing is known but the standard and the units. */
export const emptyEntry = (standard: string, units: UnitSystem): Entry => ({
  units,
  texts: { standard, 'joint.kind': 'fin-plate', top: 'on', bottom: 'none' },
  assumed: ['joint.kind', 'top', 'bottom'],
});

/** The entry with a text at a path, no longer assumed; an empty text leaves nothing there. */
export const withText = (entry: Entry, path: string, text: string): Entry => {
  const { [path]: _, ...others } = entry.texts;
  return {
    ...entry,
    texts: text === '' ? others : { ...others, [path]: text },
    assumed: entry.assumed.filter((one) => one !== path),
  };
};

/** The entry with values that the bench proposes where nothing stands, marked as assumed. */
export const withProposals = (entry: Entry, proposals: Readonly<Record<string, string>>): Entry => {
  const fresh = Object.entries(proposals).filter(([path, text]) => text !== '' && textOf(entry, path) === '');
  return {
    ...entry,
    texts: { ...entry.texts, ...Object.fromEntries(fresh) },
    assumed: [...entry.assumed, ...fresh.map(([path]) => path)],
  };
};
