import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { planOf } from '../../core/check/plan.ts';
import { resolve } from '../../core/check/resolve.ts';
import type { Facts } from '../../core/end/facts.ts';
import { readEnd } from '../../core/end/readEnd.ts';
import { Values } from '../../core/formula/number.ts';
import type { Program } from '../../core/formula/run.ts';
import { run } from '../../core/formula/run.ts';
import type { Condition, Tree } from '../../core/formula/tree.ts';
import { joints } from '../../core/joints/index.ts';
import { standards } from '../../core/standards/index.ts';
import { isNoRule } from '../../core/standards/standard.ts';
import { jointEndOf, plausibleJoint } from '../support/arbitraryJoint.ts';
import { underStandard } from '../support/underStandard.ts';

const kinds = Object.keys(joints) as (keyof typeof joints)[];

/** Facts of a random end under one standard; none where it is refused. */
const factsOf = (end: object): Facts | undefined => {
  const read = readEnd(end);
  if ('faults' in read) return undefined;
  const found = resolve(read.end, standards[read.end.standard]!);
  return 'faults' in found ? undefined : found.resolved.facts;
};

type Pair = readonly [Tree | Condition | undefined, number | undefined];

/** Every formula that the program worked out, beside the same read by itself. */
const differing = (values: Values, { cells }: Program, pairs: readonly Pair[]): unknown[] =>
  pairs.flatMap(([one, cell]) => {
    if (!one || cell === undefined) return [];
    const read = 'dimension' in one ? values.of(one) : Number(values.met(one));
    return Object.is(read, cells[cell]) ? [] : [{ op: one.op, read, ran: cells[cell] }];
  });

describe.each(Object.values(standards))(
  '$id: the program of a joint gives the bits of the formulas read one by one',
  (standard) => {
    test.each(kinds)('%s', (kind) => {
      const { program, strength, fit } = planOf(standard, kind);
      let compared = 0;
      fc.assert(
        fc.property(plausibleJoint, (end) => {
          const facts = factsOf(underStandard(jointEndOf(end, kind), standard));
          if (!facts) return;
          const values = new Values(facts as never);
          run(program, facts as never);
          for (const { rule, ways } of strength) {
            if (isNoRule(rule)) continue;
            ways.forEach(({ gate, off, limits, demand, resistance, failsAt, unbounded, informs }, at) => {
              const gates = [...off, ...limits];
              const first = gates.findIndex(({ when }) => values.met(when));
              expect(program.cells[gate]).toBe(first);
              const way = rule.ways[at]!;
              expect(differing(values, program, [[way.informs, informs]])).toEqual([]);
              if (first >= 0 && (first < off.length || limits[first - off.length]!.noNumber)) return;
              const numbers: Pair[] = way.failsAt
                ? [[way.failsAt, failsAt]]
                : [
                    [way.demand, demand],
                    [way.resistance, resistance],
                    [way.unbounded, unbounded],
                  ];
              expect(differing(values, program, numbers)).toEqual([]);
              compared += 1;
            });
          }
          for (const { rule, parts } of fit) {
            if (isNoRule(rule)) continue;
            parts.forEach(({ gate, off, given, least, most, clash }, at) => {
              const first = off.findIndex(({ when }) => values.met(when));
              expect(program.cells[gate]).toBe(first);
              const part = rule.parts[at]!;
              if (first >= 0) return;
              expect(
                differing(values, program, [
                  [part.given, given],
                  [part.least, least],
                  [part.most, most],
                  [part.clash, clash],
                ]),
              ).toEqual([]);
              compared += 1;
            });
          }
        }),
        { numRuns: 80 },
      );
      expect(compared).toBeGreaterThan(300);
    });
  },
);
