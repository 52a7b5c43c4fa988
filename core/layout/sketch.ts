/** A bay in its own axes, before it takes its place: what each recipe yields. */
import type { Vec3 } from '../geometry/vector.ts';
import type { LineHolder, Member, Role } from '../project/model.ts';
import type { DimensionLine, NodeSupport, Plane } from './model.ts';

export interface BaySketch {
  readonly planes: readonly Plane[];
  readonly nodes: readonly SketchNode[];
  readonly bars: readonly SketchBar[];
  readonly dimensions: readonly DimensionLine[];
}

export interface SketchNode {
  readonly key: string;
  readonly at: Vec3;
  readonly label: string;
  readonly support: NodeSupport | null;
}

export interface SketchBar {
  readonly key: string;
  readonly role: Role;
  readonly i: string;
  readonly j: string;
  readonly plane: string;
  readonly member: Member | null;
  readonly offset: Vec3;
  readonly line: { readonly id: string; readonly heldBy: LineHolder } | null;
  /** Face of the gusset for each arrangement of the bay's diagonals. */
  readonly face: { readonly opposite: 'near' | 'far'; readonly sameSide: 'near' | 'far' };
}

export const ON_THE_LINE: Vec3 = [0, 0, 0];
export const NEAR = { opposite: 'near', sameSide: 'near' } as const;

/** A bar that is no diagonal. */
export function memberBar(
  key: string,
  role: Role,
  ends: readonly [string, string],
  plane: string,
  member: Member | null,
  offset: Vec3 = ON_THE_LINE,
): SketchBar {
  return { key, role, i: ends[0], j: ends[1], plane, member, offset, line: null, face: NEAR };
}

/** A diagonal, knee or tie. */
export function diagonalBar(
  key: string,
  role: Role,
  ends: readonly [string, string],
  plane: string,
  face: SketchBar['face'],
): SketchBar {
  return { key, role, i: ends[0], j: ends[1], plane, member: null, offset: ON_THE_LINE, line: null, face };
}
