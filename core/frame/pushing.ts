import type { Vec3 } from '../geometry/vector.ts';
import type { BarId, BayLayout, Layout } from '../layout/model.ts';
import type { Holdings } from '../restraint/heldNodes.ts';
import { bayFrame, type FrameOptions } from './bayFrame.ts';
import type { Mechanism } from './model.ts';
import { ellipseInPlace, type SectionAxes, type StiffnessEllipse } from './push.ts';
import { FrameSolver } from './solver.ts';

/** How the bars of a bay move for one newton on a place of one of them. */
export interface PushTest {
  readonly bar: BarId;
  readonly at: number;
  /** Bar in place; null when the place can move without resistance. */
  readonly ellipse: StiffnessEllipse | null;
  /** Displacement in mm for 1 N along the section's x, and along its y. */
  readonly alongX: readonly BarMovement[];
  readonly alongY: readonly BarMovement[];
  readonly mechanisms: readonly Mechanism[];
}

export interface BarMovement {
  readonly bar: BarId;
  readonly points: readonly { readonly at: number; readonly displacement: Vec3 }[];
}

/** Points along each diagonal at which its movement is given. */
const PARTS = 12;

/** @param at mm from end i of the bar, between its ends */
export function pushTest(
  layout: Layout,
  holdings: Holdings,
  bay: BayLayout,
  options: FrameOptions,
  target: { readonly bar: BarId; readonly at: number; readonly axes: SectionAxes },
): PushTest | null {
  const places = new Map(
    bay.diagonals.map((id) => [id, evenPlaces(layout.bars.get(id)?.length ?? 0)] as const),
  );
  places.set(target.bar, [...(places.get(target.bar) ?? []), target.at]);
  const frame = bayFrame(layout, holdings, bay, { ...options, extraPlaces: places });
  const solver = new FrameSolver(frame);
  const node = frame.along.get(target.bar)?.find(({ at }) => Math.abs(at - target.at) <= 1)?.node;
  if (node === undefined) return null;
  const movement = (force: Vec3): readonly BarMovement[] => {
    const x = solver.solve(solver.loadOf([{ node, force }]));
    return bay.diagonals.flatMap((bar): BarMovement[] => {
      const along = frame.along.get(bar);
      if (!along) return [];
      return [
        {
          bar,
          points: along.map(({ at, node: n }) => {
            const [a, b, c] = solver.motionOf(x, n);
            return { at, displacement: [a, b, c] };
          }),
        },
      ];
    });
  };
  return {
    bar: target.bar,
    at: target.at,
    ellipse: ellipseInPlace(solver, node, target.axes),
    alongX: movement(target.axes.x),
    alongY: movement(target.axes.y),
    mechanisms: solver.mechanisms(),
  };
}

/** Places that part a length evenly, its ends left out. */
export const evenPlaces = (length: number): readonly number[] =>
  Array.from({ length: PARTS - 1 }, (_, k) => (length * (k + 1)) / PARTS);
