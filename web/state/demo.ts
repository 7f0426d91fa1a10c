import { readEnd } from '../../core/end/readEnd.ts';
import demo from '../../fixtures/demo/citrus-packhouse.json' with { type: 'json' };
import { type Entry, emptyEntry } from './entry.ts';
import { entryOf } from './entryOf.ts';

/** The invented end that stands on the bench at the first visit; its job says that it is a demo. */
export const demoEntry = (): Entry => {
  const read = readEnd(demo);
  return 'end' in read ? entryOf(read.end) : emptyEntry('sans-10162-1', 'mm-kN');
};
