/** What standards ask of a hold, against the worked figures of a fact sheet of formulas for angle diagonals (its section J3). */
import { describe, expect, it } from 'vitest';
import {
  aiscPanel,
  aiscPoint,
  bowReduction,
  bsOnePerCent,
  detailed,
  enStabilising,
  type RestraintCase,
  restraintDemands,
} from '../../core/practice/restraintDemand.ts';
import { halfLastDigit } from './printed.ts';

/** P = 500 kN, Lb = 3 m, one point, D0 = 3000/500 = 6 mm. */
const GIVEN: RestraintCase = { compression: 500_000, spacing: 3000, points: 1, misalignment: 6 };

function near(actual: number | null, printed: string, unit: number): void {
  expect(Math.abs((actual ?? Number.NaN) / unit - Number(printed))).toBeLessThan(
    halfLastDigit(printed) * 1.001,
  );
}
const KN = 1000;
/** kN/m are N/mm. */
const KN_PER_M = 1;

describe('the demands on a hold', () => {
  it('are 5.0 kN and 1778 kN/m for a point, 2.5 kN and 444 kN/m for a panel, by AISC 360', () => {
    near(aiscPoint(GIVEN).force, '5.0', KN);
    near(aiscPoint(GIVEN).stiffness, '1778', KN_PER_M);
    near(aiscPanel(GIVEN).force, '2.5', KN);
    near(aiscPanel(GIVEN).stiffness, '444', KN_PER_M);
  });

  it('are 10 kN by the simple rule of CSA S16 and SANS 10162, 4.0 kN by the detailed one, 8.0 kN with β = 4', () => {
    for (const practice of ['csaS16', 'sans10162'] as const) {
      const [simple, full] = restraintDemands(practice, GIVEN);
      near(simple?.force ?? null, '10.0', KN);
      near(full?.force ?? null, '4.0', KN);
    }
    near(detailed({ ...GIVEN, points: 9 }, '').force, '8.0', KN);
  });

  it('rise from β = 2 to 4 with the number of points', () => {
    // 2, 3, 3.41, 3.63, 4; Winter's own are 2(1 + cos π/(n + 1)) = 2, 3, 3.414, 3.618 up to 4: the clause lies within a hundredth.
    const force = (points: number) => detailed({ ...GIVEN, points }, '').force;
    for (let n = 1; n <= 4; n++)
      expect(Math.abs(force(n) / (force(1) / 2) - 2 * (1 + Math.cos(Math.PI / (n + 1))))).toBeLessThan(0.015);
    expect(force(5)).toBe(force(40));
  });

  it('are 0.775 N/mm over 24 m for five members of 300 kN by EN 1993-1-1, more where the bracing gives', () => {
    // m = 5, L = 24 m: eight spans of 3 m.
    const given: RestraintCase = { compression: 300_000, spacing: 3000, points: 7, misalignment: 6 };
    near(bowReduction(5), '0.7746', 1);
    near((bowReduction(5) * 24_000) / 500, '37.18', 1);
    for (const [deflection, q] of [
      [0, '0.775'],
      [9.6, '0.975'],
      [24, '1.275'],
    ] as const)
      near(enStabilising(given, 5, deflection).force, q, 3000);
    near(enStabilising(given, 5, 0).force * 8, '18.6', KN);
  });

  it('count on how far the bracing gives by EN 1993-1-1: in balance with the load that it makes', () => {
    // One bar of 500 kN over 6 m, held at its middle by 1000 N/mm: c = 8 · 500 000 · 3000/6000² = 333.3; e0 = 12; δ = 12/(3 − 1) = 6; F = 333.3 · 18.
    const [demand] = restraintDemands('en1993', { ...GIVEN, offered: 1000 });
    near(demand?.force ?? null, '6.000', KN);
    expect(demand?.rule).toContain('gives 6.0 mm');
    expect(restraintDemands('en1993', { ...GIVEN, offered: 300 })[0]?.force).toBe(Number.POSITIVE_INFINITY);
  });

  it('reduce the bow for several members: 1.000, 0.816, 0.775, 0.742 for 1, 3, 5, 10', () => {
    for (const [m, printed] of [
      [1, '1.000'],
      [3, '0.816'],
      [5, '0.775'],
      [10, '0.742'],
    ] as const)
      near(bowReduction(m), printed, 1);
  });

  it('are 2.5 % by AS 4100 and IS 800, 1 % by BS 5950, without a stiffness', () => {
    for (const practice of ['as4100', 'is800'] as const) {
      const [only, comparison, ...more] = restraintDemands(practice, GIVEN);
      expect(more).toEqual([]);
      near(only?.force ?? null, '12.5', KN);
      // BS 5950 stands beside every practice.
      near(comparison?.force ?? null, '5.0', KN);
      expect(only?.stiffness).toBeNull();
    }
    near(bsOnePerCent(GIVEN).force, '5.0', KN);
  });

  it('name clause and confidence for every practice', () => {
    for (const practice of ['sans10162', 'csaS16', 'aisc360', 'en1993', 'as4100', 'is800'] as const) {
      const demands = restraintDemands(practice, GIVEN);
      expect(demands.length).toBeGreaterThan(0);
      for (const { clause, confidence, rule } of demands) {
        expect(clause).toMatch(/\d/);
        expect(confidence).not.toBe('');
        expect(rule).not.toBe('');
      }
    }
  });
});
