import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { headOf, joinedAssessment, partOf, partsOf } from '../../../renderer/assessing/assessmentParts.ts';
import { CATALOGUES, fourPanelBays } from '../../bench/given.ts';

describe('an assessment in parts', () => {
  it('is the same once joined, in the same order, each part having crossed by itself', () => {
    const project = fourPanelBays(47);
    const whole = assess(project, CATALOGUES, 'by the marks');
    const count = partsOf(whole);
    expect(count).toBeGreaterThan(1);
    const parts = Array.from({ length: count }, (_, k) => structuredClone(partOf(whole, k)));
    const joined = joinedAssessment(project, structuredClone(headOf(whole)), parts);
    expect(joined).toEqual(whole);
    for (const key of ['diagonals', 'bays'] as const)
      expect([...joined[key].keys()]).toEqual([...whole[key].keys()]);
    for (const key of ['nodes', 'bars', 'crossings'] as const)
      expect([...joined.layout[key].keys()]).toEqual([...whole.layout[key].keys()]);
  });

  it('of a small project is one part', () => {
    expect(partsOf(assess(fourPanelBays(1), CATALOGUES, 'by the marks'))).toBe(1);
  });
});
