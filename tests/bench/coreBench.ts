import { HyperFormula } from 'hyperformula';
import { checkEnd } from '../../core/check/checkEnd.ts';
import { evaluate } from '../../core/check/evaluate.ts';
import { planOf } from '../../core/check/plan.ts';
import { resolve } from '../../core/check/resolve.ts';
import type { Facts } from '../../core/end/facts.ts';
import { coefficientOf, instantaneousCentre } from '../../core/end/instantaneousCentre.ts';
import { readEnd } from '../../core/end/readEnd.ts';
import type { End } from '../../core/end/schema.ts';
import { Values } from '../../core/formula/number.ts';
import { programOf } from '../../core/formula/program.ts';
import { run } from '../../core/formula/run.ts';
import type { Tree } from '../../core/formula/tree.ts';
import type { Standard } from '../../core/standards/standard.ts';
import { isNoRule, treesOf, type Way } from '../../core/standards/standard.ts';
import { goodEnds } from '../support/published.ts';
import { sheetRow } from '../support/spreadsheet.ts';
import { underStandard } from '../support/underStandard.ts';
import { type Contestant, type Figure, interleaved } from './timing.ts';

const ENDS = 1000;

/** A schedule of ends, each with its own reaction, pitch and notch. Invented. */
const schedule = (standard: Standard): End[] => {
  const { end } = goodEnds().find(({ name }) => name === 'example')!;
  const read = readEnd(underStandard(end, standard));
  if ('faults' in read) throw new Error('the example end is refused');
  return Array.from({ length: ENDS }, (_, i) => {
    const one = structuredClone(read.end);
    one.reaction = 100 + i / 10;
    if (one.joint.kind !== 'fin-plate') throw new Error('the example end has no fin plate');
    one.joint.bolts.pitch = 60 + (i % 40);
    one.top = { length: 90 + (i % 60), depth: 40 + (i % 17) / 2, radius: 10 };
    return one;
  });
};

const numbers = (end: End, standard: Standard): number => {
  const found = resolve(end, standard);
  if ('faults' in found) throw new Error('an end of the schedule is refused');
  const { facts } = found.resolved;
  return evaluate(planOf(standard, end.joint.kind), facts, (end.reaction as number) * 1000).capacity;
};

const turning = <T>(list: readonly T[]): (() => T) => {
  let at = 0;
  return () => {
    at = (at + 1) % list.length;
    return list[at]!;
  };
};

/** Every formula of the strength checks that apply to a schedule, and facts to put into them. */
const formulasOf = (standard: Standard, ends: readonly End[]): { trees: Tree[]; facts: Facts[] } => {
  const facts = ends.slice(0, 200).map((end) => {
    const found = resolve(end, standard);
    if ('faults' in found) throw new Error('an end of the schedule is refused');
    return found.resolved.facts;
  });
  // The ends of a schedule differ in sizes alone, so that what applies to the first applies to all.
  const first = new Values(facts[0] as never);
  const applies = ({ off = [] }: Way): boolean => !off.some(({ when }) => first.met(when));
  const ways = Object.values(standard.strength).flatMap((rule) => (isNoRule(rule) ? [] : rule.ways));
  return { trees: ways.filter(applies).flatMap(treesOf), facts };
};

/** All these formulas worked out once, as one program. */
const reading = ({ trees, facts }: ReturnType<typeof formulasOf>): (() => number) => {
  const { program, places } = programOf([{ always: [], gates: [], of: trees }]);
  const { of } = places[0]!;
  const next = turning(facts);
  return () => {
    run(program, next() as never);
    let sum = 0;
    for (const cell of of) sum += program.cells[cell!]! > 0 ? 1 : 0;
    return sum;
  };
};

/** The same formulas in a general spreadsheet engine: all inputs of all rows replaced in one call. Microseconds a row. */
const spreadsheet = ({ trees, facts }: ReturnType<typeof formulasOf>): number => {
  const row = sheetRow(trees);
  const inputs = facts.map((one) => row.inputs.map((read) => read(one as never)));
  const engine = HyperFormula.buildFromArray(
    inputs.map((values, at) => [...values, ...row.formulas.map((text) => text.replaceAll('{r}', String(at + 1)))]),
    { licenseKey: 'gpl-v3' },
  );
  const times = [1.01, 1.02, 1.03].map((factor) => {
    const changed = inputs.map((values) => values.map((value) => value * factor));
    const start = performance.now();
    engine.setCellContents({ sheet: 0, row: 0, col: 0 }, changed);
    return ((performance.now() - start) * 1000) / facts.length;
  });
  engine.destroy();
  return times.sort((a, b) => a - b)[1]!;
};

/** Number path, full check, workings and the bolt-group solver of one standard. */
export const coreBench = (standard: Standard): Figure[] => {
  const ends = schedule(standard);
  const [one, two, three, four] = [turning(ends), turning(ends), turning(ends), turning(ends)];
  const formulas = formulasOf(standard, ends);
  const arm = turning(Array.from({ length: 500 }, (_, i) => 50 + i));
  const contestants: Contestant[] = [
    { name: 'numbers', turns: 2000, turn: () => numbers(one(), standard) },
    { name: 'report', turns: 200, turn: () => report(two(), false) },
    { name: 'workings', turns: 40, turn: () => report(three(), true) },
    { name: 'centre', turns: 100, turn: () => instantaneousCentre({ n: 6, m: 2, p: 70, q: 70 }, arm()).C },
    { name: 'centre again', turns: 2000, turn: () => coefficientOf(6, 2, 70, 70, 100) },
    { name: 'formulas', turns: 1000, turn: reading(formulas) },
    { name: 'read', turns: 500, turn: () => ('end' in readEnd(four()) ? 1 : 0) },
  ];
  const [quick, full, workings, centre, again, alone, read] = interleaved(contestants) as never as {
    median: number;
    least: number;
  }[];
  const engine = spreadsheet(formulas);
  const figure = (
    name: string,
    value: number,
    unit: string,
    target: number,
    ceiling: number,
    more = false,
  ): Figure => ({
    name: `${standard.id}: ${name}`,
    value,
    unit,
    target,
    ceiling,
    more,
  });
  return [
    figure('numbers of a whole end (names looked up, facts, every check), median', quick!.median, 'µs', 8, 25),
    figure('the same, least of the rounds', quick!.least, 'µs', 8, 25),
    figure('the formulas alone, worked out from the facts', alone!.median, 'µs', 8, 25),
    figure('general spreadsheet engine, same formulas, over these', engine / alone!.median, 'times', 100, 33, true),
    figure('bolt-group centre, 6 x 2 bolts, not solved before', centre!.median, 'µs', 60, 180),
    figure('bolt-group centre, solved before', again!.median, 'µs', 1, 3),
    figure('reading one end from JSON values (schema)', read!.median, 'µs', 10, 30),
    figure('full report without workings', full!.median, 'µs', 100, 300),
    figure('workings of every check beside it', workings!.median - full!.median, 'µs', 300, 1000),
  ];
};

const report = (end: End, working: boolean): number => {
  const outcome = checkEnd(end, { working });
  return 'report' in outcome ? (outcome.report.capacity ?? 0) : 0;
};
