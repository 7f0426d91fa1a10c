import { describe, expect, test } from 'vitest';
import { standards } from '../../../core/standards/index.ts';
import { optionName, optionValue } from '../../../core/words/optionWords.ts';

describe('options in words', () => {
  test.each(Object.values(standards))(
    'every option of $title and every value of it has words of its own',
    ({ options }) => {
      for (const [key, values] of Object.entries(options)) {
        expect(optionName(key)).toMatch(/^[A-Z][a-z ,]+$/);
        const words = values.map(optionValue);
        expect(new Set(words).size).toBe(values.length);
        for (const one of words) expect(one).toMatch(/^[a-z ]+$/);
      }
    },
  );

  test('the name of a value never reaches people in place of its words', () => {
    expect(optionName('web-block')).toBe('Block tearing, web');
    expect(optionValue('report')).toBe('for information');
    expect(optionValue('verdict')).toBe('counts in the verdict');
  });
});
