/** All 137 angles of the AISC Shapes Database v15.0: given back as printed, and the derived figures against the printed ones. */
import { describe, expect, it } from 'vitest';
import usFile from '../../assets/catalogues/us.json' with { type: 'json' };
import { readCatalogue } from '../../core/catalogue/readCatalogue.ts';
import { motionAbout, radiusFor } from '../../core/section/direction.ts';
import published from './data/angles-us.json' with { type: 'json' };
import { halfThirdFigure } from './printed.ts';

type Row = (typeof published.rows)[number];
const catalogue = readCatalogue(usFile);
const INCH = 25.4;
/** Conversion from inches and back is all that happens to a carried figure: a few roundings of binary arithmetic. */
const CARRIED = 1e-12;

function stock(row: Row) {
  const angle = catalogue.angles.find(({ designation }) => designation === row.designation);
  if (!angle) throw new Error(`${row.designation} is not in the catalogue`);
  return angle;
}

describe('AISC Shapes Database v15.0, angles', () => {
  it('is carried whole and in its order', () => {
    expect(published.rows).toHaveLength(137);
    expect(catalogue.angles.map(({ designation }) => designation)).toEqual(
      published.rows.map(({ designation }) => designation),
    );
  });

  it.each(published.rows)('gives back $designation as published', (row) => {
    const { properties: p, outline, massPerMetre, basis } = stock(row);
    expect(basis).toBe('published');
    const carried: (readonly [number, number])[] = [
      [outline.longLeg / INCH, row.long],
      [outline.shortLeg / INCH, row.short],
      [outline.thickness / INCH, row.t],
      [p.area / INCH ** 2, row.A],
      [p.centroidX / INCH, row.x],
      [p.centroidY / INCH, row.y],
      [p.Ixx / INCH ** 4, row.Ix],
      [p.rx / INCH, row.rx],
      [p.Iyy / INCH ** 4, row.Iy],
      [p.ry / INCH, row.ry],
      [p.Iv / INCH ** 4, row.Iz],
      [p.rv / INCH, row.rz],
      [p.J / INCH ** 4, row.J],
      [p.Iw / INCH ** 6, row.Cw],
      // One pound is 0.45359237 kg and one foot 0.3048 m, by definition.
      [(massPerMetre * 0.3048) / 0.45359237, row.W],
    ];
    const { printed } = stock(row);
    if (!printed) throw new Error('nothing printed is carried');
    carried.push([printed.Iu / INCH ** 4, row.Iw], [Math.abs(Math.tan(printed.alpha)), row.tanAlpha]);
    for (const [ours, theirs] of carried) expect(Math.abs(ours / theirs - 1)).toBeLessThan(CARRIED);
  });

  it.each(published.rows)('gives the printed radii of $designation in the directions of its axes', (row) => {
    const { properties: p } = stock(row);
    expect(radiusFor(p, [0, 1]) / INCH / row.rx).toBeCloseTo(1, 12);
    expect(radiusFor(p, [1, 0]) / INCH / row.ry).toBeCloseTo(1, 12);
    expect(radiusFor(p, motionAbout(p, 'v')) / INCH / row.rz).toBeCloseTo(1, 12);
    expect(radiusFor(p, motionAbout(p, 'u')) / p.ru).toBeCloseTo(1, 12);
  });

  // Tolerance: half a printed unit of each of the four figures that meet in Ix + Iy = Iz + Iw.
  it.each(published.rows)('finds the major second moment of $designation from the other three', (row) => {
    const ours = stock(row).properties.Iu / INCH ** 4;
    const tolerance = [row.Ix, row.Iy, row.Iz, row.Iw].map(halfThirdFigure).reduce((a, b) => a + b);
    expect(Math.abs(ours - row.Iw)).toBeLessThanOrEqual(tolerance);
  });

  // Tolerance: what tan alpha becomes when the three radii it follows from are half a printed unit more or less, and half a unit of its own print.
  it.each(published.rows)(
    'finds the printed direction of the principal axes of $designation from its radii',
    (row) => {
      const tangents = [-1, 0, 1].flatMap((dx) =>
        [-1, 0, 1].flatMap((dy) =>
          [-1, 0, 1].map((dz) =>
            tangent(
              row.rx + dx * halfThirdFigure(row.rx),
              row.ry + dy * halfThirdFigure(row.ry),
              row.rz + dz * halfThirdFigure(row.rz),
            ),
          ),
        ),
      );
      const half = halfThirdFigure(row.tanAlpha);
      expect(row.tanAlpha + half).toBeGreaterThanOrEqual(Math.min(...tangents));
      expect(row.tanAlpha - half).toBeLessThanOrEqual(Math.max(...tangents));
      expect(Math.tan(stock(row).properties.alpha)).toBeCloseTo(tangent(row.rx, row.ry, row.rz), 9);
    },
  );

  it('has x parallel to the shorter leg, so that nothing is stiffer about y than about x', () => {
    for (const { properties: p } of catalogue.angles) {
      expect(p.Ixx).toBeGreaterThanOrEqual(p.Iyy);
      expect(p.rx).toBeGreaterThanOrEqual(p.ry);
      expect(p.centroidY).toBeGreaterThanOrEqual(p.centroidX);
      expect(p.Ixy).toBeLessThan(0);
    }
  });
});

/** tan of the angle between x and the major axis: tan 2a = 2√((rx² − rz²)(ry² − rz²))/(rx² − ry²), solved for tan a. */
function tangent(rx: number, ry: number, rz: number): number {
  const product = Math.sqrt((rx * rx - rz * rz) * (ry * ry - rz * rz));
  const half = (rx * rx - ry * ry) / 2;
  return (Math.hypot(half, product) - half) / product;
}
