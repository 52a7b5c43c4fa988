/** Shapes other than an angle, each against a formula that the code does not take, or a printed table. */
import { describe, expect, it } from 'vitest';
import { stockOf } from '../../../core/catalogue/stock.ts';
import { angleProperties } from '../../../core/section/angleProperties.ts';
import { shapeProperties } from '../../../core/section/shapeProperties.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const stock = stockOf('en', [], CATALOGUES);
const called = (typed: string) => {
  const found = stock.find(typed);
  if (!found.ok) throw new Error(`${typed} is not found`);
  return found.angle;
};

describe('a round tube', () => {
  it('has the printed properties of CHS 60.3 × 4', () => {
    // EN 10210-2: A 7.07 cm², I 28.2 cm⁴, i 2.00 cm (from memory, sure). Half the last printed digit.
    const { area, Ixx, rv } = called('CHS 60.3x4').properties;
    expect(Math.abs(area - 707)).toBeLessThan(0.5);
    expect(Math.abs(Ixx / 1e4 - 28.2)).toBeLessThan(0.05);
    expect(Math.abs(rv / 10 - 2)).toBeLessThan(0.005);
  });
});

describe('a flat and a rod', () => {
  it('have the radii of a rectangle and a circle', () => {
    const flat = called('FL 80x8').properties;
    expect(flat.rv).toBeCloseTo(8 / Math.sqrt(12), 12);
    expect(flat.ru).toBeCloseTo(80 / Math.sqrt(12), 12);
    expect(called('rod 20').properties.rv).toBeCloseTo(5, 12);
  });
});

describe('two angles', () => {
  const one = angleProperties(called('70x70x6').outline);

  it('back to back have twice the area, and the gap widens only what bends across it', () => {
    const pair = called('2L 70x70x6/10').properties;
    expect(pair.area).toBeCloseTo(2 * one.area, 9);
    expect(pair.Ixx).toBeCloseTo(2 * one.Ixx, 6);
    // Steiner: each centroid lies half the gap and its own distance from the middle.
    expect(pair.Iyy).toBeCloseTo(2 * (one.Iyy + one.area * (5 + one.centroidX) ** 2), 4);
  });

  it('heel to heel keep the least radius of one about the axis through both heels’ sides', () => {
    // Equal angles in a star: about the axis along both heels the pair has twice I_u of one, across it 2(I_v + A d²).
    const star = called('2L 70x70x6/10 STAR').properties;
    const d = Math.SQRT2 * (5 + one.centroidX);
    const [a, b] = [2 * one.Iu, 2 * (one.Iv + one.area * d * d)];
    expect(star.Iv).toBeCloseTo(Math.min(a, b), 3);
    expect(star.Iu).toBeCloseTo(Math.max(a, b), 3);
  });
});

describe('a channel', () => {
  it('has its shear centre behind its web, by the thin-walled formula e = 3b²t_f/(6bt_f + ht_w)', () => {
    const [depth, width, web, flange] = [100, 50, 6, 8.5];
    const p = shapeProperties({ kind: 'channel', depth, width, web, flange });
    const [h, b] = [depth - flange, width - web / 2];
    const e = (3 * b * b * flange) / (6 * b * flange + h * web);
    expect(p.shearCentre[0]).toBeCloseTo(web / 2 - e - p.centroidX, 9);
  });
});

describe('names that make no shape', () => {
  it('are found nowhere', () => {
    for (const typed of ['FL 8x80', 'CHS 20x12', 'ROD 200', '2L 70x70x6/0', 'SHS 60x40x4', 'T 100x100'])
      expect(stock.find(typed).ok, typed).toBe(false);
  });
});
