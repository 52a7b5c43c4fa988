import { type JSX, useRef } from 'react';
import type { Crossing, CrossingId, Layout } from '../../../core/layout/model.ts';
import { JOIN_NAMES } from '../../../core/project/joinNames.ts';
import type { Join } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { CrossingPicture } from './CrossingPicture.tsx';
import { JoinDetails } from './JoinDetails.tsx';
import { JoinTable } from './JoinTable.tsx';
import { usePanelFocus } from './usePanelFocus.ts';
import { useReadings } from './useReadings.ts';
import './crossing.css';

/** Docked beside the drawing: how the bars are joined where they cross, and what each join would do. */
export function CrossingPanel({ crossingId }: { readonly crossingId: CrossingId }): JSX.Element | null {
  const actions = useActions();
  const assessment = useWindow(shownAssessment);
  const units = useWindow((state) => shownProject(state).settings.units);
  const trying = useWindow((state) => state.trying !== null);
  const chosenBar = useWindow((state) => state.selection.bar);
  const readings = useReadings(crossingId);
  const panel = useRef<HTMLElement>(null);
  usePanelFocus(panel, crossingId, readings !== null);
  const layout = assessment?.layout;
  const crossing = layout?.crossings.get(crossingId);
  if (layout === undefined || crossing === undefined) return null;

  const readBar =
    chosenBar === crossing.b && layout.bars.get(crossing.b)?.angle != null ? crossing.b : crossing.a;
  const title = crossingTitle(crossing, layout);
  const at = readBar === crossing.b ? crossing.onB : crossing.onA;
  const mark = (ids: readonly CrossingId[], join: Join | null): void => {
    const what = ids.length > 1 ? `${ids.length} crossings` : title;
    const done = join === null ? `Take the mark off ${what}` : `Mark ${what}: ${JOIN_NAMES[join.kind]}`;
    actions.edit({ kind: 'join', crossings: ids, join }, done);
  };
  const alike = alikeIn(crossing, layout);
  return (
    <section ref={panel} className="docked" data-region tabIndex={-1} aria-label={`Crossing ${title}`}>
      <div className="docked-head">
        <h2>
          Crossing {title} at {showLength(at, units, 'spoken')}
        </h2>
        <IconButton label="Close the crossing" tip="Close (Esc)" onClick={actions.stepBack}>
          <CloseSign />
        </IconButton>
      </div>
      <CrossingPicture crossing={crossing} layout={layout} readBar={readBar} units={units} />
      <fieldset disabled={trying}>
        <legend className="unseen">How {title} is joined</legend>
        <JoinTable
          crossing={crossing}
          readings={readings}
          readBar={readBar}
          readMark={layout.bars.get(readBar)?.mark ?? ''}
          units={units}
          onJoin={(join) => mark([crossing.id], join)}
        />
        <JoinDetails
          crossing={crossing}
          layout={layout}
          units={units}
          onJoin={(join) => mark([crossing.id], join)}
        />
        <div className="docked-buttons">
          {alike.length > 1 && crossing.join !== null && (
            <button
              type="button"
              className="link-button"
              onClick={() => {
                if (crossing.join !== null) mark(alike, crossing.join);
              }}
            >
              Mark all {alike.length} such crossings of {crossing.bay} so
            </button>
          )}
          {crossing.join !== null && (
            <button type="button" className="link-button" onClick={() => mark([crossing.id], null)}>
              Take the mark off
            </button>
          )}
        </div>
      </fieldset>
    </section>
  );
}

function crossingTitle(crossing: Crossing, { bars }: Layout): string {
  const names = [bars.get(crossing.a)?.mark ?? crossing.a, bars.get(crossing.b)?.mark ?? crossing.b];
  return names.sort((a, b) => a.localeCompare(b, 'en', { numeric: true })).join(' × ');
}

/** Crossings of the bay of the same kind that could be joined the same way; a cut names its bar, so it is not handed on. */
function alikeIn(crossing: Crossing, { crossings }: Layout): readonly CrossingId[] {
  const { join } = crossing;
  if (join === null || join.kind === 'cut') return [];
  return [...crossings.values()]
    .filter(
      (each) => each.bay === crossing.bay && each.kind === crossing.kind && each.choices.includes(join.kind),
    )
    .map(({ id }) => id);
}
