/** Single figures that were worked out independently of this program, or follow from a formula in print. */
import { describe, expect, it } from 'vitest';
import { angleProperties } from '../../core/section/angleProperties.ts';
import { halfLastDigit } from './printed.ts';

describe('figures worked out independently', () => {
  // METHODS.md §1, exact integration. Tolerance: half the last digit given.
  it('gives the worked properties of 70x70x6', () => {
    const p = angleProperties({ longLeg: 70, shortLeg: 70, thickness: 6, rootRadius: 9, toeRadius: 4.5 });
    within(p.area, '812.69');
    within(p.Ixx / 10, '36884');
    within(p.Iyy / 10, '36884');
    within(-p.Ixy, '216161');
    within(p.Iu / 1000, '585');
    within(p.Iv, '152679');
    within(p.rv, '13.7');
  });

  // A fine polygon with fillets, by another program; its figures agree with remembered tables. Tolerance: half the last digit given.
  // Its centroid of 100x100x10 is left out: it says 28.23, and 28.22 comes of the sum by hand below.
  it.each([
    {
      name: '100x100x10',
      outline: { longLeg: 100, shortLeg: 100, thickness: 10, rootRadius: 12, toeRadius: 6 },
      figures: {
        area: '1915.5',
        Ix: '1.7668',
        Iu: '2.8035',
        Iv: '0.7301',
        rx: '30.37',
        ru: '38.26',
        rv: '19.52',
      },
    },
    {
      name: '70x70x7',
      outline: { longLeg: 70, shortLeg: 70, thickness: 7, rootRadius: 9, toeRadius: 4.5 },
      figures: { area: '939.7', c: '19.71', Ix: '0.4230', Iv: '0.1750', rx: '21.22', rv: '13.65' },
    },
    {
      name: '100x75x8',
      outline: { longLeg: 100, shortLeg: 75, thickness: 8, rootRadius: 10, toeRadius: 5 },
      figures: { area: '1346.7', c: '31.0', Ix: '1.3305', Iu: '1.6249', Iv: '0.3464', rv: '16.04' },
    },
  ])('agrees with a fine polygon of $name', ({ outline, figures }) => {
    const p = angleProperties(outline);
    within(p.area, figures.area);
    if (figures.c !== undefined) within(p.centroidY, figures.c);
    within(p.Ixx / 1e6, figures.Ix);
    if (figures.Iu !== undefined) within(p.Iu / 1e6, figures.Iu);
    within(p.Iv / 1e6, figures.Iv);
    if (figures.rx !== undefined) within(p.rx, figures.rx);
    if (figures.ru !== undefined) within(p.ru, figures.ru);
    within(p.rv, figures.rv);
  });

  // The same polygon of 100x75x8, for the shorter leg and the direction of the principal axes.
  it('agrees with a fine polygon of 100x75x8 about its shorter leg', () => {
    const p = angleProperties({ longLeg: 100, shortLeg: 75, thickness: 8, rootRadius: 10, toeRadius: 5 });
    within(p.centroidX, '18.7');
    within(p.Iyy / 1e6, '0.6408');
    within(Math.tan(p.alpha), '0.547');
  });
});

describe('centroid of 100x100x10 by hand', () => {
  // Two rectangles, plus the fillet, less the two toes. A corner of radius r between a quarter circle and its two tangents has the area
  // (1 − π/4) r² and its centroid (10 − 3π)/(12 − 3π) r from each tangent: plane geometry.
  it('agrees with rectangles, fillet and toes taken one by one', () => {
    const p = angleProperties({ longLeg: 100, shortLeg: 100, thickness: 10, rootRadius: 12, toeRadius: 6 });
    const area = (r: number): number => (1 - Math.PI / 4) * r ** 2;
    const inset = (r: number): number => ((10 - 3 * Math.PI) / (12 - 3 * Math.PI)) * r;
    const parts: readonly (readonly [number, number])[] = [
      [100 * 10, 50],
      [10 * 90, 5],
      [area(12), 10 + inset(12)],
      [-area(6), 100 - inset(6)],
      [-area(6), 10 - inset(6)],
    ];
    const whole = parts.reduce((sum, [a]) => sum + a, 0);
    expect(p.area).toBeCloseTo(whole, 9);
    expect(p.centroidX).toBeCloseTo(parts.reduce((sum, [a, x]) => sum + a * x, 0) / whole, 9);
  });
});

describe('torsion and shear centre of 125x75x8', () => {
  const p = angleProperties({ longLeg: 125, shortLeg: 75, thickness: 8, rootRadius: 11, toeRadius: 5.5 });

  // J = t³(h + b − t)/3 and Iw = t³[(h − t/2)³ + (b − t/2)³]/36: the thin-wall formulas in print, worked by hand here.
  it('has J and Iw of its centre lines', () => {
    expect(p.J).toBeCloseTo((512 * 192) / 3, 6);
    expect(p.Iw).toBeCloseTo((512 * (121 ** 3 + 71 ** 3)) / 36, 3);
  });

  it('has its shear centre where the centre lines of the legs meet, half a thickness from each outer face', () => {
    expect(p.shearCentre[0] + p.centroidX).toBeCloseTo(4, 12);
    expect(p.shearCentre[1] + p.centroidY).toBeCloseTo(4, 12);
  });

  // Distance of the shear centre of an equal angle from its centroid: √2 (c − t/2).
  it('lies on the axis of symmetry of an equal angle', () => {
    const equal = angleProperties({ longLeg: 70, shortLeg: 70, thickness: 6, rootRadius: 9, toeRadius: 4.5 });
    expect(Math.hypot(...equal.shearCentre)).toBeCloseTo(Math.SQRT2 * (equal.centroidX - 3), 12);
    expect(equal.shearCentre[0]).toBeCloseTo(equal.shearCentre[1], 12);
  });
});

function within(value: number, given: string): void {
  expect(Math.abs(value - Number(given)), `${value} against ${given}`).toBeLessThanOrEqual(
    halfLastDigit(given),
  );
}
