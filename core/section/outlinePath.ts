import type { Vec2 } from '../geometry/vector.ts';
import type { Segment } from './areaIntegrals.ts';
import type { AngleOutline } from './model.ts';
import { shapePolygon } from './shapePolygon.ts';

/**
 * The outline of an angle, anticlockwise from the heel, in mm.
 * Coordinates [along the shorter leg, along the longer leg], heel at the origin: sharp heel, root fillet at the inside
 * corner, a toe radius on the inner edge of each toe (what reproduces the published tables, METHODS.md §1).
 * Pieces of no length are left out.
 */
export function outlinePath(outline: AngleOutline): readonly Segment[] {
  const { shortLeg: b, longLeg: h, thickness: t, rootRadius: r1, toeRadius: r2 } = outline;
  const quarter = Math.PI / 2;
  // A toe radius above the thickness, as in thin Australian angles, meets the outer face at a slant; the leg keeps its length.
  const slant = r2 > t ? Math.asin((r2 - t) / r2) : 0;
  const reach = r2 * Math.cos(slant);
  const pieces: readonly Segment[] = [
    line([0, 0], [b, 0]),
    line([b, 0], [b, Math.max(0, t - r2)]),
    arc([b - reach, t - r2], r2, slant, quarter - slant),
    line([b - reach, t], [t + r1, t]),
    // The fillet is hollow: it is walked clockwise.
    arc([t + r1, t + r1], r1, -quarter, -quarter),
    line([t, t + r1], [t, h - reach]),
    arc([t - r2, h - reach], r2, 0, quarter - slant),
    line([Math.max(0, t - r2), h], [0, h]),
    line([0, h], [0, 0]),
  ];
  return pieces.filter((piece) => !isEmpty(piece));
}

/**
 * The outline as straight pieces for drawing: heel at the origin, [along the shorter leg, along the longer leg], anticlockwise,
 * the first point not repeated at the end. Arcs become `stepsPerArc` (1 or more) chords.
 */
export function outlinePolygon(outline: AngleOutline, stepsPerArc: number): readonly Vec2[] {
  if (outline.shape) return shapePolygon(outline.shape, (angle) => outlinePolygon(angle, stepsPerArc));
  return outlinePath(outline).flatMap((piece) => {
    if (piece.kind === 'line') return [piece.from];
    return Array.from({ length: stepsPerArc }, (_, step): Vec2 => {
      const turn = piece.start + (piece.sweep * step) / stepsPerArc;
      return [
        piece.centre[0] + piece.radius * Math.cos(turn),
        piece.centre[1] + piece.radius * Math.sin(turn),
      ];
    });
  });
}

function line(from: Vec2, to: Vec2): Segment {
  return { kind: 'line', from, to };
}

function arc(centre: Vec2, radius: number, start: number, sweep: number): Segment {
  const at = (turn: number): Vec2 => [
    centre[0] + radius * Math.cos(turn),
    centre[1] + radius * Math.sin(turn),
  ];
  return { kind: 'arc', from: at(start), to: at(start + sweep), centre, radius, start, sweep };
}

function isEmpty(piece: Segment): boolean {
  if (piece.kind === 'arc') return piece.radius === 0;
  return piece.from[0] === piece.to[0] && piece.from[1] === piece.to[1];
}
