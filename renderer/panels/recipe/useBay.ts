import type { Bay } from '../../../core/project/model.ts';
import { useWindow } from '../../shell/services.tsx';
import { shownProject } from '../../store/shown.ts';

/** The chosen bay as it is shown, or null. */
export function useChosenBay(): Bay | null {
  return useWindow((state) => shownProject(state).bays.find(({ id }) => id === state.selection.bay) ?? null);
}
