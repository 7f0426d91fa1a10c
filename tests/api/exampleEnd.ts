import { exampleEnd } from '../../api/exampleEnd.ts';
import type { End } from '../../core/end/schema.ts';

export { exampleEnd };

/** The same end at a load under which it fails (FAILS), and with a corner that practice refers (REFER). */
export const failingEnd: End = { ...exampleEnd, reaction: 400 };
export const referringEnd: End = { ...exampleEnd, top: { ...exampleEnd.top, radius: 0 } };
