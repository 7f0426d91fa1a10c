import { describe, expect, it } from 'vitest';
import { chords, cubics, swept } from '../../../core/drawing/arcs.ts';

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

  it('keep within a thousandth of the radius as cubic curves', () => {
    const [curve] = cubics({ x: 10, y: 0 }, quarter);
    const at = (t: number, axis: 'x' | 'y') =>
      (1 - t) ** 3 * (axis === 'x' ? 10 : 0) +
      3 * (1 - t) ** 2 * t * curve!.c1[axis] +
      3 * (1 - t) * t ** 2 * curve!.c2[axis] +
      t ** 3 * curve!.to[axis];
    for (const t of [0.25, 0.5, 0.75]) expect(Math.abs(Math.hypot(at(t, 'x'), at(t, 'y')) - 10)).toBeLessThan(0.01);
  });

  it('take a radius too small for their ends as a straight line', () => {
    const flat = { to: { x: 20, y: 0 }, radius: 3, clockwise: true };
    expect(swept({ x: 0, y: 0 }, flat)).toBeNull();
    expect(chords({ x: 0, y: 0 }, [flat])).toEqual([
      { x: 0, y: 0 },
      { x: 20, y: 0 },
    ]);
    expect(cubics({ x: 0, y: 0 }, flat)).toHaveLength(1);
  });
});
