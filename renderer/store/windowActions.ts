/** What a user may intend, as changes of the window's state. Changes of the project go through core's edits, one labelled step each. */
import type { StoreApi } from 'zustand/vanilla';
import type { BarId, CrossingId } from '../../core/layout/model.ts';
import { editLabel, tryEdit } from '../../core/project/applyEdit.ts';
import type { Edit } from '../../core/project/edit.ts';
import type { Project } from '../../core/project/model.ts';
import type { ProjectProblem } from '../../core/project/problem.ts';
import type { ThemeSetting } from '../theme/themeSetting.ts';
import { NOTHING_CLOSER } from './closerAnswers.ts';
import { coalescingKey } from './coalescing.ts';
import type { Dialog } from './dialog.ts';
import { recorded, redone, startedHistory, undone } from './history.ts';
import { NO_PUSH, type Pushing } from './push.ts';
import { sameProject } from './sameProject.ts';
import {
  type BarEnd,
  NOTHING_SELECTED,
  steppedBack,
  withBar,
  withBay,
  withCrossing,
  withEnd,
  withRenamedBay,
} from './selection.ts';
import { presentProject, shownAssessment } from './shown.ts';
import { steppedState } from './shownForces.ts';
import { type Trial, tryingOf } from './trying.ts';
import { type DockTab, NO_RESULTS, type ViewName, type ViewState, type WindowState } from './windowState.ts';

/** Null when the edit was made; else why not. */
export type Refusal = readonly ProjectProblem[] | null;

export interface WindowActions {
  /** Makes the edits as one step. Refused, with the reasons, when the outcome could not be a project; and while a change is on trial. */
  edit(edits: Edit | readonly Edit[], label?: string): Refusal;
  undo(): void;
  redo(): void;
  startTrial(trial: Trial): void;
  keepTrial(): void;
  putBackTrial(): void;
  selectBay(bay: string): void;
  selectBar(bar: BarId): void;
  selectCrossing(crossing: CrossingId): void;
  selectEnd(end: BarEnd): void;
  hover(bar: BarId | null): void;
  /** Closes what is docked over the view. */
  stepBack(): void;
  look(view: ViewName): void;
  /** The user has turned the drawing away from the named view. */
  turnView(): void;
  setView(
    change: Partial<Pick<ViewState, 'scale' | 'bow' | 'shape' | 'playing' | 'trail' | 'loadCase'>>,
  ): void;
  /** Draws the chosen bar bowed, or straight; bowed, in the place of forces. */
  setBow(bow: boolean): void;
  /** Draws forces, or what bows. */
  showForces(forces: boolean): void;
  /** Shows one combination, and forces with it; null: the greatest of all. */
  chooseForceState(state: string | null): void;
  /** The next combination, or the one before; beyond either end the greatest of all. */
  stepForceState(step: 1 | -1): void;
  /** Turns pushing on or off; either way nothing pushes any more. */
  setPushMode(push: boolean): void;
  /** Pushes the chosen bar otherwise. */
  push(change: Partial<Omit<Pushing, 'bar'>>): void;
  showTab(tab: DockTab): void;
  setTheme(theme: ThemeSetting): void;
  openDialog(dialog: Dialog): void;
  closeDialog(): void;
  say(notice: string | null): void;
  /** Another project takes the place of this one. */
  replaceProject(
    project: Project,
    file: { readonly name: string; readonly token: string | null; readonly saved: boolean },
  ): void;
  markSaved(project: Project, name: string, token: string): void;
}

export function windowActions(
  store: StoreApi<WindowState>,
  /** ms on a clock that does not run backwards. */
  now: () => number,
): WindowActions {
  const { getState, setState } = store;
  return {
    edit: (given, label) => {
      const edits = 'kind' in given ? [given] : given;
      const state = getState();
      if (state.trying !== null) return [ON_TRIAL];
      const outcome = edited(presentProject(state), edits);
      if (!outcome.ok) return outcome.problems;
      if (sameProject(outcome.project, presentProject(state))) return null;
      const [first] = edits;
      const step = {
        project: outcome.project,
        label: label ?? (first === undefined ? '' : editLabel(first)),
        key: coalescingKey(edits),
        at: now(),
      };
      setState({
        history: recorded(state.history, step),
        selection: edits.reduce(followRename, state.selection),
      });
      return null;
    },
    undo: () =>
      setState((state) => (state.trying === null ? { history: undone(state.history) } : withoutTrial(state))),
    redo: () => setState(({ history, trying }) => (trying === null ? { history: redone(history) } : {})),
    startTrial: (trial) =>
      setState((state) => ({
        trying: tryingOf(trial, presentProject(state)),
        assessing: { ...state.assessing, tried: null },
        selection: trial.bar === null ? state.selection : withBar(state.selection, trial.bar),
      })),
    keepTrial: () =>
      setState((state) => {
        const { trying, assessing, history } = state;
        if (trying === null) return {};
        const { project, label, where } = trying;
        const step = { project, label: where === '' ? label : `${label}: ${where}`, key: null, at: now() };
        return {
          trying: null,
          history: recorded(history, step),
          assessing: { ...assessing, base: assessing.tried ?? assessing.base, tried: null },
        };
      }),
    putBackTrial: () => setState(withoutTrial),
    selectBay: (bay) =>
      setState((state) => ({ selection: withBay(state.selection, bay, shownAssessment(state)) })),
    selectBar: (bar) => setState(({ selection }) => ({ selection: withBar(selection, bar) })),
    selectCrossing: (crossing) =>
      setState((state) => {
        const assessment = shownAssessment(state);
        return assessment === null ? {} : { selection: withCrossing(state.selection, crossing, assessment) };
      }),
    selectEnd: (end) => setState({ selection: withEnd(end) }),
    hover: (hovered) => {
      if (getState().hovered !== hovered) setState({ hovered });
    },
    stepBack: () => setState(({ selection }) => ({ selection: steppedBack(selection) })),
    look: (name) =>
      setState(({ view }) => ({ view: { ...view, name, turned: false, nonce: view.nonce + 1 } })),
    turnView: () => setState(({ view }) => (view.turned ? {} : { view: { ...view, turned: true } })),
    setView: (change) => setState(({ view }) => ({ view: { ...view, ...change } })),
    setBow: (bow) => setState(({ view }) => ({ view: { ...view, bow, forces: bow ? false : view.forces } })),
    showForces: (forces) =>
      setState(({ view }) => ({ view: { ...view, forces, push: forces ? false : view.push } })),
    chooseForceState: (forceState) =>
      setState(({ view }) => ({ view: { ...view, forces: true, push: false, forceState } })),
    stepForceState: (step) =>
      setState((state) => ({
        view: { ...state.view, forces: true, push: false, forceState: steppedState(state, step) },
      })),
    setPushMode: (push) =>
      setState(({ view }) => ({
        view: { ...view, push, forces: push ? false : view.forces },
        pushing: NO_PUSH,
      })),
    push: (change) =>
      setState(({ pushing, selection }) => {
        const before = pushing.bar === selection.bar ? pushing : NO_PUSH;
        return { pushing: { ...before, ...change, bar: selection.bar } };
      }),
    showTab: (tab) => setState({ tab }),
    setTheme: (theme) => setState({ theme }),
    openDialog: (dialog) => setState({ dialog }),
    closeDialog: () => setState({ dialog: null }),
    say: (notice) => setState({ notice }),
    replaceProject: (project, { name, token, saved }) =>
      setState(({ view }) => ({
        started: true,
        history: startedHistory(project),
        file: { name, token, saved: saved ? project : null },
        assessing: NO_RESULTS,
        trying: null,
        selection: NOTHING_SELECTED,
        hovered: null,
        pushing: NO_PUSH,
        closer: NOTHING_CLOSER,
        view: { ...view, name: 'axonometric', turned: false, nonce: view.nonce + 1, forceState: null },
      })),
    markSaved: (project, name, token) => setState({ file: { name, token, saved: project } }),
  };
}

const ON_TRIAL: ProjectProblem = {
  path: '',
  what: 'A change is on trial.',
  todo: 'Keep it or put it back first.',
};

type Outcome = ReturnType<typeof tryEdit>;

function edited(project: Project, edits: readonly Edit[]): Outcome {
  let outcome: Outcome = { ok: true, project };
  for (const edit of edits) if (outcome.ok) outcome = tryEdit(outcome.project, edit);
  return outcome;
}

function followRename(selection: WindowState['selection'], edit: Edit): WindowState['selection'] {
  return edit.kind === 'rename bay' ? withRenamedBay(selection, edit.bay, edit.to) : selection;
}

function withoutTrial({ assessing }: WindowState): Partial<WindowState> {
  return { trying: null, assessing: { ...assessing, tried: null } };
}
