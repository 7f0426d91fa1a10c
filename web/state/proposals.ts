import type { ExaminedNumbers } from '../../core/check/examined.ts';
import { writeQuantity } from '../../core/units/printQuantity.ts';
import { INCH, toSystem } from '../../core/units/systems.ts';
import type { Entry } from './entry.ts';
import { LEGS } from './joined.ts';
import { jointProposals } from './jointProposals.ts';

/** Values put where nothing stands yet when a part is switched on, by path. */
export type Proposals = Readonly<Record<string, string>>;

interface Known {
  readonly entry: Entry;
  /** The last end that could be examined. */
  readonly last: ExaminedNumbers | null;
}

/** A length given for both systems, as text. */
const size =
  ({ entry }: Known) =>
  (mm: number, inches: string): string =>
    entry.units === 'mm-kN' ? String(mm) : inches;

/** A length in mm as a round size at or above it. */
const roundUp = ({ entry }: Known, mm: number): string => {
  if (entry.units === 'mm-kN') return String(Math.ceil(mm / 5 - 1e-9) * 5);
  return writeQuantity(Math.ceil((mm / INCH) * 4 - 1e-9) / 4, '1,0', 'in-kip');
};

/** Past the root of the beam's own flange, and past the half flange of the support where that is known. */
const cope = (known: Known, path: 'top' | 'bottom'): Proposals => {
  const facts = known.last?.facts;
  const at = size(known);
  const reach = facts?.support.here ? facts.support.b / 2 - facts.support.tw / 2 - facts.g + 10 : 0;
  return {
    [`${path}.length`]: reach > 0 ? roundUp(known, reach) : at(90, '3-1/2'),
    [`${path}.depth`]: facts ? roundUp(known, facts.tf + facts.r) : at(40, '1-1/2'),
    [`${path}.radius`]: at(12, '1/2'),
  };
};

const strengths = (known: Known, path: string, fy: number | undefined, fu: number | undefined): Proposals => {
  const { units } = known.entry;
  const text = (mpa: number | undefined): string =>
    mpa ? writeQuantity(Number(toSystem(mpa, '-2,1', units).toPrecision(5)), '-2,1', units) : '';
  return { [`${path}.fy`]: text(fy), [`${path}.fu`]: text(fu) };
};

const tensile = (known: Known, path: string, fu: number | undefined): Proposals => ({
  [`${path}.fu`]: strengths(known, path, undefined, fu)[`${path}.fu`]!,
});

const ownSizes = (known: Known): Proposals => {
  const section = known.last?.facts.section;
  if (!section) return {};
  const { units } = known.entry;
  const text = (mm: number): string => writeQuantity(Number(toSystem(mm, '1,0', units).toPrecision(9)), '1,0', units);
  return {
    'beam.section.depth': text(section.h),
    'beam.section.width': text(section.b),
    'beam.section.flange': text(section.tf),
    'beam.section.web': text(section.tw),
    'beam.section.radius': text(section.r),
    'beam.section.family': section.family === 'channel' ? 'channel' : 'I',
  };
};

/** What the bench proposes when `value` is chosen at `path`. Everything proposed is marked as assumed until someone touches it. */
export const proposalsFor = (known: Known, path: string, value: string): Proposals => {
  const facts = known.last?.facts;
  switch (`${path}=${value}`) {
    case 'top=on':
      return cope(known, 'top');
    case 'bottom=on':
      return cope(known, 'bottom');
    case 'support=on':
      return { 'support.kind': 'beam-web' };
    case 'beam.section.by=sizes':
      return ownSizes(known);
    case 'beam.grade.by=strength':
      return strengths(known, 'beam.grade', facts?.fy, facts?.fu);
    case 'joint.plate.grade.by=strength':
    case 'joint.cleat.grade.by=strength':
    case 'joint.ply.grade.by=strength':
      return strengths(known, path.replace(/\.by$/, ''), facts?.fyp, facts?.fup);
    case 'joint.bolts.grade.by=strength':
      return tensile(known, 'joint.bolts.grade', facts?.fub);
    case 'joint.supportBolts.grade.by=strength':
      return tensile(known, 'joint.supportBolts.grade', facts?.supportBolts.fub);
    default:
      if (path !== 'joint.kind' && path !== LEGS) return {};
      return jointProposals(known.entry, facts, size(known), (mm) => roundUp(known, mm));
  }
};
