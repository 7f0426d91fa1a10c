import { fittingSizes } from '../end/fittingSizes.ts';
import type { End } from '../end/schema.ts';

/** What of the end of one cell is not the template's. */
export interface Place {
  readonly section: string;
  readonly rows: number;
  readonly reaction: number;
}

type Some = Readonly<Record<string, unknown>>;

const isObject = (value: unknown): value is Some =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** A plate or cleat of a depth of its own grows by a pitch with every row; its edges are kept. */
const grown = (fitting: unknown, bolts: unknown, rows: number): unknown => {
  if (!isObject(fitting) || !isObject(bolts) || typeof fitting.depth !== 'number') return fitting;
  const { rows: were, pitch = 0 } = bolts;
  if (typeof were !== 'number' || typeof pitch !== 'number') return fitting;
  return { ...fitting, depth: Number((fitting.depth + (rows - were) * pitch).toPrecision(9)) };
};

/** The joint with so many bolt rows, in web and support alike. */
const withRows = (joint: unknown, rows: number): unknown => {
  if (!isObject(joint)) return joint;
  const { bolts, supportBolts, plate, cleat } = joint;
  return {
    ...joint,
    ...(isObject(bolts) && { bolts: { ...bolts, rows } }),
    ...(isObject(supportBolts) && { supportBolts: { ...supportBolts, rows } }),
    ...(plate !== undefined && { plate: grown(plate, supportBolts, rows) }),
    ...(cleat !== undefined && { cleat: grown(cleat, supportBolts, rows) }),
  };
};

/** The template with what it would not say itself; anything may be given, and what is no object stays as it is. */
export const cardEnd = (template: unknown, { section, rows, reaction }: Place): unknown => {
  if (!isObject(template)) return template;
  const { beam, joint } = template;
  return {
    ...template,
    reaction,
    beam: isObject(beam) ? { ...beam, section } : beam,
    joint: withRows(joint, rows),
  };
};

/** Depth of the plate, ply or cleat with so many rows: first row, pitch and edges are kept. In the template's unit. */
export const plateDepth = (end: End, rows: number): number => {
  const grown = cardEnd(end, { section: '', rows, reaction: 0 }) as End;
  return Number(fittingSizes(grown, 1).hp.toPrecision(9));
};
