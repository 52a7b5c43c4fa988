import type { Vec2 } from '../../../core/geometry/vector.ts';

/** An upright box on the sheet, px. */
export interface Box {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** A box about its middle. */
export function boxAbout([x, y]: Vec2, halfWidth: number, halfHeight = halfWidth): Box {
  return { left: x - halfWidth, top: y - halfHeight, width: 2 * halfWidth, height: 2 * halfHeight };
}

/** Area common to two boxes, px². */
export function overlap(a: Box, b: Box): number {
  const x = Math.min(a.left + a.width, b.left + b.width) - Math.max(a.left, b.left);
  const y = Math.min(a.top + a.height, b.top + b.height) - Math.max(a.top, b.top);
  return x > 0 && y > 0 ? x * y : 0;
}

export function inside(box: Box, sheet: Box): boolean {
  return (
    box.left >= sheet.left &&
    box.top >= sheet.top &&
    box.left + box.width <= sheet.left + sheet.width &&
    box.top + box.height <= sheet.top + sheet.height
  );
}

export function grown(box: Box, by: number): Box {
  return { left: box.left - by, top: box.top - by, width: box.width + 2 * by, height: box.height + 2 * by };
}

/** Whether a straight line passes through a box. */
export function crosses(line: readonly [Vec2, Vec2], box: Box): boolean {
  return clipped(line, box) !== null;
}

/** The part of a straight line that lies in a box (Liang and Barsky's clipping); null when none does. */
export function clipped([a, b]: readonly [Vec2, Vec2], box: Box): readonly [Vec2, Vec2] | null {
  const run: Vec2 = [b[0] - a[0], b[1] - a[1]];
  let enters = 0;
  let leaves = 1;
  const slabs = [
    [run[0], a[0], box.left, box.left + box.width],
    [run[1], a[1], box.top, box.top + box.height],
  ] as const;
  for (const [speed, start, low, high] of slabs) {
    if (Math.abs(speed) < 1e-9) {
      if (start < low || start > high) return null;
      continue;
    }
    const p = (low - start) / speed;
    const q = (high - start) / speed;
    enters = Math.max(enters, Math.min(p, q));
    leaves = Math.min(leaves, Math.max(p, q));
  }
  if (leaves <= enters) return null;
  return [
    [a[0] + run[0] * enters, a[1] + run[1] * enters],
    [a[0] + run[0] * leaves, a[1] + run[1] * leaves],
  ];
}
