import { beforeEach, describe, expect, it } from 'vitest';
import { createStore, type StoreApi } from 'zustand/vanilla';
import type { Project } from '../../../core/project/model.ts';
import { newRoofBay, newWallBay } from '../../../core/project/newBay.ts';
import { newProject } from '../../../core/project/newProject.ts';
import { duplicatedBay, freshBay } from '../../../renderer/store/newBays.ts';
import { isChanged, presentProject, shownProject } from '../../../renderer/store/shown.ts';
import { type WindowActions, windowActions } from '../../../renderer/store/windowActions.ts';
import { firstState, type WindowState } from '../../../renderer/store/windowState.ts';

const BAR = 'W1/t1.rise';
const shed: Project = {
  ...newProject('shed'),
  bays: [newWallBay('W1', 'line A'), newRoofBay('R1', 'north')],
};

let clock = 0;
let store: StoreApi<WindowState>;
let actions: WindowActions;

beforeEach(() => {
  clock = 0;
  store = createStore<WindowState>(() => firstState('light'));
  actions = windowActions(store, () => clock);
  actions.replaceProject(shed, { name: 'shed', token: 'one', saved: true });
});

const width = (): number | null => {
  const recipe = presentProject(store.getState()).bays[0]?.recipe;
  return recipe?.kind === 'wall' ? recipe.width : null;
};

function setWidth(mm: number): ReturnType<WindowActions['edit']> {
  const { recipe } = newWallBay('W1', 'line A');
  if (recipe.kind !== 'wall') throw new Error('a wall bay has a wall recipe');
  return actions.edit({ kind: 'recipe', bay: 'W1', recipe: { ...recipe, width: mm }, what: 'width' });
}

describe('editing the project', () => {
  it('makes an edit one labelled step, and undo gives the saved project back as saved', () => {
    expect(isChanged(store.getState())).toBe(false);
    expect(setWidth(7000)).toBe(null);
    expect([width(), isChanged(store.getState())]).toEqual([7000, true]);
    expect(store.getState().history.present.label).toBe('Change width of W1');
    actions.undo();
    expect([width(), isChanged(store.getState())]).toEqual([6000, false]);
    actions.redo();
    expect(width()).toBe(7000);
  });

  it('leaves no step for an edit that changes nothing', () => {
    expect(setWidth(6000)).toBe(null);
    expect(store.getState().history.past).toHaveLength(0);
  });

  it('refuses an edit after which the project could not be opened again, and says why', () => {
    const refusal = setWidth(-5);
    expect(refusal?.[0]?.todo).not.toBe('');
    expect(width()).toBe(6000);
  });

  it('joins the presses of an arrow key into one step', () => {
    for (const mm of [6100, 6200, 6300]) {
      clock += 200;
      setWidth(mm);
    }
    actions.undo();
    expect(width()).toBe(6000);
  });

  it('makes several edits one step, or none of them', () => {
    const made = actions.edit(
      [
        { kind: 'bars', bars: [BAR], change: { heel: 'down' } },
        { kind: 'settings', change: { ownLimit: 250 } },
      ],
      'Two at once',
    );
    expect(made).toBe(null);
    expect(store.getState().history.past).toHaveLength(1);
    const refused = actions.edit([
      { kind: 'settings', change: { ownLimit: 240 } },
      { kind: 'settings', change: { ownLimit: Number.NaN } },
    ]);
    expect(refused).not.toBe(null);
    expect(presentProject(store.getState()).settings.ownLimit).toBe(250);
  });

  it('keeps the selection on a bay that takes another name', () => {
    actions.selectBar(BAR);
    actions.edit({ kind: 'rename bay', bay: 'W1', to: 'A' });
    expect(store.getState().selection).toMatchObject({ bay: 'A', bar: 'A/t1.rise' });
  });

  it('leaves selection, view and theme out of undo', () => {
    setWidth(7000);
    actions.selectBar(BAR);
    actions.look('plan');
    actions.setTheme('dark');
    actions.undo();
    const { selection, view, theme } = store.getState();
    expect([selection.bar, view.name, theme]).toEqual([BAR, 'plan', 'dark']);
  });
});

describe('a change on trial', () => {
  const trial = {
    id: 'slender:W1#0',
    label: 'Change to 90×90×7',
    where: 'all of W1',
    edits: [{ kind: 'diagonals', bay: 'W1', change: { section: '90x90x7' } }],
    bar: BAR,
  } as const;

  const sectionOf = (project: Project): string | undefined => project.bays[0]?.diagonals.section;

  it('is shown and does not touch the project until it is kept', () => {
    actions.startTrial(trial);
    const state = store.getState();
    expect([sectionOf(shownProject(state)), sectionOf(presentProject(state))]).toEqual([
      '90x90x7',
      '70x70x6',
    ]);
    expect(isChanged(state)).toBe(false);
  });

  it('becomes one step with its own words when it is kept', () => {
    actions.startTrial(trial);
    actions.keepTrial();
    const state = store.getState();
    expect([state.trying, sectionOf(presentProject(state))]).toEqual([null, '90x90x7']);
    expect(state.history.present.label).toBe('Change to 90×90×7: all of W1');
    actions.undo();
    expect(sectionOf(presentProject(store.getState()))).toBe('70x70x6');
  });

  it('leaves nothing behind when it is put back, by undo too', () => {
    for (const putBack of [actions.putBackTrial, actions.undo]) {
      actions.startTrial(trial);
      putBack();
      const state = store.getState();
      expect([state.trying, state.history.past.length, shownProject(state)]).toEqual([null, 0, shed]);
    }
  });

  it('keeps other edits out while it lasts', () => {
    actions.startTrial(trial);
    expect(setWidth(7000)?.[0]?.what).toBe('A change is on trial.');
    expect(width()).toBe(6000);
  });

  it('gives way to another trial, which starts from the project and not from the first one', () => {
    actions.startTrial(trial);
    actions.startTrial({
      ...trial,
      id: 'other',
      edits: [{ kind: 'bars', bars: [BAR], change: { heel: 'down' } }],
    });
    expect(sectionOf(shownProject(store.getState()))).toBe('70x70x6');
  });
});

describe('opening another project', () => {
  it('starts a history, a selection and results of its own', () => {
    setWidth(7000);
    actions.selectBar(BAR);
    actions.replaceProject(newProject('other'), { name: 'other', token: null, saved: false });
    const state = store.getState();
    expect([state.history.past.length, state.selection.bar, state.assessing.base]).toEqual([0, null, null]);
    expect(isChanged(state)).toBe(true);
  });
});

describe('bays to add', () => {
  it('take the next free id and stand clear of those that are there', () => {
    const wall = freshBay(shed, 'wall');
    expect(wall.id).toBe('W2');
    expect(wall.place.origin[1]).toBeGreaterThan(0);
    expect(freshBay(newProject('empty'), 'knee').id).toBe('K1');
  });

  it('copy everything but id and place', () => {
    const copy = duplicatedBay(shed, 'R1');
    expect(copy).toMatchObject({ id: 'R2', name: 'north', recipe: shed.bays[1]?.recipe });
    expect(duplicatedBay(shed, 'nowhere')).toBe(null);
  });
});
