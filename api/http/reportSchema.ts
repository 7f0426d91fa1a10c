import * as z from 'zod';
import type { Report } from '../../core/check/report.ts';
import { fitNames, partNames, strengthNames } from '../../core/end/checkNames.ts';
import { regions } from '../../core/words/regions.ts';

/** What a field means, for the description of the API. */
export const said = (description: string) => ({ description });
const number = z.number();
const checkName = z.enum([...strengthNames, ...fitNames]);
const basis = z
  .enum(['seen', 'memory', 'research', 'practice', ''])
  .meta(said('How the formula is known; see /v1/standards'));
export const optionsSchema = z.record(z.string(), z.string());

const workingRow = z.strictObject({
  symbol: z.string(),
  expression: z.string().meta(said('The formula in symbols')),
  numbers: z.string().meta(said('The formula with the numbers in place')),
  value: number.meta(said('In `unit`, unrounded')),
  unit: z.string(),
  clause: z.string(),
  basis,
  note: z.string().exactOptional(),
});

const check = z.strictObject({
  id: checkName,
  part: z.enum(partNames),
  title: z.string(),
  clause: z.string(),
  basis,
  symbol: z.string().meta(said('Symbol of the demand')),
  demand: number
    .nullable()
    .meta(said('At the reaction, in `unit`; for rules of fit: required. Null where nothing can be computed')),
  resistance: number.nullable().meta(said('In `unit`; for rules of fit: given. Null where nothing can be computed')),
  unit: z.string(),
  utilisation: number
    .nullable()
    .meta(said('Reaction / reactionAtFailure; for checks without the reaction: required / given')),
  reactionAtFailure: number
    .nullable()
    .exactOptional()
    .meta(said('End reaction at which this is exactly used up; absent for checks without the reaction')),
  state: z
    .enum(['holds', 'fails', 'refer', 'notApplicable', 'information'])
    .meta(said('refer: outside the limits of the method or of practice, never a pass')),
  reason: z.string().exactOptional(),
  reasonText: z.string().exactOptional(),
  of: z.string().exactOptional().meta(said('Which section, leg or edge the numbers speak of')),
  ofText: z.string().exactOptional(),
  verified: z.enum(['published', 'theory', 'hand', 'none']),
  working: z.array(workingRow).exactOptional().meta(said('Only with working=1')),
});

const sectionStress = z.strictObject({
  name: z.enum(['full', 'tee-top', 'tee-bottom', 'rectangle']),
  at: number.meta(said("From the support's face")),
  area: number,
  centroid: number.meta(said('From top of steel')),
  inertia: number,
  modulusCut: number.meta(said('Elastic modulus to the cut edge')),
  plasticModulus: number,
  firstMoment: number.meta(said('Above the level of the peak')),
  peakStress: number,
  peakAt: number.meta(said('From top of steel')),
  meanStress: number,
  firstYieldStress: number,
  firstYieldReaction: number,
  profile: z.array(z.tuple([number, number])).meta(said('Pairs of level and stress, from top to bottom')),
});

export const noteSchema = z.strictObject({ code: z.string(), text: z.string(), path: z.string().exactOptional() });

export const reportSchema = z
  .strictObject({
    mark: z.string(),
    standard: z.strictObject({ id: z.string(), title: z.string(), edition: z.string() }),
    words: z.enum(regions).meta(said('Whose trade words titles, reasons and notes are in')),
    level: z.enum(['factored', 'service']),
    units: z.enum(['mm-kN', 'in-kip']),
    verdict: z.enum(['holds', 'fails', 'refer']),
    governing: checkName.meta(said('The check that comes first')),
    reaction: number,
    capacity: number.nullable().meta(said('Least reactionAtFailure of the checks that hold, fail or refer')),
    shareOfWebShear: number,
    checks: z.array(check).meta(said('Weakest first; then rules of fit, information, what does not apply')),
    shape: z.strictObject({ sections: z.array(sectionStress) }),
    assumptions: z.array(noteSchema),
    notes: z.array(noteSchema),
    options: optionsSchema.meta(said('Every option in force')),
    version: z.string(),
    fingerprint: z.string().regex(/^[0-9a-f]{8}$/),
  })
  .meta(said("What the checks say of one end, in the end's own units")) satisfies z.ZodType<Report>;
