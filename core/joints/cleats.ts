import { noSupportBolts, noSupportWeld, noWebHoles, noWebWeld } from '../end/gates.ts';
import { beamEnd } from './beamEnd.ts';
import type { JointChecks } from './joint.ts';

/** One angle or a pair between web and support; each leg bolted or welded. */
export const cleats: JointChecks = {
  strength: [
    ...beamEnd.strength,
    ['bolt-shear', 'bolts', noWebHoles],
    ['cleat-bearing', 'cleat', noWebHoles],
    ['cleat-tearout', 'cleat'],
    ['cleat-gross-shear', 'cleat'],
    ['cleat-net-shear', 'cleat'],
    ['cleat-block', 'cleat'],
    ['cleat-bending', 'cleat'],
    ['cleat-buckling', 'cleat'],
    ['weld-web', 'weld', noWebWeld],
    ['weld', 'weld', noSupportWeld],
    ['support-bolt-shear', 'support-bolts', noSupportBolts],
    ['support-bearing', 'support', noSupportBolts],
    ['support-shear', 'support'],
  ],
  fit: [...beamEnd.fit, ['fit-edge-plate', 'cleat'], ['fit-plate-depth', 'cleat'], ['fit-rotation', 'cleat']],
};
