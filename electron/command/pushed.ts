import type { Assessment } from '../../core/assessment.ts';
import { planeWays, stiffnessAlong } from '../../core/bowing/barProblems.ts';
import type { StiffnessEllipse } from '../../core/frame/push.ts';
import type { PushTest } from '../../core/frame/pushing.ts';
import { degreesOf } from '../../core/geometry/vector.ts';
import type { DiagonalBar } from './diagonalNamed.ts';

/** A push test as it is written: N/mm, mm; directions in the section plane, degrees from x (the shorter leg) towards y, in [0, 180). */
export interface Pushed {
  readonly bar: string;
  readonly bay: string;
  readonly mark: string;
  readonly section: string;
  readonly length: number;
  readonly at: number;
  /** With the bar in place; null when it can move there without resistance. */
  readonly inPlace: PushedStiffness | null;
  /** What the rest of the bay offers; null where nothing is joined to the bar. */
  readonly offered: PushedStiffness | null;
}

export interface PushedStiffness {
  /** Against a push in the plane across the bar, and out of the plane, the other way free to follow. */
  readonly inPlane: number;
  readonly outOfPlane: number;
  /** Largest and least over all ways, and the way of the largest. */
  readonly stiff: number;
  readonly soft: number;
  readonly stiffWayDegrees: number;
}

/** A station counts as the place asked for when it is nearer than this, mm. */
const SAME_PLACE = 1.5;

export function pushed(assessment: Assessment, bar: DiagonalBar, test: PushTest): Pushed {
  const ways = planeWays(bar);
  const stations = assessment.diagonals.get(bar.id)?.bowing?.stations ?? [];
  const offered = stations.find(({ at }) => Math.abs(at - test.at) < SAME_PLACE);
  const stiffness = (ellipse: StiffnessEllipse): PushedStiffness => ({
    inPlane: stiffnessAlong({ ellipse }, ways.inPlane),
    outOfPlane: stiffnessAlong({ ellipse }, ways.outOfPlane),
    stiff: ellipse.stiff,
    soft: ellipse.soft,
    stiffWayDegrees: degreesOf(ellipse.stiffWay),
  });
  return {
    bar: bar.id,
    bay: bar.bay,
    mark: bar.mark,
    section: bar.angle.spec.section,
    length: bar.length,
    at: test.at,
    inPlace: test.ellipse && stiffness(test.ellipse),
    offered: offered ? stiffness(offered.ellipse) : null,
  };
}
