/** Changes to what acts on a project. */
import { type Actions, type Carry, type Load, type LoadCase, NO_ACTIONS } from './actions.ts';
import type { Project } from './model.ts';

/** A project on which nothing acts has no entry for it, as one that never had. */
export function withActions(project: Project, change: (actions: Actions) => Actions): Project {
  const { actions = NO_ACTIONS, ...rest } = project;
  const changed = change(actions);
  const nothing =
    changed.cases.length === 0 && changed.combinations.length === 0 && changed.carries.length === 0;
  return nothing ? rest : { ...rest, actions: changed };
}

/** The list with one entry put in the place of the one of its id, or at the end; null takes it out. */
export function placed<T extends { readonly id: string }>(
  list: readonly T[],
  id: string,
  entry: T | null,
): readonly T[] {
  if (entry === null) return list.filter((each) => each.id !== id);
  return list.some((each) => each.id === id)
    ? list.map((each) => (each.id === id ? entry : each))
    : [...list, entry];
}

/** A case that goes takes its factors with it; one that is given another id keeps them. */
export function withLoadCase(actions: Actions, id: string, loadCase: LoadCase | null): Actions {
  const to = loadCase?.id ?? null;
  return {
    ...actions,
    cases: placed(actions.cases, id, loadCase),
    combinations:
      to === id
        ? actions.combinations
        : actions.combinations.map((combination) => ({
            ...combination,
            factors: Object.fromEntries(
              Object.entries(combination.factors).flatMap(([of, factor]) =>
                of !== id ? [[of, factor]] : to === null ? [] : [[to, factor]],
              ),
            ),
          })),
  };
}

export function withLoad(actions: Actions, loadCase: string, id: string, load: Load | null): Actions {
  return {
    ...actions,
    cases: actions.cases.map((each) =>
      each.id === loadCase ? { ...each, loads: placed(each.loads, id, load) } : each,
    ),
  };
}

export function withCarry(actions: Actions, from: string, eaves: Carry['eaves'], to: string | null): Actions {
  const others = actions.carries.filter((carry) => carry.from !== from || carry.eaves !== eaves);
  return { ...actions, carries: to === null ? others : [...others, { from, to, eaves }] };
}

/** Renames a bay wherever an action names it. */
export function withActionsFollowing(project: Project, from: string, to: string): Project {
  const { actions } = project;
  if (!actions) return project;
  const bay = (id: string): string => (id === from ? to : id);
  const place = (id: string): string => (id.startsWith(`${from}/`) ? `${to}${id.slice(from.length)}` : id);
  const followed = (load: Load): Load => {
    switch (load.kind) {
      case 'node':
        return { ...load, node: place(load.node) };
      case 'line':
      case 'shortened':
        return { ...load, bar: place(load.bar) };
      case 'gable':
      case 'side':
      case 'bowed':
        return { ...load, bay: bay(load.bay) };
      default:
        return load satisfies never;
    }
  };
  return {
    ...project,
    actions: {
      ...actions,
      cases: actions.cases.map((each) => ({ ...each, loads: each.loads.map(followed) })),
      carries: actions.carries.map((carry) => ({ ...carry, from: bay(carry.from), to: bay(carry.to) })),
    },
  };
}
