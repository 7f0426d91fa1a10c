import * as z from 'zod';

// Code generation would need eval, which a strict content policy forbids.
z.config({ jitless: true });

const positive = z.number().positive();
const atLeastZero = z.number().nonnegative();
const name = z.string().min(1).max(80);
const words = z.string().max(200);

const grade = z.union([name, z.strictObject({ fy: positive, fu: positive })]).meta({
  description: 'Name of a steel grade, or its yield and ultimate strength',
});

const cope = z
  .strictObject({
    length: positive.meta({ description: 'Along the beam, from its end' }),
    depth: positive.meta({ description: 'From the outer face of the flange' }),
    radius: atLeastZero.optional().meta({ description: 'Of the re-entrant corner; absent = 0' }),
  })
  .nullable();

const bolts = z.strictObject({
  size: name.meta({ description: 'M12 to M36, or inch sizes 1/2 to 1-1/4' }),
  grade: z.union([name, z.strictObject({ fu: positive })]),
  threads: z
    .enum(['in', 'out'])
    .optional()
    .meta({ description: 'Threads in or out of the shear plane; absent = in, assumed' }),
  rows: z.int().min(1).max(30),
  columns: z.int().min(1).max(6).optional(),
  pitch: atLeastZero.optional().meta({ description: 'Between rows; needed from two rows up' }),
  gauge: atLeastZero.optional().meta({ description: 'Between columns; needed from two columns up' }),
  holes: z.enum(['drilled', 'punched']).optional(),
  hole: positive.optional().meta({ description: 'Hole diameter, in place of the standard one' }),
});

const ply = z.strictObject({
  thickness: positive,
  grade,
  topEdge: positive,
  bottomEdge: positive,
  edge: positive.meta({ description: 'From the last bolt column to the free edge' }),
});

const weld = z.strictObject({
  leg: positive,
  electrode: positive.optional().meta({ description: 'Strength of the weld metal' }),
});

const place = {
  firstRow: positive.meta({ description: 'First bolt row, down from top of steel' }),
  endDistance: positive.meta({ description: 'First bolt column, from the end of the beam' }),
  bolts,
};

const joint = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('fin-plate'), ...place, plate: ply, weld }),
  z.strictObject({ kind: z.literal('web-bolts'), ...place, ply }),
]);

const ownSection = z.strictObject({
  depth: positive,
  width: positive,
  flange: positive,
  web: positive,
  radius: atLeastZero,
  family: z.enum(['I', 'channel']).optional(),
});

const support = z.strictObject({
  kind: z.enum(['beam-web', 'column-flange', 'column-web']),
  section: name.optional(),
  thickness: positive.optional(),
  grade: grade.optional(),
  topOfSteel: z.number().optional().meta({ description: "Support's top flange above the beam's, positive up" }),
  otherReaction: atLeastZero.optional(),
});

const sheet = z.strictObject({
  job: words.optional(),
  drawing: words.optional(),
  number: words.optional(),
  revision: z.string().max(8).optional(),
  reason: words.optional(),
  loadCase: words.optional(),
  date: z.iso.date().optional(),
  prepared: words.optional(),
  checked: words.optional(),
  approved: words.optional(),
  paper: z.enum(['A4', 'Letter']).optional(),
  decimal: z.enum(['.', ',']).optional(),
});

/** One beam end as written in files, links and requests. Values in the file's own `units`. */
export const endSchema = z
  .strictObject({
    mark: z.string().max(40).optional(),
    standard: name,
    units: z.enum(['mm-kN', 'in-kip']),
    reaction: z.union([z.number(), z.strictObject({ ofWebShear: z.number().min(0).max(2) })]),
    level: z.enum(['factored', 'service']).optional(),
    tie: atLeastZero.optional(),
    beam: z.strictObject({ section: z.union([name, ownSection]), grade }),
    top: cope.optional(),
    bottom: cope.optional(),
    setback: atLeastZero,
    joint,
    support: support.optional(),
    options: z.record(z.string(), z.string()).optional(),
    piece: z.string().max(40).optional(),
    end: z.enum(['start', 'far']).optional(),
    quantity: z.int().min(1).max(100000).optional(),
    sheet: sheet.optional(),
  })
  .meta({ id: 'End', title: 'One beam end' });

export type End = z.infer<typeof endSchema>;
export type Cope = NonNullable<End['top']>;
export type Joint = End['joint'];
export type GradeGiven = End['beam']['grade'];

/** The plate or ply through which a joint's bolts pass, whatever its name. */
export const plyOf = (joint: Joint) => (joint.kind === 'fin-plate' ? joint.plate : joint.ply);
