import type { JSX } from 'react';
import type { Assessment, DiagonalAssessment } from '../../../core/assessment.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { Verdict } from '../../../core/practice/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { Governing, Restraint } from '../../../core/restraint/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { useFontsLoaded } from '../../controls/useFontsLoaded.ts';
import { useSize } from '../../controls/useSize.ts';
import { useWindow } from '../../shell/services.tsx';
import { LaneHead } from './LaneHead.tsx';
import { LaneLegend } from './LaneLegend.tsx';
import { LaneRow } from './LaneRow.tsx';
import { LanesInWords } from './LanesInWords.tsx';
import { LANE_DEEP, laneDrawing } from './laneDrawing.ts';

interface LanesProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly restraint: Restraint;
  /** Before the change on trial. */
  readonly before: Restraint | null;
  readonly diagonal: DiagonalAssessment;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
}

/** The four axes as four strips along the bar, cut where a station stops that motion, filled by nearness, the governing one outlined. */
export function Lanes({
  bar,
  angle,
  restraint,
  before,
  diagonal,
  assessment,
  units,
}: LanesProps): JSX.Element {
  const [ref, size] = useSize<HTMLDivElement>();
  useFontsLoaded(); // Chips are as wide as their words, which are measured again once the typeface is there.
  const trying = useWindow((state) => state.trying !== null);
  const { limit } = diagonal.limit;
  const { governing } = restraint;
  const read = readSlenderness(governing, diagonal.inService);
  const over = read > limit;
  const figure = showSlenderness(read, limit);
  const drawing =
    size === null || size.width < 100
      ? null
      : laneDrawing({
          restraint,
          before,
          limit,
          width: size.width,
          governs: read,
          flagText: `governs ${figure} ${over ? '>' : '≤'} ${limit}`,
        });
  return (
    <section className="lanes" aria-label={`Lanes of ${bar.mark}`}>
      <div className="lanes-title">
        <h3>Lanes</h3>
        <LaneLegend limit={limit} before={trying && before !== null} />
      </div>
      <div ref={ref} className="lanes-sheet">
        {drawing !== null && size !== null && (
          <svg width={size.width} height={drawing.height} aria-hidden="true">
            <LaneHead
              restraint={restraint}
              angle={angle}
              layout={assessment.layout}
              along={drawing.along}
              width={size.width}
              units={units}
            />
            {drawing.lanes.map((lane) => (
              <LaneRow
                key={lane.axis}
                lane={lane}
                letter={lane.axis === 'free' ? 'any' : lane.axis}
                ends={[
                  drawing.along(restraint.stations[0]?.at ?? 0),
                  drawing.along(restraint.stations.at(-1)?.at ?? 1),
                ]}
                limit={limit}
                units={units}
              />
            ))}
            {drawing.outline !== null && (
              <rect
                x={drawing.outline.left + 1}
                y={drawing.outline.top}
                width={Math.max(2, drawing.outline.right - drawing.outline.left - 2)}
                height={LANE_DEEP}
                fill="none"
                stroke="var(--ink)"
                strokeWidth="2"
              />
            )}
            {drawing.flag !== null && (
              <>
                <rect
                  x={drawing.flag.x}
                  y={drawing.flag.y}
                  width={drawing.flag.wide}
                  height="18"
                  fill="var(--ink)"
                />
                {over ? (
                  <path
                    d="M5 0 10 5 5 10 0 5Z"
                    fill="var(--overinv)"
                    transform={`translate(${drawing.flag.x + 6} ${drawing.flag.y + 4})`}
                  />
                ) : (
                  <circle
                    cx={drawing.flag.x + 11}
                    cy={drawing.flag.y + 9}
                    r="4"
                    fill="none"
                    stroke="var(--panel)"
                    strokeWidth="1.3"
                  />
                )}
                <text className="lane-flag" x={drawing.flag.x + 21} y={drawing.flag.y + 13}>
                  {drawing.flag.text}
                </text>
              </>
            )}
          </svg>
        )}
      </div>
      <LanesInWords bar={bar} restraint={restraint} read={read} limit={limit} units={units} />
    </section>
  );
}

/** Of a bar with mixed holds the verdict is the exact one, while the rule gives only a bound. */
function readSlenderness({ basis, slenderness }: Governing, inService: Verdict | null): number {
  return basis === 'mixed bound' && inService !== null && inService.bound !== null
    ? inService.slenderness
    : slenderness;
}
