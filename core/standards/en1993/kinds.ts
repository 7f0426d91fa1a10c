import { byKind, isCleat, isEndPlate, isPlate } from '../../end/byKind.ts';
import type { Gate } from '../../end/gates.ts';
import { not } from '../../formula/tree.ts';

const fin = byKind('a fin plate', (kind) => kind === 'fin-plate');
const cleats = byKind('one cleat or two', isCleat);
const endPlates = byKind('an end plate', isEndPlate);

/** What is asked of one kind of joint only. */
export const notFinPlate: Gate = { when: not(fin), reason: 'fin-plates-only' };
export const notCleat: Gate = { when: not(cleats), reason: 'cleats-only' };
export const notEndPlate: Gate = { when: not(endPlates), reason: 'end-plates-only' };
/** A plate or ply beside the web, with the bolts of the web in it. */
export const notPlate: Gate = {
  when: byKind('no plate or ply beside the web', (kind) => !isPlate(kind)),
  reason: 'plates-only',
};
