import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { plasticModulus } from '../../../core/shape/plasticModulus.ts';
import { firstMoment, wholeShape } from '../../../core/shape/shape.ts';
import { findSection, listSections } from '../../../core/steel/findSection.ts';

const folder = new URL('../../../fixtures/sections/', import.meta.url);

interface Published {
  readonly table: string;
  readonly toleranceShare: number;
  readonly rows: [designation: string, ...figures: number[]][];
}

const read = (file: string): Published => JSON.parse(readFileSync(new URL(file, folder), 'utf8'));

const families = readdirSync(folder)
  .filter((file) => file.endsWith('.json'))
  .map(read);

const off = (value: number, published: number): number => Math.abs(value / published - 1);

const record = (designation: string) => {
  const found = findSection(designation);
  if ('nearest' in found) throw new Error(`${designation} is not in the library`);
  return found;
};

describe.each(families)('$table: $rows.0.0 and its family', ({ table, toleranceShare, rows }) => {
  it('agree in area, second moment, elastic and plastic modulus with the published figures', () => {
    for (const [designation, area, inertia, elastic, plastic] of rows) {
      const shape = wholeShape(record(designation).section);
      const differences = {
        A: off(shape.area, area! * 1e2),
        I: off(shape.inertia, inertia! * 1e4),
        Wel: off(shape.modulusTop, elastic! * 1e3),
        Wpl: off(plasticModulus(shape), plastic! * 1e3),
      };
      for (const [name, share] of Object.entries(differences)) {
        expect(share, `${name} of ${designation}`).toBeLessThanOrEqual(toleranceShare);
      }
    }
  });

  it('have half the plastic modulus as first moment at mid-depth', () => {
    for (const [designation] of rows) {
      const { section } = record(designation);
      const shape = wholeShape(section);
      expect(off(2 * firstMoment(shape, section.h / 2), plasticModulus(shape)), designation).toBeLessThan(1e-9);
    }
  });

  it('weigh what their area says, at 7850 kg/m³, within 2 %', () => {
    for (const [designation] of rows) {
      const { mass, section } = record(designation);
      expect(off(wholeShape(section).area * 7850e-6, mass), designation).toBeLessThanOrEqual(0.02);
    }
  });

  it('name the table they come from', () => {
    for (const [designation] of rows) expect(table).toContain(record(designation).source);
  });
});

describe('the library', () => {
  it('has a published row for every section it holds, and holds every published row', () => {
    const published = families.flatMap(({ rows }) => rows.map(([designation]) => designation)).sort();
    const held = listSections()
      .flatMap(({ designations }) => designations)
      .sort();
    expect(held).toEqual(published);
    expect(held.length).toBeGreaterThan(500);
  });
});
