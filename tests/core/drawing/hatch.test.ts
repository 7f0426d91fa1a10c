import { describe, expect, it } from 'vitest';
import { hatchLines } from '../../../core/drawing/hatch.ts';

const square = [
  { x: 0, y: 0 },
  { x: 100, y: 0 },
  { x: 100, y: 100 },
  { x: 0, y: 100 },
];
const hole = { kind: 'outline', centre: { x: 50, y: 50 }, radius: 20 } as const;

describe('hatching', () => {
  it('runs at 45 degrees inside the area, evenly spaced', () => {
    const lines = hatchLines(square, 5, []);
    expect(lines.length).toBe(Math.floor((100 * Math.SQRT2) / 5));
    for (const [a, b] of lines) {
      expect(a.x + a.y).toBeCloseTo(b.x + b.y, 9);
      for (const p of [a, b]) expect(Math.min(p.x, p.y)).toBeGreaterThanOrEqual(-1e-9);
    }
  });

  it('covers the area but for its holes', () => {
    // Length of hatch times spacing is the area: 100 x 100 - pi 20^2, within the spacing's own coarseness.
    const spacing = 0.5;
    const sum = hatchLines(square, spacing, [hole]).reduce((all, [a, b]) => all + Math.hypot(b.x - a.x, b.y - a.y), 0);
    expect(sum * spacing).toBeGreaterThan((10000 - Math.PI * 400) * 0.995);
    expect(sum * spacing).toBeLessThan((10000 - Math.PI * 400) * 1.005);
    for (const [a, b] of hatchLines(square, spacing, [hole])) {
      expect(Math.hypot((a.x + b.x) / 2 - 50, (a.y + b.y) / 2 - 50)).toBeGreaterThan(19.9);
    }
  });

  it('leaves an area without extent empty', () => {
    expect(
      hatchLines(
        [
          { x: 0, y: 0 },
          { x: 0, y: 0 },
        ],
        5,
        [],
      ),
    ).toEqual([]);
  });
});
