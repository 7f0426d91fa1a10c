import { type Entry, textOf } from './entry.ts';

/** Whether the end has the part that a path belongs to: sizes of a part that is off, or of another joint, stay in the entry and out of the end. */
export const isThere = (entry: Entry, path: string): boolean => {
  const [first = '', second = ''] = path.split('.');
  if (path === 'sheet.beside.reaction') return textOf(entry, 'sheet.beside.standard') !== '';
  if (/^(top|bottom|support)\./.test(path)) return textOf(entry, first) === 'on';
  if (second === 'ply') return textOf(entry, 'joint.kind') === 'web-bolts';
  if (second === 'plate' || second === 'weld') return textOf(entry, 'joint.kind') !== 'web-bolts';
  return true;
};
