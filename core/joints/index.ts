import type { Joint } from '../end/schema.ts';
import { cleats } from './cleats.ts';
import { endPlate } from './endPlate.ts';
import { finPlate } from './finPlate.ts';
import type { JointChecks } from './joint.ts';
import { webBolts } from './webBolts.ts';

export const joints: Readonly<Record<Joint['kind'], JointChecks>> = {
  'fin-plate': finPlate,
  'web-bolts': webBolts,
  'double-cleat': cleats,
  'single-cleat': cleats,
  'end-plate': endPlate,
  'full-end-plate': endPlate,
};
