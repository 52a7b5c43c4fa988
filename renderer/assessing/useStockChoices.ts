import { useEffect, useState } from 'react';
import { useServices, useWindow } from '../shell/services.tsx';
import { shownProject } from '../store/shown.ts';
import type { StockChoices } from './assessApi.ts';

/** The angles that the project may use; null until they are read. */
export function useStockChoices(): StockChoices | null {
  const { assessor } = useServices();
  const catalogue = useWindow((state) => shownProject(state).settings.catalogue);
  const own = useWindow((state) => shownProject(state).ownStock);
  const [stock, setStock] = useState<StockChoices | null>(null);
  useEffect(() => {
    let wanted = true;
    assessor
      .ask((api) => api.stock(catalogue, [...own]))
      .then(
        (answer) => {
          if (wanted) setStock(answer);
        },
        () => {
          // Without a list the field still takes what is typed; that the worker fails is told by the state of the figures.
        },
      );
    return () => {
      wanted = false;
    };
  }, [assessor, catalogue, own]);
  return stock;
}
