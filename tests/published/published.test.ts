import { describe, expect, test } from 'vitest';
import { compared } from '../support/compare.ts';
import { publishedFixtures } from '../support/published.ts';

describe.each(publishedFixtures())('$id: $says', (fixture) => {
  test.each(compared(fixture))(
    '$expectation.check $expectation.field $expectation.row: $expectation.value $expectation.unit',
    (one) => {
      const { expectation, ours, check } = one;
      expect(Math.abs(ours - expectation.value), `ours ${ours}; ${fixture.source}`).toBeLessThanOrEqual(
        expectation.within,
      );
      expect(check.of ?? '').toBe(expectation.of ?? check.of ?? '');
      const unit = expectation.row ? check.working?.find(({ symbol }) => symbol === expectation.row)?.unit : check.unit;
      if (!expectation.way && expectation.field !== 'utilisation' && expectation.field !== 'reactionAtFailure')
        expect(unit).toBe(expectation.unit);
    },
  );

  test('says where it comes from and why a difference is allowed', () => {
    expect(fixture.source.length).toBeGreaterThan(20);
    for (const { why, sum } of fixture.expect) {
      expect(why).not.toBe('');
      if (fixture.standing === 'hand') expect(sum ?? '', 'a hand value shows its sum').not.toBe('');
    }
  });
});
