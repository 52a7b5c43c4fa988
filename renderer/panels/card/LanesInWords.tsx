import type { JSX } from 'react';
import type { Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { Lane, Restraint } from '../../../core/restraint/model.ts';
import { AXES } from '../../../core/section/model.ts';
import { showLength, showRadius, showSlenderness } from '../../../core/units/quantity.ts';
import { chipText } from './laneWords.ts';

interface LanesInWordsProps {
  readonly bar: Bar;
  readonly restraint: Restraint;
  /** The slenderness held against the limit. */
  readonly read: number;
  readonly limit: number;
  readonly units: UnitSystem;
}

/** The lanes as a table for those who do not see the drawing: the same lengths, radii, slendernesses and reasons. */
export function LanesInWords({ bar, restraint, read, limit, units }: LanesInWordsProps): JSX.Element {
  const { governing } = restraint;
  const ownLane = governing.axis === 'free' || governing.basis === 'mixed bound';
  return (
    <table className="unseen" aria-label={`Lanes of ${bar.mark} as a table`}>
      <thead>
        <tr>
          <th scope="col">Axis</th>
          <th scope="col">Unbraced length</th>
          <th scope="col">Radius</th>
          <th scope="col">Slenderness</th>
          <th scope="col">Stations</th>
        </tr>
      </thead>
      <tbody>
        {AXES.map((axis) => {
          const lane = restraint.lanes[axis];
          return (
            <tr key={axis}>
              <th scope="row">{axis}</th>
              <td>{showLength(lane.unbraced, units, 'spoken')}</td>
              <td>{showRadius(lane.radius, units)}</td>
              <td>
                {showSlenderness(lane.slenderness, limit)}
                {restraint.governing.axis === axis && !ownLane && ', governs'}
              </td>
              <td>
                {[
                  ...lane.cuts.flatMap((cut) => {
                    const station = restraint.stations[cut.station];
                    return station === undefined ? [] : [chipText(cut, station).long];
                  }),
                  ...endsThatLetGo(lane),
                ].join('; ')}
              </td>
            </tr>
          );
        })}
        {ownLane && (
          <tr>
            <th scope="row">any way</th>
            <td>{showLength(governing.to - governing.from, units, 'spoken')}</td>
            <td>{showRadius(governing.radius, units)}</td>
            <td>{showSlenderness(read, limit)}, governs</td>
            <td>bows in a direction that is none of the four</td>
          </tr>
        )}
      </tbody>
    </table>
  );
}

/** "end j is marked as not holding this way, so the part beyond counts twice" */
function endsThatLetGo({ endsStop }: Lane): readonly string[] {
  return (['i', 'j'] as const)
    .filter((_, k) => !endsStop[k])
    .map(
      (end) => `end ${end} is marked as not holding this way, so the part beyond the last cut counts twice`,
    );
}
