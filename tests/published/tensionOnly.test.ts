import { describe, expect, it } from 'vitest';
import { tensionOnlyEquilibrium } from '../../core/forces/tensionOnly.ts';
import { crossedTiers } from '../properties/given/plainBays.ts';

// Statics of a pinned crossed bay of 5 m by 4 m under 100 kN: L = √41 m, cos = 5/√41, T = V/cos = 128.1 kN with one diagonal slack.
const bay = (push: number, presets: readonly number[] = []) =>
  tensionOnlyEquilibrium(crossedTiers(5000, [4000], { member: 1e14, diagonal: 1.6e8 }, [push], presets));

describe('a crossed bay of tension-only diagonals', () => {
  it('carries the whole shear in the taut diagonal, the other slack', () => {
    const found = bay(100_000);
    if (found.kind !== 'balanced') throw new Error(found.kind);
    // Tolerance: working accuracy; the hand result is exact statics.
    expect(found.forces[3]).toBeCloseTo((100_000 * Math.sqrt(41)) / 5, 3);
    expect(found.forces[4]).toBe(0);
    expect(found.slack).toEqual(['t0.fall']);
  });

  it('shares the load between both while pretension keeps both taut: T = P0 + V/(2 cos)', () => {
    // P0 = EA·preset/L with stiff members: 1.6e8 × 3/6403.1 = 74.96 kN each, so both stay taut under 100 kN (V/(2 cos) = 64.0 kN).
    const found = bay(100_000, [3, 3]);
    if (found.kind !== 'balanced') throw new Error(found.kind);
    const P0 = (1.6e8 * 3) / Math.sqrt(5000 ** 2 + 4000 ** 2);
    const half = (100_000 * Math.sqrt(41)) / 10;
    // Members of EA 1e14 give by some 1e-6 of what the diagonals do; the hand result takes them as rigid.
    expect((found.forces[3] ?? 0) / (P0 + half)).toBeCloseTo(1, 3);
    expect((found.forces[4] ?? 0) / (P0 - half)).toBeCloseTo(1, 3);
  });

  it('says that a single diagonal cannot carry the reversed load, and which way the bay goes', () => {
    const problem = crossedTiers(5000, [4000], { member: 1e12, diagonal: 1.6e8 }, [-100_000]);
    const found = tensionOnlyEquilibrium({ ...problem, bars: problem.bars.slice(0, 4) });
    if (found.kind !== 'no way to carry') throw new Error(found.kind);
    // Unknown 6 is the push's own: the head of the left column, along x.
    expect(found.motion[6]).toBeCloseTo(-1, 6);
  });
});
