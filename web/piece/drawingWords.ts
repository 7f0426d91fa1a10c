import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { DrawingWords } from '../../core/drawing/words.ts';
import { drawingWordsOf } from '../../core/drawing/wordsOf.ts';
import { standards } from '../../core/standards/known.ts';
import type { Words } from '../../core/words/words.ts';

/** What the drawing of an end writes beside its sizes. */
export const drawingWords = ({ end, designation, report }: ExaminedNumbers, words: Words): DrawingWords =>
  drawingWordsOf(end, {
    units: report.units,
    section: designation.replace(/(?<=\d)\s*x\s*(?=\d)/gi, ' × ') || 'own section',
    words,
    standard: standards[report.standard.id]!,
  });
