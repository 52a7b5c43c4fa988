import type { JSX } from 'react';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { BarMark, UnitSystem } from '../../../core/project/model.ts';
import { useFindSection } from '../../assessing/useFindSection.ts';
import { useStockChoices } from '../../assessing/useStockChoices.ts';
import { NumberField } from '../../controls/NumberField.tsx';
import { SectionField } from '../../controls/SectionField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { Fold } from '../recipe/Fold.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';

interface BarMarksProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly units: UnitSystem;
}

const OWN: readonly (keyof BarMark)[] = [
  'mark',
  'section',
  'grade',
  'countedOn',
  'legInPlane',
  'heel',
  'side',
  'roll',
];

/** What differs for this one bar from the diagonals of its bay. */
export function BarMarks({ bar, angle, units }: BarMarksProps): JSX.Element {
  const actions = useActions();
  const stock = useStockChoices();
  const find = useFindSection();
  const trying = useWindow((state) => state.trying !== null);
  const { spec, mark } = angle;
  const shape = angle.stock?.outline.shape;
  const own = OWN.filter((key) => mark[key] !== undefined);
  const edit = (change: BarMark, what: string): string | null =>
    refusalText(actions.edit({ kind: 'bars', bars: [bar.id], change }, `Change ${what} of ${bar.mark}`));
  const clear = (): void => {
    actions.edit(
      { kind: 'bars', bars: [bar.id], change: {}, clear: own },
      `Set ${bar.mark} like the rest of ${bar.bay}`,
    );
  };
  return (
    <Fold
      title={`${bar.mark} alone`}
      aside={own.length === 0 ? `as the diagonals of ${bar.bay}` : `${own.length} of its own`}
    >
      <fieldset disabled={trying} className="bar-marks">
        <legend className="unseen">What differs for {bar.mark}</legend>
        <TextField
          label="Mark"
          value={bar.mark}
          check={(text) => (text === '' ? 'A bar needs a mark.' : null)}
          onChange={(to) => edit({ mark: to }, 'the mark')}
        />
        <SectionField
          label="Section"
          designation={spec.section}
          choices={stock?.choices ?? []}
          onFind={find}
          units={units}
          onChange={(section) => edit({ section }, 'section')}
        />
        <TextField label="Grade" value={spec.grade} onChange={(grade) => edit({ grade }, 'grade')} />
        <Segmented
          label="Counted on"
          value={spec.countedOn}
          options={[
            { value: 'tension', label: 'Tension only' },
            { value: 'both', label: 'Both' },
          ]}
          onChange={(countedOn) => edit({ countedOn }, 'what is counted on')}
        />
        {shape === undefined && (
          <>
            <Segmented
              label="Leg in plane"
              value={spec.legInPlane}
              options={[
                { value: 'longer', label: 'Longer' },
                { value: 'shorter', label: 'Shorter' },
              ]}
              onChange={(legInPlane) => edit({ legInPlane }, 'leg in plane')}
            />
            <Segmented
              label="Heel"
              value={spec.heel}
              options={[
                { value: 'up', label: 'Up' },
                { value: 'down', label: 'Down' },
              ]}
              onChange={(heel) => edit({ heel }, 'heel')}
            />
          </>
        )}
        <Segmented
          label="Side of gusset"
          value={angle.side}
          options={[
            { value: 'near', label: 'Near' },
            { value: 'far', label: 'Far' },
          ]}
          onChange={(side) => edit({ side }, 'side of gusset')}
        />
        <NumberField
          label="Roll"
          value={mark.roll ?? 0}
          unit="°"
          least={-180}
          most={180}
          step={5}
          decimals={1}
          onChange={(roll) => edit({ roll }, 'roll')}
        />
        {own.length > 0 && (
          <div className="recipe-add">
            <button type="button" className="link-button" onClick={clear}>
              Set it like the rest of {bar.bay}
            </button>
          </div>
        )}
      </fieldset>
    </Fold>
  );
}
