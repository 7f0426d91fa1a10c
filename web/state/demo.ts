import demo from '../../fixtures/demo/citrus-packhouse.json' with { type: 'json' };
import { type Entry, emptyEntry } from './entry.ts';
import { entryOf } from './entryOf.ts';
import { openedFrom } from './opened.ts';

/** The invented end that stands on the bench at the first visit; its job says that it is a demo. */
export const demoEntry = (): Entry => {
  const opened = openedFrom(demo);
  return 'end' in opened ? entryOf(opened.end) : emptyEntry('sans-10162-1', 'mm-kN');
};
