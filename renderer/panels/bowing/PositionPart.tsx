import type { JSX, ReactNode } from 'react';
import type { Assessment, DiagonalAssessment } from '../../../core/assessment.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { BarStudy } from '../../../core/study/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { showForce } from '../../../core/units/loads.ts';
import { LoadPlot } from './LoadPlot.tsx';
import { plotLevels } from './plotLevels.ts';
import { at } from './TautPart.tsx';

interface PositionPartProps {
  readonly bar: Bar;
  readonly diagonal: DiagonalAssessment;
  readonly assessment: Assessment;
  readonly study: BarStudy | null;
  readonly units: UnitSystem;
  /** Which plot to show, where there is room for one. */
  readonly choice: ReactNode;
  readonly hidden: boolean;
}

/** Critical load with one crossing, rigid in the plane, anywhere along the bar: exact, and by the rule, which strays off the middle. */
export function PositionPart({
  bar,
  diagonal,
  assessment,
  study,
  units,
  choice,
  hidden,
}: PositionPartProps): JSX.Element {
  const curve = study?.againstPosition ?? null;
  const present = curve === null ? null : at(curve.points, curve.present);
  return (
    <section
      className="bowing-part"
      data-plot-hidden={hidden || undefined}
      aria-label="Critical load against the place of the crossing"
    >
      <div className="bowing-head">
        <h3 className="plot-title">Against the place of the crossing</h3>
        {choice}
        <span className="plot-key">
          <PlotKey look="main" /> exact <PlotKey look="rule" /> rule
        </span>
      </div>
      {diagonal.bowing?.partner == null ? (
        <p className="bowing-none">{bar.mark} has no partner that crosses it by itself.</p>
      ) : curve === null || present === null ? (
        <p className="bowing-none" role="status">
          Working out the curve…
        </p>
      ) : (
        <LoadPlot
          name={`Critical load of ${bar.mark} against the place of one crossing that is rigid in the plane`}
          from={0}
          to={1}
          ticks={[0, 0.25, 0.5, 0.75, 1].map((part) => ({
            at: part,
            label: part === 0 ? 'i' : part === 1 ? 'j' : grouped(part, 2),
          }))}
          words={['', 'held in the plane alone, no more from its partner', '']}
          lines={[
            {
              look: 'rule',
              label: 'rule',
              points: curve.points.map(({ at: place, rule }) => ({ at: place, N: rule })),
            },
            { look: 'main', label: 'exact', points: curve.points },
          ]}
          levels={plotLevels(bar, diagonal, assessment.practice)}
          present={{
            at: curve.present,
            N: present,
            says: `Now it is at ${grouped(curve.present, 2)} of the length, which gives ${showForce(present, units)}`,
          }}
          units={units}
        />
      )}
    </section>
  );
}

function PlotKey({ look }: { readonly look: 'main' | 'rule' }): JSX.Element {
  return (
    <svg className="glyph" width="16" height="8" aria-hidden="true">
      <path className={`plot-line ${look}`} d="M0 4h16" />
    </svg>
  );
}
