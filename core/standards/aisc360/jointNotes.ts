import { noSupportBolts, pairOfCleats } from '../../end/gates.ts';
import { flag } from '../../end/given.ts';
import { all, not } from '../../formula/tree.ts';
import { sharedWeb } from '../methods/supportShear.ts';
import type { Standard } from '../standard.ts';
import { concentric } from './conventional.ts';
import { told } from './supportGates.ts';

const tiedAngles = flag('', (f) => f.T > 0 && f.n > 0 && f.legWeb > 0, 'angles under a tie force');

/** What is left out, or taken in beyond the handbook, with angles and end plates. */
export const jointNotes: Standard['notes'] = [
  { code: 'web-bolts-no-arm', when: concentric },
  { code: 'pair-no-arm', when: all(pairOfCleats.when, not(noSupportBolts.when)) },
  { code: 'beam-opposite-added', when: all(sharedWeb, told) },
  { code: 'tie-not-in-legs', when: tiedAngles },
];
