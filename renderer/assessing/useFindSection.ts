import { useCallback } from 'react';
import { useServices } from '../shell/services.tsx';
import { shownProject } from '../store/shown.ts';
import type { SectionFound } from './assessApi.ts';

/** Looks a typed designation up in every list that the project may take from. */
export function useFindSection(): (typed: string) => Promise<SectionFound> {
  const { assessor, store } = useServices();
  return useCallback(
    (typed) => {
      const { settings, ownStock } = shownProject(store.getState());
      return assessor.ask((api) => api.section(settings.catalogue, [...ownStock], typed));
    },
    [assessor, store],
  );
}
