import { describe, expect, test } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { standards } from '../../../core/standards/index.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';

type Json = Record<string, unknown>;

const endOf = (name: string): Json => goodEnds().find((one) => one.name === name)!.end;
const single = endOf('single-cleat');
const welded = endOf('double-cleat-support-welded');
const webWelded = endOf('double-cleat-web-welded');

const checkOf = (id: string, end: Json, change: Json, check: string): Check =>
  reportOf(underStandard(changed(end, change), standards[id]!), false).checks.find((one) => one.id === check)!;

describe('one cleat alone', () => {
  test.each(['sans-10162-1', 'csa-s16', 'as-4100', 'is-800'])(
    '%s: a support that V alone tears fails, whatever the beam opposite brings',
    (id) => {
      const thin = (otherReaction: number) => ({
        support: { kind: 'beam-web', thickness: 2, grade: 'S355JR', otherReaction },
      });
      const state = (reaction: number, opposite: number) =>
        checkOf(id, single, { reaction, ...thin(opposite) }, 'support-bearing').state;
      expect([state(10, 0), state(10, 10)]).toEqual(['holds', 'refer']);
      expect([state(100, 0), state(100, 10)]).toEqual(['fails', 'fails']);
    },
  );

  // V stands in the middle of the web, 90 + 7.9/2 from the weld; of a pair at the faces of the web, 90 from it
  test.each([
    ['sans-10162-1', 220],
    ['csa-s16', 220],
    ['as-4100', 220],
    ['en-1993', 220 - 12 / Math.SQRT2],
    ['en-1993-uk', 220 - 12 / Math.SQRT2],
  ])('%s: welded to its support it carries less than half of a pair', (id, length) => {
    const { reactionAtFailure: two } = checkOf(id, welded, {}, 'weld');
    const { reactionAtFailure: one } = checkOf(id, welded, { joint: { kind: 'single-cleat' } }, 'weld');
    expect(two! / one!).toBeCloseTo((2 * Math.hypot(length, 6 * 93.95)) / Math.hypot(length, 6 * 90), 9);
  });

  test('is-800: likewise, by the plain sum that exempts from the combination', () => {
    const { reactionAtFailure: two } = checkOf('is-800', welded, {}, 'weld');
    const { reactionAtFailure: one } = checkOf('is-800', welded, { joint: { kind: 'single-cleat' } }, 'weld');
    const used = (arm: number) => Math.min(Math.hypot((6 * arm) / 208, Math.sqrt(3)), (6 * arm) / 208 + 1);
    expect(two! / one!).toBeCloseTo((2 * used(93.95)) / used(90), 9);
  });
});

describe('a fillet along the toe of a cleat', () => {
  test.each(Object.keys(standards))('%s: larger than the cleat is thick it refers where it would hold', (id) => {
    const toSupport = (leg: number) => ({ reaction: 40, joint: { cleat: { thickness: 8, supportWeld: { leg } } } });
    const toWeb = (leg: number) => ({ reaction: 40, joint: { cleat: { thickness: 8, webWeld: { leg } } } });
    const reasons = (leg: number) => [
      checkOf(id, welded, toSupport(leg), 'weld').reason,
      checkOf(id, webWelded, toWeb(leg), 'weld-web').reason,
    ];
    expect(reasons(8.5)).toEqual(['weld-above-edge', 'weld-above-edge']);
    expect(reasons(6)).not.toContain('weld-above-edge');
    expect(checkOf(id, welded, { ...toSupport(8.5), reaction: 5000 }, 'weld').state).not.toBe('holds');
  });
});
