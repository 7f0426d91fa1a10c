import type { Context, Under } from './context.ts';

type Named = Pick<Under, 'input'>;

/** Standard with its edition, as one designation: SANS 10162-1:2011; EN 1993-1-8:2005, recommended values. */
export const standardName = ({ input }: Named): string => {
  const { title, edition } = input.report.standard;
  if (!/^\d{4}/.test(edition)) return `${title}, ${edition}`;
  const [name = '', ...choice] = title.split(', ');
  return [`${name}:${edition}`, ...choice].join(', ');
};

/** Standard without edition and national choice, where the page has named it in full; with the choice where only that tells two standards apart. */
export const standardTitles = ({ input, second }: Context): readonly [first: string, second: string] => {
  const titles = [input.report.standard.title, second?.input.report.standard.title ?? ''] as const;
  const [first = '', other = ''] = titles.map((one) => one.split(', ')[0]!);
  return first === other ? titles : [first, other];
};

/** Every option in force, as `key value`. */
export const optionsText = ({ input }: Named): string =>
  Object.entries(input.report.options)
    .map(([key, value]) => `${key} ${value}`)
    .join(', ');
