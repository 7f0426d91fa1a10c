import type { Joint } from '../../core/end/schema.ts';
import { type Entry, textOf } from './entry.ts';

/** The bench's own word for which legs of a cleat are bolted. */
export const LEGS = 'joint.cleat.legs';
export type Legs = 'bolted' | 'web-welded' | 'support-welded';

/** What a joint is made of, as far as its fields go. */
export interface Joined {
  readonly kind: Joint['kind'];
  readonly cleat: boolean;
  readonly endPlate: boolean;
  readonly webBolts: boolean;
  readonly supportBolts: boolean;
  /** Where the plate, ply or cleat stands in the end, and its weld; empty where it has none. */
  readonly fitting: string;
  readonly weld: string;
}

export const joinedIn = (entry: Entry): Joined => {
  const kind = (textOf(entry, 'joint.kind') || 'fin-plate') as Joint['kind'];
  const cleat = kind === 'double-cleat' || kind === 'single-cleat';
  const endPlate = kind === 'end-plate' || kind === 'full-end-plate';
  const legs = cleat ? ((textOf(entry, LEGS) || 'bolted') as Legs) : 'bolted';
  const welded = { bolted: '', 'web-welded': 'joint.cleat.webWeld', 'support-welded': 'joint.cleat.supportWeld' };
  const ply = kind === 'web-bolts';
  return {
    kind,
    cleat,
    endPlate,
    webBolts: !endPlate && legs !== 'web-welded',
    supportBolts: endPlate || (cleat && legs !== 'support-welded'),
    fitting: cleat ? 'joint.cleat' : ply ? 'joint.ply' : 'joint.plate',
    weld: cleat ? welded[legs] : endPlate ? 'joint.webWeld' : ply ? '' : 'joint.weld',
  };
};

/** Bolts of a beam opposite. */
export const OPPOSITE = 'support.opposite';

/** Whether an entry has bolts of a beam opposite: through the web that carries both, where the joint is bolted to it. */
export const oppositeFits = (entry: Entry): boolean =>
  textOf(entry, 'support.otherReaction') !== '' &&
  textOf(entry, 'support.kind') !== 'column-flange' &&
  joinedIn(entry).supportBolts;

/** Told by the first of its sizes; before that they are taken as shared. */
export const oppositeTold = (entry: Entry): boolean =>
  Object.keys(entry.texts).some((path) => path.startsWith(`${OPPOSITE}.`));

/** Names of a fitting's own fields beside thickness and grade. */
export const fittingSizes = ({ cleat, endPlate, webBolts }: Joined): readonly string[] => {
  if (endPlate) return ['width', 'depth', 'top'];
  if (!cleat) return ['topEdge', 'bottomEdge', 'edge'];
  return ['legWeb', 'legSupport', 'radius', ...(webBolts ? ['topEdge', 'bottomEdge'] : ['top', 'depth'])];
};

/** Names of a weld's own fields. */
export const weldSizes = ({ cleat }: Joined): readonly string[] =>
  cleat ? ['leg', 'electrode', 'return'] : ['leg', 'electrode'];
