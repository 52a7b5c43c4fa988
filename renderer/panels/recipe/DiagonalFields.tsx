import type { JSX } from 'react';
import type { Bay, UnitSystem } from '../../../core/project/model.ts';
import { isCentred } from '../../../core/section/barShape.ts';
import { useFindSection } from '../../assessing/useFindSection.ts';
import { useStockChoices } from '../../assessing/useStockChoices.ts';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { SectionField } from '../../controls/SectionField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { presentProject, shownAssessment } from '../../store/shown.ts';
import { EndFields, endText } from './EndFields.tsx';
import { Fold } from './Fold.tsx';
import { refusalText, useDiagonalsEdit } from './useRecipeEdit.ts';

/** What every diagonal of the bay is, unless one is marked otherwise. */
export function DiagonalFields({
  bay,
  units,
}: {
  readonly bay: Bay;
  readonly units: UnitSystem;
}): JSX.Element {
  const edit = useDiagonalsEdit(bay);
  const actions = useActions();
  const stock = useStockChoices();
  const find = useFindSection();
  const { diagonals } = bay;
  // While a change is on trial, what it replaces is shown struck.
  const was = useWindow((state) =>
    state.trying === null
      ? null
      : (presentProject(state).bays.find(({ id }) => id === bay.id)?.diagonals ?? null),
  );
  const gauge = useWindow((state) => {
    const layout = shownAssessment(state)?.layout;
    const first = layout?.bays.find(({ id }) => id === bay.id)?.diagonals[0];
    return layout?.bars.get(first ?? '')?.angle?.placement.gauge ?? 40;
  });
  // Only an angle has legs and a heel, and what the gusset goes through lies on neither side of it.
  const shape = useWindow((state) => {
    const layout = shownAssessment(state)?.layout;
    const first = layout?.bays.find(({ id }) => id === bay.id)?.diagonals[0];
    return layout?.bars.get(first ?? '')?.angle?.stock?.outline.shape?.kind ?? null;
  });
  const own = Object.keys(bay.bars).filter((key) => bay.bars[key]?.section !== undefined);
  return (
    <>
      <SectionField
        label="Section"
        designation={diagonals.section}
        choices={stock?.choices ?? []}
        onFind={find}
        units={units}
        onChange={(section) => edit({ section }, 'section')}
      />
      {own.length > 0 && (
        <p className="recipe-note">
          {own.length} {own.length === 1 ? 'bar has a section' : 'bars have sections'} of{' '}
          {own.length === 1 ? 'its' : 'their'} own.{' '}
          <button
            type="button"
            className="link-button"
            onClick={() =>
              refusalText(
                actions.edit(
                  {
                    kind: 'bars',
                    bars: own.map((key) => `${bay.id}/${key}`),
                    change: {},
                    clear: ['section'],
                  },
                  `Give all of ${bay.id} its section`,
                ),
              )
            }
          >
            Give all of {bay.id} this one
          </button>
        </p>
      )}
      <TextField
        label="Grade"
        value={diagonals.grade}
        check={(text) => (text === '' ? 'Name the grade, such as S355JR.' : null)}
        onChange={(grade) => edit({ grade }, 'grade')}
      />
      {shape === null && (
        <Segmented
          label={bay.recipe.kind === 'roof' ? 'Leg in slope' : 'Leg in plane'}
          value={diagonals.legInPlane}
          was={was !== null && was.legInPlane !== diagonals.legInPlane ? was.legInPlane : null}
          options={[
            { value: 'longer', label: 'Longer' },
            { value: 'shorter', label: 'Shorter' },
          ]}
          onChange={(legInPlane) => edit({ legInPlane }, 'leg in plane')}
        />
      )}
      {(shape === null || !isCentred({ kind: shape })) && (
        <Segmented
          label="Bars placed"
          value={diagonals.arrangement}
          options={[
            { value: 'opposite', label: 'Back to back' },
            { value: 'same side', label: 'One side' },
          ]}
          onChange={(arrangement) => edit({ arrangement }, 'bars placed')}
        />
      )}
      {shape === null && (
        <Segmented
          label="Heel"
          value={diagonals.heel}
          options={[
            { value: 'up', label: 'Up' },
            { value: 'down', label: 'Down' },
          ]}
          onChange={(heel) => edit({ heel }, 'heel')}
        />
      )}
      <Segmented
        label="Counted on"
        value={diagonals.countedOn}
        options={[
          { value: 'tension', label: 'Tension only' },
          { value: 'both', label: 'Both' },
        ]}
        onChange={(countedOn) => edit({ countedOn }, 'what is counted on')}
      />
      {/^\s*2L/i.test(diagonals.section) && (
        <NumberField
          label="Battens"
          value={diagonals.battens ?? 0}
          least={0}
          most={100}
          onChange={(battens) => edit({ battens }, 'battens')}
        />
      )}
      <LengthField
        label="Gusset"
        mm={diagonals.gusset}
        units={units}
        least={1}
        most={100}
        step={1}
        small
        onChange={(gusset) => edit({ gusset }, 'gusset')}
      />
      <Fold title="Ends" aside={endText(diagonals.ends, units)}>
        <EndFields
          ends={diagonals.ends}
          units={units}
          usualGauge={gauge}
          onChange={(change, what) => edit({ ends: { ...diagonals.ends, ...change } }, what)}
        />
      </Fold>
    </>
  );
}
