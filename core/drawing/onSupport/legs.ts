import type { Facts } from '../../end/facts.ts';
import type { Box } from '../drawing.ts';

/** Sides on which something lies on the support: -1 left, the near side of the beam, and 1 right. */
export const sidesOf = ({ k, legSupport }: Facts): readonly (1 | -1)[] => (legSupport > 0 && k === 1 ? [-1] : [-1, 1]);

/** From `a` to `b` off the web's middle on one side, over the depth of the cleat or plate. */
export const strip = ({ yp, hp }: Facts, side: 1 | -1, a: number, b: number): Box => ({
  left: Math.min(side * a, side * b),
  right: Math.max(side * a, side * b),
  top: yp,
  bottom: yp + hp,
});

/** A cleat's web leg, cut through, and its leg on the support, seen from the front. */
export const webLegBox = (it: Facts, side: 1 | -1): Box => strip(it, side, it.tw / 2, it.tw / 2 + it.tp);
export const supportLegBox = (it: Facts, side: 1 | -1): Box => strip(it, side, it.tw / 2, it.tw / 2 + it.legSupport);

/** The end plate, or both support legs together. */
export const fixedBox = (it: Facts): Box => {
  if (it.bp > 0) return { left: -it.bp / 2, right: it.bp / 2, top: it.yp, bottom: it.yp + it.hp };
  const boxes = sidesOf(it).map((side) => supportLegBox(it, side));
  return {
    left: Math.min(...boxes.map((one) => one.left)),
    right: Math.max(...boxes.map((one) => one.right)),
    top: it.yp,
    bottom: it.yp + it.hp,
  };
};
