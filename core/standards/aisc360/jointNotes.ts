import { noSupportBolts, pairOfCleats } from '../../end/gates.ts';
import { all, not } from '../../formula/tree.ts';
import { sharedWeb } from '../methods/supportShear.ts';
import type { Standard } from '../standard.ts';
import { concentric } from './conventional.ts';
import { told } from './supportGates.ts';

/** What is left out, or taken in beyond the handbook, with angles and end plates. */
export const jointNotes: Standard['notes'] = [
  { code: 'web-bolts-no-arm', when: concentric },
  { code: 'pair-no-arm', when: all(pairOfCleats.when, not(noSupportBolts.when)) },
  { code: 'beam-opposite-added', when: all(sharedWeb, told) },
];
