import type { Dimension } from '../../core/units/dimension.ts';

/** A field that holds a quantity. */
export interface QuantityField {
  readonly kind: 'quantity';
  readonly dimension: Dimension;
  /** What an arrow key adds, mm; forces and strengths step by one of their unit. */
  readonly step: 1 | 5;
  /** The least value that arrow keys reach; absent = they stop above zero. */
  readonly least?: number;
}

/** A field that holds a whole number. */
export interface CountField {
  readonly kind: 'count';
  readonly least: 1;
  readonly most: number;
}

/** A field that holds words, or a name from a list. */
export interface WordsField {
  readonly kind: 'words';
}

export type Field = QuantityField | CountField | WordsField;

const size = (step: 1 | 5, least?: number): QuantityField => ({
  kind: 'quantity',
  dimension: '1,0',
  step,
  ...(least !== undefined && { least }),
});
const force = (least = 0): QuantityField => ({ kind: 'quantity', dimension: '0,1', step: 1, least });
const strength: QuantityField = { kind: 'quantity', dimension: '-2,1', step: 5 };
const count = (most: number): CountField => ({ kind: 'count', least: 1, most });

/** Every field whose text is read as a number, by the path of the end's JSON. All others hold words. */
export const numberFields: Readonly<Record<string, QuantityField | CountField>> = {
  reaction: force(),
  'reaction.ofWebShear': { kind: 'quantity', dimension: '0,0', step: 1, least: 0 },
  tie: force(),
  'beam.section.depth': size(1),
  'beam.section.width': size(1),
  'beam.section.flange': size(1),
  'beam.section.web': size(1),
  'beam.section.radius': size(1, 0),
  'beam.grade.fy': strength,
  'beam.grade.fu': strength,
  'top.length': size(5),
  'top.depth': size(5),
  'top.radius': size(1, 0),
  'bottom.length': size(5),
  'bottom.depth': size(5),
  'bottom.radius': size(1, 0),
  setback: size(1, 0),
  'joint.firstRow': size(5),
  'joint.endDistance': size(5),
  'joint.bolts.grade.fu': strength,
  'joint.bolts.rows': count(30),
  'joint.bolts.columns': count(6),
  'joint.bolts.pitch': size(5, 0),
  'joint.bolts.gauge': size(5, 0),
  'joint.bolts.hole': size(1),
  'joint.bolts.socket': size(1),
  'joint.supportBolts.grade.fu': strength,
  'joint.supportBolts.rows': count(30),
  'joint.supportBolts.pitch': size(5, 0),
  'joint.supportBolts.crossCentres': size(5),
  'joint.supportBolts.topEdge': size(5),
  'joint.supportBolts.hole': size(1),
  'joint.supportBolts.socket': size(1),
  ...plyFields('joint.plate'),
  ...plyFields('joint.ply'),
  ...plyFields('joint.cleat'),
  'joint.plate.width': size(5),
  'joint.plate.depth': size(5),
  'joint.plate.top': size(5),
  'joint.cleat.legWeb': size(5),
  'joint.cleat.legSupport': size(5),
  'joint.cleat.radius': size(1, 0),
  'joint.cleat.top': size(5),
  'joint.cleat.depth': size(5),
  ...weldFields('joint.weld'),
  ...weldFields('joint.webWeld'),
  ...weldFields('joint.cleat.webWeld'),
  ...weldFields('joint.cleat.supportWeld'),
  'support.thickness': size(1),
  'support.grade.fy': strength,
  'support.grade.fu': strength,
  'support.topOfSteel': size(5, Number.NEGATIVE_INFINITY),
  'support.otherReaction': force(),
  'support.opposite.firstRow': size(5, Number.NEGATIVE_INFINITY),
  'support.opposite.rows': count(30),
  'support.opposite.pitch': size(5, 0),
  'support.opposite.gauge': size(5),
  quantity: count(100000),
  'sheet.beside.reaction': force(),
};

function plyFields(ply: string): Record<string, QuantityField> {
  return {
    [`${ply}.thickness`]: size(1),
    [`${ply}.grade.fy`]: strength,
    [`${ply}.grade.fu`]: strength,
    [`${ply}.topEdge`]: size(5),
    [`${ply}.bottomEdge`]: size(5),
    [`${ply}.edge`]: size(5),
  };
}

function weldFields(weld: string): Record<string, QuantityField> {
  return { [`${weld}.leg`]: size(1), [`${weld}.electrode`]: strength, [`${weld}.return`]: size(5) };
}

const words: WordsField = { kind: 'words' };

export const fieldAt = (path: string): Field => (Object.hasOwn(numberFields, path) ? numberFields[path]! : words);
