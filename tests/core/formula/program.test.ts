import { describe, expect, test } from 'vitest';
import { numberOf } from '../../../core/formula/number.ts';
import { type Group, programOf } from '../../../core/formula/program.ts';
import { run, runAgain } from '../../../core/formula/run.ts';
import {
  all,
  any,
  atMost,
  below,
  type Condition,
  cubed,
  flagOf,
  foundOf,
  givenOf,
  least,
  minus,
  most,
  not,
  over,
  pick,
  plus,
  power,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../../core/formula/tree.ts';

interface Plate {
  readonly t: number;
  readonly w: number;
  readonly sawn: boolean;
}
const t = givenOf<Plate>()('t', '0,0', (f) => f.t);
const w = givenOf<Plate>()('w', '0,0', (f) => f.w);
const sawn = flagOf<Plate>()('sawn', (f) => f.sawn);
const plate: Plate = { t: 0.1, w: 0.7, sawn: true };

/** What a program leaves in the cells of its groups. */
const ran = (groups: readonly Partial<Group>[], facts: Plate = plate) => {
  const { program, places } = programOf(groups.map((one) => ({ gates: [], of: [], always: [], ...one })));
  run(program, facts as never);
  return places.map(({ gate, of, always }) => ({
    gate: program.cells[gate],
    of: of.map((cell) => program.cells[cell!]),
    always: always.map((cell) => program.cells[cell!]),
  }));
};

const solver = () => {
  let runs = 0;
  const tree = foundOf<Plate>()('0,0', 'counted', [t, w], (_, t, w) => {
    runs += 1;
    return t! / w!;
  });
  return { tree, runs: () => runs };
};

describe('a program gives the bits of its formulas read one by one', () => {
  const formulas: Tree[] = [
    times(0.3, t, w, 1.1, w),
    plus(t, w, 0.3, t),
    minus(t, w),
    over(plus(t, w, 0.3, t), times(3, w)),
    root(plus(squared(t), squared(w))),
    cubed(w),
    power(w, 1.65),
    least(w, t, 0.4),
    most(w, t, 0.4),
    least(over(0, minus(t, t)), 1),
    pick([[below(w, t), t]], times(2, w)),
    pick(
      [
        [all(sawn, not(atMost(w, t))), times(3, t)],
        [any(sawn, below(t, w)), w],
      ],
      t,
    ),
    step('a', over(times(0.3, t, w), step('b', plus(t, w, 0.3, t)))),
  ];

  test('alone and together', () => {
    const values = formulas.map((one) => numberOf(one, plate));
    expect(ran([{ of: formulas }])[0]!.of).toEqual(values);
    expect(formulas.map((one) => ran([{ of: [one] }])[0]!.of[0])).toEqual(values);
  });

  test('conditions come out as 1 and 0, on a number that is none too', () => {
    const none = over(minus(t, t), minus(w, w));
    const conditions: Condition[] = [sawn, not(sawn), atMost(t, w), below(w, t), atMost(none, t), not(atMost(none, t))];
    expect(ran([{ of: conditions }])[0]!.of).toEqual([1, 0, 1, 0, 0, 1]);
  });
});

describe('what is not needed is not worked out', () => {
  test('a solver behind a gate that closes, or in a branch not taken, does not run', () => {
    const { tree, runs } = solver();
    const gates = [{ when: sawn, closes: true }];
    ran([{ gates, of: [tree, times(2, tree)] }, { of: [pick([[sawn, w]], tree)] }]);
    expect(runs()).toBe(0);
    ran([{ gates, of: [tree, times(2, tree)] }, { of: [pick([[sawn, w]], tree)] }], { ...plate, sawn: false });
    expect(runs()).toBe(1);
  });

  test('a solver that is needed first in one place on some facts, and in another on others, has its value in both', () => {
    const { tree } = solver();
    const groups = [{ of: [pick([[sawn, t]], tree)] }, { of: [plus(tree, 1)] }];
    for (const facts of [plate, { ...plate, sawn: false }]) {
      expect(ran(groups, facts)[1]!.of[0]).toBe(facts.t / facts.w + 1);
    }
  });

  test('a solver whose value another solver takes', () => {
    const { tree, runs } = solver();
    const outer = foundOf<Plate>()('0,0', 'twice', [plus(tree, 1)], (_, x) => 2 * x!);
    expect(ran([{ of: [plus(outer, tree), outer] }])[0]!.of[1]).toBe(2 * (plate.t / plate.w + 1));
    expect(runs()).toBe(1);
  });
});

describe('gates', () => {
  const gates = [
    { when: below(w, t), closes: true },
    { when: sawn, closes: false },
    { when: atMost(t, w), closes: true },
  ];

  test('the first that is met is noted; one that does not close lets the numbers through', () => {
    expect(ran([{ gates, of: [times(2, w)] }])).toEqual([{ gate: 1, of: [2 * plate.w], always: [] }]);
    expect(ran([{ gates, of: [times(2, w)] }], { ...plate, sawn: false })[0]!.gate).toBe(2);
    expect(ran([{ gates: gates.slice(0, 1), of: [w] }])[0]!.gate).toBe(-1);
  });

  test('what is asked for whatever they say is there behind a closed one', () => {
    const closed = { gates: [{ when: sawn, closes: true }], of: [times(2, w)], always: [below(t, w)] };
    expect(ran([closed])[0]).toMatchObject({ gate: 0, always: [1] });
  });
});

describe('what is asked for after a run', () => {
  const grown = step('g', plus(times(t, w), t));
  const group: Group = {
    gates: [{ when: sawn, closes: true }],
    of: [over(1, grown), root(grown)],
    always: [],
    after: [grown, over(solver().tree, t), times(2, w)],
  };
  const after = (facts: Plate, value: number) => {
    const { program, places } = programOf([group], { changing: t });
    run(program, facts as never);
    const { from, after } = places[0]!;
    runAgain(program, facts as never, from, value);
    return after.map((cell) => program.cells[cell!]);
  };

  test('is worked out at the other value, solvers too', () => {
    const facts = { ...plate, sawn: false };
    expect(after(facts, 0.4)).toEqual(group.after!.map((one) => numberOf(one as Tree, { ...facts, t: 0.4 })));
  });

  test('costs nothing before: the run itself solves nothing for it', () => {
    const { tree, runs } = solver();
    const { program } = programOf([{ gates: [], of: [t], always: [], after: [tree] }], { changing: t });
    run(program, plate as never);
    expect(runs()).toBe(0);
  });
});

test('what several formulas of a group lean on stands behind its gates, and what another group leans on too does not', () => {
  const shared = times(t, w);
  const gates = [{ when: sawn, closes: true }];
  const [, open] = ran([{ gates, of: [plus(shared, 1), plus(shared, 2)] }, { of: [plus(shared, 3)] }]);
  expect(open!.of).toEqual([numberOf(plus(shared, 3), plate)]);
});
