import { type JSX, useState } from 'react';
import type { Assessment } from '../../../../core/assessment.ts';
import type { BarChecks, Check } from '../../../../core/checks/model.ts';
import type { Bar } from '../../../../core/layout/model.ts';
import type { UnitSystem } from '../../../../core/project/model.ts';
import { showForce, showUse } from '../../../../core/units/loads.ts';
import { STATUS_WORDS, StatusGlyph } from '../../../glyphs/StatusGlyph.tsx';
import { useActions, useWindow } from '../../../shell/services.tsx';
import { shownForceState, shownForces } from '../../../store/shownForces.ts';
import { ForceGlyph } from '../../forces/ForceGlyph.tsx';
import { CheckWorking } from './CheckWorking.tsx';
import { CombinationBars } from './CombinationBars.tsx';
import { ResistanceLadder } from './ResistanceLadder.tsx';
import { SymbolText } from './SymbolText.tsx';
import './forcePart.css';

interface ForcePartProps {
  readonly bar: Bar;
  readonly checks: BarChecks;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
}

/** What acts on a bar, what it resists, and how much of it is used; the working clause by clause when asked for. */
export function ForcePart({ bar, checks, assessment, units }: ForcePartProps): JSX.Element {
  const actions = useActions();
  const forces = useWindow(shownForces);
  const one = useWindow(shownForceState);
  const [open, setOpen] = useState(false);
  const { governing } = checks;
  return (
    <section className="force-part" aria-label={`Forces and resistance of ${bar.mark}`}>
      <div className="remedies-head">
        <h3>Force and resistance</h3>
        <button type="button" className="link-button" onClick={() => actions.showTab('forces')}>
          {forces === null ? 'Say what acts' : `${forces.states.length} combinations`}
        </button>
      </div>
      {checks.unknown !== null && <p className="force-unknown">{checks.unknown}</p>}
      {governing !== null && (
        <>
          <Boxes checks={checks} governing={governing} units={units} />
          <ResistanceLadder checks={checks} units={units} />
          {forces !== null && (
            <CombinationBars bar={bar} forces={forces} chosen={one?.id ?? null} units={units} />
          )}
          <button
            type="button"
            className="working-toggle"
            aria-expanded={open}
            onClick={() => setOpen(!open)}
          >
            <span aria-hidden="true">{open ? '⌄' : '›'}</span> Show the working
            <small>
              {assessment.practice.name}
              {checks.steel && <SymbolText text={`, f_y ${checks.steel.fy}, f_u ${checks.steel.fu} N/mm²`} />}
            </small>
          </button>
          {open &&
            checks.checks.map((check) => (
              <CheckWorking
                key={`${check.resistance.kind} ${check.resistance.end ?? ''}`}
                check={check}
                governs={check === governing}
                judged={
                  check.resistance.against !== 'compression' ||
                  check.resistance.kind === checks.compressionBy?.kind
                }
                units={units}
              />
            ))}
        </>
      )}
    </section>
  );
}

function Boxes({
  checks,
  governing,
  units,
}: {
  readonly checks: BarChecks;
  readonly governing: Check;
  readonly units: UnitSystem;
}): JSX.Element {
  const { demand, resistance, utilisation } = governing;
  const squeezed = demand !== null && demand.force === checks.compression?.force;
  const status = checks.status === 'no load' ? 'unknown' : checks.status;
  return (
    <ul className="readings-row">
      <li className="reading">
        <em>force</em>
        <span className="reading-figure">
          <b>{demand === null ? '–' : showForce(demand.force, units)}</b>{' '}
          {demand !== null && <ForceGlyph kind={squeezed ? 'squeezed' : 'pulled'} />}
        </span>
        <span className="reading-says">{demand === null ? 'nothing acts' : demand.name}</span>
      </li>
      <li className="reading">
        <em>resists{resistance.end === null ? '' : ` at end ${resistance.end}`}</em>
        <span className="reading-figure">
          <b>{resistance.resistance === null ? '–' : showForce(resistance.resistance, units)}</b>
        </span>
        <span className="reading-says">{resistance.title.toLowerCase()}</span>
      </li>
      <li className="reading" data-worst={checks.status === 'over' ? 'breaks' : undefined}>
        <em>used</em>
        <span className="reading-figure">
          <b>{showUse(utilisation)}</b>
        </span>
        {checks.status !== 'no load' && (
          <span className="reading-state">
            <StatusGlyph status={status} />
            {STATUS_WORDS[status]}
          </span>
        )}
      </li>
    </ul>
  );
}
