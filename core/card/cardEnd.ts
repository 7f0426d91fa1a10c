import type { End } from '../end/schema.ts';

/** What of the end of one cell is not the template's. */
export interface Place {
  readonly section: string;
  readonly rows: number;
  readonly reaction: number;
}

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** The template with what it would not say itself; anything may be given, and what is no object stays as it is. */
export const cardEnd = (template: unknown, { section, rows, reaction }: Place): unknown => {
  if (!isObject(template)) return template;
  const { beam, joint } = template;
  return {
    ...template,
    reaction,
    beam: isObject(beam) ? { ...beam, section } : beam,
    joint: isObject(joint) && isObject(joint.bolts) ? { ...joint, bolts: { ...joint.bolts, rows } } : joint,
  };
};

/** Depth of the plate or ply with so many rows: first row, pitch and edges are kept. In the template's unit. */
export const plateDepth = (
  { topEdge, bottomEdge }: { topEdge: number; bottomEdge: number },
  { joint }: End,
  rows: number,
): number => Number((topEdge + (rows - 1) * (joint.bolts.pitch ?? 0) + bottomEdge).toPrecision(9));
