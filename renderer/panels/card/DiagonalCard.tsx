import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import { useWindow } from '../../shell/services.tsx';
import { beforeAssessment, shownProject } from '../../store/shown.ts';
import { CardReadings } from '../bowing/CardReadings.tsx';
import { BarMarks } from './BarMarks.tsx';
import { CardHead } from './CardHead.tsx';
import { ForcePart } from './forces/ForcePart.tsx';
import { HoldsTable } from './HoldsTable.tsx';
import { Lanes } from './Lanes.tsx';
import { Overrides } from './Overrides.tsx';
import { RemedyList } from './RemedyList.tsx';
import { SectionPart } from './SectionPart.tsx';
import { interiorOf } from './stations.ts';
import { Verdicts } from './Verdicts.tsx';

interface DiagonalCardProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly assessment: Assessment;
}

/** In the order of the argument: section, lanes, verdicts, reason, remedies; then the other readings, forces, and what the user sets for this bar alone. */
export function DiagonalCard({ bar, angle, assessment }: DiagonalCardProps): JSX.Element {
  const units = useWindow((state) => shownProject(state).settings.units);
  const before = useWindow((state) => beforeAssessment(state)?.diagonals.get(bar.id) ?? null);
  const diagonal = assessment.diagonals.get(bar.id);
  const restraint = diagonal?.restraint ?? null;
  return (
    <>
      <CardHead bar={bar} angle={angle} assessment={assessment} units={units} />
      <div className="card-body">
        {diagonal === undefined || restraint === null ? (
          <Unassessed bar={bar} angle={angle} turns={diagonal?.turns ? diagonal.reason : null} />
        ) : (
          <>
            <SectionPart
              bar={bar}
              angle={angle}
              restraint={restraint}
              assessment={assessment}
              units={units}
            />
            <Lanes
              bar={bar}
              angle={angle}
              restraint={restraint}
              before={before?.restraint ?? null}
              diagonal={diagonal}
              assessment={assessment}
              units={units}
            />
            {interiorOf(restraint).length > 2 && <HoldsTable restraint={restraint} assessment={assessment} />}
          </>
        )}
      </div>
      {diagonal !== undefined && restraint !== null && (
        <div className="card-argument">
          <Verdicts diagonal={diagonal} before={before} practice={assessment.practice} />
          <blockquote className="reason" aria-label="Reason">
            {diagonal.reason}
          </blockquote>
        </div>
      )}
      <div className="card-after">
        <RemedyList bar={bar} assessment={assessment} />
        {diagonal !== undefined && (
          <CardReadings bar={bar} diagonal={diagonal} assessment={assessment} units={units} />
        )}
        {diagonal?.checks != null && (
          <ForcePart
            key={`forces ${bar.id}`}
            bar={bar}
            checks={diagonal.checks}
            assessment={assessment}
            units={units}
          />
        )}
        {/* New keys for each bar, so that no field keeps what was typed for another. */}
        <BarMarks key={`marks ${bar.id}`} bar={bar} angle={angle} units={units} />
        <Overrides key={`overrides ${bar.id}`} bar={bar} angle={angle} restraint={restraint} units={units} />
      </div>
    </>
  );
}

interface UnassessedProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  /** Why it turns freely; null where it does not. */
  readonly turns: string | null;
}

function Unassessed({ bar, angle, turns }: UnassessedProps): JSX.Element {
  if (turns !== null) return <p className="card-problem">{turns}</p>;
  if (angle.stock === null)
    return (
      <p className="card-problem">
        “{angle.spec.section}” is in none of the stock lists, so {bar.mark} has no figures.
        {angle.nearest.length > 0 && ` Near to it: ${angle.nearest.join(', ')}.`} Choose another section, or
        add this one to the own stock list.
      </p>
    );
  return (
    <p className="card-problem">
      The ends of {bar.mark} take more than the length there is, so it has no figures. Give the ends a shorter
      set-back.
    </p>
  );
}
