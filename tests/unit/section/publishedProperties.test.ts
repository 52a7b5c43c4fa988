import { describe, expect, it } from 'vitest';
import { angleProperties } from '../../../core/section/angleProperties.ts';
import { radiusFor } from '../../../core/section/direction.ts';
import { publishedProperties } from '../../../core/section/publishedProperties.ts';

const outline = { longLeg: 125, shortLeg: 75, thickness: 8, rootRadius: 11, toeRadius: 5.5 };

describe('properties carried as published', () => {
  // Figures with all their digits leave nothing to rounding, so carrying them must give back the computed section itself.
  it('are the computed ones when the published figures are exact', () => {
    const exact = angleProperties(outline);
    const carried = publishedProperties(outline, exact);
    for (const key of ['Ixx', 'Iyy', 'Ixy', 'Iu', 'Iv', 'alpha', 'rx', 'ry', 'ru', 'rv'] as const)
      expect(carried[key] / exact[key]).toBeCloseTo(1, 9);
    const n = [Math.cos(1), Math.sin(1)] as const;
    expect(radiusFor(carried, n)).toBeCloseTo(radiusFor(exact, n), 9);
  });

  it('are refused when the minor axis is not the weakest', () => {
    const exact = angleProperties(outline);
    expect(() => publishedProperties(outline, { ...exact, rv: exact.ry * 1.01 })).toThrow(/least radius/);
    expect(() => publishedProperties(outline, { ...exact, Iv: exact.Iyy * 1.01 })).toThrow(/not the least/);
  });
});
