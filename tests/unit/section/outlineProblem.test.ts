import { describe, expect, it } from 'vitest';
import { angleProperties } from '../../../core/section/angleProperties.ts';
import type { AngleOutline } from '../../../core/section/model.ts';
import { outlineProblem, outlineProblemText } from '../../../core/section/outlineProblem.ts';

const sound: AngleOutline = { longLeg: 100, shortLeg: 75, thickness: 8, rootRadius: 10, toeRadius: 5 };

describe('an outline that is no angle', () => {
  it.each<[string, Partial<AngleOutline>, string]>([
    ['no thickness', { thickness: 0 }, 'not a size'],
    ['a leg that is no number', { longLeg: Number.NaN }, 'not a size'],
    ['an endless leg', { longLeg: Number.POSITIVE_INFINITY }, 'not a size'],
    ['a radius below zero', { toeRadius: -1 }, 'not a size'],
    ['its legs swapped', { longLeg: 70 }, 'legs swapped'],
    ['a thickness of the whole leg', { thickness: 75 }, 'too thick'],
    ['toes rounder than twice the thickness', { toeRadius: 17 }, 'toe rounder than thick'],
    ['radii that overlap', { rootRadius: 65 }, 'radii overlap'],
  ])('is refused with %s, as data and in words that say what to do', (_, change, kind) => {
    const problem = outlineProblem({ ...sound, ...change });
    expect(problem?.kind).toBe(kind);
    if (problem) expect(outlineProblemText(problem)).toMatch(/give|swap|check/);
  });

  it('is not met in a usual angle', () => {
    expect(outlineProblem(sound)).toBeNull();
  });

  it('stops the properties from being computed', () => {
    expect(() => angleProperties({ ...sound, thickness: 80 })).toThrow(/thickness of 80 mm/);
  });
});
