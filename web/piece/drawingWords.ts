import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { DrawingWords } from '../../core/drawing/words.ts';
import { fittingOf, supportBoltsOf, webBoltsOf } from '../../core/end/jointParts.ts';
import { standards } from '../../core/standards/known.ts';
import { fieldName, type Words } from '../../core/words/words.ts';

/** What the drawing of an end writes beside its sizes. */
export const drawingWords = ({ end, designation, report }: ExaminedNumbers, words: Words): DrawingWords => {
  const bolts = webBoltsOf(end.joint)?.bolts ?? supportBoltsOf(end.joint)!;
  return {
    units: report.units,
    section: designation.replace(/(?<=\d)\s*x\s*(?=\d)/gi, ' × ') || 'own section',
    boltSize: bolts.size,
    boltGrade: typeof bolts.grade === 'string' ? bolts.grade : '',
    holes: bolts.holes ?? standards[report.standard.id]?.materials.holesAssumed ?? '',
    cope: words.cope,
    gauge: words.gauge,
    plate: fieldName(words, fittingOf(end.joint).path),
  };
};
