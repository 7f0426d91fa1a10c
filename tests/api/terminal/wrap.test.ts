import fc from 'fast-check';
import { expect, test } from 'vitest';
import { setColumns } from '../../../api/terminal/columns.ts';
import { hanging, widthOf, wrap } from '../../../api/terminal/wrap.ts';

const text = fc
  .array(fc.constantFrom('a', 'bb', 'ccc', '×', 'φ_b', 'x'.repeat(30), ' '))
  .map((parts) => parts.join(' '));

test('a wrapped text keeps its words in order and within the width', () => {
  fc.assert(
    fc.property(text, fc.integer({ min: 5, max: 40 }), (given, width) => {
      const lines = wrap(given, width);
      for (const line of lines) expect(widthOf(line)).toBeLessThanOrEqual(width);
      expect(lines.join('').replace(/\s/g, '')).toBe(given.replace(/\s/g, ''));
    }),
  );
});

test('a hanging text is set in behind its lead', () => {
  expect(hanging('Lead: ', 'one two three', 12)).toEqual(['Lead: one', '      two', '      three']);
});

test('columns line up over all blocks, and a sentence under a row stands set in', () => {
  const columns = [
    { align: 'left', gap: 0 },
    { align: 'left', gap: 1, share: 1 },
    { align: 'right', gap: 2 },
  ] as const;
  const blocks = [[{ cells: ['A', 'first', '1.0'] }], [{ cells: ['BBB', 'second', '10.0'], under: 'why' }]];
  expect(setColumns(columns, blocks)).toEqual([['A   first    1.0'], ['BBB second  10.0', '        why']]);
});
