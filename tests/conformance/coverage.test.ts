import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import type { Joint } from '../../core/end/schema.ts';
import { joints } from '../../core/joints/index.ts';
import { standards } from '../../core/standards/index.ts';
import { isNoRule } from '../../core/standards/standard.ts';
import { type CoverageTable, coverageUnder } from '../support/coverage.ts';
import { publishedFixtures } from '../support/published.ts';

const table = JSON.parse(
  readFileSync(new URL('../../fixtures/coverage.json', import.meta.url), 'utf8'),
) as CoverageTable;

const kinds = Object.keys(joints) as Joint['kind'][];
const cases = Object.values(standards).flatMap((standard) =>
  kinds.map((kind) => ({ id: standard.id, standard, kind })),
);

test('the table of coverage speaks of every standard and every kind of joint, and of no other', () => {
  expect(Object.keys(table).sort()).toEqual(Object.keys(standards).sort());
  for (const id of Object.keys(table)) expect(Object.keys(table[id]!).sort()).toEqual([...kinds].sort());
});

describe.each(cases)('$id, $kind', ({ standard, kind }) => {
  test('each check does what the table of coverage says', () => {
    expect(coverageUnder(standard, kind)).toEqual(table[standard.id]?.[kind]);
  });
});

const held = (id: string): ReadonlySet<string> =>
  new Set(
    publishedFixtures()
      .filter(({ standard }) => standard === id)
      .flatMap(({ expect: all }) => all.map(({ check }) => check)),
  );

describe.each(cases)('$id, $kind', ({ standard, kind }) => {
  const does = Object.entries(table[standard.id]?.[kind] ?? {});

  test('every check that computes is held against a number that the program did not make', () => {
    const outside = held(standard.id);
    const computing = does.filter(([, what]) => what === 'computes').map(([id]) => id);
    expect(computing.filter((id) => !outside.has(id))).toEqual([]);
  });

  test('a check without a rule is one that the standard says it has none for', () => {
    for (const [id, what] of does) {
      const rule = id in standard.strength ? standard.strength[id as never] : standard.fit[id as never];
      if (isNoRule(rule)) expect(what, id).toBe('noRule');
    }
  });
});
