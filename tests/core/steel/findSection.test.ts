import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findSection, listSections } from '../../../core/steel/findSection.ts';
import { aiscW } from '../../../core/steel/sections/aiscW.ts';
import { readTable } from '../../../core/steel/sectionTable.ts';

const found = (name: string) => {
  const answer = findSection(name);
  if ('nearest' in answer) throw new Error(`${name}: ${answer.nearest.join(', ')}`);
  return answer;
};

const proposals = (name: string) => {
  const answer = findSection(name);
  return 'nearest' in answer ? answer.nearest : [`found ${answer.designation}`];
};

const designations = listSections().flatMap((family) => family.designations);

describe('a section is found by its name', () => {
  it.each([
    ['UB 406x178x60', 'UB 406x178x60'],
    ['406X178X60UB', 'UB 406x178x60'],
    ['UB406*178*60', 'UB 406x178x60'],
    ['406 x 178 x 60 UB', 'UB 406x178x60'],
    ['406x178x60', 'UB 406x178x60'],
    ['  ub 406×178×60 ', 'UB 406x178x60'],
    ['203x203x46', 'UC 203x203x46'],
    ['IPE300', 'IPE 300'],
    ['ipe  300', 'IPE 300'],
    ['IPE 300 A', 'IPE A 300'],
    ['IPE A 300', 'IPE A 300'],
    ['IPE O 300', 'IPE O 300'],
    ['IPE 750x137', 'IPE 750x137'],
    ['HE 200 A', 'HEA 200'],
    ['HEA200', 'HEA 200'],
    ['HE200A', 'HEA 200'],
    ['HE 200 B', 'HEB 200'],
    ['he 200 m', 'HEM 200'],
    ['W18x40', 'W18x40'],
    ['W 18 X 40', 'W18x40'],
    ['w18×40', 'W18x40'],
    ['W6x8.5', 'W6x8.5'],
    ['UPE 200', 'UPE 200'],
    ['PFC 200x75x23', 'PFC 200x75x23'],
    ['PFC 200x75', 'PFC 200x75x23'],
    ['200x75x23 PFC', 'PFC 200x75x23'],
    ['200x75x23', 'PFC 200x75x23'],
    ['410UB53.7', '410UB53.7'],
    ['410 UB 53.7', '410UB53.7'],
    ['410ub53.7', '410UB53.7'],
    ['UB 410x53.7', '410UB53.7'],
    ['530UB82', '530UB82.0'],
    ['310UC96.8', '310UC96.8'],
    ['310 uc 96.8', '310UC96.8'],
    ['200PFC', '200PFC'],
    ['200 PFC', '200PFC'],
    ['PFC 200', '200PFC'],
    ['ISMB 400', 'ISMB 400'],
    ['ismb400', 'ISMB 400'],
    ['MB 400', 'ISMB 400'],
    ['MB400', 'ISMB 400'],
    ['ISMB 200x25.4', 'ISMB 200x25.4'],
    ['MB 200 x 24.2', 'ISMB 200x24.2'],
  ])('%s is %s', (name, designation) => {
    expect(found(name).designation).toBe(designation);
    expect(found(name).readAs).toBeUndefined();
  });

  it('whatever case and spacing, for every designation in the library', () => {
    for (const designation of designations) {
      const squeezed = designation.replaceAll(' ', '').toLowerCase();
      const spread = designation.replaceAll('x', ' X ');
      const turned = designation.replace(/^([A-Z]+(?: [A-Z])?) ?(.*)$/, '$2 $1');
      for (const name of [designation, squeezed, spread, turned]) expect(found(name).designation).toBe(designation);
    }
  });

  it('with its dimensions in mm, its mass, its family and the table they come from', () => {
    expect(found('UB 457x191x67')).toEqual({
      designation: 'UB 457x191x67',
      family: 'UB',
      market: 'UK',
      mass: 67.1,
      section: { family: 'I', h: 453.4, b: 189.9, tf: 12.7, tw: 8.5, r: 10.2 },
      source: 'SCI/BCSA steel section tables (BS EN 10365, BS 4-1)',
    });
    expect(found('PFC 200x75').section).toEqual({ family: 'channel', h: 200, b: 75, tf: 12.5, tw: 6, r: 12 });
    expect(found('410UB53.7').section).toEqual({ family: 'I', h: 403, b: 178, tf: 10.9, tw: 7.6, r: 11.4 });
  });

  it('with the slope of its flanges and their toe radius where they taper: ISMB 400 slopes 8 degrees', () => {
    const slope = (8 * Math.PI) / 180;
    expect(found('ISMB 400').section).toEqual({ family: 'I', h: 400, b: 140, tf: 16, tw: 8.9, r: 14, slope, toe: 7 });
    expect(found('ISMB 400').mass).toBe(61.6);
  });

  it('in inches where its list is in inches: W18x40 is 17.9 x 6.02 in, flange 0.525 in, web 0.315 in, 40 lb/ft', () => {
    const { section, mass } = found('W18x40');
    expect(section.h).toBeCloseTo(17.9 * 25.4, 9);
    expect(section.b).toBeCloseTo(6.02 * 25.4, 9);
    expect(section.tf).toBeCloseTo(0.525 * 25.4, 9);
    expect(section.tw).toBeCloseTo(0.315 * 25.4, 9);
    expect(mass).toBeCloseTo(59.53, 2);
  });

  it('as the same section object each time, so that what is worked out from it is kept', () => {
    expect(found('ub406x178x60').section).toBe(found('UB 406x178x60').section);
    expect(found('305x165x41').section).toBe(found('UB 305x165x40').section);
  });
});

describe('a label of another list is read as the shape it names, and says so', () => {
  it.each([
    ['305x102x29', 'UB 305x102x28'],
    ['UB 305x165x41', 'UB 305x165x40'],
    ['406x178x75', 'UB 406x178x74'],
    ['457x191x75 UB', 'UB 457x191x74'],
    ['457X191X90', 'UB 457x191x89'],
    ['533*210*93', 'UB 533x210x92'],
  ])('%s of South African lists is %s', (name, designation) => {
    const { designation: own, readAs, readFrom } = found(name);
    expect(own).toBe(designation);
    expect(readAs).toMatch(/^UB \d+x\d+x\d+$/);
    expect(readAs).not.toBe(designation);
    expect(readFrom).toBe('South Africa');
  });

  it.each([
    ['W410x39', 'W16x26'],
    ['W410x38.8', 'W16x26'],
    ['W460x68', 'W18x46'],
    ['w 310 x 33', 'W12x22'],
    ['W310x38.7', 'W12x26'],
    ['W310x39', 'W12x26'],
  ])('%s of Canadian lists is %s', (name, designation) => {
    expect(found(name)).toMatchObject({ designation, readFrom: 'Canada' });
  });

  it('for every W shape, under its exact mass and under the rounded one: no two Canadian labels round to the same', () => {
    const rows = readTable(aiscW);
    expect(rows).toHaveLength(283);
    for (const { record, otherLabel = '' } of rows) {
      const [depth, mass] = otherLabel.split('x');
      for (const label of [otherLabel, `${depth}x${Math.round(Number(mass))}`]) {
        expect(found(`W${label}`)).toMatchObject({
          designation: record.designation,
          readAs: `W${label}`,
          readFrom: 'Canada',
        });
      }
    }
  });
});

describe('a name that is not known', () => {
  it.each([
    ['UB 406x178x61', 'UB 406x178x60'],
    ['UB 406x187x60', 'UB 406x178x60'],
    ['46x178x60 UB', 'UB 406x178x60'],
    ['UKB 406x178x60', 'UB 406x178x60'],
    ['IPE 290', 'IPE 300'],
    ['IP 300', 'IPE 300'],
    ['W18x41', 'W18x40'],
    ['305x165x42', 'UB 305x165x41'],
    ['UPE 210', 'UPE 220'],
    ['410UB53', '410UB53.7'],
    ['ISMB 410', 'ISMB 400'],
  ])('%s has %s as its nearest', (name, neighbour) => {
    expect(proposals(name)).toHaveLength(3);
    expect(proposals(name)[0]).toBe(neighbour);
  });

  it('that fits several families or masses gets them as proposals, never one of them as the answer', () => {
    expect(proposals('HEC 200')).toEqual(['HEA 200', 'HEB 200', 'HEM 200']);
    expect(proposals('300')).toHaveLength(3);
    for (const name of proposals('UB 406x178')) expect(name).toMatch(/^UB 406x178x/);
    expect(proposals('200x75')).toHaveLength(3);
  });

  it('that two editions of a list give different shapes gets both as proposals, with their masses', () => {
    for (const name of ['ISMB 200', 'MB 200', 'ismb200'])
      expect(proposals(name)).toEqual(['ISMB 200x25.4', 'ISMB 200x24.2']);
    expect(proposals('ISMB 300')).toEqual(['ISMB 300x44.2', 'ISMB 300x46']);
  });

  it.each(['', '   ', '???', '×'])('without letter or number (%j) has no neighbours', (name) => {
    expect(findSection(name)).toEqual({ nearest: [] });
  });

  it.each(['UB 406x178x60x', 'UB 40617860', 'UB 406x178x60; IPE 300', 'UB 406-178-60', '406x178x60 UC', 'constructor'])(
    'is not guessed at: %s',
    (name) => expect('nearest' in findSection(name)).toBe(true),
  );

  it('whatever it is, never throws and has neighbours that are found', () => {
    const scraps = fc.constantFrom(
      'UB',
      'IPE',
      'HE',
      'A',
      'W',
      ' ',
      'x',
      '×',
      '*',
      '.',
      '406',
      '178',
      '60',
      '0',
      '__proto__',
    );
    const names = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 60 }),
      fc.array(scraps, { maxLength: 12 }).map((parts) => parts.join('')),
    );
    fc.assert(
      fc.property(names, (name) => {
        const answer = findSection(name);
        if (!('nearest' in answer)) return;
        expect(answer.nearest.length).toBeLessThanOrEqual(3);
        for (const one of answer.nearest) found(one);
      }),
    );
  });

  it('may be as long as it likes', () => {
    expect(proposals(`IPE 300${' '.repeat(100_000)}`)).toHaveLength(3);
    expect(proposals('9'.repeat(100_000))).toHaveLength(3);
  });
});

describe('the list of sections', () => {
  it('has each family with its market, every designation once', () => {
    expect(listSections().map(({ family, market }) => `${family}: ${market}`)).toEqual([
      'UB: UK',
      'UC: UK',
      'PFC: UK',
      'IPE: Europe',
      'IPE A: Europe',
      'IPE O: Europe',
      'HEA: Europe',
      'HEB: Europe',
      'HEM: Europe',
      'UPE: Europe',
      'W: North America',
      'UB (AU): Australia',
      'UC (AU): Australia',
      'PFC (AU): Australia',
      'ISMB: India',
      'ISMB 1989: India',
    ]);
    expect(new Set(designations).size).toBe(designations.length);
  });

  it('holds only sections that can be rolled', () => {
    for (const designation of designations) {
      const { section } = found(designation);
      const { h, b, tf, tw, r, family } = section;
      expect(Math.min(h, b, tf, tw, r), designation).toBeGreaterThan(0);
      expect(h, designation).toBeGreaterThan(2 * (tf + r));
      expect(b, designation).toBeGreaterThan(tw + (family === 'I' ? 2 : 1) * r);
    }
  });
});
