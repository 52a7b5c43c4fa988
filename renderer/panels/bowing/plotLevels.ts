import type { DiagonalAssessment } from '../../../core/assessment.ts';
import { loadAtSlenderness } from '../../../core/bowing/critical.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { Practice } from '../../../core/practice/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import type { PlotLevel } from './LoadPlot.tsx';

/** The limit, and what the marks read, as loads of this bar. */
export function plotLevels(bar: Bar, diagonal: DiagonalAssessment, practice: Practice): readonly PlotLevel[] {
  const area = bar.angle?.stock?.properties.area;
  if (area === undefined) return [];
  const level = (slenderness: number, look: PlotLevel['look']): PlotLevel => ({
    N: loadAtSlenderness(slenderness, area, practice.steel.E),
    label: showSlenderness(slenderness, diagonal.limit.limit),
    look,
  });
  const { limit, inService } = diagonal;
  return [
    level(limit.limit, 'limit'),
    ...(inService === null ? [] : [level(inService.slenderness, 'marks')]),
  ];
}
