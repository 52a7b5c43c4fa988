import type { JSX, ReactNode } from 'react';
import type { Assessment, DiagonalAssessment } from '../../../core/assessment.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { BarStudy } from '../../../core/study/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { showForce } from '../../../core/units/loads.ts';
import { NumberField } from '../../controls/NumberField.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { LoadPlot } from './LoadPlot.tsx';
import { plotLevels } from './plotLevels.ts';

interface TautPartProps {
  readonly bar: Bar;
  readonly diagonal: DiagonalAssessment;
  readonly assessment: Assessment;
  readonly study: BarStudy | null;
  readonly units: UnitSystem;
  /** Which plot to show, where there is room for one. */
  readonly choice: ReactNode;
  readonly hidden: boolean;
}

/** Critical load against the force in the partner, from squeezed as hard to pulled as hard; and a field to say which it is. */
export function TautPart({
  bar,
  diagonal,
  assessment,
  study,
  units,
  choice,
  hidden,
}: TautPartProps): JSX.Element {
  const actions = useActions();
  const trying = useWindow((state) => state.trying !== null);
  const partner = diagonal.bowing?.partner ?? null;
  const crossing = partner === null ? undefined : assessment.layout.crossings.get(partner.crossing);
  const other = partner === null ? undefined : assessment.layout.bars.get(partner.bar);
  const curve = study?.againstPartner ?? null;
  const present = curve === null ? null : at(curve.points, curve.present);
  return (
    <section
      className="bowing-part"
      data-plot-hidden={hidden || undefined}
      aria-label="Critical load against the partner's force"
    >
      <div className="bowing-head">
        <h3 className="plot-title">Against the force in {other?.mark ?? 'a partner'}</h3>
        {choice}
        {crossing !== undefined && partner !== null && (
          <fieldset className="taut-field" disabled={trying || partner.shareFrom.kind === 'combination'}>
            <legend className="unseen">Force in {other?.mark}</legend>
            <span aria-hidden="true">T/C</span>
            <NumberField
              bare
              label={`T/C: tension in ${other?.mark} over compression in ${bar.mark}`}
              value={partner.tensionShare}
              least={-1}
              most={10}
              step={0.1}
              decimals={2}
              onChange={(share) => {
                const refused = actions.edit({
                  kind: 'tension share',
                  bay: bar.bay,
                  crossing: crossing.key,
                  share: share === 0 ? null : share,
                });
                return refused === null ? null : (refused[0]?.what ?? 'This was refused.');
              }}
            />
          </fieldset>
        )}
      </div>
      {partner === null || other === undefined ? (
        <p className="bowing-none">
          No single diagonal is joined to {bar.mark} at a place of its own, so no partner’s force matters
          here.
        </p>
      ) : curve === null || present === null ? (
        <p className="bowing-none" role="status">
          Working out the curve…
        </p>
      ) : (
        <>
          <LoadPlot
            name={`Critical load of ${bar.mark} against the force in ${other.mark}`}
            from={-1}
            to={1}
            ticks={[-1, -0.5, 0, 0.5, 1].map((share) => ({
              at: share,
              label: grouped(share, share % 1 ? 1 : 0),
            }))}
            words={[`${other.mark} squeezed`, 'T/C', 'pulled as hard']}
            lines={[{ look: 'main', label: '', points: curve.points }]}
            levels={plotLevels(bar, diagonal, assessment.practice)}
            present={{
              at: curve.present,
              N: present,
              says: `Now T/C is ${grouped(curve.present, 2)} and the critical load ${showForce(present, units)}`,
            }}
            units={units}
          />
          {partner.shareFrom.kind === 'combination' && (
            <p className="bowing-note">T/C from the combination that is worst for {bar.mark}.</p>
          )}
          {diagonal.bowing?.twist.governs === true && (
            <p className="bowing-note">
              With twist, which takes {grouped((1 - diagonal.bowing.twist.ratio) * 100, 1)} % of it now.
            </p>
          )}
        </>
      )}
    </section>
  );
}

/** The curve between its points. */
export function at(
  points: readonly { readonly at: number; readonly N: number }[],
  place: number,
): number | null {
  const after = points.findIndex((point) => point.at >= place);
  const right = points[after < 0 ? points.length - 1 : after];
  const left = points[Math.max(0, after - 1)];
  if (right === undefined || left === undefined) return null;
  if (after <= 0 || right.at === left.at) return right.N;
  return left.N + ((right.N - left.N) * (place - left.at)) / (right.at - left.at);
}
