import type { SaidFault } from '../../core/check/report.ts';
import { isDemo } from './demo.ts';
import { later } from './later.ts';
import { canRead } from './readEnd.ts';
import { listedAs, rulesOf, titled } from './rules.ts';
import { lookedUp } from './sections.ts';

type Tree = Readonly<Record<string, unknown>>;

/** What an end names is not at hand: `coming`, or the fault that it could not be loaded. */
export type Awaited = 'coming' | SaidFault;

const missed = (path: string, given: string, what: string): SaidFault => ({
  code: 'not-loaded',
  path,
  given,
  limit: null,
  text: `${what} could not be loaded. Try again once there is a network.`,
});

const reader = later(() => import('./reader.ts'));

/** What reads ends comes after the first view; the demo alone does not wait for it. */
const unread = (end: Tree): Awaited | null => {
  if (canRead.value || isDemo(end)) return null;
  return reader.value || !reader.failed ? 'coming' : missed('', '', 'What reads an end');
};

const nameIn = (part: unknown): string[] => {
  const section = (part as Tree | undefined)?.section;
  return typeof section === 'string' ? [section] : [];
};

/** What is not at hand yet of all that an end asks for: the rules of its standard, the families of its sections, what reads it; null where nothing is. */
export const awaitedOf = (end: Tree): Awaited | null => {
  const id = typeof end.standard === 'string' ? end.standard : '';
  const rules = rulesOf(id);
  if (rules === 'missed') return missed('standard', id, `The rules of ${titled(listedAs(id)!)}`);
  const names = [...nameIn(end.beam), ...nameIn(end.support)];
  const [sections, form] = [lookedUp(names), unread(end)];
  if (sections === 'missed') return missed('beam.section', names[0] ?? '', 'The tables of sections');
  return rules === 'coming' || sections === 'coming' ? 'coming' : form;
};
