import { standardPage } from '../../core/check/standardPage.ts';
import { standards } from '../../core/standards/index.ts';
import { nearest } from '../../core/steel/nearest.ts';
import type { Asked } from './arguments.ts';
import { complain, HOLDS, print } from './output.ts';
import { printStandard } from './printStandard.ts';

const list = (): string =>
  Object.values(standards)
    .map(({ id, title, edition, level }) => `${id.padEnd(16)}${title}:${edition}, ${level} reactions\n`)
    .join('');

/** Prints a standard in full, or the list of them; the exit status. */
export const standardsCommand = async ({ file: id }: Asked): Promise<number> => {
  if (id === undefined) {
    await print(list());
    return HOLDS;
  }
  const standard = Object.hasOwn(standards, id) ? standards[id] : undefined;
  if (!standard) {
    return complain(`${id} is no standard known here; nearest: ${nearest(id, Object.keys(standards), 3).join(', ')}.`);
  }
  await print(printStandard(standardPage(standard)));
  return HOLDS;
};
