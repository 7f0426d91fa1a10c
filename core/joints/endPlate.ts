import { beamEnd } from './beamEnd.ts';
import type { JointChecks } from './joint.ts';

/** A plate welded to the web and bolted to the support. */
export const endPlate: JointChecks = {
  strength: [
    ...beamEnd.strength,
    ['endplate-bearing', 'plate'],
    ['endplate-tearout', 'plate'],
    ['endplate-gross-shear', 'plate'],
    ['endplate-net-shear', 'plate'],
    ['endplate-block', 'plate'],
    ['endplate-web-shear', 'web'],
    ['weld-web', 'weld'],
    ['support-bolt-shear', 'support-bolts'],
    ['support-bearing', 'support'],
    ['support-shear', 'support'],
  ],
  fit: [...beamEnd.fit, ['fit-edge-plate', 'plate'], ['fit-plate-depth', 'plate'], ['fit-rotation', 'plate']],
};
