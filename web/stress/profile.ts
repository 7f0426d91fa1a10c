import type { Check, Report, SectionStress } from '../../core/check/report.ts';
import { fixed, roundedDown } from '../../core/units/figures.ts';
import { fromSystem, unitOf } from '../../core/units/systems.ts';

/** One section's shear stress as it is drawn: levels in mm below top of steel, stresses in the report's unit. */
export interface Profile {
  readonly name: string;
  /** The check of this section, where it is for information and its working is opened here. */
  readonly check: Check | null;
  readonly points: readonly { readonly level: number; readonly stress: number }[];
  readonly peak: { readonly level: number; readonly stress: number };
  readonly mean: number;
  /** The standard's own limit; null where it has none. */
  readonly limit: number | null;
  /** Reaction of first yield, without a factor, as it is printed with its unit. */
  readonly firstYield: string;
}

const names: Readonly<Record<SectionStress['name'], string>> = {
  full: 'full section',
  'tee-top': 'cut tee',
  'tee-bottom': 'cut tee',
  rectangle: 'rectangle',
};

/** A check that has several sections names the one its numbers speak of. */
const speaksOf = ({ of = '' }: Check, { name }: SectionStress): boolean => of === '' || name.startsWith(of);

/** The full section first, then what is left behind the copes. */
export const profilesOf = ({ checks, shape, units }: Pick<Report, 'checks' | 'shape' | 'units'>): Profile[] =>
  shape.sections.map((section) => {
    const id = section.name === 'full' ? 'stress-full' : 'stress-cope';
    const check = checks.find((one) => one.id === id);
    const own = check && speaksOf(check, section) ? check : undefined;
    const level = (value: number): number => fromSystem(value, '1,0', units);
    return {
      name: names[section.name],
      check: own?.state === 'information' ? own : null,
      points: section.profile.map(([at, stress]) => ({ level: level(at), stress })),
      peak: { level: level(section.peakAt), stress: section.peakStress },
      mean: section.meanStress,
      limit: check && check.state !== 'notApplicable' ? check.resistance : null,
      firstYield: `${roundedDown(section.firstYieldReaction)} ${unitOf('0,1', units).name}`,
    };
  });

/** A stress to 0.1 MPa or 0.01 ksi. */
export const stressText = (value: number, { units }: Pick<Report, 'units'>): string =>
  fixed(value, units === 'mm-kN' ? 1 : 2);

/** How far to the right the stresses of all profiles reach; a limit far beyond them stands at the edge, off the scale. */
const NEAR = 1.6;

export const reachOf = (profiles: readonly Profile[]): number => {
  const peak = Math.max(...profiles.map((one) => one.peak.stress));
  const limits = profiles.flatMap(({ limit }) => (limit !== null && limit <= NEAR * peak ? [limit] : []));
  return Math.max(peak, ...limits, 1e-9);
};
