import { expect, test, vi } from 'vitest';
import * as bench from '../../../web/state/bench.ts';
import { demoEntry } from '../../../web/state/demo.ts';
import * as edits from '../../../web/state/edits.ts';
import { withText } from '../../../web/state/entry.ts';

const codes = () => bench.faults.value.map(({ code }) => code);
const under = (section: string) => withText(demoEntry(), 'beam.section', section);

test('a section of a family that is still to come is never called unknown; once all have come, one that none has is', async () => {
  edits.begin(demoEntry());
  expect(bench.isCurrent.value).toBe(true);
  edits.begin(under('W18x40'));
  expect(bench.awaited.value).toBe('coming');
  expect(bench.faults.value).toEqual([]);
  edits.write('beam.section', 'UB 1');
  expect(codes()).toEqual([]);
  await vi.waitFor(() => expect(codes()).toEqual(['unknown-section']));
  edits.write('beam.section', 'W18x40');
  expect(codes()).not.toContain('unknown-section');
});
