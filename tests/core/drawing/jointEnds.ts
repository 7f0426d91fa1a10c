import { readFileSync } from 'node:fs';
import { examine } from '../../../core/check/examine.ts';
import type { Check } from '../../../core/check/report.ts';
import type { DrawingWords } from '../../../core/drawing/words.ts';
import { drawingWordsOf } from '../../../core/drawing/wordsOf.ts';
import type { Facts } from '../../../core/end/facts.ts';
import { standards } from '../../../core/standards/known.ts';
import type { Standard } from '../../../core/standards/standard.ts';
import { wordsFor } from '../../../core/words/wordsFor.ts';
import { underStandard } from '../../support/underStandard.ts';

/** Good ends of every kind of joint, by the names of their files. */
export const jointNames = [
  'fin-plate',
  'web-bolts',
  'double-cleat',
  'single-cleat',
  'double-cleat-web-welded',
  'double-cleat-support-welded',
  'end-plate',
  'full-end-plate',
] as const;
export type JointName = (typeof jointNames)[number];

/** Those of them that lie on the support, and are drawn in two views. */
export const inTwoViews = jointNames.slice(2);

type Json = Record<string, unknown>;

export const endNamed = (name: JointName): Json => {
  const file = name === 'fin-plate' ? 'example' : name;
  return JSON.parse(
    readFileSync(new URL(`../../../fixtures/input/good/${file}.json`, import.meta.url), 'utf8'),
  ) as Json;
};

export interface Drawable {
  readonly facts: Facts;
  readonly words: DrawingWords;
  readonly checks: readonly Check[];
}

/** What the drawing of an end is made from; null where the end has a fault. */
export const drawable = (given: unknown): Drawable | null => {
  const examination = examine(given, { working: false });
  if ('faults' in examination) return null;
  const { end, facts, designation, report } = examination.examined;
  const standard = standards[report.standard.id] as Standard;
  const section = designation.replaceAll('x', ' × ');
  const words = drawingWordsOf(end, { units: report.units, section, words: wordsFor(standard.region), standard });
  return { facts, words, checks: report.checks };
};

/** A good end, under its own standard or another. */
export const jointEnd = (name: JointName, standard?: Standard): Drawable => {
  const end = endNamed(name);
  const it = drawable(standard ? underStandard(end, standard) : end);
  if (it === null) throw new Error(`${name} has a fault`);
  return it;
};
