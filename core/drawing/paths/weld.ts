import type { Facts } from '../../end/facts.ts';
import type { Area, FailurePath, Point } from '../drawing.ts';
import { depthFields, plateField } from '../fields.ts';
import { webAtPlate } from '../fitting.ts';
import { sidesOf, supportLegBox } from '../onSupport/legs.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import type { DrawingWords } from '../words.ts';
import { onSupport } from './onSupport.ts';
import { fitting, type PathMaker, path, tag, torn } from './pathMaker.ts';

/** To the support: two fillets along the plate at the support's face, or one along the toe of each cleat's leg. */
export const weld: PathMaker = (it, words) => {
  if (it.weldTo !== 'support') return null;
  if (it.legSupport > 0) return supportLegWeld(it, words);
  const { left: x, top, bottom } = plateBox(it);
  const half = Math.max(it.leg / 2, it.g / 4, 2);
  const [head, foot] = upright(x, top, bottom);
  return path(`Two fillets tear off the support along the ${words.plate}.`, {
    areas: [black(x - half, top, x + half, bottom)],
    tags: [tag(head, foot, `2 × ${length(bottom - top, words.units)}`)],
    fields: ['joint.weld.leg', ...depthFields(it)],
  });
};

const supportLegWeld = (it: Facts, words: DrawingWords): FailurePath => {
  const boxes = sidesOf(it).map((side) => ({ ...supportLegBox(it, side), side }));
  const bars = boxes.map(({ left, right, top, bottom, side }) =>
    side > 0 ? black(right, top, right + it.leg, bottom) : black(left - it.leg, top, left, bottom),
  );
  const { left, right, top, bottom, side } = boxes.at(-1)!;
  return onSupport(`The fillet along the toe of ${fitting(it, words)} tears off the support.`, {
    areas: bars,
    tags: [tag(...upright(side > 0 ? right : left, top, bottom), length(bottom - top, words.units))],
    fields: [plateField(it, 'supportWeld.leg'), plateField(it, 'legSupport')],
  });
};

/** To the web: two fillets beside an end plate, or one around each cleat's web leg; `web`: the web behind the latter. */
export const weldWeb: PathMaker = (it, words, of) => {
  if (it.weldTo !== 'web') return null;
  if (it.bp > 0) {
    const { top, bottom } = webAtPlate(it);
    return path(`Two fillets tear off the web along the ${words.plate}.`, {
      areas: [black(0, top, Math.max(it.leg, 3), bottom)],
      tags: [tag(...upright(0, top, bottom), `2 × ${length(bottom - top, words.units)}`)],
      fields: ['joint.webWeld.leg', plateField(it, 'depth')],
    });
  }
  return of === 'web' ? webBehindWeld(it, words) : legWeld(it, words);
};

/** The corners of a web leg's weld: end of the upper return, toe above, toe below, end of the lower return. */
const around = (it: Facts): [Point, Point, Point, Point] => {
  const { top, right, bottom } = plateBox(it);
  const back = right - it.weldReturn;
  return [
    { x: back, y: top },
    { x: right, y: top },
    { x: right, y: bottom },
    { x: back, y: bottom },
  ];
};

const weldTags = (it: Facts, { units }: DrawingWords): FailurePath['tags'] => {
  const [, head, foot, end] = around(it);
  return [tag(head, foot, length(it.hp, units)), tag(foot, end, `2 × ${length(it.weldReturn, units)}`)];
};

const legFields = (it: Facts): string[] =>
  ['webWeld.leg', 'webWeld.return', 'depth', 'legWeb'].map((name) => plateField(it, name));

const legWeld = (it: Facts, words: DrawingWords): FailurePath => {
  const [end, head, foot] = around(it);
  const wide = Math.max(it.leg, 3);
  return path(`The fillet around the toe of ${fitting(it, words)} tears, first at the ends of its returns.`, {
    areas: [
      black(head.x, head.y - wide, head.x + wide, foot.y + wide),
      black(end.x, head.y - wide, head.x, head.y),
      black(end.x, foot.y, head.x, foot.y + wide),
    ],
    tags: weldTags(it, words),
    fields: legFields(it),
  });
};

const webBehindWeld = (it: Facts, words: DrawingWords): FailurePath =>
  path(`The web shears along the weld around ${fitting(it, words)}.`, {
    strokes: [torn(...around(it))],
    tags: weldTags(it, words),
    fields: legFields(it),
  });

/** The web beside the fillets of an end plate; `how` it gives way. */
const webBeside = (it: Facts, words: DrawingWords, how: string, said: string): FailurePath | null => {
  if (it.bp === 0) return null;
  const { top, bottom } = webAtPlate(it);
  const [head, foot] = upright(it.leg, top, bottom);
  return path(`The web ${how} beside the fillets of the ${words.plate}.`, {
    strokes: [torn(head, foot)],
    tags: [tag(head, foot, `${length(bottom - top, words.units)} in ${said}`)],
    fields: [plateField(it, 'depth')],
  });
};

export const endPlateWebShear: PathMaker = (it, words) => webBeside(it, words, 'shears', 'shear');
export const endPlateWebPulled: PathMaker = (it, words) => webBeside(it, words, 'is pulled off', 'tension');

const upright = (x: number, top: number, bottom: number): [Point, Point] => [
  { x, y: top },
  { x, y: bottom },
];

const black = (left: number, top: number, right: number, bottom: number): Area => ({
  fill: 'black',
  outline: [
    { x: left, y: top },
    { x: right, y: top },
    { x: right, y: bottom },
    { x: left, y: bottom },
  ],
});
