import { computed } from '@preact/signals';
import { type CopeAdvice, copeFromSupport } from '../../core/advice/copeFromSupport.ts';
import { canonicalJson } from '../../core/end/canonical.ts';
import { writeQuantity } from '../../core/units/printQuantity.ts';
import { adviceWordsFor } from '../../core/words/adviceWords.ts';
import { awaited, entry, input, region } from '../state/bench.ts';
import { type Entry, textOf, withText } from '../state/entry.ts';
import '../state/reader.ts';

/** Copes proposed from the support, or why none are, in sentences; none of these where the faults stand at fields of their own. */
export type Proposal = { readonly advice: CopeAdvice } | { readonly sentences: readonly string[] };

/** What the end has in place of its copes and reaction plays no part in the proposal, so it may be half typed. */
const plays = (path: string): boolean => !/^(?:top|bottom|reaction)(?:\.|$)/.test(path);

const hasSupportingBeam = (it: Entry): boolean =>
  textOf(it, 'support') === 'on' &&
  textOf(it, 'support.kind') === 'beam-web' &&
  textOf(it, 'support.section').trim() !== '';

/** The end without what plays no part, as text: while it stays, so does the proposal. */
const leansOn = computed<string | null>(() => {
  if (!hasSupportingBeam(entry.value) || awaited.value || input.value.faults.some(({ path }) => plays(path)))
    return null;
  return canonicalJson({ ...input.value.input, top: null, bottom: null, reaction: 0 });
});

/** Null where the end names no supporting beam, or has faults elsewhere. */
export const proposal = computed<Proposal | null>(() => {
  if (leansOn.value === null) return null;
  const found = copeFromSupport(JSON.parse(leansOn.value));
  if ('advice' in found) return found;
  const own = adviceWordsFor(region.value).faults;
  const sentences = found.faults.filter(({ code }) => Object.hasOwn(own, code)).map(({ text }) => text);
  return sentences.length > 0 ? { sentences } : null;
});

/** The proposal where it can be taken: with it the end can be checked. */
export const takeable = computed<CopeAdvice | null>(() => {
  const it = proposal.value;
  return it && 'advice' in it && it.advice.faults.length === 0 ? it.advice : null;
});

const withCope = (it: Entry, edge: 'top' | 'bottom', proposed: CopeAdvice['top']): Entry =>
  Object.entries(proposed?.cope ?? {}).reduce(
    (after, [size, value]) => withText(after, `${edge}.${size}`, writeQuantity(value, '1,0', it.units)),
    withText(it, edge, proposed ? 'on' : 'none'),
  );

/** The entry with the proposed copes in place of its own; the hand that takes them gives them. */
export const entryWith = ({ top, bottom }: CopeAdvice): Entry =>
  withCope(withCope(entry.value, 'top', top), 'bottom', bottom);

/** The end has the proposed copes, given and not assumed. */
export const isTaken = computed<boolean>(() => {
  const advice = takeable.value;
  return advice !== null && canonicalJson(entryWith(advice)) === canonicalJson(entry.value);
});
