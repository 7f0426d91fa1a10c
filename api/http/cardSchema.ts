import * as z from 'zod';
import type { Card } from '../../core/card/card.ts';
import { MOST_COLUMNS, MOST_ROWS, MOST_SECTIONS } from '../../core/card/readCard.ts';
import { fitNames, strengthNames } from '../../core/end/checkNames.ts';
import { endSchema } from '../../core/end/schema.ts';
import { noteSchema, optionsSchema, reportSchema, said } from './reportSchema.ts';

const number = z.number();

export const cardRequestSchema = z
  .strictObject({
    end: endSchema,
    family: z.string().exactOptional().meta(said('Every section of this family; this or sections')),
    sections: z
      .array(z.string())
      .min(1)
      .max(MOST_SECTIONS)
      .exactOptional()
      .meta(said('The sections, by name; this or family')),
    rows: z
      .array(z.int().min(1).max(MOST_ROWS))
      .min(1)
      .max(MOST_COLUMNS)
      .exactOptional()
      .meta(said('Counts of bolt rows; absent = 2 to 8')),
  })
  .meta(
    said(
      'What a card is made from: an end as template, whose section, reaction and count of bolt rows stand for nothing; first row, pitch, edges of the plate, copes and setback are kept in every cell',
    ),
  );

const why = z.strictObject({
  code: z.string().meta(said('The check, or the code of a fault')),
  title: z.string(),
  text: z.string(),
});

export const cardSchema = z
  .strictObject({
    standard: reportSchema.shape.standard,
    level: reportSchema.shape.level,
    units: reportSchema.shape.units,
    words: reportSchema.shape.words,
    options: optionsSchema,
    version: z.string(),
    joint: z.enum(['fin-plate', 'web-bolts', 'double-cleat', 'single-cleat', 'end-plate', 'full-end-plate']),
    rows: z.array(z.int()).meta(said('Counts of bolt rows, one for each cell of a section')),
    plateDepths: z.array(number).meta(said('Depth of plate or ply with each count of rows')),
    sections: z.array(
      z.strictObject({
        section: z.string(),
        cells: z.array(
          z.union([
            z.strictObject({
              verdict: z.literal('holds'),
              reaction: number.meta(said('Rounded down; a full check of the end at this reaction holds')),
              governing: z.enum(strengthNames),
            }),
            z.strictObject({
              verdict: z
                .enum(['refer', 'fails'])
                .meta(said('fails: at any reaction, or its sizes do not fit; blank on the printed card')),
              because: z.array(why),
            }),
          ]),
        ),
      }),
    ),
    checks: z.array(
      z.strictObject({ id: z.enum(strengthNames), title: z.string(), letter: z.string(), governs: z.boolean() }),
    ),
    fit: z.array(z.strictObject({ id: z.enum(fitNames), title: z.string() })),
    assumptions: z.array(noteSchema),
    notes: z.array(noteSchema),
    fingerprint: reportSchema.shape.fingerprint,
  })
  .meta(
    said("The reaction that each section carries with each count of bolt rows, in the template's own units"),
  ) satisfies z.ZodType<Card>;
