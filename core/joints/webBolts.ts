import { beamEnd } from './beamEnd.ts';
import type { JointChecks } from './joint.ts';

/** The web bolted straight to a ply of the support. */
export const webBolts: JointChecks = {
  strength: [
    ...beamEnd.strength,
    ['bolt-shear', 'bolts'],
    ['plate-bearing', 'plate'],
    ['plate-tearout', 'plate'],
    ['plate-gross-shear', 'plate'],
    ['plate-net-shear', 'plate'],
    ['plate-block', 'plate'],
    ['plate-bending', 'plate'],
    ['plate-buckling', 'plate'],
  ],
  fit: [...beamEnd.fit, ['fit-edge-plate', 'plate'], ['fit-plate-depth', 'plate'], ['fit-rotation', 'plate']],
};
