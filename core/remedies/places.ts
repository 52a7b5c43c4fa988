/** Bars and crossings that a finding names. */
import type { Assessment } from '../assessment.ts';
import type { Bar, BarId, Crossing } from '../layout/model.ts';

export const barsOf = (assessment: Assessment, ids: readonly BarId[]): readonly Bar[] =>
  ids.flatMap((id) => assessment.layout.bars.get(id) ?? []);

export function crossingsOn(assessment: Assessment, ids: readonly BarId[]): readonly Crossing[] {
  const bars = new Set(ids);
  return [...assessment.layout.crossings.values()].filter(({ a, b }) => bars.has(a) || bars.has(b));
}

export const unjoined = ({ join }: Crossing): boolean => join === null || join.kind === 'none';
