import { type Grade, strengthOf } from '../../steel/grades.ts';
import { namedIn, type Steels } from '../materials.ts';

/** Steels of a table of grades; those from memory are noted. `readAs` turns what people write into the name listed. */
export const steelsOf = (table: readonly Grade[], readAs?: (plain: string) => string): Steels => {
  const byName = new Map(table.map((grade) => [grade.name, grade]));
  const grades = [...byName.keys()];
  return {
    grades,
    named: namedIn(grades, readAs),
    strengthAt: (name, thickness) => {
      const grade = byName.get(name);
      return grade && strengthOf(grade, thickness);
    },
    noteOf: (name) => (byName.get(name)?.basis === 'memory' ? 'memory-grade' : undefined),
  };
};
