import type { Check, Report, State } from '../../core/check/report.ts';
import { limitText } from '../../core/sheet/fitLimit.ts';
import { type Numbers, numbersOf } from '../../core/sheet/numbers.ts';
import { sheetWords as say } from '../../core/sheet/sheetWords.ts';
import { titleOf } from '../../core/sheet/verdictSentence.ts';
import { shortOf, type Words } from '../../core/words/words.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { type Column, type Row, setColumns } from './columns.ts';
import { printWorking } from './printWorking.ts';
import { verdictLine } from './verdictLine.ts';
import { hanging, harmless } from './wrap.ts';

/** State, title, demand / resistance, unit, ratio, fails at, clause, basis. */
const columns: readonly Column[] = [
  { align: 'left', gap: 0 },
  { align: 'left', gap: 1, share: 2 },
  { align: 'right', gap: 2 },
  { align: 'left', gap: 1 },
  { align: 'right', gap: 2 },
  { align: 'right', gap: 2 },
  { align: 'left', gap: 2, share: 1 },
  { align: 'left', gap: 2 },
];

const stateWords: Readonly<Record<State, string>> = { ...say.verdict, information: '', notApplicable: '' };

const isFit = ({ id }: Check): boolean => id.startsWith('fit-');

interface Context {
  readonly report: Report;
  readonly numbers: Numbers;
  readonly words: Words;
}

/** Demand / resistance, or for a rule of fit what is given / what it must be. */
const sizesOf = (check: Check, numbers: Numbers): string => {
  const resistance = numbers.amount(check.resistance, check.unit);
  return isFit(check)
    ? `${resistance} / ${limitText(numbers, check)}`
    : `${numbers.amount(check.demand, check.unit)} / ${resistance}`;
};

const rowOf = ({ report, numbers, words }: Context, check: Check): Row => {
  const { id, state, unit, clause, basis, utilisation, reactionAtFailure, verified, reasonText } = check;
  const lead = id === report.governing ? say.table.governs : '';
  const title = titleOf({ ...check, title: shortOf(words, check) });
  const told = (state === 'fails' || state === 'refer') && reasonText;
  return {
    cells: [
      stateWords[state],
      `${lead}${title}${verified === 'none' ? ' *' : ''}`,
      sizesOf(check, numbers),
      unit,
      numbers.ratio(utilisation),
      reactionAtFailure === undefined ? '' : numbers.failsAt(reactionAtFailure),
      clause,
      basis,
    ],
    ...(told && { under: told }),
  };
};

const head = (title: string, sizes: string, failsAt: string): Row => ({
  cells: ['', title, sizes, '', say.table.ratio, failsAt, say.table.clause, say.table.basis],
});

/** Ladder, footing and information, in the same columns. */
const tables = (context: Context): string[][] => {
  const told = context.report.checks.filter(({ state }) => state !== 'notApplicable');
  const rows = (of: (check: Check) => boolean): Row[] => told.filter(of).map((one) => rowOf(context, one));
  const failsAt = `fails at\n${context.numbers.force}`;
  const demand = `${say.table.demand} /\n${say.table.resistance}`;
  const given = `${say.table.given} /\n${say.table.limit}`;
  const informs = rows(({ state }) => state === 'information');
  return setColumns(columns, [
    [head(say.table.check, demand, failsAt), ...rows((one) => !isFit(one) && one.state !== 'information')],
    [head('Footing', given, ''), ...rows(isFit)],
    informs.length > 0 ? [head('For information', demand, failsAt), ...informs] : [],
  ]);
};

const notApplicable = ({ checks }: Report): string[] => {
  const absent = checks.filter(({ state }) => state === 'notApplicable');
  if (absent.length === 0) return [];
  const each = absent.map((one) => titleOf(one) + (one.reasonText ? ` (${one.reasonText})` : ''));
  return hanging(say.notApplicable, `${each.join('; ')}.`);
};

const sources = ({ report, words }: Context): string[] => {
  const met = [...new Set(report.checks.map(({ basis }) => basis))].filter((one) => one !== '');
  const options = Object.entries(report.options).map(([key, value]) => `${key} ${value}`);
  const unverified = report.checks.some(({ verified, state }) => verified === 'none' && state !== 'notApplicable');
  return [
    ...hanging(say.basis, `${met.map((one) => `${one} – ${words.bases[one] ?? one}`).join('; ')}.`),
    ...(unverified ? [say.unverified] : []),
    ...(options.length > 0 ? hanging(say.options, `${options.join('; ')}.`) : []),
  ];
};

const limits = ({ report, words }: Context): string[] => [
  say.limits.trim(),
  ...[...report.assumptions, ...report.notes].flatMap(({ text }) => hanging('  ', harmless(text))),
  ...words.cautions.flatMap((text) => hanging('  ', text)),
];

const heading = ({ report, numbers }: Context): string[] => {
  const { mark, standard, level } = report;
  const load = `${level} reaction ${numbers.load(report.reaction)} ${numbers.force}`;
  const parts = [harmless(mark), `${standard.title}:${standard.edition}`, load];
  return [...hanging('', parts.filter(Boolean).join(', ')), ...hanging(...verdictLine(report, numbers))];
};

/** The report for a person: 100 columns, weakest first; the working of every check after it where the report carries it. */
export const printReport = (report: Report): string => {
  const words = wordsFor(report.words);
  const context: Context = { report, numbers: numbersOf(report.units, '.'), words };
  const blocks = [
    heading(context),
    ...tables(context),
    notApplicable(report),
    ...report.checks.map((one) => printWorking(one, titleOf(one))),
    sources(context),
    limits(context),
    [`${say.programName} ${report.version}. ${say.fingerprint}: ${report.fingerprint}`],
  ];
  const text = blocks.filter(({ length }) => length > 0).map((lines) => lines.join('\n'));
  return `${text.join('\n\n')}\n`;
};
