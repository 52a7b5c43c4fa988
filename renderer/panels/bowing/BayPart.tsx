import type { JSX } from 'react';
import type { Bar } from '../../../core/layout/model.ts';
import type { Practice } from '../../../core/practice/model.ts';
import type { RestraintDemand } from '../../../core/practice/restraintDemand.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { BarStudy } from '../../../core/study/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { showForce, showStiffness } from '../../../core/units/loads.ts';
import { useActions } from '../../shell/services.tsx';

interface BayPartProps {
  readonly bar: Bar;
  readonly study: BarStudy;
  readonly practice: Practice;
  readonly units: UnitSystem;
}

/** The whole bay under this bar's compression, and what the practice asks of a hold where the bar is counted on in compression. */
export function BayPart({ bar, study, practice, units }: BayPartProps): JSX.Element {
  const actions = useActions();
  const { N, ratio } = study.bay;
  return (
    <section className="bowing-part bowing-bay" aria-label={`The whole of ${bar.bay}`}>
      <div className="bowing-head">
        <h3>The whole of {bar.bay}</h3>
        {study.bay.movement.length > 0 && (
          <button
            type="button"
            className="link-button"
            onClick={() => actions.setView({ bow: true, shape: 'bay' })}
          >
            Show its shape
          </button>
        )}
      </div>
      {N === null ? (
        <p className="bowing-none">
          {bar.bay} can move without resistance, so it has no critical load: a finding says where.
        </p>
      ) : (
        <p className="bowing-bay-words">
          Under the compression in {bar.mark} it gives way at <b>{showForce(N, units)}</b>
          {ratio !== null && `, ${againstBar(ratio)}`}.
        </p>
      )}
      {study.demands !== null && (
        <>
          <h3>Asked of a hold by {practice.name}</h3>
          <p className="second">
            While {bar.mark} is squeezed by {showForce(study.demands.compression, units)},{' '}
            {study.demands.from.kind === 'critical load'
              ? 'its critical load'
              : `in ${study.demands.from.name}`}
            .
          </p>
          <ul className="demands">
            {study.demands.each.map((demand) => (
              <Demand key={`${demand.clause} ${demand.rule}`} demand={demand} units={units} />
            ))}
          </ul>
        </>
      )}
    </section>
  );
}

function againstBar(ratio: number): string {
  if (Math.abs(ratio - 1) < 0.01) return 'as the bar by itself';
  return `${grouped(ratio, 2)} of the bar by itself`;
}

function Demand({
  demand: { rule, force, stiffness, clause, confidence },
  units,
}: {
  readonly demand: RestraintDemand;
  readonly units: UnitSystem;
}): JSX.Element {
  return (
    <li>
      <b>{Number.isFinite(force) ? showForce(force, units) : 'too soft'}</b>
      {stiffness !== null && <b>{showStiffness(stiffness, units)}</b>}
      <span className="demand-rule">{rule}</span>
      <span className="second">
        {clause}
        {confidence === 'from memory, verify' ? (
          <span className="verify"> · from memory, verify</span>
        ) : (
          ` · ${confidence}`
        )}
      </span>
    </li>
  );
}
