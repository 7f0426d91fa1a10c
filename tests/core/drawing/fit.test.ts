import { describe, expect, it } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import { fitToScale, fitToWindow, paperScales } from '../../../core/drawing/fit.ts';
import { sampleFacts, sampleWords, variedEnds } from './sampleFacts.ts';

const draw = (name: string) => drawEnd(sampleFacts(variedEnds[name]), sampleWords);
const size = ({ laid, scale }: ReturnType<typeof fitToWindow>) => ({
  width: (laid.box.right - laid.box.left) * scale,
  height: (laid.box.bottom - laid.box.top) * scale,
});

describe('fitting a drawing', () => {
  it('fills the bench’s window in one direction and passes it in neither, for every end', () => {
    const window = { width: 430, height: 600, textSize: 14.5 };
    for (const name of Object.keys(variedEnds)) {
      const fitted = fitToWindow(draw(name), window, { values: 'gap' }, 10);
      const { width, height } = size(fitted);
      expect(fitted.fits, name).toBe(true);
      expect(width).toBeLessThanOrEqual(430);
      expect(height).toBeLessThanOrEqual(600);
      expect(Math.max(width / 430, height / 600), name).toBeGreaterThan(0.85);
      expect(fitted.laid.textHeight * fitted.scale).toBeCloseTo(14.5, 9);
    }
  });

  it('fits the window of a telephone', () => {
    for (const width of [290, 360]) {
      const fitted = fitToWindow(draw('K-207/L'), { width, height: 620, textSize: 14 }, { values: 'gap' }, 1.6);
      expect(fitted.fits).toBe(true);
      expect(size(fitted).width / width).toBeGreaterThan(0.9);
    }
  });

  it('never draws a small piece larger than it is told', () => {
    const window = { width: 2000, height: 2000, textSize: 14 };
    expect(fitToWindow(draw('one bolt'), window, { values: 'gap' }, 1.6).scale).toBe(1.6);
  });

  it('takes the largest standard scale that fits the sheet', () => {
    const window = { width: 112, height: 113, textSize: 2.5 / 0.7 };
    const fitted = fitToScale(draw('K-207/L'), window, { values: 'parallel' });
    expect(fitted.scale).toBe(1 / 5);
    expect(fitted.fits).toBe(true);
    const deep = fitToScale(draw('deep, three columns of eight'), { ...window, height: 122 }, { values: 'parallel' });
    expect(deep.scale).toBe(1 / 10);
  });

  it('says so where not even the smallest scale fits', () => {
    const fitted = fitToScale(draw('K-207/L'), { width: 20, height: 20, textSize: 3.5 }, { values: 'parallel' });
    expect(fitted.fits).toBe(false);
    expect(fitted.scale).toBe(paperScales.at(-1));
    const bench = fitToWindow(draw('K-207/L'), { width: 60, height: 60, textSize: 14.5 }, { values: 'gap' }, 2);
    expect(bench.fits).toBe(false);
    expect(bench.scale).toBeGreaterThan(0);
  });
});
