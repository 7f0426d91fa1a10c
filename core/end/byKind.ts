import type { Condition } from '../formula/tree.ts';
import type { Facts } from './facts.ts';
import { flag } from './given.ts';
import type { Joint } from './schema.ts';

type Kind = Joint['kind'];

export const isCleat = (kind: Kind): boolean => kind === 'double-cleat' || kind === 'single-cleat';
export const isEndPlate = (kind: Kind): boolean => kind === 'end-plate' || kind === 'full-end-plate';
/** A plate or ply beside the web, bolted to it. */
export const isPlate = (kind: Kind): boolean => kind === 'fin-plate' || kind === 'web-bolts';

/** A yes-or-no fact that the kind of joint settles, where `settled` says so; else `read` from the facts. */
export const settledByKind = (
  text: string,
  settled: (kind: Kind) => boolean | undefined,
  read: (f: Facts) => boolean,
  called = text,
): Condition => flag(text, read, called, (kind) => settled(kind as Kind));

/** A yes-or-no fact that the kind of joint alone settles. */
export const byKind = (text: string, holds: (kind: Kind) => boolean, called = text): Condition =>
  settledByKind(text, holds, (f) => holds(f.kind), called);
