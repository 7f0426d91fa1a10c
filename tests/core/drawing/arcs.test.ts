import { describe, expect, it } from 'vitest';
import { chords, swept } from '../../../core/drawing/arcs.ts';

describe('arcs', () => {
  const quarter = { to: { x: 0, y: 10 }, radius: 10, clockwise: true };

  it('are known by centre and sweep, clockwise as seen with heights running down', () => {
    const it = swept({ x: 10, y: 0 }, quarter)!;
    expect(it.centre.x).toBeCloseTo(0, 12);
    expect(it.centre.y).toBeCloseTo(0, 12);
    expect(it.sweep).toBeCloseTo(Math.PI / 2, 12);
    const back = swept({ x: 10, y: 0 }, { ...quarter, clockwise: false })!;
    expect(back.centre).toEqual({ x: 10, y: 10 });
    expect(back.sweep).toBeCloseTo(-Math.PI / 2, 12);
  });

  it('are followed by chords within a twentieth of the radius, both ends included', () => {
    const points = chords({ x: 10, y: 0 }, [quarter]);
    expect(points[0]).toEqual({ x: 10, y: 0 });
    expect(points.at(-1)).toEqual({ x: 0, y: 10 });
    points.slice(1).forEach((point, i) => {
      const last = points[i]!;
      const middle = Math.hypot((point.x + last.x) / 2, (point.y + last.y) / 2);
      expect(Math.abs(middle - 10)).toBeLessThan(0.5);
    });
  });

  it('take a radius too small for their ends as a straight line', () => {
    const flat = { to: { x: 20, y: 0 }, radius: 3, clockwise: true };
    expect(swept({ x: 0, y: 0 }, flat)).toBeNull();
    expect(chords({ x: 0, y: 0 }, [flat])).toEqual([
      { x: 0, y: 0 },
      { x: 20, y: 0 },
    ]);
  });
});
