import { describe, expect, it } from 'vitest';
import { force, length, reaction, stress } from '../../../core/drawing/sizes.ts';

describe('sizes on the drawing', () => {
  it('are plain millimetres without closing zeros', () => {
    expect([110, 361.4, 12.75, 0].map((mm) => length(mm, 'mm-kN'))).toEqual(['110', '361.4', '12.75', '0']);
  });

  it('are inches in sixteenths, lowest terms, where the value is one; else with decimals', () => {
    const inches = [1, 1.5, 0.25, 3.0625, 2.75, 0.3, 10.1].map((value) => length(value * 25.4, 'in-kip'));
    expect(inches).toEqual(['1', '1\u00a01/2', '1/4', '3\u00a01/16', '2\u00a03/4', '0.3', '10.1']);
    expect(length(-0.5 * 25.4, 'in-kip')).toBe('\u22121/2');
  });

  it('state forces and stresses to a tenth, the reaction as it was given', () => {
    expect(force(85_012, 'mm-kN')).toBe('85.0');
    expect(force(4448.2216152605, 'in-kip')).toBe('1.0');
    expect(stress(6.894757293168361, 'in-kip')).toBe('1.0');
    expect(reaction(165_000, 'mm-kN')).toBe('165');
    expect(reaction(162_750, 'mm-kN')).toBe('162.75');
  });
});
