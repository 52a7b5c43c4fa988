import type { JSX } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import { AXES } from '../../../core/section/model.ts';
import type { Candidate } from '../../../core/shortlist/model.ts';
import { showMassPerMetre, showSlenderness } from '../../../core/units/quantity.ts';
import { shownSection } from '../../controls/figures.ts';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { useServices, useWindow } from '../../shell/services.tsx';
import { TryButton } from '../findings/TryButton.tsx';
import { candidateKey, placementText } from './candidateKey.ts';
import { pickEdits, type Scope, scopeText } from './shortlistView.ts';
import type { ShortlistAnswer } from './useShortlist.ts';

interface CandidateCardProps {
  readonly candidate: Candidate;
  readonly answer: ShortlistAnswer;
  readonly scope: Scope;
  readonly units: UnitSystem;
}

/** The chosen stock angle: what it weighs, what it reads, why it fails, and taking it. */
export function CandidateCard({ candidate, answer, scope, units }: CandidateCardProps): JSX.Element | null {
  const { actions } = useServices();
  const assessment = useWindow((state) => state.assessing.base?.assessment ?? null);
  const trying = useWindow((state) => state.trying !== null);
  if (assessment === null) return null;
  const present = answer.list.candidates.find(({ isPresent }) => isPresent);
  const change = present === undefined ? null : candidate.massPerMetre - present.massPerMetre;
  const name = shownSection(candidate.designation);
  const where = scopeText(scope, answer.bar, assessment);
  const placed = placementText(candidate);
  const label = `Take ${name}${placed === '' ? '' : `, ${placed}`}`;
  const edits = pickEdits(candidate, scope, answer.bar, assessment);
  const id = `pick ${candidateKey(candidate)} ${scope}`;
  return (
    <section className="candidate" aria-label="Chosen stock angle">
      <div className="candidate-head">
        <h3>
          {name} {placed !== '' && <small>{placed}</small>}
        </h3>
        <NearnessChip ratio={candidate.slenderness / candidate.limit} />
        <b>{showSlenderness(candidate.slenderness, candidate.limit)}</b>
      </div>
      <p>
        {showMassPerMetre(candidate.massPerMetre, units)}
        {change !== null &&
          Math.abs(change) > 0.005 &&
          `, ${change > 0 ? '+' : '−'}${showMassPerMetre(Math.abs(change), units, 'bare')}`}{' '}
        · x y u v{' '}
        {AXES.map((axis, index) => (
          <span key={axis}>
            {index > 0 && ' · '}
            {axis === candidate.axis ? (
              <b>{showSlenderness(candidate.bySlenderness[axis])}</b>
            ) : (
              showSlenderness(candidate.bySlenderness[axis])
            )}
          </span>
        ))}{' '}
        · handling {showSlenderness(candidate.handling)}
      </p>
      {candidate.why !== null && <p className="candidate-why">{candidate.why}</p>}
      {candidate.fit !== null && <p className="candidate-why">{candidate.fit}</p>}
      <div className="candidate-buttons">
        <TryButton
          id={id}
          name={`${label} for ${where}`}
          trial={() => ({ id, label, where, edits, bar: answer.bar })}
        />
        <button
          type="button"
          className="button"
          disabled={trying}
          onClick={() => actions.edit(edits, `${label} for ${where}`)}
        >
          Take it for {where}
        </button>
      </div>
    </section>
  );
}
