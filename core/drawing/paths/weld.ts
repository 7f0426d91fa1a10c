import { plateField } from '../fields.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import { type PathMaker, path, tag } from './pathMaker.ts';

/** Two fillets along the plate at the support's face. */
export const weld: PathMaker = (it, words) => {
  if (it.kind !== 'fin-plate') return null;
  const { left: x, top, bottom } = plateBox(it);
  const half = Math.max(it.leg / 2, it.g / 4, 2);
  const [head, foot] = [
    { x, y: top },
    { x, y: bottom },
  ];
  return path(`Two fillets tear off the support along the ${words.plate}.`, {
    areas: [
      {
        fill: 'black',
        outline: [
          { x: x - half, y: top },
          { x: x + half, y: top },
          { x: x + half, y: bottom },
          { x: x - half, y: bottom },
        ],
      },
    ],
    tags: [tag(head, foot, `2 × ${length(bottom - top, words.units)}`)],
    fields: ['joint.weld.leg', plateField(it, 'topEdge'), plateField(it, 'bottomEdge'), 'joint.bolts.pitch'],
  });
};
