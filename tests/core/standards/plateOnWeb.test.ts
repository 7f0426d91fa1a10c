import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { standards } from '../../../core/standards/index.ts';
import { changed } from '../../support/changed.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';

/** UB 406x178x60 in S355: h 406.4, t_f 12.8, r 10.2, so 406.4 − 2 × 23 = 360.4 of plain web. Invented. */
const whole = goodEnds().find(({ name }) => name.startsWith('full-end-plate'))!.end;

describe.each(Object.values(standards))('an end plate of the full depth, $id', (standard) => {
  const failsAt = (change: Record<string, unknown>): (number | null | undefined)[] => {
    const outcome = checkEnd(underStandard(changed(whole, change), standard));
    if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
    const { checks } = outcome.report;
    return ['weld-web', 'endplate-web-shear'].map((id) => checks.find((one) => one.id === id)?.reactionAtFailure);
  };

  test('carries along the web what a plate of the clear web between the fillets does, and no more where it is deeper', () => {
    const clear = failsAt({
      joint: { kind: 'end-plate', plate: { depth: 360.4, top: 23 }, supportBolts: { topEdge: 60 } },
    });
    const own = failsAt({});
    expect(own.every((one) => typeof one === 'number')).toBe(true);
    own.forEach((one, at) => {
      expect(one! / clear[at]!).toBeCloseTo(1, 9);
    });
    expect(failsAt({ joint: { plate: { depth: 445 } } })).toEqual(own);
  });
});
