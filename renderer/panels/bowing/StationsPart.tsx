import { type JSX, useState } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { Bowing, HoldGrip, OfferedStation } from '../../../core/bowing/model.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { StationNeed } from '../../../core/study/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { newtonsPerForceUnit, showMovement, showStiffness } from '../../../core/units/loads.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { Segmented } from '../../controls/Segmented.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { seenSection } from '../card/sectionGeometry.ts';
import { NeedsScale } from './NeedsScale.tsx';
import { FILLED, type FigureScale, StiffnessFigure } from './StiffnessFigure.tsx';

interface StationsPartProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly bowing: Bowing;
  readonly assessment: Assessment;
  readonly needs: readonly StationNeed[] | null;
  readonly units: UnitSystem;
}

/** More stations than this are chosen from a list. */
const SIDE_BY_SIDE = 4;

/** What the framing offers at each place where something is joined, the bar left out, against what a hold there would need. */
export function StationsPart(props: StationsPartProps): JSX.Element {
  const { bar, bowing, assessment, units } = props;
  const [chosen, setChosen] = useState(0);
  const restraint = assessment.diagonals.get(bar.id)?.restraint;
  const labelOf = ({ station, at }: OfferedStation): string =>
    restraint?.stations[station]?.label ?? showLength(at, units, 'spoken');
  const offered = bowing.stations[Math.min(chosen, bowing.stations.length - 1)];
  const options = bowing.stations.map((each, index) => ({ value: String(index), label: labelOf(each) }));
  const choice = { label: 'Station', value: String(chosen), options, bare: true } as const;
  return (
    <section className="bowing-part bowing-stations" aria-label="Stiffness at the stations">
      <div className="bowing-head">
        <h3>
          {offered === undefined
            ? 'Stiffness'
            : `At ${labelOf(offered)}, ${showLength(offered.at, units, 'spoken')}`}
        </h3>
        {options.length > 1 &&
          (options.length <= SIDE_BY_SIDE ? (
            <Segmented {...choice} onChange={(value) => setChosen(Number(value))} />
          ) : (
            <SelectField {...choice} onChange={(value) => setChosen(Number(value))} />
          ))}
      </div>
      {bowing.unsupported !== null ? (
        <p className="bowing-none">{bowing.unsupported}</p>
      ) : offered === undefined ? (
        <p className="bowing-none">
          Nothing is joined to {bar.mark} between its ends, so there is nothing to push against.
        </p>
      ) : (
        <Station {...props} offered={offered} />
      )}
    </section>
  );
}

function Station({
  bar,
  angle,
  needs,
  units,
  offered,
}: StationsPartProps & { readonly offered: OfferedStation }): JSX.Element | null {
  const [scale, setScale] = useState<FigureScale>('tens');
  const [axis, setAxis] = useState<'soft' | 'stiff' | null>(null);
  const { stock } = angle;
  if (stock === null) return null;
  const needOf = (hold: HoldGrip): StationNeed | null =>
    needs?.find(({ station, direction }) => station === offered.station && direction === hold.direction) ??
    null;
  const stiffer = offered.holds.reduce<HoldGrip | undefined>(
    (best, hold) => (best === undefined || hold.offered > best.offered ? hold : best),
    undefined,
  );
  const axisOf = (hold: HoldGrip): 'soft' | 'stiff' => (hold === stiffer ? 'stiff' : 'soft');
  const soft = offered.holds.find((hold) => hold !== stiffer);
  const softNeed = soft === undefined ? null : needOf(soft);
  const shownScale = axis === null ? scale : 'true';
  return (
    <div className="station">
      <div className="station-figure">
        <StiffnessFigure
          name={`Stiffness that ${bar.mark} is offered, seen from i: ${offered.holds
            .map((hold) => `${hold.direction} ${showStiffness(hold.offered, units)}`)
            .join(', ')}`}
          offered={offered}
          seen={seenSection(bar, angle, stock)}
          scale={shownScale}
          axis={axis ?? 'soft'}
          size={158}
          wanted={[
            ...(soft === undefined ? [] : [{ stiffness: soft.ideal, kind: 'ideal' as const }]),
            ...(softNeed?.needed.forAll == null
              ? []
              : [{ stiffness: softNeed.needed.forAll, kind: 'needed' as const }]),
          ]}
        />
        <p className="bowing-note station-ring">
          {shownScale === 'tens'
            ? 'half-axes by tens'
            : `ring: ${ringMovement(axis ?? 'soft', offered, units)} under 1 ${unitNames(units).force}`}
        </p>
        <div className="station-scale">
          <Segmented<FigureScale>
            bare
            label="Scale of the figure"
            value={shownScale}
            options={[
              { value: 'tens', label: 'by tens' },
              { value: 'true', label: 'true' },
            ]}
            onChange={setScale}
          />
        </div>
      </div>
      <div className="station-ways">
        <p className="bowing-note">
          {bar.mark} left out, its ends still. Long is soft, short is stiff; dashed a full hold, dotted all
          that is needed. In {unitNames(units).stiffness}.
        </p>
        {offered.holds.map((hold) => (
          <div key={hold.direction} className="station-way">
            <button
              type="button"
              className="station-axis"
              aria-label={`${hold.direction}: show this axis on its true scale`}
              onPointerEnter={() => setAxis(axisOf(hold))}
              onPointerLeave={() => setAxis(null)}
              onFocus={() => setAxis(axisOf(hold))}
              onBlur={() => setAxis(null)}
            >
              <span>{hold.direction}</span>
              <b>{showStiffness(hold.offered, units, 'bare')}</b>
            </button>
            <NeedsScale hold={hold} need={needOf(hold)} units={units} />
            <p className="station-grip">
              {hold.grip === null ? 'not counted' : `counted; grips ${grouped(hold.grip * 100, 0)} %`}
              <span>
                1 {unitNames(units).force} moves it {movementUnderOne(hold, units)}
              </span>
            </p>
          </div>
        ))}
      </div>
    </div>
  );
}

function ringMovement(axis: 'soft' | 'stiff', { ellipse }: OfferedStation, units: UnitSystem): string {
  const stiffness = axis === 'soft' ? ellipse.soft : ellipse.stiff;
  return showMovement(newtonsPerForceUnit(units) / stiffness / FILLED, units);
}

/** What offers next to nothing is not told in kilometres. */
const NOTHING = 1e-3;

function movementUnderOne({ offered }: HoldGrip, units: UnitSystem): string {
  return offered < NOTHING ? 'freely' : showMovement(newtonsPerForceUnit(units) / offered, units);
}
