import type { JointChecks } from './joint.ts';

/** Checks of the beam's own end, whatever joins it through bolts in its web. */
export const beamEnd: JointChecks = {
  strength: [
    ['web-gross-shear', 'web'],
    ['cope-shear', 'web'],
    ['web-net-shear', 'web'],
    ['web-block', 'web'],
    ['web-tearout', 'web'],
    ['cope-bending', 'web'],
    ['cope-buckling', 'web'],
    ['web-bearing', 'web'],
    ['web-tie', 'web'],
    ['stress-full', 'web'],
    ['stress-cope', 'web'],
  ],
  fit: [
    ['fit-pitch', 'bolts'],
    ['fit-gauge', 'bolts'],
    ['fit-edge-web', 'web'],
    ['fit-end', 'web'],
    ['fit-cope-length', 'end'],
    ['fit-cope-depth', 'end'],
    ['fit-cope-radius', 'end'],
    ['fit-cope-clearance', 'end'],
    ['fit-setback', 'end'],
    ['fit-wrench', 'bolts'],
  ],
};
