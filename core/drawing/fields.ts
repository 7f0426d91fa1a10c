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
