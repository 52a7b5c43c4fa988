/** Bays as frames, for tests. */
import { bayFrame, type FrameOptions } from '../../../core/frame/bayFrame.ts';
import type { Frame } from '../../../core/frame/model.ts';
import { offeredTo, type StationStiffness } from '../../../core/frame/push.ts';
import { FrameSolver } from '../../../core/frame/solver.ts';
import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import type { AngleBar, Bar, BayLayout, Layout } from '../../../core/layout/model.ts';
import type { Bay, FreeRecipe, Join, Member } from '../../../core/project/model.ts';
import { restraintContext } from '../../../core/restraint/restraint.ts';
import type { SectionProperties } from '../../../core/section/model.ts';
import { bay, free, project } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';
import { E, G } from './given.ts';

/** Ends of diagonals that turn freely both ways, as pinned bars do. */
export const HINGED: FrameOptions['ends'] = { inPlane: 'hinged', outOfPlane: 'hinged' };

export interface Built {
  readonly layout: Layout;
  readonly bay: BayLayout;
  readonly frame: Frame;
  readonly solver: FrameSolver;
}

export function built(
  given: Bay,
  ends: FrameOptions['ends'] = HINGED,
  change: Partial<FrameOptions> = {},
): Built {
  const layout = layOut(project([given]), stock());
  const [first] = layout.bays;
  if (!first) throw new Error('a project without a bay');
  const { holdings } = restraintContext(layout);
  const frame = bayFrame(layout, holdings, first, { E, G, ends, tension: new Map(), ...change });
  return { layout, bay: first, frame, solver: new FrameSolver(frame) };
}

export interface Diagonal extends Bar {
  readonly angle: AngleBar;
  readonly section: SectionProperties;
}

export function diagonal({ layout }: Built, id: string): Diagonal {
  const bar = layout.bars.get(id);
  const section = bar?.angle?.stock?.properties;
  if (!bar?.angle || !section) throw new Error(`${id} is no diagonal in stock`);
  return { ...bar, angle: bar.angle, section };
}

/** Two diagonals over a rectangle, all four corners held: "ab" from the lower left, "cd" from the lower right. */
export function crossed(
  [width, height]: readonly [number, number],
  section: string,
  join: Join = { kind: 'bolted' },
): Bay {
  const corners: Readonly<Record<string, Vec3>> = {
    a: [0, 0, 0],
    b: [width, 0, height],
    c: [width, 0, 0],
    d: [0, 0, height],
  };
  return bay(
    free(corners, [
      ['ab', 'a', 'b'],
      ['cd', 'c', 'd'],
    ]),
    { joins: { 'ab+cd': join }, diagonals: { section } },
  );
}

/** What the rest of the bay offers a bar at its only crossing. */
export function offeredAtCrossing(of: Built, id: string): StationStiffness {
  const [station] = offeredTo(of.solver, id, diagonal(of, id).angle.placement) ?? [];
  if (!station) throw new Error(`${id} is offered nothing`);
  return station;
}

/** Members for the bars of a free bay that are not of angle. */
export const withMember = (recipe: FreeRecipe, member: Member): FreeRecipe => ({
  ...recipe,
  bars: recipe.bars.map((each) => (each.role === 'diagonal' ? each : { ...each, member })),
});

/** Stiffness against a push one way in the section plane, the other way free to follow. */
export function along({ ellipse }: Pick<StationStiffness, 'ellipse'>, [x, y]: Vec2): number {
  const [xx, xy, yy] = ellipse.matrix;
  return (xx * yy - xy * xy) / (x * x * yy - 2 * x * y * xy + y * y * xx);
}
