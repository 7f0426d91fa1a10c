import { describe, expect, it } from 'vitest';
import { stressFigure } from '../../../core/drawing/stressFigure.ts';
import { sampleFacts, sampleWords, variedEnds } from './sampleFacts.ts';

describe('the figure of shear stress', () => {
  it('shows the full section and what is left behind each cope, each on its own levels', () => {
    const figure = (name: string) => stressFigure(sampleFacts(variedEnds[name]), sampleWords, 210.87).profiles;
    expect(figure('K-207/L').map((one) => [one.name, one.top, one.bottom])).toEqual([
      ['full', 0, 406.4],
      ['tee', 45, 406.4],
    ]);
    expect(figure('two copes, top the longer').map((one) => one.name)).toEqual(['full', 'rectangle', 'tee']);
    expect(figure('channel on a ply').map((one) => one.title)).toEqual(['full channel']);
  });

  it('states peak, mean and the reaction at which the limit is reached', () => {
    // Derived in the rules of SANS 10162-1 for K-207/L at 165 kN: peaks 58.00 and 78.92 of 210.87 MPa.
    // Means 165000/(7.9 x 406.4) = 51.39 and 165000/(7.9 x 361.4) = 57.79 MPa.
    const [full, tee] = stressFigure(sampleFacts(), sampleWords, 210.87).profiles;
    expect([full!.peak.text, tee!.peak.text]).toEqual(['58.0', '78.9']);
    expect([full!.mean.text, tee!.mean.text]).toEqual(['mean 51.4', 'mean 57.8']);
    // 165 x 210.87/58.00 = 599.9, 165 x 210.87/78.92 = 440.9, rounded down from the unrounded peaks.
    expect(full!.limit!.text).toMatch(/^210\.9 at 599\.[89] kN$/);
    expect(tee!.limit!.text).toMatch(/^210\.9 at 440\.[89] kN$/);
  });

  it('peaks on the curve, at the level of the path on the piece, with one scale for all sections', () => {
    for (const { curve, peak } of stressFigure(sampleFacts(), sampleWords, null).profiles) {
      const at = curve.filter((one) => Math.abs(one.y - peak.at) < 1e-9);
      expect(at.some((one) => Math.abs(one.x - peak.share) < 1e-9)).toBe(true);
    }
    const shares = stressFigure(sampleFacts(), sampleWords, null).profiles.map((one) => one.peak.share);
    expect(Math.max(...shares)).toBe(1);
    expect(shares[0]! / shares[1]!).toBeCloseTo(58.0 / 78.92, 3);
  });

  it('has no limit where the standard states none, and a figure where there is no reaction', () => {
    const { profiles } = stressFigure(sampleFacts({ V: 0 }), sampleWords, null);
    expect(profiles.every((one) => one.limit === undefined)).toBe(true);
    expect(profiles[0]!.peak.text).toBe('0.0');
  });
});
