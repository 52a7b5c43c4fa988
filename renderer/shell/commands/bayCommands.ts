import type { RecipeKind } from '../../../core/project/model.ts';
import { duplicatedBay, freshBay } from '../../store/newBays.ts';
import { presentProject, shownAssessment } from '../../store/shown.ts';
import type { WindowState } from '../../store/windowState.ts';
import type { Services } from '../services.tsx';
import type { Command } from './command.ts';

const ADDED: readonly { readonly kind: RecipeKind; readonly label: string }[] = [
  { kind: 'wall', label: 'Add a wall bay' },
  { kind: 'roof', label: 'Add a roof bay' },
  { kind: 'knee', label: 'Add knees' },
  { kind: 'free', label: 'Add a free bay' },
];

// New bays come last, so that the marks of those that are there stay as they are.
export function addBay({ store, actions }: Services, kind: RecipeKind): void {
  const state = store.getState();
  const bay = freshBay(presentProject(state), kind);
  if (actions.edit({ kind: 'add bay', bay, after: null }) === null) actions.selectBay(bay.id);
}

export function duplicateBay({ store, actions }: Services, id: string): void {
  const copy = duplicatedBay(presentProject(store.getState()), id);
  if (copy === null) return;
  if (actions.edit({ kind: 'add bay', bay: copy, after: null }, `Duplicate ${id}`) === null)
    actions.selectBay(copy.id);
}

export const bayCommands: readonly Command[] = [
  ...ADDED.map(
    ({ kind, label }): Command => ({
      id: `add ${kind}`,
      menu: 'Bay',
      group: 1,
      label: () => label,
      enabled: ({ trying }) => trying === null,
      run: (services) => addBay(services, kind),
    }),
  ),
  {
    id: 'bay',
    menu: 'Bay',
    group: 2,
    label: ({ selection }) => `Name and place of ${selection.bay ?? 'the bay'}…`,
    enabled: hasBay,
    run: ({ store, actions }) => {
      const { bay } = store.getState().selection;
      if (bay !== null) actions.openDialog({ kind: 'bay', bay });
    },
  },
  {
    id: 'duplicate',
    menu: 'Bay',
    group: 2,
    label: ({ selection }) => `Duplicate ${selection.bay ?? 'the bay'}`,
    enabled: hasBay,
    run: (services) => {
      const { bay } = services.store.getState().selection;
      if (bay !== null) duplicateBay(services, bay);
    },
  },
  {
    id: 'remove bay',
    menu: 'Bay',
    group: 2,
    label: ({ selection }) => `Remove ${selection.bay ?? 'the bay'}`,
    enabled: hasBay,
    run: ({ store, actions }) => {
      const { bay } = store.getState().selection;
      if (bay !== null) actions.edit({ kind: 'remove bay', bay });
    },
  },
  {
    id: 'previous diagonal',
    menu: 'Bay',
    group: 3,
    label: () => 'Diagonal before',
    shortcut: { key: '[' },
    run: (services) => moveAlong(services, -1),
  },
  {
    id: 'next diagonal',
    menu: 'Bay',
    group: 3,
    label: () => 'Next diagonal',
    shortcut: { key: ']' },
    run: (services) => moveAlong(services, 1),
  },
];

function hasBay({ selection, trying }: WindowState): boolean {
  return selection.bay !== null && trying === null;
}

/** To the diagonal so many places on in the order of the project, round the end. */
export function moveAlong({ store, actions }: Services, steps: number): void {
  const state = store.getState();
  const assessment = shownAssessment(state);
  if (assessment === null) return;
  const order = assessment.layout.bays.flatMap(({ diagonals }) => diagonals);
  const at = state.selection.bar === null ? -1 : order.indexOf(state.selection.bar);
  const next = order[(at + steps + order.length) % order.length];
  if (next !== undefined) actions.selectBar(next);
}
