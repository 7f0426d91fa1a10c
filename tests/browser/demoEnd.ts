import { readFileSync } from 'node:fs';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check, Report } from '../../core/check/report.ts';
import { encodeLink } from '../../core/exchange/link.ts';
import { shortOf } from '../../core/words/words.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import type { ShownRung } from './bench.ts';

/** The invented end that stands on the bench at the first visit. */
export const demoEnd: Readonly<Record<string, unknown>> = JSON.parse(
  readFileSync(new URL('../../fixtures/demo/citrus-packhouse.json', import.meta.url), 'utf8'),
);

/** A good end of the fixtures by the name of its file. */
export const endAt = (name: string): Readonly<Record<string, unknown>> =>
  JSON.parse(readFileSync(new URL(`../../fixtures/input/good/${name}.json`, import.meta.url), 'utf8'));

/** An end under a standard whose rules are no part of the first view, with a section that is none either. */
export const australianEnd = endAt('as-4100-fin-plate');

/** The report on an end, made in Node. */
export const reportOf = (end: unknown): Report => {
  const outcome = checkEnd(end, { working: true });
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  return outcome.report;
};

/** What stands behind the `#` of an end's link. */
export const linkOf = (end: unknown): string => encodeLink(end, reportOf(end).fingerprint);

/** Ways of failing that have a reaction at failure, the strongest first. */
const measured = ({ checks }: Report): Check[] =>
  checks
    .filter(({ id, state }) => !id.startsWith('fit-') && /^(?:holds|fails|refer)$/.test(state))
    .filter(({ reactionAtFailure }) => typeof reactionAtFailure === 'number')
    .reverse();

const floorTenth = (value: number): number => Math.floor(value * 10 + 1e-9) / 10;
/** A ratio above 1 never reads 1.00. */
const hundredths = (value: number | null): number | null =>
  value === null ? null : Number((value > 1 ? Math.max(value, 1.01) : value).toFixed(2));

/** What the ladder must say of a report: reactions rounded down to 0.1, ratios to 0.01. */
export const rungsOf = (report: Report): ShownRung[] =>
  measured(report).map((check, at, all) => ({
    name: shortOf(wordsFor(report.words), check),
    word: check.state === 'refer' ? 'refers' : check.state,
    weakest: at === all.length - 1,
    failsAt: floorTenth(check.reactionAtFailure!),
    ratio: hundredths(check.utilisation),
  }));
