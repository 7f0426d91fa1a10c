import type { Facts } from '../end/facts.ts';

const fittings: Readonly<Record<Facts['kind'], string>> = {
  'fin-plate': 'joint.plate',
  'web-bolts': 'joint.ply',
  'double-cleat': 'joint.cleat',
  'single-cleat': 'joint.cleat',
  'end-plate': 'joint.plate',
  'full-end-plate': 'joint.plate',
};

/** Field names of the plate, ply or cleat. */
export const plateField = ({ kind }: Facts, name: string): string => `${fittings[kind]}.${name}`;

/** Fields that make the depth of the plate, ply or cleat. */
export const depthFields = (it: Facts): string[] =>
  it.n > 0 ? [plateField(it, 'topEdge'), plateField(it, 'bottomEdge'), 'joint.bolts.pitch'] : [plateField(it, 'depth')];
