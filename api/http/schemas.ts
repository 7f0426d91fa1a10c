import * as z from 'zod';
import type { SaidFault } from '../../core/check/report.ts';
import { endSchema } from '../../core/end/schema.ts';
import { cardRequestSchema, cardSchema } from './cardSchema.ts';
import { reportSchema, said } from './reportSchema.ts';

const number = z.number();

export const faultSchema = z
  .strictObject({
    code: z.string().meta(said('Short name of the kind of fault')),
    path: z.string().meta(said('Where in the JSON of the end, such as joint.bolts.pitch')),
    given: z.unknown().meta(said('What was given there')),
    limit: z.unknown().meta(said('What would be accepted: a bound, a list of values, or the nearest known names')),
    text: z.string().meta(said('The sentence for people')),
  })
  .meta(said('Why an end cannot be checked')) satisfies z.ZodType<SaidFault>;

const faults = z.array(faultSchema).min(1);

export const faultLineSchema = z
  .strictObject({ faults })
  .meta(said('The line that answers a line which cannot be checked'));

export const problemSchema = z
  .strictObject({
    type: z.literal('about:blank'),
    title: z.string(),
    status: z.int(),
    detail: z.string(),
    faults: faults.exactOptional(),
  })
  .meta(said('Problem details, RFC 9457'));

export const sectionsSchema = z
  .strictObject({
    units: z.strictObject({ length: z.literal('mm'), mass: z.literal('kg/m') }),
    families: z.array(
      z.strictObject({
        family: z.string(),
        market: z.string().meta(said('Where the family is sold first')),
        shape: z.enum(['I', 'channel']),
        source: z.string().meta(said('The published table behind the sizes')),
        sections: z.array(
          z.strictObject({
            designation: z.string(),
            mass: number,
            depth: number,
            width: number,
            flange: number,
            web: number,
            radius: number,
            slope: number.exactOptional().meta(said('Of a tapered flange, degrees')),
            toeRadius: number.exactOptional().meta(said('Of a tapered flange')),
          }),
        ),
      }),
    ),
  })
  .meta(said('The sections that an end can name'));

export const standardsSchema = z
  .strictObject({
    standards: z.array(
      z.strictObject({
        id: z.string(),
        title: z.string(),
        edition: z.string(),
        level: z.enum(['factored', 'service']).meta(said('Of the reaction')),
        options: z.record(z.string(), z.array(z.string())).meta(said('Values of each option, the default first')),
        grades: z.array(z.string()),
        plateGrades: z.array(z.string()),
        boltGrades: z.array(z.string()),
      }),
    ),
    bases: z.record(z.string(), z.string()).meta(said('What each basis of a formula means')),
  })
  .meta(said('The design standards that an end can name'));

/** Everything that goes in or out, by the name it has in the description of the API. */
export const schemas = {
  End: endSchema,
  CardRequest: cardRequestSchema,
  Card: cardSchema,
  Report: reportSchema,
  Fault: faultSchema,
  FaultLine: faultLineSchema,
  Problem: problemSchema,
  Sections: sectionsSchema,
  Standards: standardsSchema,
} as const;

export type SchemaName = keyof typeof schemas;
