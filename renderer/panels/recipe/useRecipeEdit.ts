import type { Bay, DiagonalSpec, Recipe } from '../../../core/project/model.ts';
import { useActions } from '../../shell/services.tsx';
import type { Refusal } from '../../store/windowActions.ts';

/** Why an edit was refused, as one text for the field; null when it was made. */
export function refusalText(refusal: Refusal): string | null {
  const first = refusal?.[0];
  return first === undefined ? null : `${first.what} ${first.todo}`.trim();
}

/** Puts another recipe in the place of the bay's; `what` names the field for undo, as in "Change width of W1". */
export function useRecipeEdit<R extends Recipe>(bay: Bay): (recipe: R, what: string) => string | null {
  const actions = useActions();
  return (recipe, what) => refusalText(actions.edit({ kind: 'recipe', bay: bay.id, recipe, what }));
}

/** Changes what every diagonal of the bay is. */
export function useDiagonalsEdit(bay: Bay): (change: Partial<DiagonalSpec>, what: string) => string | null {
  const actions = useActions();
  return (change, what) =>
    refusalText(actions.edit({ kind: 'diagonals', bay: bay.id, change }, `Change ${what} of ${bay.id}`));
}
