/** What the window shows: the change on trial while there is one, else the project as it stands. */
import type { Assessment } from '../../core/assessment.ts';
import type { Project } from '../../core/project/model.ts';
import type { Assessed, WindowState } from './windowState.ts';

export function presentProject(state: WindowState): Project {
  return state.history.present.project;
}

export function shownProject(state: WindowState): Project {
  return state.trying?.project ?? presentProject(state);
}

/** The newest results that there are, which may lag behind the project by a moment. */
export function shownAssessed(state: WindowState): Assessed | null {
  const { base, tried } = state.assessing;
  return state.trying !== null && tried !== null ? tried : base;
}

export function shownAssessment(state: WindowState): Assessment | null {
  return shownAssessed(state)?.assessment ?? null;
}

/** The figures as they were before the change on trial; null when nothing is on trial. */
export function beforeAssessment(state: WindowState): Assessment | null {
  return state.trying !== null && state.assessing.tried !== null
    ? (state.assessing.base?.assessment ?? null)
    : null;
}

/** Whether the project differs from what was last saved. */
export function isChanged(state: WindowState): boolean {
  return state.file.saved !== presentProject(state);
}

/** Whether the shown figures belong to the shown project. */
export function isUpToDate(state: WindowState): boolean {
  return shownAssessed(state)?.project === shownProject(state);
}
