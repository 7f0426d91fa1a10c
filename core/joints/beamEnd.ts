import { noWebHoles } from '../end/gates.ts';
import type { JointChecks } from './joint.ts';

/** Checks of the beam's own end, whatever joins it. */
export const beamEnd: JointChecks = {
  strength: [
    ['web-gross-shear', 'web'],
    ['cope-shear', 'web'],
    ['web-net-shear', 'web', noWebHoles],
    ['web-block', 'web', noWebHoles],
    ['web-tearout', 'web', noWebHoles],
    ['cope-bending', 'web'],
    ['cope-buckling', 'web'],
    ['web-bearing', 'web', noWebHoles],
    ['web-tie', 'web'],
    ['stress-full', 'web'],
    ['stress-cope', 'web'],
  ],
  fit: [
    ['fit-pitch', 'bolts'],
    ['fit-gauge', 'bolts'],
    ['fit-edge-web', 'web', noWebHoles],
    ['fit-end', 'web', noWebHoles],
    ['fit-cope-length', 'end'],
    ['fit-cope-depth', 'end'],
    ['fit-cope-radius', 'end'],
    ['fit-cope-clearance', 'end'],
    ['fit-setback', 'end'],
    ['fit-wrench', 'bolts'],
  ],
};
