import { flag } from '../../end/given.ts';
import { rowEnd } from '../../end/tearPaths.ts';
import { constant, minus, pick, step } from '../../formula/tree.ts';
import { manual } from './clauses.ts';
import { inches, noLength } from './given.ts';

const asDrawn = flag('option end-underrun: as-drawn', (f) => f.options['end-underrun'] === 'as-drawn');
const inch = flag('', (f) => f.inch, 'bolts of inch sizes');
const underrun = step(
  'u',
  pick(
    [
      [asDrawn, noLength],
      [inch, inches('1/4', 0.25)],
    ],
    constant('6 mm', 6, '1,0'),
  ),
  manual(10),
  'a beam may come out shorter than drawn',
);

/** End distance of the web as used: a beam may come out shorter than drawn. Manual Part 10. */
export const endUsed = step('e′', minus(rowEnd, underrun), manual(10), 'as used');
