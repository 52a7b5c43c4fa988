import type { JSX } from 'react';
import { showForce } from '../../../core/units/loads.ts';
import { Key } from '../../controls/Key.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { reducedMotion } from '../../scene/overlay/reducedMotion.ts';
import { useActions, useWindow } from '../../shell/services.tsx';
import { latestStudy } from '../../store/closer.ts';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import type { BowedShape } from '../../store/windowState.ts';
import './bowing.css';

/** Under the bar of views while a diagonal is drawn bowed: which shape it is, and whether it swings. */
export function ShapeStrip(): JSX.Element | null {
  const actions = useActions();
  const study = useWindow(latestStudy);
  const units = useWindow((state) => shownProject(state).settings.units);
  const view = useWindow((state) => state.view);
  const bar = useWindow((state) =>
    state.selection.bar === null ? undefined : shownAssessment(state)?.layout.bars.get(state.selection.bar),
  );
  const real = useWindow((state) =>
    state.selection.bar === null
      ? null
      : (shownAssessment(state)?.diagonals.get(state.selection.bar)?.bowing?.real ?? null),
  );
  // There before the computed shape is, so that the drawing does not move when that comes.
  if (bar?.angle == null) return null;
  const still = reducedMotion();
  const bay = study?.bay.N ?? null;
  const says =
    view.shape === 'marks'
      ? 'the way that the marks leave free, drawn as a picture of it'
      : study === null || real === null
        ? 'no computed shape so far'
        : view.shape === 'bar'
          ? `at ${showForce(real.N, units)}: ${study.modeSays}`
          : bay === null
            ? `${bar.bay} can move without resistance`
            : `at ${showForce(bay, units)} in ${bar.mark}`;
  return (
    <div className="view-strip" role="toolbar" aria-label="Shape">
      <Segmented<BowedShape>
        bare
        label="Bowed"
        value={view.shape}
        options={[
          { value: 'marks', label: 'by the marks' },
          { value: 'bar', label: `computed, ${bar.mark}` },
          { value: 'bay', label: `all of ${bar.bay}` },
        ]}
        onChange={(shape) => actions.setView({ shape })}
      />
      {view.shape !== 'marks' && study !== null && !still && (
        <button
          type="button"
          className="button strip-play"
          aria-pressed={view.playing}
          aria-keyshortcuts="A"
          onClick={() => actions.setView({ playing: !view.playing })}
        >
          <PlaySign playing={view.playing} />
          {view.playing ? 'Pause' : 'Play'} <Key>A</Key>
        </button>
      )}
      <span className="strip-says" title={says}>
        {says}
      </span>
    </div>
  );
}

function PlaySign({ playing }: { readonly playing: boolean }): JSX.Element {
  return (
    <svg className="glyph" width="9" height="10" aria-hidden="true">
      <path d={playing ? 'M0 0h3v10H0ZM6 0h3v10H6Z' : 'M0 0 9 5 0 10Z'} fill="currentColor" />
    </svg>
  );
}
