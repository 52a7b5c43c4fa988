/** What is free at a node, as directions over the fields of displacement or slope. */

/** Weight of each field. */
export type Way = readonly number[];

/** Resists what `row` makes of the fields, N/mm or N·mm/rad. */
export interface Spring {
  readonly row: Way;
  readonly stiffness: number;
}

/** Directions that are this nearly dependent count as one: sine of the angle between them. */
const DEPENDENT = 1e-9;

/**
 * Orthonormal ways square to all that is held. Those along the springs come first, the stiffest leading: however stiff a spring is, then,
 * its great number stands by itself on the diagonal and drowns nothing.
 *
 * @param held rows over the fields; those that say nothing new are passed over
 */
export function freeWays(held: readonly Way[], springs: readonly Spring[], fields: number): readonly Way[] {
  const known: Way[] = [];
  for (const row of held) {
    const way = newWay(row, known);
    if (way) known.push(way);
  }
  const first = known.length;
  const stiffestFirst = springs.length > 1 ? [...springs].sort((p, q) => q.stiffness - p.stiffness) : springs;
  for (const { row } of stiffestFirst) {
    const way = newWay(row, known);
    if (way) known.push(way);
  }
  while (known.length < fields) known.push(leastKnown(known, fields));
  return known.slice(first);
}

/** What a row says beyond the ways known; null when that is nothing. */
function newWay(row: Way, known: readonly Way[]): Way | null {
  const once = lessAlong(row, known);
  const size = sizeOf(once);
  if (!(size > DEPENDENT * sizeOf(row))) return null;
  // A second sweep makes it square to working accuracy.
  const twice = lessAlong(once, known);
  const length = sizeOf(twice);
  return twice.map((value) => value / length);
}

/** Begins with the unit vector that is least known. */
function leastKnown(known: readonly Way[], fields: number): Way {
  let best = 0;
  let most = -1;
  for (let axis = 0; axis < fields; axis++) {
    let left = 1;
    for (const way of known) left -= (way[axis] ?? 0) ** 2;
    if (left > most + 1e-12) {
      most = left;
      best = axis;
    }
  }
  const unit = Array.from({ length: fields }, (_, k) => (k === best ? 1 : 0));
  return newWay(unit, known) ?? unit;
}

function lessAlong(row: Way, known: readonly Way[]): number[] {
  const rest = [...row];
  for (const way of known) {
    let share = 0;
    for (let k = 0; k < rest.length; k++) share += (rest[k] ?? 0) * (way[k] ?? 0);
    for (let k = 0; k < rest.length; k++) rest[k] = (rest[k] ?? 0) - share * (way[k] ?? 0);
  }
  return rest;
}

function sizeOf(row: Way): number {
  let sum = 0;
  for (const value of row) sum += value * value;
  return Math.sqrt(sum);
}
