/** Holes, what is deducted for them, and least distances. Practice-facts H3, B0; CSA S16 22.3 as an open teaching example applies it. */
import { describe, expect, it } from 'vitest';
import { deductedWidth, leastDistances, normalHole } from '../../../core/resistance/holes.ts';

const INCH = 25.4;

describe('a normal hole', () => {
  it('is as each practice makes it for M12, M16, M20, M24 and M30', () => {
    const holes = (practice: Parameters<typeof normalHole>[0]) =>
      [12, 16, 20, 24, 30].map((bolt) => normalHole(practice, bolt));
    expect(holes('en1993')).toEqual([13, 18, 22, 26, 33]);
    expect(holes('is800')).toEqual([13, 18, 22, 26, 33]);
    expect(holes('sans10162')).toEqual([14, 18, 22, 26, 33]);
    expect(holes('csaS16')).toEqual([14, 18, 22, 26, 33]);
    expect(holes('as4100')).toEqual([14, 18, 22, 26, 33]);
    expect(holes('aisc360')).toEqual([14, 18, 22, 27, 33]);
  });

  it('is 9/16, 11/16, 13/16, 15/16 and 1 1/8 in for AISC’s inch bolts', () => {
    // AISC 360-16 Table J3.3.
    const sixteenths = [0.5, 0.625, 0.75, 0.875, 1].map(
      (bolt) => (normalHole('aisc360', bolt * INCH) / INCH) * 16,
    );
    [9, 11, 13, 15, 18].forEach((printed, k) => {
      expect(sixteenths[k]).toBeCloseTo(printed, 9);
    });
  });
});

describe('the width deducted', () => {
  const m20 = { boltDiameter: 20, hole: 22 };

  it('is 2 mm above the hole in SANS, CSA and AISC, whatever way it is made', () => {
    for (const practice of ['sans10162', 'csaS16', 'aisc360'] as const)
      expect([false, true].map((punched) => deductedWidth(practice, m20, punched).width)).toEqual([24, 24]);
  });

  it('is the hole in EN, and 2 mm more for punched holes in AS and IS', () => {
    expect([false, true].map((punched) => deductedWidth('en1993', m20, punched).width)).toEqual([22, 22]);
    for (const practice of ['as4100', 'is800'] as const)
      expect([false, true].map((punched) => deductedWidth(practice, m20, punched).width)).toEqual([22, 24]);
  });

  it('is 7/8 in for a 3/4 in bolt by AISC: the hole and 1/16 in', () => {
    const made = { boltDiameter: 0.75 * INCH, hole: (13 / 16) * INCH };
    expect(deductedWidth('aisc360', made, false).width / INCH).toBeCloseTo(0.875, 9);
    expect(deductedWidth('aisc360', made, false).formula).toBe('hole + 1/16 in (B4.3b)');
  });
});

describe('least distances', () => {
  it('are 2.2, 1.2 and 1.2 holes in EN', () => {
    expect(leastDistances('en1993', { boltDiameter: 20, hole: 22 }, 3)).toMatchObject({
      pitch: 2.2 * 22,
      end: 1.2 * 22,
      edge: 1.2 * 22,
    });
  });

  it('are 51.43, 25 and 25 mm for four 3/4 in bolts in CSA, and 1.5 bolts at the end for two', () => {
    // Teaching example T15: minimum pitch 51.43, edge 25, end 25 with more than two bolts in line.
    const made = { boltDiameter: 19.05, hole: 22 };
    const four = leastDistances('csaS16', made, 4);
    expect(four.pitch).toBeCloseTo(51.43, 1);
    expect([four.end, four.edge]).toEqual([25, 25]);
    expect(leastDistances('csaS16', made, 2).end).toBeCloseTo(1.5 * 19.05, 9);
  });

  it('are 50 and 33 mm for M20 in IS: 2.5 bolts, 1.5 holes', () => {
    // A published design manual to IS 800 takes pitch 50 and end distance 33 for 20 mm bolts.
    expect(leastDistances('is800', { boltDiameter: 20, hole: 22 }, 6)).toMatchObject({ pitch: 50, end: 33 });
  });

  it('are 1 in to the edge and 2 in apart for a 3/4 in bolt by AISC', () => {
    const { edge, pitch } = leastDistances(
      'aisc360',
      { boltDiameter: 0.75 * INCH, hole: (13 / 16) * INCH },
      3,
    );
    expect(edge / INCH).toBeCloseTo(1, 9);
    expect(pitch / INCH).toBeCloseTo(2, 9);
  });

  it('never fall with a larger bolt', () => {
    for (const practice of ['sans10162', 'csaS16', 'aisc360', 'en1993', 'as4100', 'is800'] as const) {
      const edges = [12, 16, 19.05, 20, 22, 22.225, 24, 25.4, 27, 30, 36, 42].map(
        (bolt) => leastDistances(practice, { boltDiameter: bolt, hole: normalHole(practice, bolt) }, 3).edge,
      );
      expect(
        [...edges].sort((a, b) => a - b),
        practice,
      ).toEqual(edges);
    }
  });
});
