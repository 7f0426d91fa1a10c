import type { CheckName } from '../end/checkNames.ts';
import type { Tree } from '../formula/tree.ts';
import { type WorkingRow, workingsOf } from '../formula/working.ts';
import { standards } from '../standards/known.ts';
import { isNoRule, treesOf as treesOfWay } from '../standards/standard.ts';
import { evaluate } from './evaluate.ts';
import type { ExaminedNumbers } from './examined.ts';
import { type FitPlan, type Plan, planOf, type StrengthPlan } from './plan.ts';
import { type Result, resultAt } from './result.ts';

/** What a working leads to: demand and resistance of the way that the numbers speak of; none where the method gives no number. */
const ofStrength = ({ rule }: StrengthPlan, { way, demand, resistance }: Result): readonly Tree[] | undefined => {
  const found = isNoRule(rule) ? undefined : rule.ways[way];
  if (!found) return undefined;
  if (Number.isNaN(resistance) && found.resistance) return [];
  return treesOfWay(found).filter((one) => one !== found.demand || !Number.isNaN(demand));
};

/** The same for a rule of fit: what is given and its bounds. */
const ofFit = ({ rule }: FitPlan, { way }: Result): readonly Tree[] | undefined => {
  const part = isNoRule(rule) ? undefined : rule.parts[way];
  return part && [part.given, part.least, part.most].filter((one) => one !== undefined);
};

/** What the workings of an end lead to, by check; a check that does not apply has none. */
const treesOf = (plan: Plan, { facts }: ExaminedNumbers): Map<CheckName, readonly Tree[]> => {
  const { rows } = evaluate(plan, facts, facts.V);
  const all = new Map<CheckName, readonly Tree[]>();
  const put = (id: CheckName, trees: readonly Tree[] | undefined): void => {
    if (trees) all.set(id, trees);
  };
  plan.strength.forEach((one, at) => {
    put(one.id, ofStrength(one, resultAt(rows, at)));
  });
  plan.fit.forEach((one, at) => {
    put(one.id, ofFit(one, resultAt(rows, plan.strength.length + at)));
  });
  return all;
};

const planFor = ({ end, report }: ExaminedNumbers): Plan => planOf(standards[report.standard.id]!, end.joint.kind);

/** The working of one check of an end that was examined: its steps in the order of use; none for a check that does not apply. */
export const workingOfCheck = (examined: ExaminedNumbers, id: CheckName): readonly WorkingRow[] => {
  const trees = treesOf(planFor(examined), examined).get(id);
  return trees ? workingsOf(examined.facts, examined.report.units)(trees) : [];
};

/** The same end with the working of every check. */
export const withWorkings = (examined: ExaminedNumbers): ExaminedNumbers => {
  const { facts, report } = examined;
  const trees = treesOf(planFor(examined), examined);
  const write = workingsOf(facts, report.units);
  const checks = report.checks.map((check) => {
    const found = trees.get(check.id);
    return found ? { ...check, working: write(found) } : check;
  });
  return { ...examined, report: { ...report, checks } };
};
