import { findSection, listSections } from '../../core/steel/knownSections.ts';
import { otherFamilies } from '../state/sections.ts';

const MOST = 8;

interface Known {
  readonly name: string;
  readonly plain: string;
}

let known: readonly Known[] = [];
let whole = false;

const plain = (text: string): string =>
  text
    .toUpperCase()
    .replace(/[×*]/g, 'X')
    .replace(/[^A-Z0-9.]/g, '');

/** The families at hand; all of them once they have come. */
const names = (): readonly Known[] => {
  const all = otherFamilies.value !== null;
  if (known.length > 0 && whole === all) return known;
  whole = all;
  known = listSections().flatMap(({ designations }) => designations.map((name) => ({ name, plain: plain(name) })));
  return known;
};

/** Sections whose name holds what is typed, those that begin with it first; where few do, the nearest names. */
export const suggestSections = (text: string): string[] => {
  const wanted = plain(text);
  if (wanted === '') return [];
  const holding = names().filter((one) => one.plain.includes(wanted));
  const begins = (one: Known): number => {
    if (one.plain.startsWith(wanted)) return 0;
    return one.plain.replace(/^[A-Z]+/, '').startsWith(wanted) ? 1 : 2;
  };
  const found = holding.sort((a, b) => begins(a) - begins(b)).map(({ name }) => name);
  const near = findSection(text);
  const others = 'nearest' in near ? near.nearest : [near.designation];
  return [...new Set([...found.slice(0, MOST), ...(found.length < 3 ? others : [])])].slice(0, MOST);
};
