import { expect } from 'vitest';
import type { Vec3 } from '../../../../core/geometry/vector.ts';

/** Double precision over some ten metres leaves about 1e-11 mm; a millionth of a millimetre is far below any workshop. */
const PLACES = 6;

export function expectAt(actual: Vec3 | undefined, expected: Vec3): void {
  expect(actual).toBeDefined();
  expected.forEach((value, k) => {
    expect(actual?.[k]).toBeCloseTo(value, PLACES);
  });
}

export function expectNear(actual: number | undefined, expected: number): void {
  expect(actual).toBeDefined();
  expect(actual ?? Number.NaN).toBeCloseTo(expected, PLACES);
}
