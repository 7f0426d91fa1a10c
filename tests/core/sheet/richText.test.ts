import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Run, richText } from '../../../core/sheet/richText.ts';

/** Italic in slashes, subscript in brackets, raised in braces. */
const seen = (runs: readonly Run[]) =>
  runs
    .map(({ text, italic, sub, sup }) => {
      if (italic) return `/${text}/`;
      if (sub) return `[${text}]`;
      return sup ? `{${text}}` : text;
    })
    .join('');

const set = (line: string) => seen(richText(line));
const prose = (line: string) => seen(richText(line, 'prose'));

describe('formulas set from plain symbols', () => {
  it('set symbols italic, subscripts upright and lowered, numbers and signs upright', () => {
    expect(set('0.60 φ_b A_b f_ub × 0.70')).toBe('0.60 /φ/[b] /A/[b] /f/[ub] × 0.70');
    expect(set('A_gv − (n − 0.5) d′ t')).toBe('/A/[gv] − (/n/ − 0.5) /d/′ /t/');
    expect(set('V √((z y_max / Σy²)² + (1 / n)²)')).toBe('/V/ √((/z/ /y/[max] / /Σy/²)² + (1 / /n/)²)');
  });

  it('keep a subscript with a comma in one piece', () => {
    expect(set('V_eff,1,Rd + x')).toBe('/V/[eff,1,Rd] + /x/');
    expect(set('V_eff,Rd ≤ F_v,Ed')).toBe('/V/[eff,Rd] ≤ /F/[v,Ed]');
    expect(set('min(A_nv; A_gv)')).toBe('min(/A/[nv]; /A/[gv])');
  });

  it('read a Greek factor before a Latin symbol as two symbols', () => {
    expect(set('φR_n = φ R_n')).toBe('/φR/[n] = /φ/ /R/[n]');
  });

  it('raise an exponent that is no whole number', () => {
    expect(set('(z / L)^1.5')).toBe('(/z/ / /L/){1.5}');
  });

  it('leave names of functions and of methods upright', () => {
    expect(set('max(0.6 f_y; 12) by bisection')).toBe('max(0.6 /f/[y]; 12) by bisection');
  });
});

describe('prose with symbols in it', () => {
  it('sets symbols but no words and no units', () => {
    expect(prose('No axial force with V.')).toBe('No axial force with /V/.');
    expect(prose('a coped I of 9.1 kN m, d_0 22, φ 0.90')).toBe('a coped I of 9.1 kN m, /d/[0] 22, /φ/ 0.90');
    expect(prose('S355JR, M20 8.8, UB 406 × 178')).toBe('S355JR, M20 8.8, UB 406 × 178');
  });
});

describe('every text', () => {
  it('keeps all its characters in their order, only _ and ^ before a subscript or exponent are dropped', () => {
    fc.assert(
      fc.property(
        fc.string({ unit: 'binary' }),
        fc.constantFrom('formula' as const, 'prose' as const),
        (line, manner) => {
          const back = richText(line, manner)
            .map(({ text, sub, sup }) => (sub ? `_${text}` : sup ? `^${text}` : text))
            .join('');
          expect(back).toBe(line);
        },
      ),
    );
  });
});
