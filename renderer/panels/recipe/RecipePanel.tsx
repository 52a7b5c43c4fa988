import type { JSX } from 'react';
import type { Bay, UnitSystem } from '../../../core/project/model.ts';
import { useWindow } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { DiagonalFields } from './DiagonalFields.tsx';
import { FreeFields } from './FreeFields.tsx';
import { KneeFields, KneeMore } from './KneeFields.tsx';
import { RoofFields, RoofMore } from './RoofFields.tsx';
import { useChosenBay } from './useBay.ts';
import { WallFields, WallMore } from './WallFields.tsx';
import './recipe.css';

/** The few parameters that set the chosen bay out. Still while a change is on trial. */
export function RecipePanel(): JSX.Element | null {
  const bay = useChosenBay();
  const units = useWindow((state) => shownProject(state).settings.units);
  const trying = useWindow((state) => state.trying !== null);
  const counts = useWindow((state) => {
    const summary = shownAssessment(state)?.bays.get(state.selection.bay ?? '');
    return summary === undefined ? '' : `${summary.bars} bars, ${summary.diagonals} diagonals`;
  });
  if (bay === null) return null;
  return (
    <section className="recipe" aria-label={`Recipe of ${bay.id}`}>
      <div className="panel-head">
        <h2>Recipe of {bay.id}</h2>
        <small>{counts}</small>
      </div>
      {/* Still fields take no focus, so the part that scrolls takes it. A new key for each bay, so that no field keeps what was typed for another. */}
      <div className="recipe-scroll" tabIndex={trying ? 0 : undefined}>
        <fieldset key={bay.id} disabled={trying}>
          <legend className="unseen">Recipe of {bay.id}</legend>
          <KindFields bay={bay} units={units} />
          <DiagonalFields bay={bay} units={units} />
          <KindMore bay={bay} units={units} />
        </fieldset>
      </div>
    </section>
  );
}

interface KindProps {
  readonly bay: Bay;
  readonly units: UnitSystem;
}

function KindFields({ bay, units }: KindProps): JSX.Element {
  const { recipe } = bay;
  switch (recipe.kind) {
    case 'wall':
      return <WallFields bay={bay} recipe={recipe} units={units} />;
    case 'roof':
      return <RoofFields bay={bay} recipe={recipe} units={units} />;
    case 'knee':
      return <KneeFields bay={bay} recipe={recipe} units={units} />;
    case 'free':
      return <FreeFields bay={bay} recipe={recipe} units={units} />;
    default:
      return recipe satisfies never;
  }
}

function KindMore({ bay, units }: KindProps): JSX.Element | null {
  const { recipe } = bay;
  switch (recipe.kind) {
    case 'wall':
      return <WallMore bay={bay} recipe={recipe} units={units} />;
    case 'roof':
      return <RoofMore bay={bay} recipe={recipe} units={units} />;
    case 'knee':
      return <KneeMore bay={bay} recipe={recipe} units={units} />;
    case 'free':
      return null;
    default:
      return recipe satisfies never;
  }
}
