import type { JSX } from 'react';
import type { Bay, KneeRecipe, UnitSystem } from '../../../core/project/model.ts';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { Fold } from './Fold.tsx';
import { MemberFields } from './MemberFields.tsx';
import { useRecipeEdit } from './useRecipeEdit.ts';

interface FieldsProps {
  readonly bay: Bay;
  readonly recipe: KneeRecipe;
  readonly units: UnitSystem;
}

export function KneeFields({ bay, recipe, units }: FieldsProps): JSX.Element {
  const edit = useRecipeEdit<KneeRecipe>(bay);
  return (
    <>
      <NumberField
        label="Purlins"
        value={recipe.count}
        least={1}
        most={100}
        onChange={(count) => edit({ ...recipe, count }, 'the number of purlins')}
      />
      <LengthField
        label="Spacing"
        mm={recipe.spacing}
        units={units}
        least={100}
        most={20_000}
        onChange={(spacing) => edit({ ...recipe, spacing }, 'spacing')}
      />
      <LengthField
        label="Drop"
        mm={recipe.drop}
        units={units}
        least={50}
        most={20_000}
        step={50}
        onChange={(drop) => edit({ ...recipe, drop }, 'drop')}
      />
      <NumberField
        label="Angle"
        value={recipe.angle}
        unit="°"
        least={10}
        most={80}
        decimals={1}
        onChange={(angle) => edit({ ...recipe, angle }, 'angle')}
      />
      <Segmented
        label="Sides"
        value={recipe.sides}
        options={[
          { value: 'both', label: 'Both' },
          { value: 'one', label: 'One' },
        ]}
        onChange={(sides) => edit({ ...recipe, sides }, 'sides')}
      />
    </>
  );
}

export function KneeMore({ bay, recipe, units }: FieldsProps): JSX.Element {
  const edit = useRecipeEdit<KneeRecipe>(bay);
  return (
    <Fold title="Members" aside="drawn, not checked">
      <MemberFields
        word="Chord"
        member={recipe.chord}
        units={units}
        onChange={(chord) => edit({ ...recipe, chord }, 'chord')}
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
