import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { MemberChecks } from '../../../core/checks/model.ts';
import { conditionWords, memberPlacing } from '../../../core/documents/memberWords.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce, showMoment, showUse } from '../../../core/units/loads.ts';
import { showLength, showSlenderness } from '../../../core/units/quantity.ts';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { STATUS_WORDS, StatusGlyph } from '../../glyphs/StatusGlyph.tsx';
import { useWindow } from '../../shell/services.tsx';
import { shownProject } from '../../store/shown.ts';
import { shownForceState, shownForces } from '../../store/shownForces.ts';
import { ForceGlyph } from '../forces/ForceGlyph.tsx';
import { CheckWorking } from './forces/CheckWorking.tsx';
import { CombinationBars } from './forces/CombinationBars.tsx';
import './forces/forcePart.css';

interface MemberCardProps {
  readonly bar: Bar;
  readonly assessment: Assessment;
}

/** A member of the frame: its size; of a strut or beam what squeezes it and what it resists. */
export function MemberCard({ bar, assessment }: MemberCardProps): JSX.Element {
  const units = useWindow((state) => shownProject(state).settings.units);
  const checks = assessment.members.get(bar.id);
  return (
    <div className="card-member">
      <h2 className="card-title">
        {bar.mark} · {bar.role === 'rail' ? 'side rail' : bar.role}
      </h2>
      <p className="second">
        {bar.bay}. {bar.member?.name ?? 'No size given'}, {showLength(bar.length, units, 'spoken')} between
        set-out points.
      </p>
      {checks === undefined ? (
        <p className="second">
          {bar.role === 'beam' || bar.role === 'strut'
            ? 'Without a size it is not checked.'
            : 'Drawn to size and not checked: its stiffness and its forces are in the figures of the others.'}
        </p>
      ) : (
        <Squeezed bar={bar} checks={checks} assessment={assessment} units={units} />
      )}
    </div>
  );
}

interface SqueezedProps extends MemberCardProps {
  readonly checks: MemberChecks;
  readonly units: UnitSystem;
}

function Squeezed({ bar, checks, assessment, units }: SqueezedProps): JSX.Element {
  const forces = useWindow(shownForces);
  const one = useWindow(shownForceState);
  const { check, compression, moment, slenderness, limit, unknown } = checks;
  return (
    <section className="force-part" aria-label={`Compression of ${bar.mark}`}>
      <p className="second">{memberPlacing(checks, units)}</p>
      <h3>Compression along it</h3>
      {unknown !== null && <p className="force-unknown">{unknown}</p>}
      {check !== null && (
        <>
          <ul className="readings-row">
            <li className="reading">
              <em>force</em>
              <span className="reading-figure">
                <b>{compression === null ? '–' : showForce(compression.force, units)}</b>{' '}
                {compression !== null && <ForceGlyph kind="squeezed" />}
              </span>
              <span className="reading-says">{compression?.name ?? 'nothing squeezes it'}</span>
            </li>
            <li className="reading">
              <em>resists</em>
              <span className="reading-figure">
                <b>
                  {check.resistance.resistance === null ? '–' : showForce(check.resistance.resistance, units)}
                </b>
              </span>
              <span className="reading-says">
                L/r {showSlenderness(slenderness ?? 0, limit)} of {limit}
              </span>
            </li>
            <li className="reading" data-worst={checks.status === 'over' ? 'breaks' : undefined}>
              <em>used</em>
              <span className="reading-figure">
                <b>{showUse(check.utilisation)}</b>
              </span>
              {checks.status !== 'no load' && (
                <span className="reading-state">
                  <StatusGlyph status={checks.status} />
                  {STATUS_WORDS[checks.status]}
                </span>
              )}
            </li>
          </ul>
          {check.resistance.conditions
            .filter(({ met }) => !met)
            .map((condition) => (
              <p key={condition.says} className="member-caution">
                <SeverityGlyph severity="look into" /> <span>{conditionWords(condition)}</span>
              </p>
            ))}
          {moment > 0 && (
            <p className="member-caution">
              <SeverityGlyph severity="look into" />{' '}
              <span>It bends too, by up to {showMoment(moment, units)}: that is not checked here.</span>
            </p>
          )}
          {forces !== null && (
            <CombinationBars bar={bar} forces={forces} chosen={one?.id ?? null} units={units} />
          )}
          <details className="member-working">
            <summary>
              Show the working <small>{assessment.practice.name}</small>
            </summary>
            <CheckWorking check={check} governs judged units={units} />
          </details>
        </>
      )}
    </section>
  );
}
