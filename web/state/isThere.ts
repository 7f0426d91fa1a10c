import { type Entry, textOf } from './entry.ts';
import { fittingSizes, type Joined, joinedIn, OPPOSITE, oppositeFits, weldSizes } from './joined.ts';

/** Fields that every fitting has. */
const always: readonly string[] = ['thickness', 'grade'];

const within = (path: string, whole: string): boolean => path === whole || path.startsWith(`${whole}.`);

/** Whether a joint has the field, as the fields of other kinds stay in the entry. */
const inJoint = (joined: Joined, path: string): boolean => {
  const { fitting, weld, webBolts, supportBolts } = joined;
  if (within(path, 'joint.bolts') || path === 'joint.firstRow' || path === 'joint.endDistance') return webBolts;
  if (within(path, 'joint.supportBolts')) return supportBolts;
  if (weld !== '' && within(path, weld)) return weldSizes(joined).some((name) => path === `${weld}.${name}`);
  if (!within(path, fitting)) return path === 'joint.kind';
  return (
    path === 'joint.cleat.legs' ||
    always.some((name) => within(path, `${fitting}.${name}`)) ||
    fittingSizes(joined).some((name) => path === `${fitting}.${name}`)
  );
};

/** Whether the end has the part that a path belongs to: sizes of a part that is off, or of another joint, stay in the entry and out of the end. */
export const isThere = (entry: Entry, path: string): boolean => {
  const [first = ''] = path.split('.');
  if (path === 'sheet.beside.reaction') return textOf(entry, 'sheet.beside.standard') !== '';
  if (within(path, OPPOSITE) && !oppositeFits(entry)) return false;
  if (/^(top|bottom|support)\./.test(path)) return textOf(entry, first) === 'on';
  if (first === 'joint') return inJoint(joinedIn(entry), path);
  return path !== 'setback' || !joinedIn(entry).endPlate;
};
