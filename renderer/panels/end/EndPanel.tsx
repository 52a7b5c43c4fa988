import type { JSX } from 'react';
import type { NodeSupport } from '../../../core/layout/model.ts';
import { END_HOLDS, type EndConnection, type EndHolds } from '../../../core/project/model.ts';
import { END_HOLDS_WORDS, endsHoldOf } from '../../../core/restraint/endWords.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import type { BarEnd } from '../../store/selection.ts';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { EndFields } from '../recipe/EndFields.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import '../crossing/crossing.css';

/** Docked beside the drawing: how this end of this bar is connected, apart from the other diagonals of its bay. */
export function EndPanel({ end: { bar: barId, end } }: { readonly end: BarEnd }): JSX.Element | null {
  const actions = useActions();
  const layout = useWindow((state) => shownAssessment(state)?.layout);
  const units = useWindow((state) => shownProject(state).settings.units);
  const trying = useWindow((state) => state.trying !== null);
  const bar = layout?.bars.get(barId);
  const angle = bar?.angle ?? null;
  if (layout === undefined || bar === undefined || angle === null) return null;

  const key = end === 'i' ? 'endI' : 'endJ';
  const own = angle.mark[key];
  const node = layout.nodes.get(end === 'i' ? bar.i : bar.j);
  const change = (fields: Partial<EndConnection>, what: string): string | null =>
    refusalText(
      actions.edit(
        { kind: 'bars', bars: [bar.id], change: { [key]: { ...own, ...fields } } },
        `Change ${what} at end ${end} of ${bar.mark}`,
      ),
    );
  const asBay = (): void => {
    actions.edit(
      { kind: 'bars', bars: [bar.id], change: {}, clear: [key] },
      `Connect end ${end} of ${bar.mark} like the rest of ${bar.bay}`,
    );
  };
  const starts = end === 'i' ? angle.cut.startsAt : angle.cut.endsBefore;
  return (
    <section className="docked" data-region tabIndex={-1} aria-label={`End ${end} of ${bar.mark}`}>
      <div className="docked-head">
        <h2>
          End {end} of {bar.mark}
          {node !== undefined && `, at ${node.label}`}
        </h2>
        <IconButton label="Close the end" tip="Close (Esc)" onClick={actions.stepBack}>
          <CloseSign />
        </IconButton>
      </div>
      <p className="end-note">
        {own === undefined ? `As the diagonals of ${bar.bay}.` : 'Of its own.'} The steel begins{' '}
        {showLength(starts, units)} from the set-out point; gauge{' '}
        {showLength(angle.placement.gauge, units, 'small')} from the heel. {heldText(node?.supports[bar.bay])}
      </p>
      <fieldset key={`${bar.id} ${end}`} className="end-fields" disabled={trying}>
        <legend className="unseen">
          Connection of end {end} of {bar.mark}
        </legend>
        <EndFields
          ends={angle.ends[end]}
          units={units}
          usualGauge={angle.placement.gauge}
          onChange={change}
        />
        <SelectField
          label="Holds the bar"
          value={endsHoldOf(angle)[end]}
          options={END_HOLDS.map((value) => ({ value, label: HOLDS[value] }))}
          onChange={(holds) => change({ holds }, 'what is held')}
        />
        <LengthField
          label={`Gusset, all of ${bar.bay}`}
          mm={angle.spec.gusset}
          units={units}
          least={1}
          most={100}
          step={1}
          small
          onChange={(gusset) =>
            refusalText(
              actions.edit(
                { kind: 'diagonals', bay: bar.bay, change: { gusset } },
                `Change gusset of ${bar.bay}`,
              ),
            )
          }
        />
      </fieldset>
      <p className="end-note">{holdsText(endsHoldOf(angle)[end])}</p>
      {own !== undefined && (
        <div className="docked-buttons">
          <button type="button" className="link-button" disabled={trying} onClick={asBay}>
            Connect it like the rest of {bar.bay}
          </button>
        </div>
      )}
    </section>
  );
}

const HOLDS: Readonly<Record<EndHolds, string>> = {
  both: 'Both ways',
  'in plane only': 'In the plane only',
  'out of plane only': 'Out of the plane only',
  nothing: 'Neither way',
};

/** What the choice means for the lengths. */
function holdsText(holds: EndHolds): string {
  return holds === 'both'
    ? 'An end holds its bar both ways across itself, unless what it is fixed to can move.'
    : `As marked, this end ${END_HOLDS_WORDS[holds]}: the bar swings out past the last place that holds it there, and that part counts twice.`;
}

function heldText(support: NodeSupport | undefined): string {
  switch (support?.kind) {
    case 'foundation':
      return 'The node stands on its foundation.';
    case 'standing':
      return 'The node stands on the bay below, as far as that holds it.';
    case 'eaves':
      return 'The node is at the eaves, held by the bays below.';
    case 'vouched':
      return 'The node is held in place, as you vouch.';
    case undefined:
      return 'The node is held by the bracing alone.';
  }
}
