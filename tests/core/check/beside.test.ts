import { describe, expect, test } from 'vitest';
import { type Beside, besideOf } from '../../../core/check/besideOf.ts';
import { examine } from '../../../core/check/examine.ts';
import type { Check } from '../../../core/check/report.ts';
import { standards } from '../../../core/standards/index.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';

const { end: example } = goodEnds().find(({ name }) => name === 'example')!;
const ids = Object.keys(standards);

const besideFound = (end: Record<string, unknown>, first: string, beside: { standard: string; reaction?: number }) => {
  const whole = { ...underStandard(end, standards[first]!), sheet: { beside } };
  const found = examine(whole, { working: false });
  if ('faults' in found) throw new Error(found.faults.map(({ text }) => text).join(' '));
  return { first: found.examined, second: besideOf(found.examined) };
};

const second = (...given: Parameters<typeof besideFound>): Beside => {
  const { second: found } = besideFound(...given);
  if (!found || 'faults' in found) throw new Error('no second ladder');
  return found;
};

const check = ({ examined }: Beside, id: string): Check => examined.report.checks.find((one) => one.id === id)!;
const pairs = ids.flatMap((one) => ids.filter((other) => other !== one).map((other) => [one, other] as const));

describe('a second standard beside the first', () => {
  test.each(pairs)(
    '%s beside %s: takes the steel and bolt strengths of the first, with its own holes',
    (one, other) => {
      const { first, second: found } = besideFound(example, one, { standard: other });
      if (!found || 'faults' in found) throw new Error('no second ladder');
      const { facts, report } = found.examined;
      for (const name of ['fy', 'fu', 'fyf', 'fyp', 'fup', 'fub'] as const) expect(facts[name]).toBe(first.facts[name]);
      expect(report.notes[0]).toMatchObject({ code: 'strengths-carried' });
      expect(report.notes[0]!.text).toContain(first.report.standard.title);
      expect(report.standard.id).toBe(other);
      expect(facts.dn).toBe(standards[other]!.materials.netHole(facts.d0, 'drilled', facts.d));
    },
  );

  test('is the very report that it gives alone where the strengths are given as numbers', () => {
    const strengths = { fy: 345, fu: 450 };
    const joint = example.joint as Record<string, Record<string, unknown>>;
    const numbers = {
      ...example,
      beam: { section: 'UB 406x178x60', grade: strengths },
      joint: { ...joint, bolts: { ...joint.bolts, grade: { fu: 830 } }, plate: { ...joint.plate, grade: strengths } },
    };
    const beside = second(numbers, 'sans-10162-1', { standard: 'csa-s16' });
    const alone = examine(underStandard(numbers, standards['csa-s16']!), { working: false });
    expect('examined' in alone && alone.examined.report.checks).toEqual(beside.examined.report.checks);
  });

  test('a bolt grade that both list does not refer in the second', () => {
    const { end } = goodEnds().find(({ name }) => name.startsWith('aisc-360'))!;
    const beside = second(end, 'aisc-360-lrfd', { standard: 'aisc-360-asd', reaction: 20 });
    expect(check(beside, 'bolt-shear').reason ?? '').not.toBe('bolt-not-listed');
  });

  test('a bolt size that the second does not know makes its bolt rungs refer, never fail', () => {
    const { end } = goodEnds().find(({ name }) => name.startsWith('aisc-360'))!;
    for (const other of ['en-1993', 'as-4100', 'is-800']) {
      const rung = check(second(end, 'aisc-360-lrfd', { standard: other }), 'bolt-shear');
      expect([other, rung.state]).toEqual([other, 'refer']);
    }
  });
});

describe('across levels', () => {
  const beside = (reaction?: number) =>
    second({ ...example, tie: 40 }, 'sans-10162-1', {
      standard: 'aisc-360-asd',
      ...(reaction !== undefined && { reaction }),
    });

  test('without a reaction at its level: strengths only, no state that a reaction would settle', () => {
    const found = beside();
    expect(found.stated).toBe(false);
    for (const one of found.examined.report.checks.filter(({ reactionAtFailure }) => reactionAtFailure !== undefined)) {
      expect(['information', 'refer', 'notApplicable']).toContain(one.state);
      expect(one.utilisation).toBeNull();
    }
    expect(check(found, 'bolt-shear').reactionAtFailure).toBeGreaterThan(0);
  });

  test('with a reaction at its level it judges by that one', () => {
    const found = beside(100);
    expect(found.stated).toBe(true);
    expect(found.examined.report.reaction).toBe(100);
    expect(found.examined.report.level).toBe('service');
    const { utilisation, reactionAtFailure } = check(found, 'web-block');
    expect(utilisation).toBeCloseTo(100 / reactionAtFailure!, 12);
  });

  test('the tie force is left out, and this is said', () => {
    expect(check(beside(100), 'web-tie')).toMatchObject({ state: 'notApplicable', reason: 'tie-other-level' });
  });

  describe('with a beam opposite', () => {
    const { end: pair } = goodEnds().find(({ name }) => name === 'double-cleat-other-beam')!;
    const under = (standard: string, support: Record<string, unknown> = {}) => {
      const whole = { ...pair, tie: 0, support: { ...(pair.support as object), ...support } };
      return second(whole, 'aisc-360-asd', { standard, reaction: 165 });
    };
    const withheldIn = ({ examined }: Beside) =>
      examined.report.checks.filter(({ reason }) => reason === 'opposite-other-level').map(({ id }) => id);

    test('what it takes part in refers without a number, as its reaction stands at the other level; all else is as alone', () => {
      expect(withheldIn(under('sans-10162-1')).sort()).toEqual(['support-bearing', 'support-shear']);
      expect(withheldIn(under('aisc-360-lrfd')).sort()).toEqual(['cleat-bearing', 'support-bearing', 'support-shear']);
      const found = under('sans-10162-1');
      expect(check(found, 'support-shear')).toMatchObject({ state: 'refer', reactionAtFailure: null, demand: null });
      const alone = under('sans-10162-1', { otherReaction: 0 });
      expect(withheldIn(alone)).toEqual([]);
      expect(check(found, 'cleat-block')).toEqual(check(alone, 'cleat-block'));
      expect(found.examined.report.verdict).not.toBe('holds');
    });

    test('the first of the other checks governs; what V alone uses up fails', () => {
      const thin = { section: undefined, thickness: 1 };
      const found = under('sans-10162-1', thin).examined.report;
      expect(found.checks.find(({ id }) => id === 'support-shear')!.state).toBe('fails');
      const { governing, capacity } = under('sans-10162-1', { section: undefined, thickness: 3 }).examined.report;
      expect(governing).not.toMatch(/^support/);
      expect(capacity).toBe(under('sans-10162-1', { otherReaction: 0 }).examined.report.capacity);
    });

    test("behind a column's flange it takes part in nothing", () => {
      const flange = { kind: 'column-flange', section: undefined, thickness: 12, topOfSteel: undefined };
      expect(withheldIn(under('sans-10162-1', flange))).toEqual([]);
    });
  });
});

describe('what cannot stand beside', () => {
  test('an unknown standard, or the first itself, is a fault; the first is unharmed', () => {
    for (const [standard, code] of [
      ['sans-10162-9', 'unknown-standard'],
      ['sans-10162-1', 'same-standard'],
    ] as const) {
      const { first, second: found } = besideFound(example, 'sans-10162-1', { standard });
      expect(found && 'faults' in found && found.faults[0]).toMatchObject({ code, path: 'sheet.beside.standard' });
      expect(first.report.capacity).toBeGreaterThan(0);
    }
  });

  test('no second standard named, no second ladder', () => {
    const found = examine(example, { working: false });
    expect('examined' in found && besideOf(found.examined)).toBeNull();
  });

  test('a least action of the first is not the reaction of the second', () => {
    const found = second({ ...example, reaction: 5 }, 'as-4100', { standard: 'sans-10162-1' });
    expect(found.examined.report.reaction).toBe(5);
  });
});
