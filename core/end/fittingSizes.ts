import type { Facts } from './facts.ts';
import type { End, Joint } from './schema.ts';

/** Sizes of the plate, ply or cleat of a joint, as in the facts. mm */
export type FittingSizes = Pick<
  Facts,
  'tp' | 'hp' | 'eTop' | 'eBot' | 'ex' | 'yp' | 'legWeb' | 'legSupport' | 'rootRadius' | 'bp' | 'weldReturn'
>;

type Of<K extends Joint['kind']> = Extract<Joint, { kind: K }>;

const noLegs = { legWeb: 0, legSupport: 0, rootRadius: 0, bp: 0, weldReturn: 0 };

const plySizes = (joint: Of<'fin-plate' | 'web-bolts'>, k: number): FittingSizes => {
  const ply = joint.kind === 'fin-plate' ? joint.plate : joint.ply;
  const { bolts } = joint;
  const eTop = ply.topEdge * k;
  const eBot = ply.bottomEdge * k;
  const rows = bolts.rows > 1 ? (bolts.rows - 1) * (bolts.pitch ?? 0) * k : 0;
  const yp = joint.firstRow * k - eTop;
  const tp = ply.thickness * k;
  const ex = ply.edge * k;
  return {
    tp,
    hp: eTop + rows + eBot,
    eTop,
    eBot,
    ex,
    yp,
    legWeb: 0,
    legSupport: 0,
    rootRadius: 0,
    bp: 0,
    weldReturn: 0,
  };
};

/** The heel stands at the support's face, so that the web leg reaches over the setback to the bolts. */
const cleatSizes = (
  { cleat, bolts, firstRow, endDistance }: Of<'double-cleat' | 'single-cleat'>,
  setback: number,
  k: number,
): FittingSizes => {
  const legs = {
    tp: cleat.thickness * k,
    legWeb: cleat.legWeb * k,
    legSupport: cleat.legSupport * k,
    rootRadius: (cleat.radius ?? 0) * k,
    bp: 0,
  };
  if (!bolts) {
    const welded = { hp: (cleat.depth ?? 0) * k, eTop: 0, eBot: 0, ex: 0, yp: (cleat.top ?? 0) * k };
    return { ...legs, ...welded, weldReturn: (cleat.webWeld?.return ?? cleat.legWeb - setback) * k };
  }
  const eTop = (cleat.topEdge ?? 0) * k;
  const eBot = (cleat.bottomEdge ?? 0) * k;
  const rows = bolts.rows > 1 ? (bolts.rows - 1) * (bolts.pitch ?? 0) * k : 0;
  const columns = (bolts.columns ?? 1) > 1 ? ((bolts.columns ?? 1) - 1) * (bolts.gauge ?? 0) * k : 0;
  const ex = legs.legWeb - (setback + (endDistance ?? 0)) * k - columns;
  return {
    ...legs,
    hp: eTop + rows + eBot,
    eTop,
    eBot,
    ex,
    yp: (firstRow ?? 0) * k - eTop,
    weldReturn: (cleat.supportWeld?.return ?? 0) * k,
  };
};

/** Sizes of a joint's plate, ply or cleat; `k`: mm in one length unit of the file. */
export const fittingSizes = ({ joint, setback }: End, k: number): FittingSizes => {
  switch (joint.kind) {
    case 'fin-plate':
    case 'web-bolts':
      return plySizes(joint, k);
    case 'double-cleat':
    case 'single-cleat':
      return cleatSizes(joint, setback, k);
    case 'end-plate':
    case 'full-end-plate': {
      const { thickness, depth, width, top } = joint.plate;
      const sizes = { tp: thickness * k, hp: depth * k, yp: top * k };
      return { ...noLegs, ...sizes, bp: width * k, eTop: 0, eBot: 0, ex: 0 };
    }
  }
};
