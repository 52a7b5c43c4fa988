/** Members made of plates against printed tables, and a column of a published example. */
import { describe, expect, it } from 'vitest';
import { compressionResistances } from '../../core/resistance/compression/compressionResistances.ts';
import { boxProperties, iProperties } from '../../core/section/plateShapes.ts';

/** Within half the last printed digit. */
const printed = (value: number, print: number, half: number): void => {
  expect(Math.abs(value - print), `${value} against ${print}`).toBeLessThanOrEqual(half * (1 + 1e-9));
};

describe('cold-formed tubes by EN 10219-2 (tables from memory)', () => {
  it('100 × 100 × 5: 18.4 cm², 271 cm⁴, 3.84 cm', () => {
    const p = boxProperties(100, 100, 5);
    printed(p.area / 100, 18.4, 0.05);
    printed(p.Ixx / 1e4, 271, 0.5);
    printed(p.rx / 10, 3.84, 0.005);
  });

  it('150 × 100 × 6: 27.6 cm², 835 and 444 cm⁴', () => {
    const p = boxProperties(150, 100, 6);
    printed(p.area / 100, 27.6, 0.05);
    printed(p.Ixx / 1e4, 835, 0.5);
    printed(p.Iyy / 1e4, 444, 0.5);
  });
});

describe('cold-formed tubes with walls over 6 mm, by EN 10219-2 (tables from memory)', () => {
  it.each([
    [100, 8, 27.2, 366],
    [150, 8, 43.2, 1412],
    [200, 10, 72.6, 4251],
    [200, 12.5, 87.0, 4860],
  ])('%d square by %d: %d cm², %d cm⁴', (side, wall, area, I) => {
    const p = boxProperties(side, side, wall);
    printed(p.area / 100, area, 0.05);
    printed(p.Ixx / 1e4, I, I > 4500 ? 5 : 0.5);
  });
});

describe('rolled I sections, whose fillets are left out (tables from memory)', () => {
  it('UB 203 × 133 × 25: 32.0 cm², 2340 and 308 cm⁴, warping 0.0294 dm⁶; never above the print by more than its rounding, and within 3 % below', () => {
    const p = iProperties({ depth: 203.2, width: 133.2, web: 5.7, flange: 7.8 });
    for (const [value, print, half] of [
      [p.area / 100, 32.0, 0.05],
      [p.Ixx / 1e4, 2340, 5],
      [p.Iyy / 1e4, 308, 0.5],
      [p.Iw / 1e12, 0.0294, 5e-5],
    ] as const) {
      expect(value).toBeLessThanOrEqual(print + half);
      expect(value).toBeGreaterThan(0.97 * print);
    }
  });
});

describe('AISC Design Examples v16, E.1A: W14×132, A992, 30 ft between pins', () => {
  // The example's section, steel and length were found by a search; the strengths 893 and 594 kips (AISC Manual Table 4-1a) and the section's A 38.8 in²,
  // r_x 6.28, r_y 3.76 in, J 12.3 in⁴, C_w 25 500 in⁶ are from memory.
  const IN = 25.4;
  const KIP = 4448.2216;
  const section = {
    designation: 'W14X132',
    shape: 'I section',
    properties: {
      ...iProperties({ depth: 14.7 * IN, width: 14.7 * IN, web: 0.645 * IN, flange: 1.03 * IN }),
      area: 38.8 * IN ** 2,
      rx: 6.28 * IN,
      ru: 6.28 * IN,
      ry: 3.76 * IN,
      rv: 3.76 * IN,
      J: 12.3 * IN ** 4,
      Iw: 25_500 * IN ** 6,
    },
    connectedLeg: 14.7 * IN,
    outstandingLeg: 14.7 * IN,
    thickness: 1.03 * IN,
    rootRadius: 0,
    offCentroid: 7.35 * IN,
    plates: [
      { name: 'flange', width: 7.35 * IN, thickness: 1.03 * IN },
      { name: 'web', width: 12.64 * IN, thickness: 0.645 * IN },
    ],
  } as const;
  const strength = (method: 'LRFD' | 'ASD'): number => {
    const length = 360 * IN;
    const [, byLengths] = compressionResistances({
      practice: 'aisc360',
      section,
      steel: {
        grade: 'A992',
        fy: 344.738,
        fu: 448.2,
        E: 199_948,
        G: 77_221,
        source: 'the example',
        confidence: 'read in a source',
      },
      ends: [],
      options: {
        method,
        partialFactors: { gammaM0: null, gammaM1: null, gammaM2: null },
        blockTearing: 'off the middle',
        punchedHoles: false,
        gussetFixity: 'hinged',
      },
      length,
      unbraced: { x: length, y: length, u: length, v: length },
      twistLength: length,
      criticalLoad: null,
      system: 'planar',
      joinedBetween: false,
    });
    return (byLengths?.resistance ?? 0) / KIP;
  };

  it('carries 893 kips by load and resistance factors', () => printed(strength('LRFD'), 893, 0.5));
  it('carries 594 kips by allowable strength', () => printed(strength('ASD'), 594, 0.5));
});
