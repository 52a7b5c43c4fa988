import type { Vec3 } from '../../../core/geometry/vector.ts';
import { dot, subtract } from '../../../core/geometry/vector.ts';
import type { BarId } from '../../../core/layout/model.ts';
import { boxOf, type Prism, type SectionBox } from './prism.ts';
import type { SteelPart } from './steelPart.ts';

/** A solid that can be hit: its box along its own axes. */
export interface Target {
  readonly bar: BarId | null;
  /** Whether hitting it selects it; others only hide what is behind. */
  readonly selectable: boolean;
  readonly prism: Prism;
  readonly box: SectionBox;
}

/** A line of sight: from far in front of everything, into the sheet. Unit direction. */
export interface Sight {
  readonly from: Vec3;
  readonly into: Vec3;
}

export function targetsOf(
  parts: readonly SteelPart[],
  selectable: (bar: BarId) => boolean,
): readonly Target[] {
  return parts.map(({ bar, prism }) => ({
    bar,
    selectable: bar !== null && selectable(bar),
    prism,
    box: boxOf(prism.outline),
  }));
}

/**
 * The bar that a line of sight meets first. Bars are slender on the screen, so one missed by less than `slack` counts too, unless
 * another is hit squarely.
 *
 * @param slack mm, the reach of a pointer at the scale of the view
 * @returns null when nothing that can be selected is met, or when something else stands before it
 */
export function pickedBar(targets: readonly Target[], sight: Sight, slack: number): BarId | null {
  return firstHit(targets, sight, 0) ?? firstHit(targets, sight, slack);
}

function firstHit(targets: readonly Target[], sight: Sight, slack: number): BarId | null {
  let nearest = Number.POSITIVE_INFINITY;
  let bar: BarId | null = null;
  for (const target of targets) {
    const at = entry(target, sight, target.selectable ? slack : 0);
    if (at === null || at >= nearest) continue;
    nearest = at;
    bar = target.selectable ? target.bar : null;
  }
  return bar;
}

/** Distance along the sight at which it enters the target's box grown by `slack`; null when it misses. */
function entry(target: Target, sight: Sight, slack: number): number | null {
  const { prism, box } = target;
  const from = subtract(sight.from, prism.origin);
  const slabs = [
    [prism.x, box.minX - slack, box.maxX + slack],
    [prism.y, box.minY - slack, box.maxY + slack],
    [prism.axis, prism.from, prism.to],
  ] as const;
  let enters = Number.NEGATIVE_INFINITY;
  let leaves = Number.POSITIVE_INFINITY;
  for (const [direction, low, high] of slabs) {
    const speed = dot(sight.into, direction);
    const start = dot(from, direction);
    if (Math.abs(speed) < 1e-9) {
      if (start < low || start > high) return null;
      continue;
    }
    const a = (low - start) / speed;
    const b = (high - start) / speed;
    enters = Math.max(enters, Math.min(a, b));
    leaves = Math.min(leaves, Math.max(a, b));
  }
  return leaves >= enters ? enters : null;
}
