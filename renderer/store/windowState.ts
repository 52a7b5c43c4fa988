/** Everything the window remembers. Results are derived from the project by the assessing worker and only kept here. */
import type { Assessment } from '../../core/assessment.ts';
import type { Project } from '../../core/project/model.ts';
import { newProject } from '../../core/project/newProject.ts';
import type { ThemeSetting } from '../theme/themeSetting.ts';
import { type Closer, NOTHING_CLOSER } from './closerAnswers.ts';
import type { Dialog } from './dialog.ts';
import { type History, startedHistory } from './history.ts';
import { NO_PUSH, type Pushing } from './push.ts';
import { NOTHING_SELECTED, type Selection } from './selection.ts';
import type { Trying } from './trying.ts';

export interface Assessed {
  readonly project: Project;
  readonly assessment: Assessment;
  /** ms that the assessment took. */
  readonly took: number;
}

export interface AssessingState {
  /** Of the project as it stands. */
  readonly base: Assessed | null;
  /** Of the change on trial. */
  readonly tried: Assessed | null;
  /** Since when a result is awaited, ms; null when nothing is. */
  readonly workingSince: number | null;
  /** How many bays are worked out while many are; null when not known. */
  readonly progress: { readonly done: number; readonly of: number } | null;
  /** The user has stopped the work; figures may be missing or old until it is taken up again. */
  readonly stopped: boolean;
  /** Why no result came; the project is untouched by it. */
  readonly failure: string | null;
}

export interface FileState {
  readonly name: string;
  /** Opaque; null until the project has a file. */
  readonly token: string | null;
  /** The project as last saved or opened; null when it never was. */
  readonly saved: Project | null;
}

export type ViewName = 'elevation' | 'plan' | 'side' | 'axonometric';

export interface ViewState {
  readonly name: ViewName;
  /** Turned by hand away from the named view. */
  readonly turned: boolean;
  /** Goes up whenever the view is asked for, so that asking again turns the camera back. */
  readonly nonce: number;
  readonly scale: 'true' | 'doubled';
  readonly bow: boolean;
  /** What is drawn bowed: the marks' picture, the computed shape of the chosen bar, or that of its whole bay. */
  readonly shape: BowedShape;
  /** Whether the computed shape swings to and fro. */
  readonly playing: boolean;
  /** Whether the pointer and the arrow keys push the chosen bar. */
  readonly push: boolean;
  readonly trail: boolean;
  /** Whether forces are drawn in place of what bows. */
  readonly forces: boolean;
  /** The combination that is shown, by the id of its state; null: the greatest of each bar in all of them. */
  readonly forceState: string | null;
  /** The case that forces placed in the drawing go into; null: the first that is there. */
  readonly loadCase: string | null;
}

export type BowedShape = 'marks' | 'bar' | 'bay';

export type DockTab = 'schedule' | 'shortlist' | 'findings' | 'bowing' | 'forces';

export interface WindowState {
  readonly started: boolean;
  readonly history: History;
  readonly file: FileState;
  readonly assessing: AssessingState;
  readonly trying: Trying | null;
  readonly selection: Selection;
  readonly hovered: string | null;
  readonly view: ViewState;
  readonly pushing: Pushing;
  readonly closer: Closer;
  readonly tab: DockTab;
  readonly theme: ThemeSetting;
  readonly dialog: Dialog | null;
  readonly notice: string | null;
}

export const NO_RESULTS: AssessingState = {
  base: null,
  tried: null,
  workingSince: null,
  progress: null,
  stopped: false,
  failure: null,
};

export function firstState(theme: ThemeSetting): WindowState {
  const project = newProject('New project');
  return {
    started: false,
    history: startedHistory(project),
    file: { name: project.name, token: null, saved: project },
    assessing: NO_RESULTS,
    trying: null,
    selection: NOTHING_SELECTED,
    hovered: null,
    view: {
      name: 'axonometric',
      turned: false,
      nonce: 0,
      scale: 'doubled',
      bow: true,
      shape: 'marks',
      playing: false,
      push: false,
      trail: true,
      forces: false,
      forceState: null,
      loadCase: null,
    },
    pushing: NO_PUSH,
    closer: NOTHING_CLOSER,
    tab: 'schedule',
    theme,
    dialog: null,
    notice: null,
  };
}
