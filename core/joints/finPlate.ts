import type { JointChecks } from './joint.ts';
import { webBolts } from './webBolts.ts';

/** A plate welded to the support by two fillets, bolted to the beam's web. */
export const finPlate: JointChecks = {
  strength: [...webBolts.strength, ['weld', 'weld'], ['support-shear', 'support']],
  fit: webBolts.fit,
};
