import type { Facts } from '../end/facts.ts';
import { type Fault, fault } from '../end/fault.ts';
import { fittingOf, supportBoltsOf, webBoltsOf } from '../end/jointParts.ts';
import { readEnd } from '../end/readEnd.ts';
import type { End } from '../end/schema.ts';
import { Values } from '../formula/number.ts';
import { standards } from '../standards/known.ts';
import { listed } from '../standards/listed.ts';
import type { Standard } from '../standards/standard.ts';
import { findGrade } from '../steel/grades.ts';
import { nearest } from '../steel/nearest.ts';
import { plain } from '../units/figures.ts';
import { fromSystem, toSystem, unitOf } from '../units/systems.ts';
import { capital } from '../words/capital.ts';
import { commonwealth } from '../words/commonwealth.ts';
import { faultSentences } from '../words/faults.ts';
import type { Region } from '../words/regions.ts';
import { faultText, fieldName, filled, type Words } from '../words/words.ts';
import { wordsFor } from '../words/wordsFor.ts';
import { assumptionsOf } from './assumptions.ts';
import { checksOf } from './checks.ts';
import { type Evaluation, evaluate } from './evaluate.ts';
import type { ExaminedNumbers } from './examined.ts';
import { type Plan, planOf } from './plan.ts';
import type { Note, Numbers, SaidFault } from './report.ts';
import { type Resolved, resolve } from './resolve.ts';
import { resultAt } from './result.ts';
import { sectionStresses } from './sectionStresses.ts';
import { VERSION } from './version.ts';

/** Names that an unknown standard may stand for. */
export const listedIds: readonly string[] = listed.map(({ id }) => id);

/** Whose words an end is spoken of in: those it asks for, else those of the standard's market. */
export const regionOf = ({ sheet }: Pick<End, 'sheet'>, { region }: Pick<Standard, 'region'>): Region =>
  sheet?.words ?? region;

export const said = (faults: readonly Fault[], words: Words = commonwealth): { faults: SaidFault[] } => ({
  faults: faults.map((one) => ({ ...one, text: faultText(words, faultSentences, one) })),
});

/** Reaction at which the full section fails in shear, N. */
const grossShearOf = ({ grossShear }: Plan, { rows }: Evaluation): number =>
  resultAt(rows, grossShear).reactionAtFailure;

/** The reaction as given, or what a share of the full section's shear comes to. N */
const reactionOf = ({ reaction, units }: End, plan: Plan, facts: Facts): number =>
  typeof reaction === 'number'
    ? fromSystem(reaction, '0,1', units)
    : reaction.ofWebShear * grossShearOf(plan, evaluate(plan, facts, 0));

/** What is to be said of the grades named: from memory, or not listed by the standard; each once. */
const gradeNotes = (end: End, { materials }: Standard): { readonly code: string; readonly name: string }[] => {
  const found = new Map<string, { code: string; name: string }>();
  const add = (code: string, name: string) => found.set(`${code} ${name}`, { code, name });
  for (const [grade, steels] of [
    [end.beam.grade, materials.sections],
    [fittingOf(end.joint).grade, 'cleat' in end.joint ? (materials.cleats ?? materials.plates) : materials.plates],
  ] as const) {
    const name = typeof grade === 'string' ? steels.named(grade) : undefined;
    if (name === undefined) continue;
    const own = steels.noteOf?.(name);
    if (own) add(own, name);
    const known = steels.noteOf ? undefined : findGrade(name);
    if (known && 'basis' in known && known.basis === 'memory') add('memory-grade', name);
  }
  return [...found.values()];
};

/** Bolts that hold a beam opposite too, as told or, where it is not told, as assumed. */
const boltsShared = ({ opposite, supportBolts, supportKind, Vo }: Facts): boolean =>
  opposite.told ? opposite.shared > 0 : supportBolts.n > 0 && Vo > 0 && supportKind !== 'column-flange';

const notesOf = (
  end: End,
  plan: Plan,
  resolved: Resolved,
  V: { readonly given: number; readonly used: number },
  words: Words,
): Note[] => {
  const notes: Note[] = [];
  const say = (code: string, values: Record<string, unknown> = {}, path?: string) =>
    notes.push({ code, text: filled(words.notes[code] ?? code, values), ...(path && { path }) });
  const force = (newtons: number) =>
    `${plain(toSystem(newtons, '0,1', end.units), 1)} ${unitOf('0,1', end.units).name}`;
  if (typeof end.reaction !== 'number') {
    say('reaction-from-share', { share: plain(end.reaction.ofWebShear, 4), value: force(V.given) }, 'reaction');
  }
  if (V.used > V.given) say('least-reaction', { given: force(V.given), value: force(V.used) }, 'reaction');
  if (resolved.readAs) say('section-read-as', { ...resolved.readAs, value: resolved.designation }, 'beam.section');
  if (end.support) say('support-outline', {}, 'support');
  if (boltsShared(resolved.facts)) say('opposite-erection', {}, 'support.otherReaction');
  const fitting = fittingOf(end.joint);
  for (const [path, grade] of [
    ['beam.grade', end.beam.grade],
    [`${fitting.path}.grade`, fitting.grade],
    ['joint.bolts.grade', webBoltsOf(end.joint)?.bolts.grade],
    ['joint.supportBolts.grade', supportBoltsOf(end.joint)?.grade],
  ] as const) {
    if (typeof grade === 'object') say('strength-given', { field: capital(fieldName(words, path)) }, path);
  }
  for (const { code, name } of gradeNotes(end, plan.standard)) say(code, { value: name });
  const values = new Values(resolved.facts as never);
  for (const { code, when } of plan.standard.notes) if (values.met(when)) say(code);
  return notes;
};

/** What a standard's rules say of an end whose names are looked up. `given`: the reaction, N; absent, the end's own. */
export const numbersOf = (end: End, plan: Plan, resolved: Resolved, given?: number): Numbers => {
  const { standard } = plan;
  const { facts } = resolved;
  const region = regionOf(end, standard);
  const words = wordsFor(region);
  const V = given ?? reactionOf(end, plan, facts);
  const evaluation = evaluate(plan, facts, V);
  const { reaction } = evaluation;
  const kN = (newtons: number) => toSystem(newtons, '0,1', end.units);
  return {
    mark: end.mark ?? '',
    standard: { id: standard.id, title: standard.title, edition: standard.edition },
    level: standard.level,
    units: end.units,
    words: region,
    verdict: evaluation.verdict,
    governing: evaluation.governing,
    reaction: kN(reaction),
    capacity: Number.isFinite(evaluation.capacity) ? kN(evaluation.capacity) : null,
    shareOfWebShear: reaction / grossShearOf(plan, evaluation),
    checks: checksOf({ plan, units: end.units, words }, evaluation),
    shape: { sections: sectionStresses(facts, end.units) },
    assumptions: assumptionsOf(end, standard, facts.channel, words),
    notes: notesOf(end, plan, resolved, { given: V, used: reaction }, words),
    options: facts.options,
    version: VERSION,
  };
};

/**
 * Checks an end, without workings and fingerprint: what a screen needs at every keystroke. Never throws for what a user wrote: what cannot
 * be computed comes back as faults.
 */
export const examineNumbers = (
  input: unknown,
): { readonly examined: ExaminedNumbers } | { readonly faults: readonly SaidFault[] } => {
  const read = readEnd(input);
  if ('faults' in read) return said(read.faults);
  const { end } = read;
  const standard = Object.hasOwn(standards, end.standard) ? standards[end.standard] : undefined;
  if (!standard) {
    return said([fault('unknown-standard', 'standard', end.standard, nearest(end.standard, listedIds, 3))]);
  }
  const found = resolve(end, standard);
  if ('faults' in found) return said(found.faults, wordsFor(regionOf(end, standard)));
  const { resolved } = found;
  const report = numbersOf(end, planOf(standard, end.joint.kind), resolved);
  if (!Number.isFinite(report.reaction) || !Number.isFinite(report.shareOfWebShear)) {
    return said([fault('not-finite', 'reaction', null, null)]);
  }
  return { examined: { end, facts: resolved.facts, designation: resolved.designation, report } };
};
