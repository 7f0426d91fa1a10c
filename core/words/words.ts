import { capital } from './capital.ts';

/** Everything the program says to people in one region's words. Codes and paths are those of the JSON. */
export interface Words {
  /** cope (North America) or notch (elsewhere). */
  readonly cope: string;
  /** fin plate or single plate. */
  readonly finPlate: string;
  /** gauge or gage. */
  readonly gauge: string;
  /** Title of a check in full, by id; of a way that is called something else, by `id, way`. */
  readonly titles: Readonly<Record<string, string>>;
  /** The same for a narrow column. */
  readonly short: Readonly<Record<string, string>>;
  /** Name of a way or part of a check, as it follows a title. */
  readonly ways: Readonly<Record<string, string>>;
  /** Why a check refers, fails or does not apply, by reason code. */
  readonly reasons: Readonly<Record<string, string>>;
  /** One line for each standing of a formula. */
  readonly bases: Readonly<Record<string, string>>;
  readonly assumptions: Readonly<Record<string, string>>;
  readonly notes: Readonly<Record<string, string>>;
  /** Name of a field of the end, by its path. */
  readonly fields: Readonly<Record<string, string>>;
  readonly cautions: readonly string[];
}

/** A fault as it comes from the core: code, path, given, limit. */
interface FaultLike {
  readonly code: string;
  readonly path: string;
  readonly given: unknown;
  readonly limit: unknown;
}

/** Name of a check, or of its way that is called something else, for a narrow column; its title where it has none. */
export const shortOf = (
  { short }: Pick<Words, 'short'>,
  { id, of, title }: { readonly id: string; readonly of?: string; readonly title: string },
): string => (of ? short[`${id}, ${of}`] : undefined) ?? short[id] ?? title;

/** Name of a field, or the last part of its path where it has none. */
export const fieldName = (words: Words, path: string): string => words.fields[path] ?? path.split('.').at(-1) ?? path;

/** Fills `{name}` places of a sentence. */
export const filled = (sentence: string, values: Readonly<Record<string, unknown>>): string =>
  sentence.replace(/\{(\w+)\}/g, (_, name: string) => spoken(values[name]));

const spoken = (value: unknown): string => {
  if (Array.isArray(value)) return value.map(spoken).join(', ');
  if (typeof value === 'number') return Number.isInteger(value) ? String(value) : String(Number(value.toPrecision(6)));
  if (value === null || value === undefined) return 'nothing';
  if (typeof value === 'object') return bounds(value as Readonly<Record<string, unknown>>);
  return String(value);
};

const boundWords: Readonly<Record<string, string>> = {
  least: 'at least',
  most: 'at most',
  above: 'more than',
  below: 'less than',
  lastRowBelow: 'with the last row above',
};

const bounds = (limit: Readonly<Record<string, unknown>>): string =>
  Object.entries(limit)
    .map(([name, value]) => `${boundWords[name] ?? name} ${spoken(value)}`)
    .join(', ');

/** The sentence of a fault: what is wrong, and how to mend it. */
export const faultText = (words: Words, faults: Readonly<Record<string, string>>, one: FaultLike): string => {
  const field = one.path ? fieldName(words, one.path) : 'the file';
  const sentence = faults[one.code] ?? '{field} was not understood: {given}.';
  return capital(filled(sentence, { field, given: one.given, limit: one.limit, path: one.path, cope: words.cope }));
};
