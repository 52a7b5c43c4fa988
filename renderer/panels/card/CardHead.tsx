import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { AngleBar, Bar, BarId } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { shownSection } from '../../controls/figures.ts';
import { useActions, useWindow } from '../../shell/services.tsx';
import { beforeAssessment } from '../../store/shown.ts';
import { placementPhrases } from './placementPhrases.ts';

interface CardHeadProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
}

/** Mark, section and length; where the bar is and how it is placed; the bars before and after. */
export function CardHead({ bar, angle, assessment, units }: CardHeadProps): JSX.Element {
  const was = useWindow((state) => beforeAssessment(state)?.layout.bars.get(bar.id) ?? null);
  const section = shownSection(angle.stock?.designation ?? angle.spec.section);
  const sectionWas =
    was?.angle == null ? section : shownSection(was.angle.stock?.designation ?? was.angle.spec.section);
  const bay = assessment.layout.bays.find(({ id }) => id === bar.bay);
  const phrases = placementPhrases(angle);
  const phrasesWas = was?.angle == null ? phrases : placementPhrases(was.angle);
  return (
    <header className="card-head">
      <div className="card-title-row">
        <h2 className="card-title">
          {bar.mark} · {sectionWas !== section && <s className="was">{sectionWas}</s>} {section} ·{' '}
          {showLength(bar.length, units, 'spoken')} <small>(set-out)</small>
        </h2>
        <Neighbours bar={bar.id} assessment={assessment} />
      </div>
      <p className="second">
        {bay === undefined ? bar.bay : `${bay.id} ${bay.name}`}.{' '}
        {phrases.map(({ about, says }, index) => (
          <Phrase key={about} phrase={says} was={phrasesWas[index]?.says ?? says} first={index === 0} />
        ))}
        .
      </p>
    </header>
  );
}

interface PhraseProps {
  readonly phrase: string;
  readonly was: string;
  readonly first: boolean;
}

/** One phrase of the placement; struck and in heavy type where the change on trial alters it. */
function Phrase({ phrase, was, first }: PhraseProps): JSX.Element | null {
  if (phrase === '' && was === '') return null;
  return (
    <>
      {!first && ', '}
      {was !== phrase && was !== '' && <s className="was">{was}</s>}{' '}
      {was === phrase ? phrase : <b className="now">{phrase}</b>}
    </>
  );
}

/** The diagonals before and after, in the order of the schedule. */
function Neighbours({
  bar,
  assessment,
}: {
  readonly bar: BarId;
  readonly assessment: Assessment;
}): JSX.Element {
  const actions = useActions();
  const order = assessment.layout.bays.flatMap(({ diagonals }) => diagonals);
  const at = order.indexOf(bar);
  const markOf = (id: BarId): string => assessment.layout.bars.get(id)?.mark ?? id;
  const [previous, next] = [order[at - 1], order[at + 1]];
  return (
    <span className="card-neighbours">
      {previous !== undefined && at > 0 && (
        <button
          type="button"
          aria-label={`Diagonal before: ${markOf(previous)}`}
          onClick={() => actions.selectBar(previous)}
        >
          ‹ {markOf(previous)}
        </button>
      )}
      {next !== undefined && (
        <button
          type="button"
          aria-label={`Next diagonal: ${markOf(next)}`}
          onClick={() => actions.selectBar(next)}
        >
          {markOf(next)} ›
        </button>
      )}
    </span>
  );
}
