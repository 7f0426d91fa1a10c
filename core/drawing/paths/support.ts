import { plateField } from '../fields.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import { type PathMaker, path, tag, torn } from './pathMaker.ts';

/** Two planes through the support, beside the welds of the plate. */
export const supportShear: PathMaker = (it, words) => {
  if (it.kind !== 'fin-plate') return null;
  const { left, top, bottom } = plateBox(it);
  const x = left - Math.max(it.ts / 2, 2);
  const [head, foot] = [
    { x, y: top },
    { x, y: bottom },
  ];
  return path(`The support shears on both sides of the ${words.plate}.`, {
    strokes: [torn(head, foot)],
    tags: [tag(head, foot, `2 × ${length(bottom - top, words.units)}`)],
    fields: [plateField(it, 'topEdge'), plateField(it, 'bottomEdge'), 'joint.bolts.pitch'],
  });
};
