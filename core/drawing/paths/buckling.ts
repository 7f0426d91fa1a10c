import type { Stroke } from '../drawing.ts';
import { plateBox } from '../plate.ts';
import { length } from '../sizes.ts';
import { level } from './bending.ts';
import { type PathMaker, path, tag, torn } from './pathMaker.ts';
import { cutOf, faceOf } from './shear.ts';

/** The web beside the cut edge in compression bows out of its plane. */
export const copeBuckling: PathMaker = (it, words, of) => {
  const cut = cutOf(it, of);
  if (cut === null || !cut.topCut) return null;
  const [top, foot] = faceOf(it, cut);
  // Between two copes the longer one counts, wherever the section is looked at.
  const both = cut === it.rectangle;
  const below = both && it.cb > it.ct;
  const free = both ? Math.max(it.ct, it.cb) : cut.c;
  const edge = below ? foot.y : top.y;
  const strokes = [0.1, 0.22, 0.34].map((share, i) =>
    wave(0, cut.c, top.y + share * cut.depth, 0.032 * cut.depth * (1 - 0.3 * i)),
  );
  const along = [
    { x: 0, y: edge },
    { x: free, y: edge },
  ] as const;
  return path(`The web buckles sideways beside the cut edge, as far as the ${words.cope} reaches.`, {
    strokes: [torn(top, foot), torn(...along), ...strokes],
    tags: [
      tag(...along, `${length(free, words.units)} free`),
      tag(top, foot, `${length(cut.depth, words.units)} deep`),
    ],
    fields: [below ? 'bottom.length' : 'top.length', 'top.depth', 'bottom.depth'],
  });
};

/** The plate bows sideways between the support and the first column. */
export const plateBuckling: PathMaker = (it, words) => {
  const { left, top, bottom } = plateBox(it);
  const right = left + it.z1;
  const deep = bottom - top;
  const strokes = [0.08, 0.2, 0.32].map((share, i) =>
    wave(left, right, bottom - share * deep, 0.03 * deep * (1 - 0.3 * i)),
  );
  const arm = level({ x: left, y: top + 0.1 * deep }, right);
  return path(`The ${words.plate} buckles sideways between the support and the first bolts.`, {
    strokes: [torn({ x: right, y: top }, { x: right, y: bottom }), ...strokes, ...arm.strokes],
    tags: [tag(...arm.ends, `${length(it.z1, words.units)} free`)],
    fields: ['setback', 'joint.endDistance'],
  });
};

/** One and a half waves between two columns. */
const wave = (left: number, right: number, y: number, height: number): Stroke => {
  const steps = 24;
  const at = (i: number) => ({
    x: left + ((right - left) * i) / steps,
    y: y - height * Math.sin((3 * Math.PI * i) / steps),
  });
  return {
    kind: 'narrow',
    from: at(0),
    to: Array.from({ length: steps }, (_, i) => at(i + 1)),
  };
};
