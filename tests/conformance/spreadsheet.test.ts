import { HyperFormula } from 'hyperformula';
import { describe, expect, test } from 'vitest';
import { examine } from '../../core/check/examine.ts';
import { strengthNames } from '../../core/end/checkNames.ts';
import { Values } from '../../core/formula/number.ts';
import { joints } from '../../core/joints/index.ts';
import { standards } from '../../core/standards/index.ts';
import { isNoRule, treesOf } from '../../core/standards/standard.ts';
import { sheetRow } from '../support/spreadsheet.ts';
import { goodEndsUnder } from '../support/underStandard.ts';

describe.each(Object.values(standards))(
  '$id: a general spreadsheet engine, given the same formulas, finds the same numbers',
  (standard) => {
    const ways = strengthNames.flatMap((id) => {
      const rule = standard.strength[id];
      return isNoRule(rule) ? [] : rule.ways.map((way) => ({ id, ...way }));
    });
    const row = sheetRow(ways.flatMap(treesOf));
    const firstOf = ways.map((_, at) => ways.slice(0, at).flatMap(treesOf).length);
    const ends = goodEndsUnder(standard);
    const facts = ends.map(({ end }) => {
      const found = examine(end);
      if ('faults' in found) throw new Error('a good end is refused');
      return found.examined.facts;
    });
    const rows = facts.map((one, at) => [
      ...row.inputs.map((read) => read(one as never)),
      ...row.formulas.map((text) => text.replaceAll('{r}', String(at + 1))),
    ]);
    const engine = HyperFormula.buildFromArray(rows, {
      licenseKey: 'gpl-v3',
      smartRounding: false,
      precisionEpsilon: 0,
    });

    test.each(ends.map(({ name }, at) => ({ name, at })))('$name', ({ at }) => {
      const values = new Values(facts[at] as never);
      const asked = new Map(joints[facts[at]!.kind].strength.map(([id, , gate]) => [id, gate]));
      let counted = 0;
      ways.forEach((way, index) => {
        const { id, off = [], limits = [], unbounded } = way;
        if (!asked.has(id)) return;
        const gates = [asked.get(id), ...off].filter((gate) => gate !== undefined);
        const closed = [...gates, ...limits.filter(({ noNumber }) => noNumber)].some(({ when }) => values.met(when));
        if (closed || (unbounded && values.met(unbounded))) return;
        treesOf(way).forEach((tree, side) => {
          const ours = values.of(tree);
          const theirs = engine.getCellValue({ sheet: 0, row: at, col: row.results[firstOf[index]! + side]! });
          expect(typeof theirs).toBe('number');
          expect(Math.abs((theirs as number) - ours)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(ours)));
          counted += 1;
        });
      });
      expect(counted).toBeGreaterThan(15);
    });
  },
);
