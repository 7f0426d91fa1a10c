import { describe, expect, test } from 'vitest';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { drawingWords } from '../../../web/piece/drawingWords.ts';
import { demo, demoEnd, demoJoint } from '../ladder/demoEnds.ts';

describe('words of the drawing', () => {
  test('the section is written with signs of multiplication, the bolts as in the end', () => {
    expect(drawingWords(demo(), commonwealth)).toEqual({
      units: 'mm-kN',
      section: 'UB 406 × 178 × 60',
      boltSize: 'M20',
      boltGrade: '8.8',
      holes: 'drilled',
      cope: 'notch',
      gauge: 'gauge',
      plate: 'fin plate',
      weldSymbols: 'iso',
    });
  });

  test('holes that the end does not name are drawn as the standard takes them', () => {
    const { holes: _, ...bolts } = demoEnd.joint.bolts;
    expect(drawingWords(demoJoint({ bolts }), commonwealth).holes).toBe('punched');
  });

  test('a section of own sizes and a bolt of own strength have no name', () => {
    const section = { depth: 400, width: 180, flange: 12, web: 8, radius: 10 };
    const it = demoJoint(
      { bolts: { ...demoEnd.joint.bolts, grade: { fu: 830 } } },
      { beam: { section, grade: 'S355JR' } },
    );
    expect(drawingWords(it, commonwealth)).toMatchObject({ section: 'own section', boltGrade: '' });
  });
});
