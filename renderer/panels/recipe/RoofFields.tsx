import type { JSX } from 'react';
import type { Bay, RoofRecipe, Slope, UnitSystem } from '../../../core/project/model.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { Fold } from './Fold.tsx';
import { LineTable } from './LineTable.tsx';
import { MemberFields } from './MemberFields.tsx';
import { TierFields } from './TierFields.tsx';
import { useRecipeEdit } from './useRecipeEdit.ts';
import { countText } from './WallFields.tsx';

interface FieldsProps {
  readonly bay: Bay;
  readonly recipe: RoofRecipe;
  readonly units: UnitSystem;
}

export function RoofFields({ bay, recipe, units }: FieldsProps): JSX.Element {
  const edit = useRecipeEdit<RoofRecipe>(bay);
  const several = recipe.slopes.length > 1;
  const setSlope = (id: string, change: Partial<Slope>, what: string): string | null =>
    edit(
      {
        ...recipe,
        slopes: recipe.slopes.map((slope) => (slope.id === id ? { ...slope, ...change } : slope)),
      },
      what,
    );
  return (
    <>
      <LengthField
        label="Rafters apart"
        mm={recipe.width}
        units={units}
        least={100}
        most={100_000}
        onChange={(width) => edit({ ...recipe, width }, 'rafters apart')}
      />
      <Segmented
        label="Slopes"
        value={several ? 'two' : 'one'}
        options={[
          { value: 'one', label: 'One' },
          { value: 'two', label: 'Two, to a ridge' },
        ]}
        onChange={(count) =>
          edit({ ...recipe, slopes: withSlopes(recipe.slopes, count === 'two') }, 'slopes')
        }
      />
      {recipe.slopes.map((slope) => (
        <div key={slope.id} className="slope">
          {several && <h3 className="slope-name">Slope {slope.id}</h3>}
          <NumberField
            label={several ? `Slope ${slope.id} pitch` : 'Slope'}
            value={slope.pitch}
            unit="°"
            least={0}
            most={80}
            step={0.5}
            decimals={1}
            onChange={(pitch) => setSlope(slope.id, { pitch }, `pitch of slope ${slope.id}`)}
          />
          <TierFields
            word="Panel"
            letter="p"
            tiers={slope.panels}
            units={units}
            onChange={(panels, what) => setSlope(slope.id, { panels }, what)}
          />
          <Fold
            title={several ? `Purlins of slope ${slope.id}` : 'Purlins'}
            aside={countText(slope.lines.length)}
            open
          >
            <LineTable
              word="Purlin"
              letter="P"
              lines={slope.lines}
              units={units}
              total={slope.panels.reduce((sum, panel) => sum + panel.height, 0)}
              bay={bay.id}
              onChange={(lines, what) => setSlope(slope.id, { lines }, what)}
            />
          </Fold>
        </div>
      ))}
    </>
  );
}

export function RoofMore({ bay, recipe, units }: FieldsProps): JSX.Element {
  const edit = useRecipeEdit<RoofRecipe>(bay);
  return (
    <Fold title="Members" aside="drawn, not checked">
      <div className="recipe-checks">
        <CheckField
          label="Strut along the eaves"
          checked={recipe.eavesStrut}
          onChange={(eavesStrut) => edit({ ...recipe, eavesStrut }, 'eaves strut')}
        />
        <CheckField
          label="Strut along the ridge"
          checked={recipe.ridgeStrut}
          onChange={(ridgeStrut) => edit({ ...recipe, ridgeStrut }, 'ridge strut')}
        />
      </div>
      <MemberFields
        word="Rafters"
        member={recipe.rafters}
        units={units}
        onChange={(rafters) => edit({ ...recipe, rafters }, 'rafters')}
      />
      <MemberFields
        word="Struts"
        member={recipe.struts}
        units={units}
        checked
        onChange={(struts) => edit({ ...recipe, struts }, 'struts')}
      />
      <MemberFields
        word="Purlins"
        member={recipe.purlin}
        units={units}
        onChange={(purlin) => edit({ ...recipe, purlin }, 'purlins')}
      />
    </Fold>
  );
}

/** A second slope begins as the first one over again; its purlins need names of their own. */
function withSlopes(slopes: readonly Slope[], two: boolean): readonly Slope[] {
  const [first, second] = slopes;
  if (first === undefined) return slopes;
  if (!two) return [first];
  if (second !== undefined) return slopes;
  const lines = first.lines.map((line, index) => ({ ...line, id: `Q${index + 1}` }));
  return [first, { ...first, id: first.id === 'b' ? 'a' : 'b', lines }];
}
