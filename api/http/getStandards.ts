import { standards } from '../../core/standards/index.ts';
import { commonwealth } from '../../core/words/commonwealth.ts';
import { json } from './reply.ts';
import type { Handler } from './route.ts';

const listed = Object.values(standards).map(({ id, title, edition, level, options, materials }) => ({
  id,
  title,
  edition,
  level,
  options,
  grades: materials.sections.grades,
  plateGrades: materials.plates.grades,
  boltGrades: materials.boltGrades,
}));

/** The design standards that an end can name, with their options and grades. */
export const getStandards: Handler = () => json({ standards: listed, bases: commonwealth.bases });
