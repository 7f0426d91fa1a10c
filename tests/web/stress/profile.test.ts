import { describe, expect, test } from 'vitest';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { drawingWords } from '../../../web/piece/drawingWords.ts';
import { profilesOf, reachOf } from '../../../web/stress/profile.ts';
import { demo } from '../ladder/demoEnds.ts';

const profiles = (parts: Record<string, unknown> = {}) => {
  const it = demo(parts);
  return { it, all: profilesOf(it, drawingWords(it, commonwealth)) };
};

const both = { top: { length: 150, depth: 45, radius: 10 }, bottom: { length: 110, depth: 40, radius: 10 } };

describe('stress profiles', () => {
  test('a notched end has the full and the cut section, each with the working of its own check', () => {
    const { all } = profiles();
    expect(all.map(({ name, check }) => [name, check?.id])).toEqual([
      ['full', 'stress-full'],
      ['tee', 'stress-cope'],
    ]);
  });

  test('peaks and first yield are those of the report', () => {
    const { it, all } = profiles();
    it.report.shape.sections.forEach(({ peakStress, firstYieldReaction, peakAt }, at) => {
      expect(all[at]!.peak.text).toBe(peakStress.toFixed(1));
      expect(all[at]!.peak.at).toBeCloseTo(peakAt, 9);
      expect(Number.parseFloat(all[at]!.firstYield)).toBeLessThanOrEqual(firstYieldReaction);
      expect(Number.parseFloat(all[at]!.firstYield)).toBeGreaterThan(firstYieldReaction - 0.1);
    });
  });

  test('with notches of two lengths there are three, and only the one that the check speaks of opens its working', () => {
    const { it, all } = profiles(both);
    expect(all.map(({ name }) => name)).toEqual(['full', 'rectangle', 'tee']);
    const cope = it.report.checks.find(({ id }) => id === 'stress-cope')!;
    expect(all.filter(({ check }) => check === cope).map(({ name }) => name)).toEqual([cope.of]);
  });

  test('where an option makes the stress a way of failing its working stands on the ladder, not here', () => {
    const { all } = profiles({ options: { 'elastic-shear': 'verdict' } });
    expect(all.every(({ check }) => check === null)).toBe(true);
    expect(all.every(({ limitText }) => limitText === '210.9')).toBe(true);
  });

  test('a limit far beyond the peaks stands off the scale, a near one on it', () => {
    expect(reachOf(profiles().all)).toBe(1);
    // 210.87 MPa over a peak of 78.92 MPa at 165 kN: at 400 kN the peak is 191.3, the limit 1.10 times as much.
    expect(reachOf(profiles({ reaction: 400 }).all)).toBeCloseTo(1.102, 3);
  });

  test('an end without load still has its curves, at no stress', () => {
    for (const { peak, curve } of profiles({ reaction: 0 }).all) {
      expect(peak.text).toBe('0.0');
      expect(curve.some(({ x }) => x > 0.5)).toBe(true);
    }
  });
});
