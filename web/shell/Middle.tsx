import { Piece } from '../piece/index.ts';
import { Stress } from '../stress/index.ts';

/** What stands between order and ladder. The page loads it after the rest: the drawing is a fifth of the program. */
export const Middle = () => (
  <>
    <Piece />
    <Stress />
  </>
);
