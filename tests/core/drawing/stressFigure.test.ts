import { describe, expect, it } from 'vitest';
import { layoutStress } from '../../../core/drawing/layStress.ts';
import { stressFigure } from '../../../core/drawing/stressFigure.ts';
import { contains, pointsOf, textsOf } from './marks.ts';
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
    const { profiles, foot } = stressFigure(sampleFacts({ V: 0 }), sampleWords, null);
    expect(profiles.every((one) => one.limit === undefined)).toBe(true);
    expect(profiles[0]!.peak.text).toBe('0.0');
    expect(foot[0]!.text).not.toContain('limit');
    expect(layoutStress({ profiles, foot }, { textHeight: 12, width: 60 }).marks.length).toBeGreaterThan(50);
  });

  it('is drawn on the levels of the piece, inside its box, no word on another', () => {
    for (const [name, sample] of Object.entries(variedEnds)) {
      const figure = stressFigure(sampleFacts(sample), sampleWords, 210.87);
      const laid = layoutStress(figure, { textHeight: 12.6, width: 50 });
      for (const point of laid.marks.flatMap(pointsOf)) expect(contains(laid.box, point), name).toBe(true);
      const base = laid.marks.find((one) => one.shape === 'run' && one.kind === 'outline' && one.to.length === 1)!;
      expect(pointsOf(base).map((one) => one.y)).toEqual([figure.profiles[0]!.top, figure.profiles[0]!.bottom]);
      const texts = textsOf(laid);
      texts.forEach((a, i) => {
        for (const b of texts.slice(i + 1)) {
          const apart = a.box.right <= b.box.left + 1e-6 || b.box.right <= a.box.left + 1e-6;
          const over = a.box.bottom <= b.box.top + 1e-6 || b.box.bottom <= a.box.top + 1e-6;
          expect(apart || over, `${name}: ${a.text} on ${b.text}`).toBe(true);
        }
      });
    }
  });

  it('draws the limit as a line only where it stands near the peak', () => {
    const dashed = (V: number): number => {
      const laid = layoutStress(stressFigure(sampleFacts({ V }), sampleWords, 210.87), { textHeight: 12, width: 60 });
      return laid.marks.filter((one) => one.shape === 'run' && one.kind === 'hidden').length;
    };
    expect(dashed(165_000)).toBe(2);
    expect(dashed(430_000)).toBe(4);
  });
});
