import type { JSX } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { Candidate } from '../../../core/shortlist/model.ts';
import { showMassPerMetre, showSlenderness } from '../../../core/units/quantity.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { shownSection } from '../../controls/figures.ts';
import { Segmented, type SegmentOption } from '../../controls/Segmented.tsx';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { useWindow } from '../../shell/services.tsx';
import { candidateKey } from './candidateKey.ts';
import { barsInScope, type Scope, type ShortlistView } from './shortlistView.ts';
import type { ShortlistAnswer } from './useShortlist.ts';

interface ShortlistSideProps {
  readonly view: ShortlistView;
  readonly answer: ShortlistAnswer;
  readonly chosen: Candidate | null;
  readonly units: UnitSystem;
  onChange(view: ShortlistView): void;
  onChoose(candidate: Candidate): void;
}

/** For which bars, in which placements; and the lightest few that pass. */
export function ShortlistSide({
  view,
  answer,
  chosen,
  units,
  onChange,
  onChoose,
}: ShortlistSideProps): JSX.Element {
  const scopes = useScopes(answer);
  const passing = answer.list.candidates
    .filter((candidate) => candidate.passes && candidate.fit === null)
    .slice(0, 5);
  return (
    <>
      <div className="shortlist-options">
        <Segmented
          label="For"
          value={view.scope}
          options={scopes}
          onChange={(scope) => onChange({ ...view, scope })}
        />
        <Segmented
          label="Unequal legs"
          value={view.placements}
          options={[
            { value: 'both', label: 'Either leg' },
            { value: 'as placed', label: 'As placed' },
          ]}
          onChange={(placements) => onChange({ ...view, placements })}
        />
        <Segmented
          label="Bolts"
          value={view.mustFit ? 'fit' : 'any'}
          options={[
            { value: 'fit', label: 'Must fit the leg' },
            { value: 'any', label: 'Whatever' },
          ]}
          onChange={(bolts) => onChange({ ...view, mustFit: bolts === 'fit' })}
        />
      </div>
      <table className="lightest" aria-label="Lightest five that pass">
        <thead>
          <tr>
            <th scope="col">Lightest that pass</th>
            <th scope="col">{unitNames(units).massPerMetre}</th>
            <th scope="col">axis</th>
            <th scope="col">L/r</th>
          </tr>
        </thead>
        <tbody>
          {passing.map((candidate) => (
            <tr
              key={candidateKey(candidate)}
              data-chosen={(chosen !== null && candidateKey(chosen) === candidateKey(candidate)) || undefined}
            >
              <th scope="row">
                <button type="button" className="lightest-choose" onClick={() => onChoose(candidate)}>
                  {shownSection(candidate.designation)}
                  {candidate.kind === 'unequal' && (
                    <small>{candidate.legInPlane === 'longer' ? ' in' : ' out'}</small>
                  )}
                </button>
              </th>
              <td>{showMassPerMetre(candidate.massPerMetre, units, 'bare')}</td>
              <td>{candidate.axis === 'free' ? 'askew' : candidate.axis}</td>
              <td>
                <span className="lightest-near">
                  <NearnessChip ratio={candidate.slenderness / candidate.limit} />
                  {showSlenderness(candidate.slenderness, candidate.limit)}
                </span>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {passing.length === 0 && (
        <p className="second">No angle of the stock list passes. Hold the bar at another point.</p>
      )}
    </>
  );
}

function useScopes(answer: ShortlistAnswer): readonly SegmentOption<Scope>[] {
  const assessment = useWindow((state) => state.assessing.base?.assessment ?? null);
  const bar = assessment?.layout.bars.get(answer.bar);
  if (assessment === null || bar === undefined) return [];
  const pair = barsInScope('pair', answer.bar, assessment);
  return [
    { value: 'bar', label: bar.mark },
    ...(pair.length > 1 ? [{ value: 'pair' as const, label: 'Pair' }] : []),
    { value: 'bay', label: bar.bay },
    { value: 'all', label: 'All' },
  ];
}
