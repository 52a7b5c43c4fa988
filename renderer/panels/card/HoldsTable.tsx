import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import { reasonText } from '../../../core/documents/words.ts';
import type { Claim, Restraint, Station } from '../../../core/restraint/model.ts';
import { isRefusedHold } from '../../assessing/refusedHold.ts';
import { JoinGlyph } from '../../glyphs/JoinGlyph.tsx';
import { LookSign, TickSign } from '../../glyphs/signs.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shapeOf } from './LaneHead.tsx';
import { interiorOf } from './stations.ts';

interface HoldsTableProps {
  readonly restraint: Restraint;
  readonly assessment: Assessment;
}

/** With more than two stations: what each one holds and why, a claim that does not count struck. */
export function HoldsTable({ restraint, assessment }: HoldsTableProps): JSX.Element {
  const actions = useActions();
  const chosen = useWindow((state) => state.selection.crossing);
  return (
    <table className="holds" aria-label="Holds">
      <thead>
        <tr>
          <th scope="col">Holds</th>
          <th scope="col" className="holds-mid">
            in plane
          </th>
          <th scope="col" className="holds-mid">
            out of plane
          </th>
          <th scope="col">because</th>
        </tr>
      </thead>
      <tbody>
        {interiorOf(restraint).map(({ station, index }) => {
          const crossing = station.crossings[0] ?? null;
          return (
            <tr key={index} data-chosen={(crossing !== null && crossing === chosen) || undefined}>
              <th scope="row">
                <button
                  type="button"
                  className="holds-station"
                  disabled={crossing === null}
                  onClick={() => {
                    if (crossing !== null) actions.selectCrossing(crossing);
                  }}
                >
                  <JoinGlyph join={shapeOf(station, assessment.layout)} />
                  {station.label}
                </button>
              </th>
              <td className="holds-mid">
                <HoldSign claims={claimsIn(station, 'in plane')} />
              </td>
              <td className="holds-mid">
                <HoldSign claims={claimsIn(station, 'out of plane')} />
              </td>
              <td>{whyText(station)}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}

function claimsIn(station: Station, direction: 'in plane' | 'out of plane'): readonly Claim[] {
  return station.claims.filter(
    (claim) =>
      claim.direction === direction || (direction === 'in plane' && claim.direction === 'along holder'),
  );
}

function HoldSign({ claims }: { readonly claims: readonly Claim[] }): JSX.Element {
  if (claims.some(({ counted }) => counted))
    return (
      <>
        <TickSign />
        <span className="unseen">held</span>
      </>
    );
  if (claims.some(isRefusedHold))
    return (
      <span className="holds-claimed">
        <LookSign /> <s>claimed</s>
      </span>
    );
  return (
    <>
      <span aria-hidden="true">–</span>
      <span className="unseen">not held</span>
    </>
  );
}

/** The reason that decides: why something claimed does not count, else why it holds. */
function whyText(station: Station): string {
  const claims = station.claims.filter(({ direction }) => direction !== 'twist');
  const told = claims.find(isRefusedHold) ?? claims.find(({ counted }) => counted) ?? claims[0];
  return told === undefined ? '' : reasonText(told.reason);
}
