import { coped, oneRow, oneSupportRow } from '../../end/gates.ts';
import { d, eBot, eEnd, eTop, ex, flag, p, supportBolts } from '../../end/given.ts';
import { all, any, atMost, below, least, not, times } from '../../formula/tree.ts';
import type { Standard } from '../standard.ts';
import { plateGroup, webGroup } from './bearing.ts';
import { boltGroup } from './bolts.ts';
import { plateGross } from './plate.ts';

const finPlate = flag('a fin plate', (f) => f.kind === 'fin-plate');
const tied = flag('a tie force', (f) => f.T > 0);

/** Spacing that the joint guide advises beyond the least of the clauses. */
const { p: ps, d: ds, ev, eh } = supportBolts;
const closeTogether = any(
  all(not(oneRow), below(p, times(2.5, d))),
  below(least(eEnd, ex, eTop, eBot), times(2, d)),
  all(not(oneSupportRow.when), below(ps, times(2.5, ds))),
  below(least(ev, eh), times(2, ds)),
);
const legWelded = flag("a cleat's leg welded to the web", (f) => f.legWeb > 0 && f.weldTo === 'web');

/** What is printed beside the checks, each while its condition is met. */
export const notes: Standard['notes'] = [
  { code: 'joint-guide', when: flag('always', () => true) },
  { code: 'notch-in-buckling', when: coped },
  {
    code: 'bolts-govern',
    when: all(finPlate, not(oneRow), atMost(boltGroup, least(webGroup, plateGroup, plateGross))),
  },
  { code: 'guide-spacing', when: closeTogether },
  { code: 'tie-support', when: tied },
  { code: 'leg-weld-full', when: legWelded },
];
