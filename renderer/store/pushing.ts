/** Where the chosen bar can be pushed, and with what. */
import type { Assessment } from '../../core/assessment.ts';
import { planeWays } from '../../core/bowing/barProblems.ts';
import type { PushTest } from '../../core/frame/pushing.ts';
import type { Vec2 } from '../../core/geometry/vector.ts';
import type { AngleBar, BarId } from '../../core/layout/model.ts';
import type { Pushing, PushWay } from './push.ts';
import type { WindowState } from './windowState.ts';

/** A place at which a bar can be pushed. */
export interface PushPlace {
  readonly at: number;
  /** "D1" for a place that is joined; null for one that is not. */
  readonly label: string | null;
}

/** Nearer than this share of the length two places are one. */
const ONE_PLACE = 0.03;

/** Where the bar is joined, and its quarter points, from i to j. */
export function pushPlaces(assessment: Assessment, bar: BarId): readonly PushPlace[] {
  const length = assessment.layout.bars.get(bar)?.length ?? 0;
  const joined = (assessment.diagonals.get(bar)?.restraint?.stations ?? [])
    .slice(1, -1)
    .map(({ at, label }) => ({ at, label }));
  const quarters = [0.25, 0.5, 0.75]
    .map((part) => ({ at: part * length, label: null }))
    .filter(({ at }) => joined.every((one) => Math.abs(one.at - at) > ONE_PLACE * length));
  return [...joined, ...quarters].sort((a, b) => a.at - b.at);
}

/** The place that is pushed, mm from end i of the chosen bar; null when none is chosen. */
export function pushedAt({ pushing, selection }: WindowState, assessment: Assessment): number | null {
  const bar = selection.bar === null ? undefined : assessment.layout.bars.get(selection.bar);
  if (bar?.angle == null) return null;
  if (pushing.bar === bar.id && pushing.at !== null && pushing.at < bar.length) return pushing.at;
  const places = pushPlaces(assessment, bar.id);
  const middle = bar.length / 2;
  const nearest = (some: readonly PushPlace[]): number | null =>
    some.reduce<number | null>(
      (best, { at }) => (best === null || Math.abs(at - middle) < Math.abs(best - middle) ? at : best),
      null,
    );
  return nearest(places.filter(({ label }) => label !== null)) ?? nearest(places) ?? middle;
}

/** A push may move a bar by this share of its length and still be called small. */
const SMALL = 1 / 600;
/** Greatest forces that are offered without being asked for, N. */
const FORCES = [10_000, 1000, 100, 10, 1] as const;

/** The greatest force, N: the user's, or a round one under which the bar moves no farther than makes sense for a linear answer. */
export function greatestForce(pushing: Pushing, test: PushTest, length: number): number {
  if (pushing.bar === test.bar && pushing.most !== null) return pushing.most;
  const soft = test.ellipse?.soft ?? 1;
  return FORCES.find((force) => force <= 1000 && force / soft <= SMALL * length) ?? 1;
}

/** The way that is set as a unit vector along the section's x and y. Any way: out of the plane until a hand says otherwise. */
export function wayVector(way: PushWay, angle: AngleBar): Vec2 {
  const ways = planeWays({ angle });
  return way === 'in plane' ? ways.inPlane : ways.outOfPlane;
}

/** What pushes at present, N along the section's x and y. */
export function presentForce(pushing: Pushing, test: PushTest, angle: AngleBar, length: number): Vec2 {
  if (pushing.bar === test.bar && pushing.force !== null) return pushing.force;
  const [x, y] = wayVector(pushing.way, angle);
  const most = greatestForce(pushing, test, length);
  return [x * most, y * most];
}
