import { describe, expect, it } from 'vitest';
import { findGrade, gradeNames, strengthAt } from '../../../core/steel/grades.ts';

describe('the strengths of EN 10025-2 Table 7', () => {
  // Least yield strength at the thickest of each band and just beyond it, MPa.
  it.each([
    ['S235JR', [235, 225, 215, 215, 215, 195]],
    ['S275JR', [275, 265, 255, 245, 235, 225]],
    ['S355JR', [355, 345, 335, 325, 315, 295]],
  ])('%s yields at %j MPa up to 16, 40, 63, 80, 100 and 150 mm', (name, yields) => {
    const limits = [16, 40, 63, 80, 100, 150];
    for (const [i, limit] of limits.entries()) {
      expect(strengthAt(name, limit)?.fy).toBe(yields[i]);
      expect(strengthAt(name, limit + 0.01)?.fy).toBe(yields[i + 1]);
    }
  });

  it.each([
    ['S235JR', 360, 360, 350],
    ['S275JR', 430, 410, 400],
    ['S355JR', 510, 470, 450],
  ])('%s breaks at %d MPa below 3 mm, %d to 100 mm, %d to 150 mm', (name, thin, usual, thick) => {
    expect(strengthAt(name, 2.99)?.fu).toBe(thin);
    expect(strengthAt(name, 3)?.fu).toBe(usual);
    expect(strengthAt(name, 100)?.fu).toBe(usual);
    expect(strengthAt(name, 100.1)?.fu).toBe(thick);
    expect(strengthAt(name, 150)?.fu).toBe(thick);
  });
});

describe('the strengths of SANS 1431', () => {
  it('are 300, 290, 280 MPa and 450 MPa for 300WA, 50 MPa more in yield and 480 MPa for 350WA, to 63 mm', () => {
    expect([16, 40, 63].map((t) => strengthAt('300WA', t))).toEqual([300, 290, 280].map((fy) => ({ fy, fu: 450 })));
    expect([16, 40, 63].map((t) => strengthAt('350WA', t))).toEqual([350, 340, 330].map((fy) => ({ fy, fu: 480 })));
    expect(strengthAt('300WA', 63.1)).toBeUndefined();
  });

  it('are marked as from memory, those of EN 10025-2 as seen', () => {
    expect(findGrade('350WA')).toMatchObject({ basis: 'memory', source: 'SANS 1431' });
    expect(findGrade('S355JR')).toMatchObject({ basis: 'seen' });
  });
});

describe('a strength is never made up', () => {
  it.each([0, -5, 150.01, Number.NaN, Number.POSITIVE_INFINITY])('for a thickness of %d mm', (thickness) => {
    for (const name of gradeNames) expect(strengthAt(name, thickness)).toBeUndefined();
  });

  it('for a grade that is not known', () => {
    expect(strengthAt('S355', 10)).toBeUndefined();
    expect(strengthAt('toString', 10)).toBeUndefined();
  });
});

describe('a grade', () => {
  it.each(['S355JR', 's355jr', 'S355 JR'])('is found as %s', (name) =>
    expect(findGrade(name)).toMatchObject({ name: 'S355JR' }),
  );

  it.each([
    ['S355JO', 'S355JR'],
    ['S275J0', 'S275JR'],
    ['350W', '350WA'],
    ['S350JR', 'S355JR'],
  ])('%s is not known; the nearest is %s', (name, neighbour) => {
    const answer = findGrade(name);
    expect('nearest' in answer && answer.nearest[0]).toBe(neighbour);
  });
});
