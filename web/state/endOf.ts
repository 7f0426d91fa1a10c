import { type Fault, fault } from '../../core/end/fault.ts';
import { type Entry, textOf } from './entry.ts';
import { fittingSizes, type Joined, joinedIn, OPPOSITE, oppositeFits, oppositeTold, weldSizes } from './joined.ts';
import { isFault, readField } from './readField.ts';

/** The end that an entry describes, as the JSON of a file, and the fields whose text could not be read. */
export interface EntryRead {
  readonly input: Readonly<Record<string, unknown>>;
  readonly faults: readonly Fault[];
  /** Why the second standard had to be left out. */
  readonly besideFaults: readonly Fault[];
}

type Tree = { [key: string]: unknown };

/** Reads the fields of an entry, and keeps what could not be read. */
class EntryReader {
  readonly faults: Fault[] = [];

  constructor(readonly entry: Entry) {}

  words(path: string): string | undefined {
    return textOf(this.entry, path).trim() || undefined;
  }

  number(path: string): number | undefined {
    const reading = readField(this.entry, path);
    if (isFault(reading)) this.faults.push(reading);
    return reading === undefined || isFault(reading) ? undefined : reading.value;
  }

  numbers(path: string, names: readonly string[]): Tree {
    return Object.fromEntries(names.map((name) => [name, this.number(`${path}.${name}`)]));
  }

  by(path: string): string {
    return textOf(this.entry, `${path}.by`);
  }

  grade(path: string, strengths: readonly string[] = ['fy', 'fu']): unknown {
    return this.by(path) === 'strength' ? this.numbers(path, strengths) : this.words(path);
  }

  under(path: string): string[] {
    return Object.keys(this.entry.texts).filter((one) => one.startsWith(`${path}.`));
  }
}

const cope = (reader: EntryReader, path: 'top' | 'bottom'): Tree | null | undefined => {
  const there = reader.words(path);
  if (there === undefined) return undefined;
  return there === 'on' ? reader.numbers(path, ['length', 'depth', 'radius']) : null;
};

const beam = (reader: EntryReader): Tree => ({
  section:
    reader.by('beam.section') === 'sizes'
      ? {
          ...reader.numbers('beam.section', ['depth', 'width', 'flange', 'web', 'radius']),
          family: reader.words('beam.section.family'),
        }
      : reader.words('beam.section'),
  grade: reader.grade('beam.grade'),
});

const bolts = (reader: EntryReader, at: string, pattern: readonly string[]): Tree => ({
  size: reader.words(`${at}.size`),
  grade: reader.grade(`${at}.grade`, ['fu']),
  threads: reader.words(`${at}.threads`),
  ...reader.numbers(at, pattern),
  holes: reader.words(`${at}.holes`),
  ...reader.numbers(at, ['hole', 'socket']),
});

const fitting = (reader: EntryReader, joined: Joined): Tree => {
  const at = joined.fitting;
  const weld = joined.weld ? reader.numbers(joined.weld, weldSizes(joined)) : undefined;
  return {
    thickness: reader.number(`${at}.thickness`),
    grade: reader.grade(`${at}.grade`),
    ...reader.numbers(at, fittingSizes(joined)),
    ...(joined.cleat && joined.weld && { [joined.weld.slice(at.length + 1)]: weld }),
  };
};

/** Last part of a path. */
const last = (path: string): string => path.slice(path.lastIndexOf('.') + 1);

const joint = (reader: EntryReader): Tree => {
  const joined = joinedIn(reader.entry);
  const { cleat, weld, webBolts, supportBolts } = joined;
  return {
    kind: reader.words('joint.kind'),
    ...(webBolts && {
      ...reader.numbers('joint', ['firstRow', 'endDistance']),
      bolts: bolts(reader, 'joint.bolts', ['rows', 'columns', 'pitch', 'gauge']),
    }),
    ...(supportBolts && {
      supportBolts: bolts(reader, 'joint.supportBolts', ['rows', 'pitch', 'crossCentres', 'topEdge']),
    }),
    [last(joined.fitting)]: fitting(reader, joined),
    ...(weld !== '' && !cleat && { [last(weld)]: reader.numbers(weld, weldSizes(joined)) }),
  };
};

/** An end plate fills the setback, so that none need be typed. */
const setback = (reader: EntryReader): number | undefined => {
  const given = reader.number('setback');
  return given === undefined && joinedIn(reader.entry).endPlate ? reader.number('joint.plate.thickness') : given;
};

const support = (reader: EntryReader): Tree | undefined =>
  reader.words('support') === 'on'
    ? {
        kind: reader.words('support.kind'),
        section: reader.words('support.section'),
        thickness: reader.number('support.thickness'),
        grade: reader.grade('support.grade'),
        ...reader.numbers('support', ['topOfSteel', 'otherReaction']),
        ...(oppositeFits(reader.entry) &&
          oppositeTold(reader.entry) && { opposite: reader.numbers(OPPOSITE, ['firstRow', 'rows', 'pitch', 'gauge']) }),
      }
    : undefined;

const reaction = (reader: EntryReader): unknown =>
  reader.by('reaction') === 'share' ? { ofWebShear: reader.number('reaction.ofWebShear') } : reader.number('reaction');

const wordsUnder = (reader: EntryReader, path: string): Tree | undefined => {
  const found = reader
    .under(path)
    .filter((one) => !one.startsWith('sheet.beside.'))
    .sort();
  if (found.length === 0) return undefined;
  return Object.fromEntries(found.map((one) => [one.slice(path.length + 1), reader.words(one)]));
};

const isForce = (value: number): boolean => value >= 0 && value <= 1e6;

/** The second standard, and why its reaction cannot be taken: the first is told all the same. */
const beside = (reader: EntryReader): { readonly beside?: Tree; readonly faults: readonly Fault[] } => {
  const at = 'sheet.beside';
  const standard = reader.words(`${at}.standard`);
  if (standard === undefined) return { faults: [] };
  const reading = readField(reader.entry, `${at}.reaction`);
  if (isFault(reading)) return { faults: [reading] };
  if (reading !== undefined && !isForce(reading.value)) {
    return { faults: [fault('too-small', `${at}.reaction`, reading.value, { least: 0 })] };
  }
  return { beside: { standard, reaction: reading?.value }, faults: [] };
};

/** Leaves out what is not there. */
const pruned = (tree: Tree): Tree =>
  Object.fromEntries(
    Object.entries(tree)
      .filter(([, value]) => value !== undefined)
      .map(([key, value]) => [key, typeof value === 'object' && value !== null ? pruned(value as Tree) : value]),
  );

const sheet = (reader: EntryReader, second: Tree | undefined): Tree | undefined => {
  const words = wordsUnder(reader, 'sheet');
  return words || second ? { ...words, beside: second } : undefined;
};

/** The end that an entry describes. A text that cannot be read is a fault, and its field is left out; so no such end may be used. */
export const endOf = (entry: Entry): EntryRead => {
  const reader = new EntryReader(entry);
  const second = beside(reader);
  const input = pruned({
    mark: reader.words('mark'),
    standard: reader.words('standard'),
    units: entry.units,
    reaction: reaction(reader),
    level: reader.words('level'),
    tie: reader.number('tie'),
    beam: beam(reader),
    top: cope(reader, 'top'),
    bottom: cope(reader, 'bottom'),
    setback: setback(reader),
    joint: joint(reader),
    support: support(reader),
    options: wordsUnder(reader, 'options'),
    piece: reader.words('piece'),
    end: reader.words('end'),
    quantity: reader.number('quantity'),
    sheet: sheet(reader, second.beside),
  });
  return { input, faults: reader.faults, besideFaults: second.faults };
};
