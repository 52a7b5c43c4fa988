import { describe, expect, it } from 'vitest';
import { readCatalogue } from '../../../core/catalogue/readCatalogue.ts';
import publishedAu from '../../published/data/angles-au.json' with { type: 'json' };
import publishedEn from '../../published/data/angles-en.json' with { type: 'json' };
import { stockCatalogues } from './stockCatalogues.ts';

const row = {
  designation: '70x70x6',
  longLeg: 70,
  shortLeg: 70,
  thickness: 6,
  rootRadius: 9,
  toeRadius: 4.5,
};
const file = {
  format: 'tautline-catalogue',
  version: 1,
  id: 'en',
  name: 'Test angles',
  standard: 'none',
  source: 'this test',
  units: 'mm',
  basis: 'computed',
  rows: [row],
};

describe('the catalogues that come with the program', () => {
  // SCI P363: 42 equal and 39 unequal; AISC v15.0: 137; the AS/NZS 3679.1 catalogue: 46 equal and 19 unequal.
  it('hold every row of their sources', () => {
    const count = (id: 'en' | 'us' | 'au', kind: string): number =>
      stockCatalogues[id].angles.filter((angle) => angle.kind === kind).length;
    expect([count('en', 'equal'), count('en', 'unequal')]).toEqual([42, 39]);
    expect([count('au', 'equal'), count('au', 'unequal')]).toEqual([46, 19]);
    expect(stockCatalogues.us.angles).toHaveLength(137);
  });

  it('name where their figures are from', () => {
    for (const catalogue of Object.values(stockCatalogues)) {
      expect(catalogue.source.length).toBeGreaterThan(10);
      expect(catalogue.standard.length).toBeGreaterThan(3);
    }
  });

  it('carry the published dimensions, order and masses of the European angles', () => {
    expect(
      stockCatalogues.en.angles.map(({ designation, outline: o, massPerMetre }) => [
        designation,
        o.longLeg,
        o.shortLeg,
        o.thickness,
        o.rootRadius,
        o.toeRadius,
        massPerMetre,
      ]),
    ).toEqual(publishedEn.rows.map((r) => [r.designation, r.a, r.b, r.t, r.r1, r.r2, r.mass]));
  });

  it('carry the actual thickness, not the nominal one, of the Australian angles', () => {
    expect(
      stockCatalogues.au.angles.map(({ designation, outline: o }) => [
        designation,
        o.longLeg,
        o.shortLeg,
        o.thickness,
        o.rootRadius,
        o.toeRadius,
      ]),
    ).toEqual(publishedAu.rows.map((r) => [r.designation, r.a, r.b, r.t, r.r1, r.r2]));
  });

  // 7850 kg/m³ on the computed area.
  it('give a mass where the source prints none', () => {
    const angle = stockCatalogues.au.angles.find(({ designation }) => designation === '150x90x8UA');
    if (!angle) throw new Error('the row is gone');
    expect(angle.massPerMetre).toBeCloseTo(angle.properties.area * 0.00785, 9);
  });

  it('use the outline of US angles to draw them only', () => {
    const angle = stockCatalogues.us.angles.find(({ designation }) => designation === 'L3X3X1/4');
    // AISC v15.0: L3X3X1/4 has kdes = 0.625 in, so the root radius drawn is 0.375 in.
    expect(angle?.outline.rootRadius).toBeCloseTo(0.375 * 25.4, 9);
    expect(angle?.basis).toBe('published');
  });
});

describe('reading a catalogue file', () => {
  it('takes a sound one', () => {
    const [angle] = readCatalogue(file).angles;
    // METHODS.md §1: A = 812.69 mm² for 70x70x6.
    expect(angle?.properties.area).toBeCloseTo(812.69, 2);
    expect(angle?.massPerMetre).toBeCloseTo(812.69 * 0.00785, 4);
  });

  it.each<[string, unknown, RegExp]>([
    ['a text', 'angles', /at the top: expected an object/],
    ['another format', { ...file, format: 'other' }, /at format/],
    ['a later version', { ...file, version: 2 }, /at version: version 2/],
    ['an unknown id', { ...file, id: 'jp' }, /at id/],
    ['a basis without its units', { ...file, units: 'in' }, /at basis/],
    ['no rows', { ...file, rows: [] }, /at rows/],
    ['a row that is no object', { ...file, rows: [7] }, /at rows\[0\]/],
    ['a leg that is a text', { ...file, rows: [{ ...row, longLeg: '70' }] }, /at rows\[0\]\.longLeg/],
    [
      'a thickness that is missing',
      { ...file, rows: [{ ...row, thickness: undefined }] },
      /at rows\[0\]\.thickness/,
    ],
    [
      'a number that is none',
      { ...file, rows: [{ ...row, toeRadius: Number.NaN }] },
      /at rows\[0\]\.toeRadius/,
    ],
    [
      'an outline that is no angle',
      { ...file, rows: [{ ...row, thickness: 71 }] },
      /at rows\[0\]: .*thickness/,
    ],
    [
      'a designation listed twice',
      { ...file, rows: [row, { ...row, designation: '70X70x6' }] },
      /at rows\[1\]\.designation/,
    ],
    ['no source', { ...file, source: '' }, /at source/],
  ])('refuses %s and says where', (_, json, message) => {
    expect(() => readCatalogue(json)).toThrow(message);
  });
});
