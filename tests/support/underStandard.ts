import type { Standard } from '../../core/standards/standard.ts';
import { goodEnds } from './published.ts';

type Json = Record<string, unknown>;

const own = { fy: 345, fu: 450 };

/** The end as another standard would have it: strengths in place of grades and bolt classes that it does not list, its own options. */
export const underStandard = (end: Json, standard: Standard): Json => {
  if (end.standard === standard.id) return end;
  const { sections, plates, cleats = plates, boltGrades } = standard.materials;
  const { options: _, level: __, ...rest } = structuredClone(end) as Json & { joint: Json; beam: Json };
  const steel = (grade: unknown, { named }: typeof sections) =>
    typeof grade === 'string' && !named(grade) ? own : grade;
  rest.beam.grade = steel(rest.beam.grade, sections);
  for (const name of ['plate', 'ply', 'cleat']) {
    const ply = rest.joint[name] as Json | undefined;
    if (ply) ply.grade = steel(ply.grade, name === 'cleat' ? cleats : plates);
  }
  const support = rest.support as Json | undefined;
  if (support?.grade) support.grade = steel(support.grade, sections);
  for (const name of ['bolts', 'supportBolts']) {
    const bolts = rest.joint[name] as Json | undefined;
    if (typeof bolts?.grade === 'string' && !boltGrades.includes(bolts.grade)) bolts.grade = { fu: 830 };
  }
  return { ...rest, standard: standard.id };
};

/** Ends that are good under a standard: its own, and those of the others as it would have them. */
export const goodEndsUnder = (standard: Standard): { name: string; end: Json }[] =>
  goodEnds().map(({ name, end }) => ({ name, end: underStandard(end, standard) }));
