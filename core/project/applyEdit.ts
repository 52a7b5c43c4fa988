import {
  placed,
  withActions,
  withActionsFollowing,
  withCarry,
  withLoad,
  withLoadCase,
} from './actionEdits.ts';
import type { Edit } from './edit.ts';
import { JOIN_NAMES } from './joinNames.ts';
import type { BarMark, Bay, Join, Line, LineHolder, Project, Recipe } from './model.ts';
import type { ProjectProblem } from './problem.ts';
import { readProjectData } from './readProject.ts';

/**
 * The project with one change made. Bays that an edit does not touch keep their identity.
 * An edit that names what is not there changes nothing.
 */
export function applyEdit(project: Project, edit: Edit): Project {
  switch (edit.kind) {
    case 'name project':
      return { ...project, name: edit.name };
    case 'settings':
      return { ...project, settings: { ...project.settings, ...edit.change } };
    case 'own stock':
      return { ...project, ownStock: edit.rows };
    case 'add bay': {
      const index = edit.after === null ? -1 : project.bays.findIndex((bay) => bay.id === edit.after);
      const at = index < 0 ? project.bays.length : index + 1;
      return { ...project, bays: [...project.bays.slice(0, at), edit.bay, ...project.bays.slice(at)] };
    }
    case 'remove bay':
      return { ...project, bays: project.bays.filter((bay) => bay.id !== edit.bay) };
    case 'bay':
      return withBay(project, edit.bay, (bay) => ({ ...bay, ...edit.change }));
    case 'rename bay':
      return renamed(project, edit.bay, edit.to);
    case 'recipe':
      return withBay(project, edit.bay, (bay) => ({ ...bay, recipe: edit.recipe }));
    case 'diagonals':
      return withBay(project, edit.bay, (bay) => ({
        ...bay,
        diagonals: { ...bay.diagonals, ...edit.change },
      }));
    case 'bars':
      return edit.bars.reduce(
        (changed, id) => withBarMark(changed, id, edit.change, edit.clear ?? []),
        project,
      );
    case 'join':
      return edit.crossings.reduce((changed, id) => withJoin(changed, id, edit.join), project);
    case 'tension share':
      return withBay(project, edit.bay, (bay) => withTensionShare(bay, edit.crossing, edit.share));
    case 'line holder':
      return withBay(project, edit.bay, (bay) => ({
        ...bay,
        recipe: withLineHolder(bay.recipe, edit.line, edit.heldBy),
      }));
    case 'load case':
      return withActions(project, (actions) => withLoadCase(actions, edit.id, edit.loadCase));
    case 'combination':
      return withActions(project, (actions) => ({
        ...actions,
        combinations: placed(actions.combinations, edit.id, edit.combination),
      }));
    case 'combinations':
      return withActions(project, (actions) => ({ ...actions, combinations: edit.combinations }));
    case 'load':
      return withActions(project, (actions) => withLoad(actions, edit.loadCase, edit.id, edit.load));
    case 'carry':
      return withActions(project, (actions) => withCarry(actions, edit.from, edit.eaves, edit.to));
    default:
      return edit satisfies never;
  }
}

export type EditOutcome =
  | { readonly ok: true; readonly project: Project }
  | { readonly ok: false; readonly problems: readonly ProjectProblem[] };

/** As `applyEdit`, but refuses a change after which the project could not be saved and opened again. */
export function tryEdit(project: Project, edit: Edit): EditOutcome {
  const read = readProjectData(applyEdit(project, edit));
  return read.ok ? { ok: true, project: applyEdit(project, edit) } : read;
}

/** What an edit does, for undo and redo. */
export function editLabel(edit: Edit): string {
  switch (edit.kind) {
    case 'name project':
      return 'Name the project';
    case 'settings':
      return 'Change the settings';
    case 'own stock':
      return 'Change the own stock list';
    case 'add bay':
      return `Add ${edit.bay.id}`;
    case 'remove bay':
      return `Remove ${edit.bay}`;
    case 'bay':
      return `Change ${edit.bay}`;
    case 'rename bay':
      return `Rename ${edit.bay} to ${edit.to}`;
    case 'recipe':
      return `Change ${edit.what} of ${edit.bay}`;
    case 'diagonals':
      return `Change the diagonals of ${edit.bay}`;
    case 'bars':
      return barsLabel(edit);
    case 'join':
      return edit.join === null ? 'Take the mark away' : `Mark the crossing: ${JOIN_NAMES[edit.join.kind]}`;
    case 'tension share':
      return `Set the forces at a crossing of ${edit.bay}`;
    case 'line holder':
      return `Change what holds ${edit.line}`;
    case 'load case':
      return edit.loadCase === null ? `Remove case ${edit.id}` : `Change case ${edit.id}`;
    case 'combination':
      return edit.combination === null ? `Remove combination ${edit.id}` : `Change combination ${edit.id}`;
    case 'combinations':
      return 'Change the combinations';
    case 'load':
      return edit.load === null ? `Take a load off ${edit.loadCase}` : `Place a load in ${edit.loadCase}`;
    case 'carry':
      return `Change what carries the eaves of ${edit.from}`;
    default:
      return edit satisfies never;
  }
}

/** A change to one end alone says which. */
function barsLabel({ bars, change, clear = [] }: Extract<Edit, { readonly kind: 'bars' }>): string {
  const named = bars.length === 1 ? `${bars[0]}` : `${bars.length} bars`;
  const [only, another] = [...Object.keys(change), ...clear];
  if (another !== undefined || (only !== 'endI' && only !== 'endJ')) return `Change ${named}`;
  return `Change end ${only === 'endI' ? 'i' : 'j'} of ${named}`;
}

function withBay(project: Project, id: string, change: (bay: Bay) => Bay): Project {
  if (!project.bays.some((bay) => bay.id === id)) return project;
  return { ...project, bays: project.bays.map((bay) => (bay.id === id ? change(bay) : bay)) };
}

/** "W1/t1.rise" as bay and key; of an id without a slash the bay is "", which no bay is called. */
export function placeOf(id: string): { readonly bay: string; readonly key: string } {
  const slash = id.indexOf('/');
  return slash < 0 ? { bay: '', key: id } : { bay: id.slice(0, slash), key: id.slice(slash + 1) };
}

function withBarMark(
  project: Project,
  id: string,
  change: BarMark,
  clear: readonly (keyof BarMark)[],
): Project {
  const { bay: bayId, key } = placeOf(id);
  return withBay(project, bayId, (bay) => {
    const merged: Record<string, unknown> = { ...bay.bars[key] };
    for (const [name, value] of Object.entries(change))
      if (value !== undefined && value !== null) merged[name] = value;
    for (const name of clear) delete merged[name];
    return {
      ...bay,
      bars: withEntry(bay.bars, key, Object.keys(merged).length > 0 ? (merged as BarMark) : null),
    };
  });
}

function withJoin(project: Project, id: string, join: Join | null): Project {
  const { bay: bayId, key } = placeOf(id);
  return withBay(project, bayId, (bay) => ({ ...bay, joins: withEntry(bay.joins, key, join) }));
}

/** A bay in which nothing is said of any crossing's forces has no entry for them at all, as one that never had. */
function withTensionShare(bay: Bay, crossing: string, share: number | null): Bay {
  if (share === null && bay.tensionShares?.[crossing] === undefined) return bay;
  const { tensionShares = {}, ...rest } = bay;
  const shares = withEntry(tensionShares, crossing, share);
  return Object.keys(shares).length === 0 ? rest : { ...rest, tensionShares: shares };
}

function withEntry<T>(
  entries: Readonly<Record<string, T>>,
  key: string,
  value: T | null,
): Readonly<Record<string, T>> {
  // No bar or crossing is called so, and no file can hold it.
  if (key === '__proto__') return entries;
  if (value !== null) return { ...entries, [key]: value };
  const { [key]: _gone, ...rest } = entries;
  return rest;
}

function withLineHolder(recipe: Recipe, line: string, heldBy: LineHolder): Recipe {
  const held = <L extends { readonly id: string }>(lines: readonly L[]): readonly L[] =>
    lines.map((each) => (each.id === line ? { ...each, heldBy } : each));
  switch (recipe.kind) {
    case 'wall':
      return { ...recipe, lines: held(recipe.lines) };
    case 'roof':
      return { ...recipe, slopes: recipe.slopes.map((slope) => ({ ...slope, lines: held(slope.lines) })) };
    case 'knee':
    case 'free':
      return recipe;
    default:
      return recipe satisfies never;
  }
}

/** Renames a bay and every mention of it. A name that is taken, or a bay that is not there, changes nothing. */
function renamed(project: Project, from: string, to: string): Project {
  const named = (id: string) => project.bays.some((bay) => bay.id === id);
  if (!named(from) || named(to)) return project;
  return {
    ...withActionsFollowing(project, from, to),
    bays: project.bays.map((bay) => {
      const following = withLinesFollowing(bay, from, to);
      return bay.id === from ? { ...following, id: to } : following;
    }),
  };
}

/** The bay with its lines held by `to` where they were held by `from`; the very same bay where none was. */
function withLinesFollowing(bay: Bay, from: string, to: string): Bay {
  const { recipe } = bay;
  const isHeldSo = ({ heldBy }: Line): boolean => heldBy.kind === 'bay' && heldBy.bay === from;
  const follow = (lines: readonly Line[]): readonly Line[] =>
    lines.map((line) => (isHeldSo(line) ? { ...line, heldBy: { kind: 'bay', bay: to } } : line));
  if (recipe.kind === 'wall' && recipe.lines.some(isHeldSo))
    return { ...bay, recipe: { ...recipe, lines: follow(recipe.lines) } };
  if (recipe.kind === 'roof' && recipe.slopes.some((slope) => slope.lines.some(isHeldSo)))
    return {
      ...bay,
      recipe: { ...recipe, slopes: recipe.slopes.map((slope) => ({ ...slope, lines: follow(slope.lines) })) },
    };
  return bay;
}
