import type { Box } from '../../core/drawing/drawing.ts';
import type { Laid } from '../../core/drawing/laid.ts';
import { boxOf } from '../../core/drawing/pad.ts';

/** A drawing without the path that was laid over it: a path moves nothing, so both come from one layout. */
export const withoutPath = (laid: Laid): Laid => {
  const marks = laid.marks.filter(({ layer }) => layer !== 'path');
  const [all, own] = [boxOf(laid.marks), boxOf(marks)];
  const side = (name: keyof Box): number => laid.box[name] + (own[name] - all[name]);
  return {
    ...laid,
    marks,
    box: { left: side('left'), top: side('top'), right: side('right'), bottom: side('bottom') },
  };
};
