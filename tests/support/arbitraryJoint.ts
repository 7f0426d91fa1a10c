import fc from 'fast-check';
import type { End, Joint } from '../../core/end/schema.ts';
import { endOf, type PlausibleEnd, plausibleEnd } from './arbitraryEnd.ts';

/** What a random but plausible end has beyond its fin plate, so that it can be joined in any way; mm, kN. Invented. */
export interface PlausibleJoint extends PlausibleEnd {
  readonly legs: 'bolted' | 'web welded' | 'support welded';
  /** Beyond the last bolt of the web leg, and beyond the line of bolts in the support leg or end plate. */
  readonly toe: number;
  readonly besideLine: number;
  readonly cc: number;
  readonly supportRows: number;
  readonly supportPitch: number;
  readonly supportSize: string;
  readonly supportEdge: number;
  readonly supportKind: 'none' | 'beam-web' | 'column-flange' | 'column-web';
  readonly supportSection: string | undefined;
  readonly ts: number;
  readonly Vo: number;
  /** How far the rows and lines of a beam opposite stand off ours; undefined where they are not told. */
  readonly opposite: { readonly down: number; readonly across: number; readonly rows: number } | undefined;
  readonly T: number;
}

const between = (min: number, max: number) => fc.integer({ min, max });

export const plausibleJoint: fc.Arbitrary<PlausibleJoint> = fc
  .tuple(
    plausibleEnd,
    fc.record({
      legs: fc.constantFrom('bolted', 'web welded', 'support welded'),
      toe: between(25, 60),
      besideLine: between(25, 60),
      cc: between(90, 180),
      supportRows: between(1, 6),
      supportPitch: between(55, 100),
      supportSize: fc.constantFrom('M16', 'M20', 'M24'),
      supportEdge: between(25, 60),
      supportKind: fc.constantFrom('none', 'beam-web', 'column-flange', 'column-web'),
      supportSection: fc.constantFrom(undefined, 'UB 610x229x101', 'UC 254x254x73'),
      ts: between(6, 25),
      Vo: fc.oneof(fc.constant(0), between(1, 300)),
      opposite: fc.option(
        fc.record({
          down: fc.oneof(fc.constant(0), between(-150, 150)),
          across: fc.oneof(fc.constant(0), between(-40, 40)),
          rows: between(1, 6),
        }),
        { nil: undefined },
      ),
      T: fc.oneof(fc.constant(0), between(1, 200)),
    }),
  )
  .map(([end, more]) => ({ ...end, ...more }) as PlausibleJoint);

const steel = { fy: 355, fu: 470 };

const supportBolts = (x: PlausibleJoint) => ({
  size: x.supportSize,
  grade: { fu: 800 },
  threads: 'in' as const,
  rows: x.supportRows,
  pitch: x.supportPitch,
  crossCentres: x.cc,
  topEdge: x.supportEdge,
  holes: 'punched' as const,
});

/** Depth that takes the support bolts with their edge at either end. */
const depthOf = (x: PlausibleJoint): number => 2 * x.supportEdge + (x.supportRows - 1) * x.supportPitch;

/** Just inside the root of the flange, or inside the cut. */
const topOf = (x: PlausibleJoint): number =>
  Math.ceil(x.copes === 'top' || x.copes === 'both' ? Math.max(x.dt, x.tf) : x.tf + x.r) + 5;

const cleats = (x: PlausibleJoint, kind: 'double-cleat' | 'single-cleat', placed: object): Joint => {
  const cleat = {
    legSupport: Math.ceil((x.cc - x.tw) / 2 + x.besideLine),
    thickness: x.tp,
    grade: steel,
  };
  const legWeb = x.g + x.eEnd + (x.columns - 1) * x.gauge + x.toe;
  if (x.legs === 'web welded') {
    const welded = { legWeb: x.g + 70, top: topOf(x), depth: depthOf(x), webWeld: { leg: x.leg, electrode: 480 } };
    return { kind, cleat: { ...cleat, ...welded }, supportBolts: supportBolts(x) };
  }
  const bolted = { ...cleat, legWeb, topEdge: x.e, bottomEdge: x.e };
  if (x.legs === 'bolted') {
    // The support's bolts stand in the same rows as the web's, so that the leg takes them.
    const rows = { ...supportBolts(x), rows: x.rows, pitch: x.pitch, topEdge: x.e };
    return { kind, ...placed, cleat: bolted, supportBolts: rows } as Joint;
  }
  return { kind, ...placed, cleat: { ...bolted, supportWeld: { leg: x.leg, electrode: 480 } } } as Joint;
};

const endPlate = (x: PlausibleJoint, kind: 'end-plate' | 'full-end-plate'): Joint => ({
  kind,
  plate: {
    thickness: x.tp,
    width: x.cc + 2 * x.besideLine,
    depth: depthOf(x),
    grade: steel,
    top: topOf(x),
  },
  webWeld: { leg: x.leg, electrode: 480 },
  supportBolts: supportBolts(x),
});

const jointOf = (x: PlausibleJoint, kind: Joint['kind'], { joint }: End): Joint => {
  if (joint.kind !== 'fin-plate') throw new Error('the plausible end has a fin plate');
  const { plate, weld, kind: _, ...placed } = joint;
  switch (kind) {
    case 'fin-plate':
      return { kind, ...placed, plate, weld };
    case 'web-bolts':
      return { kind, ...placed, ply: plate };
    case 'double-cleat':
    case 'single-cleat':
      return cleats(x, kind, placed);
    case 'end-plate':
    case 'full-end-plate':
      return endPlate(x, kind);
  }
};

/** Bolts of a beam on the other side of the same web, where those of the joint go through it. */
const oppositeOf = ({ opposite, supportKind }: PlausibleJoint, joint: Joint) => {
  if (!opposite || supportKind === 'column-flange' || !('supportBolts' in joint) || !joint.supportBolts)
    return undefined;
  const { pitch, crossCentres, topEdge } = joint.supportBolts;
  const placed =
    'cleat' in joint ? (joint.cleat.top ?? (joint.firstRow ?? 0) - (joint.cleat.topEdge ?? 0)) : joint.plate.top;
  const { down, across, rows } = opposite;
  return { firstRow: placed + topEdge + down, rows, pitch, gauge: crossCentres + across };
};

/** The end joined in this way, as JSON. */
export const jointEndOf = (x: PlausibleJoint, kind: Joint['kind']): End & Record<string, unknown> => {
  const end = endOf(x);
  const joint = jointOf(x, kind, end);
  const opposite = oppositeOf(x, joint);
  const support = {
    kind: x.supportKind,
    ...(x.supportSection && { section: x.supportSection }),
    thickness: x.ts,
    grade: steel,
    otherReaction: x.Vo,
    ...(opposite && { opposite }),
  };
  return {
    ...end,
    tie: x.T,
    joint,
    ...(x.supportKind !== 'none' && { support: support as End['support'] }),
  };
};
