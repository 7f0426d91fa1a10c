import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findSection } from '../../../core/steel/findSection.ts';
import { suggestSections } from '../../../web/field/suggest.ts';

describe('names offered while a section is typed', () => {
  test('the sizes typed come first, with or without the letters of the family', () => {
    expect(suggestSections('ub406x178')).toContain('UB 406x178x60');
    expect(
      suggestSections('406 x 178')
        .slice(0, 2)
        .every((name) => name.startsWith('UB 406x178')),
    ).toBe(true);
    expect(suggestSections('406×178')).toEqual(suggestSections('406x178'));
  });

  test('where few names hold what is typed, the nearest are offered too', () => {
    expect(suggestSections('UB 406x178x61')).toContain('UB 406x178x60');
  });

  test('every name offered is one the library knows, never more than eight, whatever is typed', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.string({ unit: fc.constantFrom(...'UBHEAIPW0123456789x× .') })), (text) => {
        const names = suggestSections(text);
        expect(names.length).toBeLessThanOrEqual(8);
        for (const name of names) expect(findSection(name)).toHaveProperty('designation');
      }),
    );
    expect(suggestSections('  ')).toEqual([]);
  });
});
