import { expect } from 'vitest';
import type { Assessment } from '../../../core/assessment.ts';

export interface Figures {
  readonly inService: number;
  readonly handling: number;
  readonly x: number;
  readonly y: number;
  readonly u: number;
  readonly v: number;
}

/** What each bar is judged by; null where it cannot be assessed. */
export function slendernesses(assessment: Assessment): ReadonlyMap<string, Figures | null> {
  return new Map(
    [...assessment.diagonals].map(([id, { restraint, handling, inService }]) => [
      id,
      restraint && handling && inService
        ? {
            inService: inService.slenderness,
            handling: handling.slenderness,
            x: restraint.lanes.x.slenderness,
            y: restraint.lanes.y.slenderness,
            u: restraint.lanes.u.slenderness,
            v: restraint.lanes.v.slenderness,
          }
        : null,
    ]),
  );
}

/** Coordinates of some ten metres in double precision carry about 1e-12 mm; a slenderness then has ten sure figures and to spare. */
const ROUNDING = 1e-9;

/** @param named what a bar of the first is called in the second */
export function expectSame(
  first: Assessment,
  second: Assessment,
  named: (id: string) => string = (id) => id,
): void {
  const [a, b] = [slendernesses(first), slendernesses(second)];
  expect(b.size).toBe(a.size);
  for (const [id, figures] of a) {
    const others = b.get(named(id));
    expect(others === undefined, `${named(id)} is missing`).toBe(false);
    expect(others === null, id).toBe(figures === null);
    if (!figures || !others) continue;
    for (const name of ['inService', 'handling', 'x', 'y', 'u', 'v'] as const)
      expect(
        Math.abs(others[name] / figures[name] - 1),
        `${id} ${name}: ${figures[name]} and ${others[name]}`,
      ).toBeLessThan(ROUNDING);
  }
}
