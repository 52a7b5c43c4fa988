/** What lies between two bars where they pass each other, along the normal of their plane. mm. */
import { dot } from '../geometry/vector.ts';
import { extentOf, isCentred, thicknessOf } from '../section/barShape.ts';
import { type AngleDraft, standingLegOf } from './angleBar.ts';
import type { Plane } from './model.ts';
import type { SketchBar } from './sketch.ts';

/** A bar as a crossing needs to know it. */
export interface CrossingBar {
  readonly sketch: SketchBar;
  readonly angle: AngleDraft | null;
}

/** From…to along the normal, measured from the bar's own line, mm. */
type Extent = readonly [number, number];

interface Depths {
  /** All of its steel. */
  readonly steel: Extent;
  /** The part that a bolt, a packer or a weld takes hold of. */
  readonly gripped: Extent;
  /** Bent past another bar rather than stopped by it. */
  readonly gives: boolean;
}

/**
 * Two diagonals: between the parts that a join takes hold of, mm; where their steel runs into each other, minus the overlap.
 * Rods bend past what they cross (common practice, no source) and only touch it.
 *
 * @param separation from the line of a to the line of b along the normal
 */
export function betweenDiagonals(a: AngleDraft, b: AngleDraft, separation: number): number {
  const [mine, other] = [depthsOf(a), depthsOf(b)];
  const clear = apart(mine.steel, other.steel, separation);
  if (clear >= 0) return apart(mine.gripped, other.gripped, separation);
  return mine.gives || other.gives ? 0 : clear;
}

/** A diagonal and a purlin, rail or other member: the clear distance, mm; a cleat or hanger bridges it. Of a purlin or rail below 0 where they overlap. */
export function besideMember(a: AngleDraft, b: SketchBar, plane: Plane, separation: number): number {
  const middle = dot(b.offset, plane.normal);
  const half = (b.member?.depth ?? 0) / 2;
  const clear = apart(depthsOf(a).steel, [middle - half, middle + half], separation);
  // A beam or a strut lies in the plane of the bay: a diagonal is connected to it where they meet.
  return b.line ? clear : Math.max(0, clear);
}

function depthsOf({ spec, side, stock }: AngleDraft): Depths {
  const shape = stock?.outline.shape ?? null;
  if (shape && isCentred(shape)) {
    const half = extentOf(shape)[0] / 2;
    const pair = shape.kind === 'angles back to back' || shape.kind === 'starred angles';
    const grip = pair ? shape.gap / 2 + shape.angle.thickness : half;
    return { steel: [-half, half], gripped: [-grip, grip], gives: shape.kind === 'rod' };
  }
  const face = spec.gusset / 2;
  const from = (depth: number): Extent => (side === 'near' ? [face, face + depth] : [-face - depth, -face]);
  const leg = shape ? thicknessOf(shape) : (stock?.outline.thickness ?? 0);
  return {
    steel: from(stock ? standingLegOf(stock, spec.legInPlane) : 0),
    gripped: from(leg),
    gives: false,
  };
}

/** Clear distance; of extents that overlap, minus the overlap. */
function apart(a: Extent, b: Extent, separation: number): number {
  const low = b[0] + separation;
  const high = b[1] + separation;
  return Math.max(low - a[1], a[0] - high);
}
