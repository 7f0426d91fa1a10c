import { type Entry, textOf } from './entry.ts';
import { listedAs } from './rules.ts';

const BESIDE = 'sheet.beside.standard';

const levelOf = (entry: Entry, path: string): string | undefined => listedAs(textOf(entry, path))?.level;

const emptied = (paths: readonly string[]): Record<string, string> =>
  Object.fromEntries(paths.map((path) => [path, '']));

/** Options are each standard's own, a reaction is of one level only, and nothing stands beside itself. */
const byStandard = (entry: Entry, id: string): Record<string, string> => {
  const options = Object.keys(entry.texts).filter((path) => path.startsWith('options.'));
  const turned = levelOf(entry, 'standard') !== listedAs(id)?.level;
  return emptied([
    ...options,
    ...(turned ? ['reaction', 'reaction.by', 'reaction.ofWebShear', 'level'] : []),
    ...(textOf(entry, BESIDE) === id ? [BESIDE, 'sheet.beside.reaction'] : []),
  ]);
};

/** Where an end plate stands and how deep it is, as far as the bench proposed it: each kind has its own. */
const plateProposed = ({ assumed }: Entry): Record<string, string> =>
  emptied(['joint.plate.depth', 'joint.plate.top'].filter((path) => assumed.includes(path)));

/**
 * What is emptied when a standard or a kind of joint is chosen in place of another, by path. All else stays: a grade or a bolt that the new standard does not
 * know gets its fault, with the nearest that it does.
 */
export const changedBy = (entry: Entry, path: string, value: string): Readonly<Record<string, string>> => {
  if (textOf(entry, path) === value) return {};
  if (path === 'joint.kind') return plateProposed(entry);
  if (path === 'standard') return byStandard(entry, value);
  const turned = path === BESIDE && levelOf(entry, BESIDE) !== listedAs(value)?.level;
  return turned ? emptied(['sheet.beside.reaction']) : {};
};
