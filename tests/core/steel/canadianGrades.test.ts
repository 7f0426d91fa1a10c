import { describe, expect, it } from 'vitest';
import { canadianGrade, canadianGradeNames } from '../../../core/steel/canadianGrades.ts';
import { strengthOf } from '../../../core/steel/grades.ts';

const at = (name: string, thickness: number) => {
  const grade = canadianGrade(name);
  return grade && strengthOf(grade, thickness);
};

describe('the strengths of Canadian lists', () => {
  // S16-14 course notes of Carleton University, 2020 (T07, T08, F10): 300W 300/450, 350W 350/450, A992 345; the others from memory.
  it.each([
    ['260W', 260, 410, 'memory'],
    ['300W', 300, 450, 'seen'],
    ['350W', 350, 450, 'seen'],
    ['A992', 345, 450, 'seen'],
    ['A572-50', 345, 450, 'memory'],
    ['A36', 250, 400, 'memory'],
  ])('%s yields at %d and breaks at %d MPa (%s)', (name, fy, fu, basis) => {
    expect(at(name, 10)).toEqual({ fy, fu });
    expect(at(name, 100)).toEqual({ fy, fu });
    expect(canadianGrade(name)).toMatchObject({ basis });
  });

  it('of G40.21 end at 100 mm, those of ASTM at 150 mm', () => {
    expect(at('350W', 100.1)).toBeUndefined();
    expect(at('A992', 150)).toBeDefined();
    for (const name of canadianGradeNames) expect(at(name, 150.1)).toBeUndefined();
  });

  it('are none for a name that is no such grade', () => {
    expect(canadianGrade('S355')).toBeUndefined();
    expect(canadianGrade('constructor')).toBeUndefined();
  });
});
