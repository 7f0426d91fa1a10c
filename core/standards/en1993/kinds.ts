import type { Gate } from '../../end/gates.ts';
import { flag } from '../../end/given.ts';
import { not } from '../../formula/tree.ts';

const fin = flag('a fin plate', (f) => f.kind === 'fin-plate');
const cleats = flag('one cleat or two', (f) => f.legWeb > 0);
const endPlates = flag('an end plate', (f) => f.bp > 0);

/** What is asked of one kind of joint only. */
export const notFinPlate: Gate = { when: not(fin), reason: 'fin-plates-only' };
export const notCleat: Gate = { when: not(cleats), reason: 'cleats-only' };
export const notEndPlate: Gate = { when: not(endPlates), reason: 'end-plates-only' };
/** A plate or ply beside the web, with the bolts of the web in it. */
export const notPlate: Gate = {
  when: flag('no plate or ply beside the web', (f) => f.legWeb > 0 || f.bp > 0),
  reason: 'plates-only',
};
