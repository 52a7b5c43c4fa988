import type { JSX } from 'react';
import type { Assessment, DiagonalAssessment } from '../../../core/assessment.ts';
import {
  type Reading,
  type ReadingName,
  type ThreeReadings,
  threeReadings,
} from '../../../core/documents/bowingWords.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { BarStudy } from '../../../core/study/model.ts';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownStudy } from '../../store/closer.ts';
import { beforeAssessment } from '../../store/shown.ts';
import { ReadingGlyph } from './ReadingGlyph.tsx';
import './bowing.css';

interface CardReadingsProps {
  readonly bar: Bar;
  readonly diagonal: DiagonalAssessment;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
}

/** By the marks, by stiffness and by critical load side by side, the worst marked, and why they differ. The verdict stays with the marks. */
export function CardReadings({ bar, diagonal, assessment, units }: CardReadingsProps): JSX.Element | null {
  const actions = useActions();
  const study = useWindow(shownStudy);
  const before = useWindow(beforeAssessment);
  const now = readingsOf(bar, diagonal, assessment, units, study);
  if (now === null) return null;
  const wasDiagonal = before?.diagonals.get(bar.id);
  const wasBar = before?.layout.bars.get(bar.id);
  const was =
    before !== null && wasDiagonal !== undefined && wasBar !== undefined
      ? readingsOf(wasBar, wasDiagonal, before, units, null)
      : null;
  return (
    <section className="readings" aria-label={`Three readings of ${bar.mark}`}>
      <div className="remedies-head">
        <h3>Three readings</h3>
        <button type="button" className="link-button" onClick={() => actions.showTab('bowing')}>
          Look closer
        </button>
      </div>
      <ul className="readings-row">
        {now.readings.map((reading) => (
          <ReadingBox
            key={reading.name}
            reading={reading}
            was={was?.readings.find(({ name }) => name === reading.name)?.figure ?? reading.figure}
            worst={now.worst}
          />
        ))}
      </ul>
      <p className="readings-difference">{now.difference}</p>
    </section>
  );
}

function readingsOf(
  bar: Bar,
  diagonal: DiagonalAssessment,
  assessment: Assessment,
  units: UnitSystem,
  study: BarStudy | null,
): ThreeReadings | null {
  return threeReadings({
    bar,
    diagonal,
    practice: assessment.practice,
    units,
    needs: study?.needs ?? null,
    markOf: (id) => assessment.layout.bars.get(id)?.mark ?? id,
  });
}

interface ReadingBoxProps {
  readonly reading: Reading;
  readonly was: string;
  readonly worst: ReadingName | null;
}

function ReadingBox({ reading, was, worst }: ReadingBoxProps): JSX.Element {
  const { name, figure, says, state, stateSays } = reading;
  const isWorst = worst === name;
  return (
    <li
      className="reading"
      data-worst={isWorst ? (state === 'over' || state === 'weak' ? 'breaks' : '') : undefined}
    >
      <em>
        {name}
        {isWorst && <span className="reading-worst"> worst</span>}
      </em>
      <span className="reading-figure">
        {was !== figure && <s className="was">{was}</s>}
        <b>{figure}</b>
      </span>
      <span className="reading-says">{says}</span>
      {stateSays !== '' && (
        <span className="reading-state">
          <ReadingGlyph state={state} />
          {stateSays}
        </span>
      )}
    </li>
  );
}
