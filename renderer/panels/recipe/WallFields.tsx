import type { JSX } from 'react';
import type { Bay, UnitSystem, WallRecipe } from '../../../core/project/model.ts';
import { LengthField } from '../../controls/LengthField.tsx';
import { Fold } from './Fold.tsx';
import { LineTable } from './LineTable.tsx';
import { MemberFields } from './MemberFields.tsx';
import { TierFields } from './TierFields.tsx';
import { useRecipeEdit } from './useRecipeEdit.ts';

interface FieldsProps<R> {
  readonly bay: Bay;
  readonly recipe: R;
  readonly units: UnitSystem;
}

export function WallFields({ bay, recipe, units }: FieldsProps<WallRecipe>): JSX.Element {
  const edit = useRecipeEdit<WallRecipe>(bay);
  return (
    <>
      <LengthField
        label="Width"
        mm={recipe.width}
        units={units}
        least={100}
        most={100_000}
        onChange={(width) => edit({ ...recipe, width }, 'width')}
      />
      <TierFields
        word="Tier"
        letter="t"
        tiers={recipe.tiers}
        units={units}
        onChange={(tiers, what) => edit({ ...recipe, tiers }, what)}
      />
    </>
  );
}

export function WallMore({ bay, recipe, units }: FieldsProps<WallRecipe>): JSX.Element {
  const edit = useRecipeEdit<WallRecipe>(bay);
  const height = recipe.tiers.reduce((sum, tier) => sum + tier.height, 0);
  return (
    <>
      <Fold title="Side rails" aside={countText(recipe.lines.length)}>
        <LineTable
          word="Rail"
          letter="S"
          lines={recipe.lines}
          units={units}
          total={height}
          bay={bay.id}
          onChange={(lines, what) => edit({ ...recipe, lines }, what)}
        />
      </Fold>
      <Fold title="Members" aside="columns, beams, rails">
        <MemberFields
          word="Columns"
          member={recipe.columns}
          units={units}
          onChange={(columns) => edit({ ...recipe, columns }, 'columns')}
        />
        <MemberFields
          word="Beams"
          member={recipe.beams}
          units={units}
          checked
          onChange={(beams) => edit({ ...recipe, beams }, 'beams')}
        />
        <MemberFields
          word="Rails"
          member={recipe.lineMember}
          units={units}
          onChange={(lineMember) => edit({ ...recipe, lineMember }, 'rails')}
        />
      </Fold>
    </>
  );
}

export function countText(count: number): string {
  return count === 0 ? 'none' : String(count);
}
