import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import { axisName } from '../../../core/documents/sheets/axisName.ts';
import { dot2 } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar, Crossing } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { Restraint } from '../../../core/restraint/model.ts';
import { AXES } from '../../../core/section/model.ts';
import { showLength, showRadius } from '../../../core/units/quantity.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { useWindow } from '../../shell/services.tsx';
import { type Compass, compassOf } from './compass.ts';
import { SectionInPlace } from './SectionInPlace.tsx';
import { type SeenSection, seenPartner, seenSection } from './sectionGeometry.ts';

interface SectionPartProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly restraint: Restraint;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
}

/** The section in place with its axes and the ring of free ways; its radii; what the ring says in words. */
export function SectionPart({
  bar,
  angle,
  restraint,
  assessment,
  units,
}: SectionPartProps): JSX.Element | null {
  const chosen = useWindow((state) => state.selection.crossing);
  const { layout } = assessment;
  const { stock } = angle;
  if (stock === null) return null;
  const chosenCrossing = chosen === null ? null : (layout.crossings.get(chosen) ?? null);
  const crossing = chosenCrossing ?? firstDiagonalCrossing(restraint, layout);
  const partner = partnerOf(bar, crossing, layout);
  const seen = seenSection(bar, angle, stock);
  const compass = compassOf(restraint, chosenCrossing);
  const partnerOutline = partner === null ? null : seenPartner(bar, angle, stock, partner);
  return (
    <div className="section-part">
      <SectionInPlace
        name={`Section of ${bar.mark} in place, seen from i`}
        seen={seen}
        gusset={angle.spec.gusset}
        compass={compass}
        partner={partnerOutline}
        units={units}
      />
      <div>
        <table className="radii" aria-label="Radii of gyration">
          <tbody>
            {AXES.map((axis) => (
              <tr key={axis}>
                <th scope="row">{axisName(axis, assessment.practice)}</th>
                <td className="radii-what">{axis === 'v' ? 'r, least' : 'r'}</td>
                <td className="radii-figure">{showRadius(restraint.lanes[axis].radius, units, 'bare')}</td>
                <td className="radii-unit">{unitNames(units).radius}</td>
              </tr>
            ))}
          </tbody>
        </table>
        <ul className="section-legend">
          <FreeLegend compass={compass} seen={seen} />
          {partner !== null && crossing !== null && partnerOutline !== null && (
            <li>
              <svg width="18" height="8" aria-hidden="true">
                <path d="M0 4h18" stroke="var(--ink3)" strokeDasharray="3 2" />
              </svg>
              {partner.mark}, {awayText(crossing, units)}
            </li>
          )}
        </ul>
        <p className="section-note">
          Seen from i. Bending about an axis moves the bar at right angles to it.
        </p>
      </div>
    </div>
  );
}

function FreeLegend({
  compass,
  seen,
}: {
  readonly compass: Compass;
  readonly seen: SeenSection;
}): JSX.Element {
  const where = compass.where === '' ? '' : ` ${compass.where}`;
  return (
    <>
      {compass.free !== 'no way' && (
        <li>
          <svg width="18" height="8" aria-hidden="true">
            <path d="M0 4h18" stroke="var(--accent)" strokeWidth="5" />
          </svg>
          free{where}: {freeWords(compass.free, seen)}
        </li>
      )}
      {compass.free !== 'every way' && (
        <li>
          <svg width="18" height="8" aria-hidden="true">
            <path d="M0 5h18" stroke="var(--ink)" strokeWidth="2" />
            <path d="M2 4l2-4M6 4l2-4M10 4l2-4M14 4l2-4" stroke="var(--ink2)" strokeWidth=".8" />
          </svg>
          held{compass.heldBy === '' ? where : ` at ${compass.heldBy}`}
        </li>
      )}
    </>
  );
}

function awayText({ gap, clash }: Crossing, units: UnitSystem): string {
  if (clash) return 'runs into it';
  return gap < 0.5 ? 'leg to leg' : `${showLength(gap, units, 'small')} away`;
}

/** Within 10° a direction takes the name of the one it is near to. */
const NEAR = Math.cos((10 * Math.PI) / 180);

export function freeWords(free: Exclude<Compass['free'], 'no way'>, seen: SeenSection): string {
  if (free === 'every way') return 'every way';
  const direction = seen.inPicture(free);
  if (Math.abs(dot2(direction, seen.outOfPlane)) >= NEAR) return 'out of plane';
  if (Math.abs(dot2(direction, seen.inPlane)) >= NEAR) return 'in plane';
  return 'askew';
}

function firstDiagonalCrossing(restraint: Restraint, layout: Assessment['layout']): Crossing | null {
  for (const { crossings } of restraint.stations)
    for (const id of crossings) {
      const crossing = layout.crossings.get(id);
      if (crossing?.kind === 'diagonals') return crossing;
    }
  return null;
}

function partnerOf(bar: Bar, crossing: Crossing | null, layout: Assessment['layout']): Bar | null {
  if (crossing === null || (crossing.a !== bar.id && crossing.b !== bar.id)) return null;
  return layout.bars.get(crossing.a === bar.id ? crossing.b : crossing.a) ?? null;
}
