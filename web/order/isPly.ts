import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';

/** The web is bolted to a ply; else to a fin plate. */
export const isPly = (): boolean => textOf(entry.value, 'joint.kind') === 'web-bolts';

/** Where the plate or ply stands in the end. */
export const plyPath = (): string => (isPly() ? 'joint.ply' : 'joint.plate');
