import { type JSX, lazy, Suspense, useMemo } from 'react';
import { useStore } from 'zustand';
import type { Assessment } from '../../../core/assessment.ts';
import type { BarId, CrossingId } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { PushFigure } from '../../panels/bowing/PushFigure.tsx';
import { PushStrip } from '../../panels/bowing/PushStrip.tsx';
import { ShapeStrip } from '../../panels/bowing/ShapeStrip.tsx';
import { CrossingPanel } from '../../panels/crossing/CrossingPanel.tsx';
import { EndPanel } from '../../panels/end/EndPanel.tsx';
import { TryBanner } from '../../panels/findings/TryBanner.tsx';
import { ForceStrip } from '../../panels/forces/ForceStrip.tsx';
import type { ForcesShown } from '../../scene/forces/forcesShown.ts';
import { presentProject, shownAssessment, shownProject } from '../../store/shown.ts';
import type { Trying } from '../../store/trying.ts';
import type { WindowState } from '../../store/windowState.ts';
import type { Theme } from '../../theme/themeSetting.ts';
import { useServices, useWindow } from '../services.tsx';
import { EmptyProject } from './EmptyProject.tsx';
import { FailedFigures } from './FailedFigures.tsx';
import { caseForArrows, forcesToShow } from './forcesToShow.ts';
import { forceEdit } from './placeForce.ts';
import { pushToShow } from './pushToShow.ts';
import { shapeToShow } from './shapeToShow.ts';
import { trailToShow } from './trail.ts';
import { ViewBar } from './ViewBar.tsx';
import './view.css';

const BayView = lazy(async () => ({ default: (await import('../../scene/BayView.tsx')).BayView }));

/** The bay in 3D with its bar of views, and what is docked beside it. */
export function ViewPanel({ theme }: { readonly theme: Theme }): JSX.Element {
  const crossing = useWindow((state) => state.selection.crossing);
  const end = useWindow((state) => state.selection.end);
  return (
    <section className="view-panel" data-region tabIndex={-1} aria-label="View">
      <ViewBar />
      <TryBanner />
      <ViewStrip />
      <div className="view-body">
        <div className="view-drawing">
          <Drawing theme={theme} />
        </div>
        {crossing !== null && <CrossingPanel crossingId={crossing} />}
        {crossing === null && end !== null && <EndPanel end={end} />}
      </div>
    </section>
  );
}

/** What is said and set of what moves in the drawing. */
function ViewStrip(): JSX.Element | null {
  const push = useWindow((state) => state.view.push);
  const forces = useWindow((state) => state.view.forces);
  const bow = useWindow((state) => state.view.bow);
  // What is on trial has a bar of its own, and the drawing needs its room.
  const trying = useWindow((state) => state.trying !== null);
  if (push) return <PushStrip />;
  if (forces) return <ForceStrip />;
  return bow && !trying ? <ShapeStrip /> : null;
}

function Drawing({ theme }: { readonly theme: Theme }): JSX.Element {
  const { store, actions } = useServices();
  const started = useWindow((state) => state.started);
  const empty = useWindow((state) => presentProject(state).bays.length === 0);
  const assessment = useWindow(shownAssessment);
  const units = useWindow((state) => shownProject(state).settings.units);
  const failure = useWindow((state) => state.assessing.failure);
  const state = useStore(store);
  const { selection, hovered, view, trying } = state;
  const shape = shapeToShow(state);
  const push = pushToShow(state);
  const forces = useForces(state);
  const figure = useMemo(
    () => pushFigure(assessment, selection.bar, push?.at ?? null, units),
    [assessment, selection.bar, push?.at, units],
  );
  const removed = useMemo(() => joinsRemoved(trying), [trying]);
  const trail = useMemo(
    () => (assessment === null || !view.trail ? null : trailToShow(assessment, selection)),
    [assessment, view.trail, selection],
  );
  if (started && empty) return <EmptyProject />;
  if (failure !== null && assessment === null) return <FailedFigures failure={failure} />;
  if (assessment === null) return <Waiting />;
  return (
    <>
      <Suspense fallback={<Waiting />}>
        <BayView
          assessment={assessment}
          units={units}
          theme={theme}
          bay={selection.bay}
          selectedBar={selection.bar}
          selectedCrossing={selection.crossing}
          hoveredBar={hovered}
          view={view.name}
          viewNonce={view.nonce}
          scale={view.scale}
          bow={view.bow}
          shape={shape}
          playing={view.playing}
          push={push}
          stiffness={view.push || state.tab === 'bowing'}
          figure={figure}
          removed={removed}
          forces={forces}
          onForce={(place, force) => {
            const into = caseForArrows(store.getState());
            if (into !== null) actions.edit(forceEdit(into, place, force));
          }}
          trail={trail}
          onSelectBar={(bar) => (bar === null ? actions.stepBack() : actions.selectBar(bar))}
          onSelectCrossing={(crossing) =>
            crossing === null ? actions.stepBack() : actions.selectCrossing(crossing)
          }
          onSelectEnd={(bar, end) => actions.selectEnd({ bar, end })}
          onPush={actions.push}
          onHoverBar={actions.hover}
          onViewChange={actions.turnView}
        />
      </Suspense>
      {failure !== null && <FailedFigures failure={failure} />}
    </>
  );
}

/** The same object while nothing of it changes, so that the drawing rests. */
function useForces(state: WindowState): ForcesShown | null {
  const { view, selection, history, assessing, trying } = state;
  // biome-ignore lint/correctness/useExhaustiveDependencies: what the forces are made from
  return useMemo(
    () => forcesToShow(state),
    [view.forces, view.forceState, view.loadCase, selection.bay, history, assessing, trying],
  );
}

/** What the framing offers at the pushed place; null where nothing is joined. */
function pushFigure(
  assessment: Assessment | null,
  id: BarId | null,
  at: number | null,
  units: UnitSystem,
): JSX.Element | null {
  const bar = id === null ? undefined : assessment?.layout.bars.get(id);
  const diagonal = id === null ? undefined : assessment?.diagonals.get(id);
  const offered = diagonal?.bowing?.stations.find((each) => at !== null && Math.abs(each.at - at) < 1);
  if (bar?.angle == null || offered === undefined || diagonal?.bowing?.unsupported != null) return null;
  const label = diagonal?.restraint?.stations[offered.station]?.label ?? '';
  return <PushFigure bar={bar} angle={bar.angle} offered={offered} label={label} units={units} />;
}

/** Crossings whose join a change on trial takes away. */
function joinsRemoved(trying: Trying | null): readonly CrossingId[] {
  return (trying?.edits ?? []).flatMap((edit) =>
    edit.kind === 'join' && (edit.join === null || edit.join.kind === 'none') ? edit.crossings : [],
  );
}

function Waiting(): JSX.Element {
  return (
    <div className="view-waiting" role="status">
      Setting out…
    </div>
  );
}
