import type { Assessment } from '../../core/assessment.ts';
import type { BarId, CrossingId } from '../../core/layout/model.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import type { TrailStep } from '../../core/restraint/model.ts';
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
  /** A hold's way to its support, to light up. */
  readonly trail: readonly TrailStep[] | null;
  readonly onSelectBar: (bar: BarId | null) => void;
  readonly onSelectCrossing: (crossing: CrossingId | null) => void;
  readonly onSelectEnd: (bar: BarId, end: 'i' | 'j') => void;
  readonly onHoverBar: (bar: BarId | null) => void;
  /** The user has turned the view away from the named one. */
  readonly onViewChange?: (view: 'free') => void;
}
