import type { Facts } from '../../end/facts.ts';
import { linesX, rowsY } from '../../end/supportPattern.ts';
import type { FailurePath, Point } from '../drawing.ts';
import { depthFields } from '../fields.ts';
import { fixedBox } from '../onSupport/legs.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { onSupport } from './onSupport.ts';
import { type PathMaker, path, tag, torn } from './pathMaker.ts';

/** Two planes through the support, beside the welds of the plate or beside what is fixed to it; `between the outer rows`: no longer. */
export const supportShear: PathMaker = (it, words, of) => {
  if (it.kind === 'web-bolts') return null;
  if (it.bp > 0 || it.legSupport > 0) return besideFixed(it, words, of);
  const { left, top, bottom } = plateBox(it);
  const x = left - Math.max(it.ts / 2, 2);
  const [head, foot] = [
    { x, y: top },
    { x, y: bottom },
  ];
  return path(`The support shears on both sides of the ${words.plate}.`, {
    strokes: [torn(head, foot)],
    tags: [tag(head, foot, `2 × ${length(bottom - top, words.units)}`)],
    fields: depthFields(it),
  });
};

const besideFixed = (it: Facts, words: DrawingWords, of: string): FailurePath => {
  const fixed = fixedBox(it);
  const { n, d0 } = it.supportBolts;
  const rows = rowsY(it);
  const bolted = n > 0;
  const between = of === 'between the outer rows' && bolted;
  const [top, bottom] = between ? [rows[0]!, rows.at(-1)!] : [fixed.top, fixed.bottom];
  const xs = bolted
    ? [Math.min(...linesX(it)) - d0 / 2, Math.max(...linesX(it)) + d0 / 2]
    : [fixed.left - it.leg, fixed.right + it.leg];
  const planes = xs.map((x): [Point, Point] => [
    { x, y: top },
    { x, y: bottom },
  ]);
  const where = bolted ? 'the bolts' : 'the welds';
  return onSupport(`The support shears upright on both sides of ${where}.`, {
    strokes: planes.map(([head, foot]) => torn(head, foot)),
    tags: [tag(...planes.at(-1)!, `2 × ${length(bottom - top, words.units)} in shear`)],
    fields: ['joint.supportBolts.crossCentres', 'joint.supportBolts.pitch'],
  });
};
