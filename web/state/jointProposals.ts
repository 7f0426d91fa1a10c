import type { Facts } from '../../core/end/facts.ts';
import { type Entry, textOf } from './entry.ts';
import { type Joined, joinedIn, LEGS } from './joined.ts';

type Texts = Readonly<Record<string, string>>;
/** A length given for both systems, as text. */
type Size = (mm: number, inches: string) => string;

const steel: readonly string[] = ['thickness', 'grade', 'grade.by', 'grade.fy', 'grade.fu'];
const kinds: readonly string[] = ['joint.plate', 'joint.cleat', 'joint.ply'];
const bolt: readonly string[] = ['size', 'grade', 'grade.by', 'grade.fu', 'threads', 'holes', 'rows', 'pitch'];
const welds: readonly string[] = ['joint.weld', 'joint.webWeld', 'joint.cleat.webWeld', 'joint.cleat.supportWeld'];

/** The first of several fields that says something. */
const firstOf = (entry: Entry, paths: readonly string[]): string =>
  paths.map((path) => textOf(entry, path)).find((text) => text !== '') ?? '';

/** Fields of one part of the joint as another part of it, or of the last joint, has them. */
const carried = (entry: Entry, names: readonly string[], from: readonly string[], to: string): Texts =>
  Object.fromEntries(
    names.map((name) => [
      `${to}.${name}`,
      firstOf(
        entry,
        from.map((one) => `${one}.${name}`),
      ),
    ]),
  );

/** Of the full depth, the plate covers what the copes leave; else it ends as far below its bolts as above them. */
const plate = (kind: Joined['kind'], facts: Facts | undefined, at: Size, round: (mm: number) => string): Texts => {
  const width = { 'joint.plate.width': at(220, '8-1/2') };
  if (!facts) return { ...width, 'joint.plate.depth': at(220, '9'), 'joint.plate.top': at(60, '2-1/2') };
  if (kind === 'full-end-plate') {
    return { ...width, 'joint.plate.depth': round(facts.h - facts.dt - facts.db), 'joint.plate.top': round(facts.dt) };
  }
  const { n, p, eTop } = facts.supportBolts;
  const depth = n > 0 ? 2 * eTop + (n - 1) * p : facts.hp;
  return {
    ...width,
    'joint.plate.depth': depth > 0 ? round(depth) : at(220, '9'),
    'joint.plate.top': facts.yp > 0 ? round(facts.yp) : at(60, '2-1/2'),
  };
};

/** Legs that take the bolts with an edge of the usual size beyond them. */
const cleat = (facts: Facts | undefined, at: Size, round: (mm: number) => string): Texts => ({
  [LEGS]: 'bolted',
  'joint.cleat.legWeb': facts && facts.n > 0 ? round(facts.z1 + (facts.m - 1) * facts.q + 35) : at(100, '4'),
  'joint.cleat.legSupport': at(100, '4'),
  'joint.cleat.top': facts && facts.yp > 0 ? round(facts.yp) : at(60, '2-1/2'),
  'joint.cleat.depth': facts && facts.hp > 0 ? round(facts.hp) : at(220, '9'),
});

const edges = (entry: Entry, { fitting }: Joined, at: Size): Texts => ({
  [`${fitting}.topEdge`]:
    firstOf(
      entry,
      kinds.map((one) => `${one}.topEdge`),
    ) || at(40, '1-1/2'),
  [`${fitting}.bottomEdge`]:
    firstOf(
      entry,
      kinds.map((one) => `${one}.bottomEdge`),
    ) || at(40, '1-1/2'),
  ...(fitting !== 'joint.cleat' && { [`${fitting}.edge`]: at(50, '2') }),
});

/** Bolts through the web as those into the support were, in the usual place. */
const webBolts = (entry: Entry, facts: Facts | undefined, at: Size, round: (mm: number) => string): Texts => ({
  ...carried(entry, bolt, ['joint.bolts', 'joint.supportBolts'], 'joint.bolts'),
  'joint.firstRow': facts ? round(facts.yp + facts.supportBolts.eTop) : '',
  'joint.endDistance': at(40, '1-1/2'),
});

/** What a kind of joint starts from: what the last one had, and the usual sizes. `round`: mm to a round size, as text. */
export const jointProposals = (
  entry: Entry,
  facts: Facts | undefined,
  at: Size,
  round: (mm: number) => string,
): Texts => {
  const joined = joinedIn(entry);
  const { kind, fitting, weld, endPlate } = joined;
  const inSupport = {
    ...carried(entry, bolt, ['joint.supportBolts', 'joint.bolts'], 'joint.supportBolts'),
    'joint.supportBolts.crossCentres': at(140, '5-1/2'),
    'joint.supportBolts.topEdge':
      firstOf(
        entry,
        kinds.map((one) => `${one}.topEdge`),
      ) || at(40, '1-1/2'),
  };
  return {
    ...carried(entry, steel, kinds, fitting),
    ...(endPlate ? plate(kind, facts, at, round) : edges(entry, joined, at)),
    ...(joined.cleat && cleat(facts, at, round)),
    ...(joined.supportBolts && inSupport),
    ...(joined.webBolts && webBolts(entry, facts, at, round)),
    ...(weld !== '' && {
      [`${weld}.leg`]:
        firstOf(
          entry,
          welds.map((one) => `${one}.leg`),
        ) || at(8, '5/16'),
    }),
  };
};
