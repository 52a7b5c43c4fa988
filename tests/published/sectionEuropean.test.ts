/** Every row of SCI P363 (UK angles to BS EN 10056-1) that was vouched for, against the properties of its outline. */
import { describe, expect, it } from 'vitest';
import { angleProperties } from '../../core/section/angleProperties.ts';
import { areaIntegrals } from '../../core/section/areaIntegrals.ts';
import type { AngleOutline, SectionProperties } from '../../core/section/model.ts';
import { outlinePolygon } from '../../core/section/outlinePath.ts';
import published from './data/angles-en.json' with { type: 'json' };
import { ARITHMETIC, halfThirdFigure } from './printed.ts';

type Row = (typeof published.rows)[number];
const FIGURES = ['A', 'cy', 'cz', 'Iy', 'Iz', 'iy', 'iz', 'Iu', 'iu', 'Iv', 'iv', 'tanAlpha'] as const;
type Figure = (typeof FIGURES)[number];

const checked = published.rows.filter((row) => row.check);

/**
 * Figures of the table that are not the rounding of the exact value, 7 of 552, each with what was found about it:
 * "cut off": the third figure was cut, not rounded; "from the printed radii": worked from figures already rounded;
 * "not explained": the exact value is confirmed below by a route of its own.
 */
const NOT_ROUNDED: Readonly<Record<string, 'cut off' | 'from the printed radii' | 'not explained'>> = {
  '90x90x10 iu': 'cut off', // 3.4278 printed 3.42; the row's own Iu and A give 3.43
  '200x100x15 Iv': 'cut off', // 193.73 printed 193
  '200x100x15 iu': 'from the printed radii', // 6.5844 printed 6.59 = √(6.40² + 2.64² − 2.12²)
  '50x30x5 iz': 'cut off', // 0.81578 printed 0.815
  '40x25x4 iz': 'cut off', // 0.68773 printed 0.687
  '40x25x4 Iv': 'cut off', // 0.70058 printed 0.700
  '150x75x10 Iz': 'not explained', // 85.367 printed 85.6
};

describe('SCI P363, angles to EN 10056-1', () => {
  it('has 46 rows to check, each with all its figures', () => {
    expect(checked).toHaveLength(46);
    for (const row of checked) for (const figure of FIGURES) expect(printed(row, figure)).toBeGreaterThan(0);
  });

  // Tolerance: half a unit in the third printed figure.
  it.each(checked)('gives A, centroid, I and r about all axes of $designation as printed', (row) => {
    const p = angleProperties(outlineOf(row));
    for (const figure of FIGURES) {
      if (NOT_ROUNDED[`${row.designation} ${figure}`]) continue;
      const expected = printed(row, figure);
      const off = Math.abs(computed(p, figure) - expected);
      expect(off, figure).toBeLessThanOrEqual(halfThirdFigure(expected) * (1 + ARITHMETIC));
    }
  });

  it('gives the figures that the table cut off, when cut off the same way', () => {
    for (const { row, figure } of oddFigures('cut off')) {
      const expected = printed(row, figure);
      const unit = 2 * halfThirdFigure(expected);
      const cut = Math.floor(computed(angleProperties(outlineOf(row)), figure) / unit) * unit;
      expect(cut, `${row.designation} ${figure}`).toBeCloseTo(expected, 9);
    }
  });

  // ru² + rv² = rx² + ry², so ru from the three printed radii is the print, and from the unrounded ones it is ours.
  it('finds the printed major radius of 200x100x15 in its other printed radii', () => {
    const [{ row } = { row: undefined }] = oddFigures('from the printed radii');
    if (!row) throw new Error('the row is gone');
    const fromPrint = Math.sqrt(printed(row, 'iy') ** 2 + printed(row, 'iz') ** 2 - printed(row, 'iv') ** 2);
    expect(fromPrint).toBeCloseTo(printed(row, 'iu'), 2);
  });

  // The only figure without an explanation: 85.6 printed, 85.37 computed, 0.27 % lower. Facets of 400 chords an arc, summed as triangles,
  // know nothing of arcs; they miss the arc by (π/2/400)²/8 of a radius, so 1e-5 of I is ample.
  it('confirms its own second moment of 150x75x10 by a polygon of many sides', () => {
    const [{ row } = { row: undefined }] = oddFigures('not explained');
    if (!row) throw new Error('the row is gone');
    const p = angleProperties(outlineOf(row));
    expect(polygonSecondMomentAboutY(outlineOf(row)) / p.Iyy).toBeCloseTo(1, 5);
    expect(p.Iyy / 1e4).toBeCloseTo(85.37, 2);
  });

  it('keeps the list of odd figures short and true: each of them does miss half a unit', () => {
    const odd = [
      ...oddFigures('cut off'),
      ...oddFigures('from the printed radii'),
      ...oddFigures('not explained'),
    ];
    expect(odd).toHaveLength(Object.keys(NOT_ROUNDED).length);
    for (const { row, figure } of odd) {
      const expected = printed(row, figure);
      const off = Math.abs(computed(angleProperties(outlineOf(row)), figure) - expected);
      expect(off, `${row.designation} ${figure}`).toBeGreaterThan(halfThirdFigure(expected));
    }
  });

  // The mass is the area at 7850 kg/m³. Tolerance: a unit of the third figure, since the table rounds the area first and then the mass
  // (43.0 cm² gives the printed 33.8 kg/m of 200x100x15, 42.99 gives 33.7); 20x20x3 is printed to two figures, 0.88.
  it.each(published.rows)('has the area that the printed mass of $designation asks for', (row) => {
    const mass = angleProperties(outlineOf(row)).area * 7.85e-3;
    const tolerance = row.mass < 1 ? 0.005 : 2 * halfThirdFigure(row.mass);
    expect(Math.abs(mass - row.mass)).toBeLessThanOrEqual(tolerance);
  });
});

function outlineOf(row: Row): AngleOutline {
  return { longLeg: row.a, shortLeg: row.b, thickness: row.t, rootRadius: row.r1, toeRadius: row.r2 };
}

function printed(row: Row, figure: Figure): number {
  return row[figure] ?? Number.NaN;
}

/** In the units of the table: cm, cm², cm⁴. Its y is our x, its z our y. */
function computed(p: SectionProperties, figure: Figure): number {
  const values: Readonly<Record<Figure, number>> = {
    A: p.area / 1e2,
    cy: p.centroidY / 10,
    cz: p.centroidX / 10,
    Iy: p.Ixx / 1e4,
    Iz: p.Iyy / 1e4,
    iy: p.rx / 10,
    iz: p.ry / 10,
    Iu: p.Iu / 1e4,
    iu: p.ru / 10,
    Iv: p.Iv / 1e4,
    iv: p.rv / 10,
    tanAlpha: Math.tan(p.alpha),
  };
  return values[figure];
}

function oddFigures(reason: string): readonly { readonly row: Row; readonly figure: Figure }[] {
  return checked.flatMap((row) =>
    FIGURES.filter((figure) => NOT_ROUNDED[`${row.designation} ${figure}`] === reason).map((figure) => ({
      row,
      figure,
    })),
  );
}

function polygonSecondMomentAboutY(outline: AngleOutline): number {
  const corners = outlinePolygon(outline, 400);
  const sums = areaIntegrals(
    corners.map((from, i) => ({ kind: 'line', from, to: corners[(i + 1) % corners.length] ?? from })),
  );
  return sums.xx - sums.x ** 2 / sums.area;
}
