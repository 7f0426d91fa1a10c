import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { Check, SectionStress } from '../../core/check/report.ts';
import { type StressProfile, stressFigure } from '../../core/drawing/stressFigure.ts';
import type { DrawingWords } from '../../core/drawing/words.ts';
import { fixed, roundedDown } from '../../core/units/figures.ts';
import { fromSystem, unitOf } from '../../core/units/systems.ts';

/** One section's shear stress as it stands beside the piece: the drawing's profile, with what is said of it. */
export interface Profile extends StressProfile {
  /** The check of this section, where it is for information and its working is opened here. */
  readonly check: Check | null;
  /** The standard's own limit as it is printed; empty where it has none. */
  readonly limitText: string;
  /** Reaction of first yield, without a factor, as it is printed with its unit. */
  readonly firstYield: string;
}

/** A check that has several sections names the one its numbers speak of. */
const speaksOf = ({ of = '' }: Check, { name }: StressProfile): boolean => of === '' || of === name;

/** The report's section that a profile is of. */
const sectionOf = (sections: readonly SectionStress[], { name }: StressProfile): SectionStress | undefined =>
  sections.find((one) => one.name === name || one.name.startsWith(`${name}-`));

/** The full section first, then what is left behind the copes. */
export const profilesOf = ({ facts, report }: ExaminedNumbers, words: DrawingWords): Profile[] => {
  const { checks, shape, units } = report;
  const judged = checks.filter(({ id, state }) => id.startsWith('stress-') && state !== 'notApplicable');
  const limit = judged.find(({ resistance }) => resistance !== null)?.resistance ?? null;
  const figure = stressFigure(facts, words, limit === null ? null : fromSystem(limit, '-2,1', units));
  return figure.profiles.map((one) => {
    const check = judged.find(({ id }) => id === (one.name === 'full' ? 'stress-full' : 'stress-cope'));
    const section = sectionOf(shape.sections, one);
    return {
      ...one,
      check: check && check.state === 'information' && speaksOf(check, one) ? check : null,
      limitText: limit === null ? '' : fixed(limit, units === 'mm-kN' ? 1 : 2),
      firstYield: section ? `${roundedDown(section.firstYieldReaction)} ${unitOf('0,1', units).name}` : '',
    };
  });
};

/** A limit further out than this share of the largest peak stands at the edge, off the scale. */
const NEAR = 1.6;

/** How far to the right the profiles reach, as a share of the largest peak. */
export const reachOf = (profiles: readonly Profile[]): number =>
  Math.max(1, ...profiles.flatMap(({ limit }) => (limit && limit.share <= NEAR ? [limit.share] : [])));
