import { type JSX, type KeyboardEvent, useEffect, useRef } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import { AXES } from '../../../core/section/model.ts';
import type { Candidate, Shortlist } from '../../../core/shortlist/model.ts';
import { showMassPerMetre, showSlenderness } from '../../../core/units/quantity.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { shownSection } from '../../controls/figures.ts';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { candidateKey, placementText } from './candidateKey.ts';

interface ShortlistTableProps {
  readonly list: Shortlist;
  readonly chosen: Candidate | null;
  readonly units: UnitSystem;
  onChoose(candidate: Candidate): void;
}

/** The shortlist as a table: the same angles, by mass, with why each lighter one fails. */
export function ShortlistTable({ list, chosen, units, onChoose }: ShortlistTableProps): JSX.Element {
  const chosenRow = useRef<HTMLTableRowElement>(null);
  const key = chosen === null ? null : candidateKey(chosen);
  // biome-ignore lint/correctness/useExhaustiveDependencies: follows the chosen row as it moves.
  useEffect(() => {
    chosenRow.current?.scrollIntoView({ block: 'nearest' });
  }, [key]);
  const move = (event: KeyboardEvent): void => {
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    const next = list.candidates[list.candidates.findIndex((each) => candidateKey(each) === key) + step];
    if (step === 0 || next === undefined) return;
    event.preventDefault();
    onChoose(next);
  };
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a part that scrolls must be reachable by keys, and the arrows choose in it.
    <section className="shortlist-table" tabIndex={0} aria-label="Stock angles" onKeyDown={move}>
      <table aria-label="Stock angles by mass">
        <thead>
          <tr>
            <th scope="col">Section</th>
            <th scope="col">{unitNames(units).massPerMetre}</th>
            {AXES.map((axis) => (
              <th key={axis} scope="col">
                {axis}
              </th>
            ))}
            <th scope="col">governs</th>
            <th scope="col">handling</th>
            <th scope="col">why not</th>
          </tr>
        </thead>
        <tbody>
          {list.candidates.map((candidate) => {
            const each = candidateKey(candidate);
            return (
              <tr
                key={each}
                ref={each === key ? chosenRow : undefined}
                data-chosen={each === key || undefined}
                onClick={() => onChoose(candidate)}
              >
                <th scope="row">
                  {shownSection(candidate.designation)} <small>{placementText(candidate)}</small>
                  {candidate.isPresent && <small> now</small>}
                </th>
                <td>{showMassPerMetre(candidate.massPerMetre, units, 'bare')}</td>
                {AXES.map((axis) => (
                  <td key={axis} data-governs={axis === candidate.axis || undefined}>
                    {showSlenderness(candidate.bySlenderness[axis])}
                  </td>
                ))}
                <td>
                  <span className="lightest-near">
                    <NearnessChip ratio={candidate.slenderness / candidate.limit} />
                    <b>{showSlenderness(candidate.slenderness, candidate.limit)}</b>
                  </span>
                </td>
                <td>{showSlenderness(candidate.handling)}</td>
                <td className="shortlist-why">{candidate.why ?? candidate.fit ?? ''}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </section>
  );
}
