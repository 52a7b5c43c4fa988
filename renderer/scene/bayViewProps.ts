import type { ReactNode } from 'react';
import type { Assessment } from '../../core/assessment.ts';
import type { BarMovement } from '../../core/frame/pushing.ts';
import type { Vec3 } from '../../core/geometry/vector.ts';
import type { BarId, CrossingId } from '../../core/layout/model.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import type { TrailStep } from '../../core/restraint/model.ts';
import type { ModeInSpace } from '../../core/study/model.ts';
import type { PushChange, PushShown } from './bowing/pushShown.ts';
import type { ForcesShown } from './forces/forcesShown.ts';
import type { AngleScale } from './geometry/steelPart.ts';
import type { ViewName } from './view/namedView.ts';

export interface BayViewProps {
  readonly assessment: Assessment;
  readonly units: UnitSystem;
  readonly theme: 'light' | 'dark';
  /** The bay in hand; the others are drawn faint round it. Null: the whole project. */
  readonly bay: string | null;
  readonly selectedBar: BarId | null;
  readonly selectedCrossing: CrossingId | null;
  readonly hoveredBar: BarId | null;
  readonly view: ViewName;
  /** Changed to go to the view again. */
  readonly viewNonce: number;
  /** Angles at their true size or at twice it; the set-out is true either way. */
  readonly scale: AngleScale;
  /** Whether the selected bar is shown bowed in its free direction. */
  readonly bow: boolean;
  /** The computed shape that takes the place of the marks' picture; null: there is none, or it is not wanted. */
  readonly shape: ComputedShape | null;
  /** Whether a computed shape swings to and fro. */
  readonly playing: boolean;
  /** While the chosen bar is pushed; null otherwise. */
  readonly push: PushShown | null;
  /** Whether what is offered at the stations of the chosen bar is drawn there. */
  readonly stiffness: boolean;
  /** Drawn at a clear place of the sheet in the stead of a crossing's detail, 148 by 186 px; null: nothing. */
  readonly figure: ReactNode;
  /** Joins that a change on trial takes away. */
  readonly removed: readonly CrossingId[];
  /** Forces, drawn in place of what bows; null: not wanted. */
  readonly forces: ForcesShown | null;
  /** A hold's way to its support, to light up. */
  readonly trail: readonly TrailStep[] | null;
  readonly onSelectBar: (bar: BarId | null) => void;
  readonly onSelectCrossing: (crossing: CrossingId | null) => void;
  readonly onSelectEnd: (bar: BarId, end: 'i' | 'j') => void;
  readonly onPush: (change: PushChange) => void;
  /** A force put on a node, kN; all noughts take it away. `place` as a load names it. */
  readonly onForce: (place: string, force: Vec3) => void;
  readonly onHoverBar: (bar: BarId | null) => void;
  /** The user has turned the view away from the named one. */
  readonly onViewChange?: (view: 'free') => void;
}

/** The shape in which the chosen bar, or its whole bay, gives way. */
export type ComputedShape =
  | { readonly kind: 'bar'; readonly mode: ModeInSpace }
  | { readonly kind: 'bay'; readonly movement: readonly BarMovement[] };
