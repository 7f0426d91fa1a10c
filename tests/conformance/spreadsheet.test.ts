import { HyperFormula } from 'hyperformula';
import { describe, expect, test } from 'vitest';
import { examine } from '../../core/check/examine.ts';
import { newRun, numberOf, testOf } from '../../core/formula/number.ts';
import type { Tree } from '../../core/formula/tree.ts';
import { standards } from '../../core/standards/index.ts';
import { isNoRule } from '../../core/standards/standard.ts';
import { goodEnds } from '../support/published.ts';
import { sheetRow } from '../support/spreadsheet.ts';

describe.each(Object.values(standards))(
  '$id: a general spreadsheet engine, given the same formulas, finds the same numbers',
  (standard) => {
    const ways = Object.values(standard.strength).flatMap((rule) => (isNoRule(rule) ? [] : rule.ways));
    const trees: Tree[] = ways.flatMap(({ demand, resistance }) => [demand, resistance]);
    const row = sheetRow(trees);
    const facts = goodEnds().map(({ end }) => {
      const found = examine({ ...end, standard: standard.id });
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

    test.each(goodEnds().map(({ name }, at) => ({ name, at })))('$name', ({ at }) => {
      newRun();
      const one = facts[at] as never;
      let counted = 0;
      ways.forEach(({ off = [], unbounded, demand, resistance }, index) => {
        if (off.some(({ when }) => testOf(when)(one)) || (unbounded && testOf(unbounded)(one))) return;
        [demand, resistance].forEach((tree, side) => {
          const ours = numberOf(tree)(one);
          const theirs = engine.getCellValue({ sheet: 0, row: at, col: row.results[2 * index + side]! });
          expect(typeof theirs).toBe('number');
          expect(Math.abs((theirs as number) - ours)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(ours)));
          counted += 1;
        });
      });
      expect(counted).toBeGreaterThan(20);
    });
  },
);
