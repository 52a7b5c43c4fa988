import type { AxialBar, EquilibriumProblem } from '../../../core/forces/model.ts';

export type Point = readonly [number, number, number];

/** A bar between two points; the EA of diagonals and members is the caller's. */
export function axialBar(
  id: string,
  points: readonly Point[],
  i: number,
  j: number,
  EA: number,
  tensionOnly: boolean,
  preset = 0,
): AxialBar {
  const [a, b] = [points[i], points[j]];
  if (!a || !b) throw new Error('no such point');
  const d = [b[0] - a[0], b[1] - a[1], b[2] - a[2]] as const;
  const length = Math.hypot(...d);
  return {
    id,
    i,
    j,
    direction: [d[0] / length, d[1] / length, d[2] / length],
    length,
    EA,
    tensionOnly,
    preset,
  };
}

/** Crossed tiers one on another in the plane y = 0, standing on two held feet: pinned, crossing not joined. */
export function crossedTiers(
  width: number,
  heights: readonly number[],
  EA: { readonly member: number; readonly diagonal: number },
  loads: readonly number[],
  presets: readonly number[] = [],
): EquilibriumProblem {
  const points: Point[] = [
    [0, 0, 0],
    [width, 0, 0],
  ];
  const bars: AxialBar[] = [];
  let z = 0;
  heights.forEach((height, tier) => {
    z += height;
    points.push([0, 0, z], [width, 0, z]);
    const low = 2 * tier;
    const bar = (id: string, i: number, j: number, tensionOnly: boolean, preset = 0) =>
      bars.push(
        axialBar(`t${tier}.${id}`, points, i, j, tensionOnly ? EA.diagonal : EA.member, tensionOnly, preset),
      );
    bar('left', low, low + 2, false);
    bar('right', low + 1, low + 3, false);
    bar('beam', low + 2, low + 3, false);
    bar('rise', low, low + 3, true, presets[2 * tier] ?? 0);
    bar('fall', low + 1, low + 2, true, presets[2 * tier + 1] ?? 0);
  });
  const held = new Set([0, 1, 2, 3, 4, 5]);
  for (let node = 2; node < points.length; node++) held.add(3 * node + 1);
  const load = new Float64Array(points.length * 3);
  loads.forEach((push, tier) => {
    load[3 * (2 * tier + 2)] = push;
  });
  return { nodes: points.length, held, bars, rest: [], load };
}
