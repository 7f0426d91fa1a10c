import { expect, test, vi } from 'vitest';
import { readEnd } from '../../../core/end/readEnd.ts';
import { ub } from '../../../core/steel/sections/ub.ts';
import { readTable } from '../../../core/steel/sectionTable.ts';
import * as bench from '../../../web/state/bench.ts';
import { demoEntry, demoSections, isDemo } from '../../../web/state/demo.ts';
import * as edits from '../../../web/state/edits.ts';
import { entryOf } from '../../../web/state/entryOf.ts';
import * as door from '../../../web/state/readEnd.ts';

test('until the reader of ends has come the demo stands checked, and no other end: one that is typed waits without a fault, then its faults are said', async () => {
  edits.begin(demoEntry());
  expect(door.canRead.value).toBe(false);
  expect(bench.isCurrent.value).toBe(true);
  const before = bench.lastGood.value;
  edits.write('joint.bolts.rows', '40');
  expect(bench.awaited.value).toBe('coming');
  expect(bench.faults.value).toEqual([]);
  expect(bench.lastGood.value).toBe(before);
  expect(door.readEnd(bench.input.value.input)).toEqual({ faults: [] });
  await vi.waitFor(() => expect(bench.faults.value).toMatchObject([{ path: 'joint.bolts.rows', code: 'too-big' }]));
  expect(bench.faults.value[0]?.text).toMatch(/^Number of bolt rows /);
  expect(door.readEnd(bench.input.value.input)).toEqual(readEnd(bench.input.value.input));
});

test('the demo is read as it stands, and nothing else passes for it', () => {
  edits.begin(demoEntry());
  const { input } = bench.input.value;
  expect(readEnd(input)).toEqual({ end: input });
  expect(isDemo(input)).toBe(true);
  const read = readEnd(input);
  if (!('end' in read)) throw new Error('the demo cannot be read');
  expect(entryOf(read.end)).toEqual(demoEntry());
  for (const other of [{ ...input, reaction: 153 }, { ...input, other: 1 }, {}, null, 'demo', [input]]) {
    expect(isDemo(other)).toBe(false);
  }
});

test('the sections of the demo stand as in the table of their family', () => {
  const { rows: _, excerpt, ...head } = demoSections;
  const { rows: __, ...whole } = ub;
  expect(excerpt).toBe(true);
  expect(head).toEqual(whole);
  const named = readTable(demoSections);
  expect(named.map(({ label }) => label).sort()).toEqual(['356x171x51', '457x191x67']);
  expect(readTable(ub)).toEqual(expect.arrayContaining(named));
});
