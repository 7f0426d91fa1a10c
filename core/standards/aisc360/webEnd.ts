import { flag } from '../../end/given.ts';
import { rowEnd } from '../../end/tearPaths.ts';
import { constant, minus, pick, step } from '../../formula/tree.ts';
import { manual } from './clauses.ts';
import { inches } from './given.ts';

const asDrawn = flag('option end-underrun: as-drawn', (f) => f.options['end-underrun'] === 'as-drawn');
const inch = flag('', (f) => f.inch, 'bolts of inch sizes');
const underrun = pick([[inch, inches('1/4', 0.25)]], constant('6 mm', 6, '1,0'));

/** End distance of the web as used: a beam may come out shorter than drawn. Manual Part 10. */
export const endUsed = step('e′', pick([[asDrawn, rowEnd]], minus(rowEnd, underrun)), manual(10), 'as used');
