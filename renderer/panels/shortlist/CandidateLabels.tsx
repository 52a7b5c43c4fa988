import type { JSX } from 'react';
import type { Candidate, Shortlist } from '../../../core/shortlist/model.ts';
import { candidateKey } from './candidateKey.ts';
import { type Chart, isOnChart } from './chart.ts';
import { type PlacedLabel, placedLabel } from './labelPlace.ts';

interface CandidateLabelsProps {
  readonly chart: Chart;
  readonly list: Shortlist;
  readonly dots: readonly Candidate[];
  readonly chosen: Candidate | null;
  readonly hovered: Candidate | null;
}

/** Names beside the one pointed at, the chosen one, the angle in place and the lightest that passes, where they cover the fewest dots. */
export function CandidateLabels({ chart, list, dots, chosen, hovered }: CandidateLabelsProps): JSX.Element {
  const present = list.candidates.find(({ isPresent }) => isPresent) ?? null;
  const at = dots.map((dot) => chart.at(dot));
  const placed: PlacedLabel[] = [];
  for (const candidate of [hovered, chosen, present, list.first]) {
    if (candidate === null || !isOnChart(chart, candidate)) continue;
    if (placed.some(({ key }) => key === candidateKey(candidate))) continue;
    placed.push(placedLabel(candidate, chart, list, at, placed));
  }
  return (
    <>
      {placed.map((label) => (
        <g key={label.key} pointerEvents="none">
          {label.leader !== null && <path className="chart-leader" d={label.leader} />}
          <text className="chart-strong halo" x={label.left} y={label.baseline}>
            {label.text}
          </text>
        </g>
      ))}
    </>
  );
}
