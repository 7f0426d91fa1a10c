import { nearest, type Unknown } from './nearest.ts';
import { readTable, type SectionRecord, type SectionTable } from './sectionTable.ts';

/** The families at hand: all of them where `findSection.ts` is loaded, on the bench those that have come so far. */
const tables: SectionTable[] = [];

let index: Index | undefined;

/** Puts families at hand. An excerpt gives way to its whole family, never the other way round. */
export const admit = (...families: readonly SectionTable[]): void => {
  for (const one of families) {
    const at = tables.findIndex(({ family }) => family === one.family);
    if (at < 0) tables.push(one);
    else if (!one.excerpt) tables[at] = one;
  }
  index = undefined;
};

/**
 * The section of that name among the families at hand, or the names it may stand for, or the three nearest.
 *
 * Read in any case and spacing, with x, × or * between the numbers and the family's letters before, between or after them:
 * `UB 406x178x60`, `406X178X60UB`, `HE 200 A`, `IPE A 300`, `w 18 x 40`, `410UB53.7`, `MB 400`. A three-part label without letters is read
 * where one family alone has it, a channel also without its mass. South African and Canadian labels of the same shapes are read too;
 * `readAs` and `readFrom` then say so. A name that fits two sections is neither: both are proposed.
 */
export const findSection = (name: string): SectionRecord | Unknown => {
  index ??= buildIndex();
  const seen = index.asWritten.get(name);
  if (seen !== undefined) return seen;
  const key = plain(name);
  const found = index.plain.get(key);
  if (found === undefined) return { nearest: index.doubtful.get(key) ?? nearest(name, index.labels, 3) };
  if (index.asWritten.size < writtenKept) index.asWritten.set(name, found);
  return found;
};

/** The families at hand, each with its designations in the order of the published table. */
export const listSections = (): { family: string; market: string; designations: string[] }[] =>
  tables.map((table) => ({
    family: table.family,
    market: table.market,
    designations: readTable(table).map(({ record }) => record.designation),
  }));

interface Index {
  /** By plain spelling. */
  readonly plain: ReadonlyMap<string, SectionRecord>;
  /** Designations of the sections that share a plain spelling. */
  readonly doubtful: ReadonlyMap<string, readonly string[]>;
  /** By the spellings met so far, which saves taking a name apart again for every row of a long list. */
  readonly asWritten: Map<string, SectionRecord>;
  /** Every name worth proposing. */
  readonly labels: readonly string[];
}

/** Spellings of one section are without number, so what is kept of them has a bound. */
const writtenKept = 4096;

const buildIndex = (): Index => {
  const spellings = tables.flatMap(spellingsOf);
  const byPlain = new Map<string, SectionRecord>();
  const doubtful = new Map<string, string[]>();
  for (const { written, record } of spellings) {
    const key = plain(written);
    const other = byPlain.get(key);
    if (other === undefined) byPlain.set(key, record);
    else if (other.designation !== record.designation) {
      doubtful.set(key, [...(doubtful.get(key) ?? [other.designation]), record.designation]);
    }
  }
  for (const key of doubtful.keys()) byPlain.delete(key);
  return {
    plain: byPlain,
    doubtful,
    asWritten: new Map(),
    labels: spellings.filter(({ proposed }) => proposed).map(({ written }) => written),
  };
};

interface Spelling {
  readonly written: string;
  readonly record: SectionRecord;
  /** Written in full, so fit to be proposed for a name that is not known. */
  readonly proposed: boolean;
}

/** Every way to write each section of a table, but for case, spaces and the place of the family's letters. */
const spellingsOf = (table: SectionTable): Spelling[] =>
  readTable(table).flatMap(({ record, label, otherLabel }) => {
    const own = labelled(table, label, record, true);
    if (otherLabel === undefined) return own;
    const rounded = otherLabel.replace(/\d+\.\d+$/, (mass) => String(Math.round(Number(mass))));
    const others = [rounded, otherLabel].flatMap((other, i) => {
      const found = { ...record, readAs: table.prefix + other, readFrom: table.otherList ?? '' };
      return labelled(table, other, found, i === 0);
    });
    return [...own, ...others];
  });

const labelled = (table: SectionTable, label: string, record: SectionRecord, proposed: boolean): Spelling[] => {
  const written = [table.prefix + label];
  const cut = label.lastIndexOf('x');
  if (label.indexOf('x') < cut) written.push(label);
  if (table.readWithoutMass === true && cut > 0) written.push(table.prefix + label.slice(0, cut));
  if (table.otherPrefix !== undefined)
    written.push(...written.map((it) => it.replace(table.prefix, table.otherPrefix!)));
  return written.map((it, i) => ({ written: it, record, proposed: proposed && i === 0 }));
};

const form = /^([A-Z]*)(\d+(?:\.\d+)?(?:X\d+(?:\.\d+)?)*)([A-Z]*)$/;
const lettersBetween = /^(\d+)([A-WYZ][A-Z]*)(\d+(?:\.\d+)?)$/;

/** A name without what people write differently: capitals, no spaces, X between numbers, the letters first. Empty if it is no such name. */
const plain = (name: string): string => {
  if (name.length > 40) return '';
  const squeezed = name.toUpperCase().replace(/\s+/g, '').replace(/[×*]/g, 'X').replace(lettersBetween, '$2$1X$3');
  const [, before, numbers, after] = form.exec(squeezed) ?? [];
  return numbers === undefined ? '' : `${before}${after}${numbers.replace(/\.0+(?!\d)/g, '')}`;
};
