/** Net area by chains of holes against every chain tried, over random holes (seeded, shrinking). */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ChainHole, deductionOf, straightDeductionOf } from '../../core/resistance/tension/netArea.ts';

const SEEDED = { seed: 20250311, numRuns: 300 };
/** A handful of products and quotients of numbers up to some thousands. */
const ROUNDING = 1e-9;

const hole: fc.Arbitrary<ChainHole> = fc.record({
  along: fc.integer({ min: 0, max: 300 }),
  across: fc.integer({ min: -150, max: 150 }),
  width: fc.integer({ min: 10, max: 40 }),
});
const holes = fc.array(hole, { minLength: 0, maxLength: 9 });

/** Every subset of the holes that goes across the section from hole to hole. */
function byTryingAll(all: readonly ChainHole[], t: number): number {
  let most = 0;
  for (let chosen = 0; chosen < 2 ** all.length; chosen++) {
    const chain = all
      .filter((_, k) => Math.floor(chosen / 2 ** k) % 2 === 1)
      .sort((a, b) => a.across - b.across);
    let taken = 0;
    let possible = true;
    chain.forEach((each, k) => {
      taken += each.width * t;
      const before = chain[k - 1];
      if (!before) return;
      const g = each.across - before.across;
      if (g === 0) possible = false;
      else taken -= ((each.along - before.along) ** 2 * t) / (4 * g);
    });
    if (possible) most = Math.max(most, taken);
  }
  return most;
}

describe('what chains of holes take from a section', () => {
  it('is what the worst of all chains takes', () => {
    fc.assert(
      fc.property(holes, fc.integer({ min: 3, max: 25 }), (all, t) => {
        expect(Math.abs(deductionOf(all, t) - byTryingAll(all, t))).toBeLessThanOrEqual(ROUNDING * 1e4);
      }),
      SEEDED,
    );
  });

  it('does not depend on the order of the holes, the end it is seen from, or the side', () => {
    fc.assert(
      fc.property(holes, (all) => {
        const one = deductionOf(all, 10);
        const mirrored = [...all]
          .reverse()
          .map(({ along, across, width }) => ({ along: 300 - along, across: -across, width }));
        expect(Math.abs(deductionOf(mirrored, 10) - one)).toBeLessThanOrEqual(ROUNDING * 1e4);
      }),
      SEEDED,
    );
  });

  it('is never less than the straight cut takes, which is one of the chains where its holes lie apart', () => {
    fc.assert(
      fc.property(fc.uniqueArray(hole, { maxLength: 9, selector: ({ across }) => across }), (apart) => {
        expect(deductionOf(apart, 10)).toBeGreaterThanOrEqual(
          straightDeductionOf(apart, 10) - ROUNDING * 1e4,
        );
      }),
      SEEDED,
    );
  });

  it('grows by no hole that is added far along the bar, and never shrinks with one more hole', () => {
    fc.assert(
      fc.property(holes, hole, (all, one) => {
        const more = deductionOf([...all, one], 10);
        expect(more).toBeGreaterThanOrEqual(deductionOf(all, 10) - ROUNDING * 1e4);
        const far = { ...one, along: 1e6 };
        expect(deductionOf([...all, far], 10)).toBe(Math.max(deductionOf(all, 10), one.width * 10));
      }),
      SEEDED,
    );
  });

  it('falls steadily with the stagger of two rows, from two holes to one at s² = 4 g d', () => {
    // Closed form: 2d − s²/(4g) until it reaches d.
    fc.assert(
      fc.property(
        fc.double({ min: 30, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 3, noNaN: true }),
        (g, share) => {
          const d = 22;
          const s = share * Math.sqrt(4 * g * d);
          const pair = [
            { along: 0, across: 0, width: d },
            { along: s, across: g, width: d },
          ];
          expect(deductionOf(pair, 1)).toBeCloseTo(Math.max(d, 2 * d - (s * s) / (4 * g)), 9);
        },
      ),
      SEEDED,
    );
  });
});
