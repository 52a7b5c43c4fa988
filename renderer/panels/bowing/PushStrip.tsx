import { type JSX, useMemo } from 'react';
import { useStore } from 'zustand';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import {
  forceIn,
  newtonsPerForceUnit,
  showForce,
  showMovement,
  showStiffness,
} from '../../../core/units/loads.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { NumberField } from '../../controls/NumberField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { placeMovement } from '../../scene/bowing/drawnMotion.ts';
import { stiffnessOf } from '../../scene/bowing/forceOfDrag.ts';
import type { PushShown } from '../../scene/bowing/pushShown.ts';
import { useServices } from '../../shell/services.tsx';
import { pushToShow } from '../../shell/view/pushToShow.ts';
import type { PushWay } from '../../store/push.ts';
import { pushPlaces, wayVector } from '../../store/pushing.ts';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import './bowing.css';

/** Under the bar of views while a diagonal is pushed: where, which way, how hard at most, and what comes of it. */
export function PushStrip(): JSX.Element | null {
  const { store, actions } = useServices();
  const state = useStore(store);
  const push = pushToShow(state);
  const assessment = shownAssessment(state);
  const units = shownProject(state).settings.units;
  const bar = state.selection.bar === null ? undefined : assessment?.layout.bars.get(state.selection.bar);
  const places = useMemo(
    () => (assessment === null || bar === undefined ? [] : pushPlaces(assessment, bar.id)),
    [assessment, bar],
  );
  if (push === null || bar?.angle == null)
    return (
      <div className="view-strip" role="toolbar" aria-label="Push">
        <span className="second">Choose a diagonal to push.</span>
      </div>
    );
  const own = places.find(({ at }) => Math.abs(at - push.at) < 1);
  const nameOf = (at: number, label: string | null): string =>
    `${label === null ? bar.mark : `${label} × ${bar.mark}`} at ${showLength(at, units, 'spoken')}`;
  const options = [
    ...places.map(({ at, label }) => ({ value: String(at), label: nameOf(at, label) })),
    ...(own === undefined ? [{ value: String(push.at), label: nameOf(push.at, null) }] : []),
  ];
  return (
    <div className="view-strip" role="toolbar" aria-label="Push">
      <span className="strip-place">
        <SelectField
          bare
          label="Place that is pushed"
          value={String(own?.at ?? push.at)}
          options={options}
          onChange={(at) => actions.push({ at: Number(at), force: null })}
        />
      </span>
      <Segmented<PushWay>
        bare
        label="Pushed along"
        value={push.way}
        options={[
          { value: 'any way', label: 'any way' },
          { value: 'out of plane', label: 'out of plane' },
          { value: 'in plane', label: 'in plane' },
        ]}
        onChange={(way) => actions.push({ way, force: null })}
      />
      {push.test !== null && (
        <span className="strip-force">
          <NumberField
            bare
            label={`Greatest force, ${unitNames(units).force}`}
            value={forceIn(push.most, units)}
            unit={unitNames(units).force}
            least={0}
            most={100}
            step={units === 'us' ? 0.01 : 0.05}
            decimals={units === 'us' ? 4 : 3}
            onChange={(force) => {
              if (force <= 0) return 'A push needs some force.';
              actions.push({ most: force * newtonsPerForceUnit(units), force: null });
              return null;
            }}
          />
        </span>
      )}
      <span className="strip-says strip-outcome" role="status">
        <Outcome push={push} angle={bar.angle} bar={bar} units={units} />
      </span>
    </div>
  );
}

interface OutcomeProps {
  readonly push: PushShown;
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly units: 'metric' | 'us';
}

/** "0.100 kN out of plane: 5.55 mm, 18.0 N/mm". */
function Outcome({ push, bar, angle, units }: OutcomeProps): JSX.Element {
  const { test, force } = push;
  if (test === null) return <>Working out…</>;
  if (test.ellipse === null) return <>{bar.bay} can move without resistance here.</>;
  const size = Math.hypot(...force);
  if (size === 0) return <>Drag {bar.mark}, or Shift and arrows</>;
  const direction = [force[0] / size, force[1] / size] as const;
  const movement = Math.hypot(...placeMovement(test, force));
  const stiffness = stiffnessOf(test, direction);
  const thatWay = size / stiffness;
  // Pushed askew it gives mostly the soft way; stiffness speaks of the way that is pushed.
  const sideways = movement > 1.01 * thatWay;
  return (
    <>
      {showForce(size, units)} {wayInWords(direction, angle)}: <b>{showMovement(movement, units)}</b>
      {sideways && `, ${showMovement(thatWay, units, 'bare')} that way`},{' '}
      <b>{showStiffness(stiffness, units)}</b>
    </>
  );
}

/** Within 10° a direction takes the name of a way. */
const ALIKE = Math.cos((10 * Math.PI) / 180);

function wayInWords(direction: readonly [number, number], angle: AngleBar): string {
  for (const way of ['in plane', 'out of plane'] as const) {
    const [x, y] = wayVector(way, angle);
    if (Math.abs(direction[0] * x + direction[1] * y) >= ALIKE) return way;
  }
  return 'askew';
}
