import { type JSX, type KeyboardEvent, useId, useState } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { Candidate, Shortlist } from '../../../core/shortlist/model.ts';
import { showMassPerMetre, showSlenderness } from '../../../core/units/quantity.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { shownSection } from '../../controls/figures.ts';
import { useSize } from '../../controls/useSize.ts';
import { CandidateDot } from './CandidateDot.tsx';
import { CandidateLabels } from './CandidateLabels.tsx';
import { candidateKey, placementText } from './candidateKey.ts';
import { type Chart, chartOf, isOnChart } from './chart.ts';

interface ShortlistPictureProps {
  readonly list: Shortlist;
  readonly chosen: Candidate | null;
  readonly units: UnitSystem;
  onChoose(candidate: Candidate): void;
}

export function ShortlistPicture({ list, chosen, units, onChoose }: ShortlistPictureProps): JSX.Element {
  const [ref, size] = useSize<HTMLDivElement>();
  const listId = useId();
  const [hovered, setHovered] = useState<string | null>(null);
  const chart =
    size === null || size.width < 160 || size.height < 90
      ? null
      : chartOf(list, size.width, size.height, units);
  const dots = chart === null ? [] : list.candidates.filter((candidate) => isOnChart(chart, candidate));
  const at = dots.findIndex(
    (candidate) => chosen !== null && candidateKey(candidate) === candidateKey(chosen),
  );
  const move = (event: KeyboardEvent): void => {
    const to = { ArrowRight: at + 1, ArrowLeft: at - 1, Home: 0, End: dots.length - 1 }[event.key];
    const next = to === undefined ? undefined : dots[Math.min(dots.length - 1, Math.max(0, to))];
    if (next === undefined) return;
    event.preventDefault();
    onChoose(next);
  };
  return (
    <div
      ref={ref}
      className="shortlist-picture"
      role="listbox"
      aria-label="Stock angles by mass"
      aria-activedescendant={at >= 0 ? `${listId}-${at}` : undefined}
      tabIndex={0}
      onKeyDown={move}
    >
      {chart !== null && size !== null && (
        <svg width={size.width} height={size.height} role="presentation">
          <Sheet chart={chart} list={list} units={units} />
          {dots.map((candidate, index) => {
            const key = candidateKey(candidate);
            const [x, y] = chart.at(candidate);
            return (
              <g
                key={key}
                id={`${listId}-${index}`}
                role="option"
                aria-selected={index === at}
                aria-label={optionName(candidate, units)}
                onClick={() => onChoose(candidate)}
                onPointerEnter={() => setHovered(key)}
                onPointerLeave={() => setHovered(null)}
              >
                <CandidateDot
                  candidate={candidate}
                  x={x}
                  y={y}
                  chosen={index === at}
                  hovered={hovered === key}
                />
              </g>
            );
          })}
          <CandidateLabels
            chart={chart}
            list={list}
            dots={dots}
            chosen={chosen}
            hovered={dots.find((each) => candidateKey(each) === hovered) ?? null}
          />
        </svg>
      )}
    </div>
  );
}

function optionName(candidate: Candidate, units: UnitSystem): string {
  const placed = placementText(candidate);
  return [
    shownSection(candidate.designation),
    ...(placed === '' ? [] : [placed]),
    showMassPerMetre(candidate.massPerMetre, units),
    `slenderness ${showSlenderness(candidate.slenderness, candidate.limit)}`,
    candidate.passes ? 'passes' : 'over the limit',
    ...(candidate.isPresent ? ['in place now'] : []),
  ].join(', ');
}

interface SheetProps {
  readonly chart: Chart;
  readonly list: Shortlist;
  readonly units: UnitSystem;
}

/** Grid, limit line with its far side hatched, and the words of both axes. */
function Sheet({ chart, list, units }: SheetProps): JSX.Element {
  const { left, right, top, bottom } = chart;
  const limit = chart.y(list.limit);
  return (
    <>
      <rect
        x={left}
        y={top}
        width={right - left}
        height={Math.max(0, limit - top)}
        fill="url(#hatch-ground)"
      />
      {chart.massTicks.map((mass) => (
        <g key={mass}>
          <path className="chart-grid" d={`M${chart.x(mass)} ${top}V${bottom}`} />
          <text className="chart-tick" x={chart.x(mass)} y={bottom + 14} textAnchor="middle">
            {Number(mass.toFixed(2))}
          </text>
        </g>
      ))}
      {chart.slendernessTicks.map((slenderness) => (
        <g key={slenderness}>
          <path className="chart-grid" d={`M${left} ${chart.y(slenderness)}H${right}`} />
          <text className="chart-tick" x={left - 7} y={chart.y(slenderness) + 4} textAnchor="end">
            {slenderness}
          </text>
        </g>
      ))}
      <path className="chart-limit" d={`M${left} ${limit}H${right}`} />
      <text className="chart-strong halo" x={right - 3} y={limit - 5} textAnchor="end">
        limit {list.limit}
      </text>
      <text className="chart-tick" x={right} y={bottom + 28} textAnchor="end">
        mass, {unitNames(units).massPerMetre}
      </text>
      <text className="chart-tick" transform={`translate(11 ${bottom}) rotate(-90)`}>
        governing slenderness
      </text>
    </>
  );
}
