/** One of several that work critical loads out, bay by bay, for the worker that assesses. */
import { expose, type Remote, wrap } from 'comlink';
import { bowingsOfBays } from '../../core/assess/bayWork.ts';
import { type Prepared, prepared } from '../../core/assess/prepared.ts';
import type { BowingApi, Keeper } from './bowingApi.ts';
import { catalogues } from './catalogues.ts';

let ready: { readonly project: Prepared; readonly keeper: Remote<Keeper> } | null = null;

const api: BowingApi = {
  begin: (project, keeper) => {
    ready = { project: prepared(project, catalogues), keeper: wrap<Keeper>(keeper) };
  },
  work: async (bays) => {
    if (ready === null) throw new Error('no project has been handed over');
    await ready.keeper.remember(bowingsOfBays(ready.project, bays));
  },
};

expose(api);
