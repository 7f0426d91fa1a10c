import { describe, expect, test } from 'vitest';
import { conditionText, formularyOf } from '../../../core/formula/formulary.ts';
import {
  all,
  atMost,
  below,
  constant,
  flagOf,
  givenOf,
  not,
  over,
  pick,
  plus,
  step,
  times,
} from '../../../core/formula/tree.ts';

interface Plate {
  readonly w: number;
  readonly t: number;
  readonly sawn: boolean;
}
const given = givenOf<Plate>();
const flag = flagOf<Plate>();
const w = given('w', '1,0', (f) => f.w);
const t = given('t', '1,0', (f) => f.t);
const phi = constant('φ', 0.9);
const sawn = flag('', (f) => f.sawn, 'a sawn edge');

describe('formulas in symbols, whatever the end', () => {
  test('each branch stands with what it is taken for, the last for all else', () => {
    const lambda = step('λ', over(w, t));
    const k = step('k', pick([[atMost(lambda, 15), constant('1', 1)]], over(15, lambda)), {
      clause: '5.1',
      basis: 'seen',
    });
    expect(formularyOf([k])).toEqual([
      { symbol: 'λ', cases: [{ expression: 'w / t', when: '' }], under: '', clause: '', basis: '', note: '' },
      {
        symbol: 'k',
        cases: [
          { expression: '1', when: 'λ ≤ 15' },
          { expression: '15 / λ', when: 'otherwise' },
        ],
        under: '',
        clause: '5.1',
        basis: 'seen',
        note: '',
      },
    ]);
  });

  test('choices within a sum are told one by one', () => {
    const edge = pick([[sawn, w]], times(2, w));
    const [row] = formularyOf([step('e', plus(t, edge))]);
    expect(row!.cases).toEqual([
      { expression: 't + w', when: 'a sawn edge' },
      { expression: 't + 2 w', when: 'otherwise' },
    ]);
  });

  test('a named number stands with its value, the factors of the standard do not', () => {
    const [row] = formularyOf([step('N', times(phi, constant('k', 0.3), w))], [phi]);
    expect(row!.cases[0]!.expression).toBe('φ k w, k = 0.3');
  });

  test('a step that only one branch leans on says which', () => {
    const wide = step('a', times(2, w));
    const rows = formularyOf([step('b', pick([[sawn, wide]], t))]);
    expect(rows[0]).toMatchObject({ symbol: 'a', under: 'a sawn edge' });
    expect(rows[1]).toMatchObject({ symbol: 'b', under: '' });
  });

  test('branches that read alike stand once', () => {
    const [one, other] = [step('M', times(2, w)), step('M', times(3, w))];
    const rows = formularyOf([step('R', times(phi, pick([[sawn, one]], other)))], [phi]);
    expect(rows.at(-1)!.cases).toEqual([{ expression: 'φ M', when: '' }]);
  });

  test('conditions are said either way round', () => {
    expect(conditionText(not(below(w, t)))).toBe('w ≥ t');
    expect(conditionText(not(all(sawn, atMost(w, t))))).toBe('not: a sawn edge or w > t');
  });
});
