import type { ExaminedNumbers } from '../check/examined.ts';
import { fingerprintOf } from '../check/fingerprint.ts';
import type { Check, Note, SaidFault } from '../check/report.ts';
import { fitNames, strengthNames } from '../end/checkNames.ts';
import { type Fault, fault } from '../end/fault.ts';
import { cardFaultSentences } from '../words/cardFaults.ts';
import { commonwealth } from '../words/commonwealth.ts';
import { faultText } from '../words/words.ts';
import { wordsFor } from '../words/wordsFor.ts';
import type { Card, CardCheck, CardRow, MadeCard, Why } from './card.ts';
import { cardEnd, plateDepth } from './cardEnd.ts';
import { cellOf, type Looked } from './cellOf.ts';
import { letters } from './letters.ts';
import { type Asked, readCard } from './readCard.ts';

const distinct = <T>(all: readonly T[], key: (one: T) => string): T[] => [
  ...new Map(all.map((one) => [key(one), one])).values(),
];

const said = (faults: readonly Fault[]): { readonly faults: readonly SaidFault[] } => ({
  faults: faults.map((one) => ({ ...one, text: faultText(commonwealth, cardFaultSentences, one) })),
});

/** Faults that stand in the way of every cell are the template's own. */
const sharedFaults = (looked: readonly Looked[]): readonly SaidFault[] => {
  const key = ({ code, path }: SaidFault): string => `${code} ${path}`;
  const [first, ...others] = looked.map(({ faults }) => faults);
  const keys = others.map((faults) => new Set(faults.map(key)));
  return (first ?? []).filter((one) => keys.every((all) => all.has(key(one))));
};

/** What the reaction of one end alone gives rise to. */
const ofOneReaction = new Set(['least-reaction']);

const notesOf = (all: readonly ExaminedNumbers[], of: 'assumptions' | 'notes'): Note[] =>
  distinct(
    all.flatMap(({ report }) => report[of]).filter(({ code }) => !ofOneReaction.has(code)),
    ({ text }) => text,
  );

/** Every standing of a check that says something somewhere. */
const standingsOf = (all: readonly ExaminedNumbers[]): Check[] =>
  distinct(
    all.flatMap(({ report }) => report.checks).filter(({ state }) => state !== 'notApplicable'),
    ({ id, basis, verified }) => `${id} ${basis} ${verified}`,
  );

const checksOf = (card: Pick<Card, 'words' | 'sections'>, standings: readonly Check[]): CardCheck[] => {
  const { titles } = wordsFor(card.words);
  const met = new Set(standings.filter(({ state }) => state !== 'information').map(({ id }) => id));
  const governing = new Set(
    card.sections.flatMap(({ cells }) => cells.map((one) => (one.verdict === 'holds' ? one.governing : ''))),
  );
  return strengthNames
    .filter((id) => met.has(id))
    .map((id) => ({ id, title: titles[id] ?? id, letter: letters[id], governs: governing.has(id) }))
    .sort((a, b) => (a.letter < b.letter ? -1 : 1));
};

const fitOf = (standings: readonly Check[], words: Card['words']): Card['fit'] => {
  const { titles } = wordsFor(words);
  const met = new Set<string>(standings.map(({ id }) => id));
  return fitNames.filter((id) => met.has(id)).map((id) => ({ id, title: titles[id] ?? id }));
};

const made = (asked: Asked, table: readonly (readonly Looked[])[], all: readonly ExaminedNumbers[]): MadeCard => {
  const like = all.find(({ report }) => report.verdict === 'holds')!;
  const { standard, level, units, words, options, version } = like.report;
  const { mark: _, ...end } = like.end;
  const sections: CardRow[] = asked.sections.map((section, i) => ({
    section,
    cells: table[i]!.map(({ cell }) => cell),
  }));
  const standings = standingsOf(all);
  const { rows } = asked;
  const card: Card = {
    standard,
    level,
    units,
    words,
    options,
    version,
    joint: end.joint.kind,
    rows,
    plateDepths: rows.map((one) => plateDepth(end, one)),
    sections,
    checks: checksOf({ words, sections }, standings),
    fit: fitOf(standings, words),
    assumptions: notesOf(all, 'assumptions'),
    notes: notesOf(all, 'notes'),
    fingerprint: fingerprintOf({ ...bare(end), sections: asked.sections, rows }, standard),
  };
  return { card, end, like, standings };
};

/** The template without what it does not say of the card. */
const bare = (end: MadeCard['end']): MadeCard['end'] =>
  cardEnd(end, { section: '', rows: 0, reaction: 0 }) as MadeCard['end'];

/** The reasons that most cells give, each once. */
const reasonsOf = (looked: readonly Looked[]): string[] => {
  const counts = new Map<string, { count: number; readonly why: Why }>();
  for (const { cell } of looked) {
    for (const why of cell.verdict === 'holds' ? [] : cell.because) {
      const found = counts.get(why.code) ?? { count: 0, why };
      found.count += 1;
      counts.set(why.code, found);
    }
  }
  return [...counts.values()]
    .sort((one, other) => other.count - one.count)
    .slice(0, 3)
    .map(({ why: { title, text } }) => [title, text.replace(/\.$/, '')].filter(Boolean).join(': '));
};

/**
 * The shop card of one fitting and setback: `{ end, family or sections, rows }` as parsed JSON, where the section, reaction and rows of the template `end`
 * are not read. Never throws: what cannot be read, and a card without a single number, come back as faults.
 */
export const cardOf = (input: unknown): { readonly made: MadeCard } | { readonly faults: readonly SaidFault[] } => {
  const read = readCard(input);
  if ('faults' in read) return said(read.faults);
  const { asked } = read;
  const table = asked.sections.map((section) => asked.rows.map((rows) => cellOf(asked.template, section, rows)));
  const looked = table.flat();
  const shared = sharedFaults(looked);
  if (shared.length > 0) return { faults: shared };
  const all = looked.flatMap(({ examined }) => (examined ? [examined] : []));
  if (looked.every(({ cell }) => cell.verdict !== 'holds')) {
    return said([fault('nothing-to-print', 'sections', null, reasonsOf(looked))]);
  }
  return { made: made(asked, table, all) };
};
