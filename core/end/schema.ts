import * as z from 'zod/mini';
import { regions } from '../words/regions.ts';

// Code generation would need eval, which a strict content policy forbids.
z.config({ jitless: true });

/** A field with what it means, for the API's description. */
const about = <S extends z.ZodMiniType>(schema: S, description: string): S => {
  z.globalRegistry.add(schema, { description });
  return schema;
};

/** No size or strength of a beam end is larger, in any unit; beyond it products would lose their meaning. */
const LARGEST = 1e6;
/** Nor is one smaller, unless it is nothing. */
const SMALLEST = 1e-6;

const positive = () => z.number().check(z.gte(SMALLEST), z.lte(LARGEST));
const atLeastZero = () => z.number().check(z.nonnegative(), z.lte(LARGEST));
const text = (most: number) => z.string().check(z.maxLength(most));
const name = () => z.string().check(z.minLength(1), z.maxLength(80));
const count = (most: number) => z.int().check(z.gte(1), z.lte(most));

const grade = about(
  z.union([name(), z.strictObject({ fy: positive(), fu: positive() })]),
  'Name of a steel grade, or its yield and ultimate strength',
);

const cope = z.nullable(
  z.strictObject({
    length: about(positive(), 'Along the beam, from its end'),
    depth: about(positive(), 'From the outer face of the flange'),
    radius: z.optional(about(atLeastZero(), 'Of the re-entrant corner; absent = 0')),
  }),
);

const boltItself = {
  size: about(name(), 'M12 to M36, or inch sizes 1/2 to 1-1/4'),
  grade: z.union([name(), z.strictObject({ fu: positive() })]),
  threads: z.optional(about(z.enum(['in', 'out']), 'Threads in or out of the shear plane; absent = in, assumed')),
  holes: z.optional(z.enum(['drilled', 'punched'])),
  hole: z.optional(about(positive(), 'Hole diameter, in place of the standard one')),
  socket: z.optional(about(positive(), "Outside diameter of the shop's wrench socket; absent = common practice")),
};

const bolts = z.strictObject({
  ...boltItself,
  rows: count(30),
  columns: z.optional(count(6)),
  pitch: z.optional(about(atLeastZero(), 'Between rows; needed from two rows up')),
  gauge: z.optional(about(atLeastZero(), 'Between columns; needed from two columns up')),
});

const ply = z.strictObject({
  thickness: positive(),
  grade,
  topEdge: positive(),
  bottomEdge: positive(),
  edge: about(positive(), 'From the last bolt column to the free edge'),
});

const fillet = {
  leg: positive(),
  electrode: z.optional(about(positive(), 'Strength of the weld metal')),
};
const weld = z.strictObject(fillet);

const place = {
  firstRow: about(positive(), 'First bolt row, down from top of steel'),
  endDistance: about(positive(), 'First bolt column, from the end of the beam'),
  bolts,
};

/** Bolts into the support: one line in each leg of a cleat, two lines in an end plate. */
const supportBolts = z.strictObject({
  ...boltItself,
  rows: count(30),
  pitch: z.optional(about(atLeastZero(), 'Between rows; needed from two rows up')),
  crossCentres: about(
    positive(),
    "Between the lines on either side of the web; of one cleat, twice the line's distance from the web's middle",
  ),
  topEdge: about(positive(), 'From the top of cleat or plate to the first row'),
});

/** The weld of a cleat's leg, with the return at its ends. */
const legWeld = (returns: string) => z.strictObject({ ...fillet, return: z.optional(about(positive(), returns)) });

const cleat = z.strictObject({
  legWeb: about(positive(), "Leg on the beam's web, from the heel"),
  legSupport: about(positive(), 'Leg on the support, from the heel'),
  thickness: positive(),
  grade,
  radius: z.optional(about(atLeastZero(), 'Root radius between the legs')),
  topEdge: z.optional(about(positive(), 'Above the first row of web bolts')),
  bottomEdge: z.optional(about(positive(), 'Below the last row of web bolts')),
  top: z.optional(about(positive(), 'Top of the cleat, down from top of steel; where its web leg is welded')),
  depth: z.optional(about(positive(), 'Depth of the cleat; where its web leg is welded')),
  webWeld: z.optional(legWeld('Top and bottom, along the beam; absent = all of the leg on the web')),
  supportWeld: z.optional(legWeld('Across the top of the leg; its strength is not counted')),
});

const endPlate = z.strictObject({
  thickness: positive(),
  width: positive(),
  depth: positive(),
  grade,
  top: about(positive(), 'Top of the plate, down from top of steel'),
});

const cleats = {
  firstRow: z.optional(place.firstRow),
  endDistance: z.optional(place.endDistance),
  bolts: z.optional(bolts),
  cleat,
  supportBolts: z.optional(supportBolts),
};
const endPlates = { plate: endPlate, webWeld: weld, supportBolts };

const joint = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('fin-plate'), ...place, plate: ply, weld }),
  z.strictObject({ kind: z.literal('web-bolts'), ...place, ply }),
  z.strictObject({ kind: z.literal('double-cleat'), ...cleats }),
  z.strictObject({ kind: z.literal('single-cleat'), ...cleats }),
  z.strictObject({ kind: z.literal('end-plate'), ...endPlates }),
  z.strictObject({ kind: z.literal('full-end-plate'), ...endPlates }),
]);

const ownSection = z.strictObject({
  depth: positive(),
  width: positive(),
  flange: positive(),
  web: positive(),
  radius: atLeastZero(),
  family: z.optional(z.enum(['I', 'channel'])),
});

/** Bolts of a beam on the other side of the same web. */
const opposite = z.strictObject({
  firstRow: about(
    z.number().check(z.gte(-LARGEST), z.lte(LARGEST)),
    "Its first row of support bolts, down from this beam's top of steel",
  ),
  rows: count(30),
  pitch: z.optional(about(atLeastZero(), 'Between rows; needed from two rows up')),
  gauge: about(positive(), "Cross centres of its bolts, as far on either side of this beam's web"),
});

const support = z.strictObject({
  kind: z.enum(['beam-web', 'column-flange', 'column-web']),
  section: z.optional(name()),
  thickness: z.optional(positive()),
  grade: z.optional(grade),
  topOfSteel: z.optional(
    about(z.number().check(z.gte(-LARGEST), z.lte(LARGEST)), "Support's top flange above the beam's, positive up"),
  ),
  otherReaction: z.optional(atLeastZero()),
  opposite: z.optional(opposite),
});

const beside = z.strictObject({
  standard: about(name(), 'Second design standard, whose ladder stands beside the first'),
  reaction: z.optional(
    about(atLeastZero(), 'End reaction at the level of that standard, where it is not the same level'),
  ),
});

const sheet = z.strictObject({
  job: z.optional(text(200)),
  drawing: z.optional(text(200)),
  number: z.optional(text(200)),
  revision: z.optional(text(8)),
  reason: z.optional(text(200)),
  loadCase: z.optional(text(200)),
  date: z.optional(z.iso.date()),
  prepared: z.optional(text(200)),
  checked: z.optional(text(200)),
  approved: z.optional(text(200)),
  paper: z.optional(z.enum(['A4', 'Letter'])),
  decimal: z.optional(z.enum(['.', ','])),
  words: z.optional(about(z.enum(regions), "Whose trade words are used; absent = those of the standard's market")),
  beside: z.optional(beside),
});

/** One beam end as written in files, links and requests. Values in the file's own `units`. */
export const endSchema = z
  .strictObject({
    mark: z.optional(text(40)),
    standard: name(),
    units: z.enum(['mm-kN', 'in-kip']),
    reaction: z.union([
      z.number().check(z.lte(LARGEST)),
      z.strictObject({ ofWebShear: z.number().check(z.gte(0), z.lte(2)) }),
    ]),
    level: z.optional(z.enum(['factored', 'service'])),
    tie: z.optional(atLeastZero()),
    beam: z.strictObject({ section: z.union([name(), ownSection]), grade }),
    top: z.optional(cope),
    bottom: z.optional(cope),
    setback: atLeastZero(),
    joint,
    support: z.optional(support),
    options: z.optional(z.record(z.string(), z.string())),
    piece: z.optional(text(40)),
    end: z.optional(z.enum(['start', 'far'])),
    quantity: z.optional(count(100_000)),
    sheet: z.optional(sheet),
  })
  .register(z.globalRegistry, { id: 'End', title: 'One beam end' });

export type End = z.infer<typeof endSchema>;
export type Cope = NonNullable<End['top']>;
export type Joint = End['joint'];
export type GradeGiven = End['beam']['grade'];

export type WebBolts = z.infer<typeof bolts>;
export type SupportBolts = z.infer<typeof supportBolts>;
export type OppositeGiven = z.infer<typeof opposite>;
