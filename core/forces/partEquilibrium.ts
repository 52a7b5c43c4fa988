/** Equilibrium of one part of the framing under given loads. */
import { add, dot, scale, subtract, type Vec3 } from '../geometry/vector.ts';
import type { BarId } from '../layout/model.ts';
import { type FramingPart, HELD_BY_THE_BUILDING, type Piece, TURN_ARM, YIELDING } from './framingPart.ts';
import type { AxialBar, NoWay } from './model.ts';
import { type SharedPattern, tensionOnlyEquilibrium } from './tensionOnly.ts';

export interface PartLoads {
  /** N, by node id. */
  readonly nodes: ReadonlyMap<string, Vec3>;
  /** mm that a bar is too short for its place; below 0 too long. */
  readonly shortened: ReadonlyMap<BarId, number>;
}

export interface PartAnswer {
  readonly kind: 'balanced';
  readonly forces: ReadonlyMap<BarId, number>;
  readonly moments: ReadonlyMap<BarId, number>;
  readonly elongations: ReadonlyMap<BarId, number>;
  readonly slack: readonly BarId[];
  readonly displacements: ReadonlyMap<string, Vec3>;
  readonly reactions: ReadonlyMap<string, Vec3>;
  readonly residual: number;
  /** All unknowns, from which a like problem may start. */
  readonly state: Float64Array;
}

/** What of a part's stiffness does not depend on the loads. */
export interface PartStiffness {
  readonly part: FramingPart;
  readonly rest: readonly (readonly [number, number, number])[];
  /** The same with the frames as stiff across the building as they are taken to be; null where nothing leans on them. */
  readonly withFrames: readonly (readonly [number, number, number])[] | null;
  /** Filled by the first solution, used by the others. */
  readonly pattern: SharedPattern;
}

export function partStiffness(part: FramingPart): PartStiffness {
  const bending = [...bendingEntries(part), ...tieEntries(part)];
  const leansOnFrames = part.holds.some(({ ofFrames }) => ofFrames);
  return {
    part,
    rest: [...bending, ...holdEntries(part, YIELDING)],
    withFrames: leansOnFrames ? [...bending, ...holdEntries(part, HELD_BY_THE_BUILDING)] : null,
    pattern: { symbolic: null },
  };
}

/**
 * Forces under given loads. What acts in the frames' own planes is held by them across the building; what acts along the bracing goes to the walls by statics,
 * the frames not keeping the roof from turning in plan. METHODS.md, "Bars that only pull".
 */
export function partEquilibrium(
  { part, rest, withFrames, pattern }: PartStiffness,
  loads: PartLoads,
  start: Float64Array | null,
  bars: 'as counted on' | 'all both ways' = 'as counted on',
): PartAnswer | NoWay {
  const load = new Float64Array(3 * part.nodes.length + part.turns.length);
  part.nodes.forEach((id, k) => {
    const force = loads.nodes.get(id);
    if (force) load.set(force, 3 * k);
  });
  const working = part.pieces.map(({ bar, axial }): AxialBar => {
    const short = loads.shortened.get(bar);
    const own = bars === 'as counted on' ? axial : { ...axial, tensionOnly: false };
    return short === undefined ? own : { ...own, preset: short };
  });
  const applied = load.slice();
  const problem = { nodes: part.nodes.length, turns: part.turns, held: part.fixed, bars: working };
  if (withFrames) {
    const own = tensionOnlyEquilibrium(
      { ...problem, rest: withFrames, load: acrossBracing(part, load) },
      null,
      pattern,
    );
    if (own.kind === 'balanced') addHeldByFrames(part, own.displacement, load);
  }
  const found = tensionOnlyEquilibrium({ ...problem, rest, load }, start, pattern);
  if (found.kind === 'no way to carry') return noWay(part, working, found.motion);
  return answerOf(part, working, found.displacement, found.forces, found.residual, applied, found.slack);
}

/** The part of the load that is square to the bracing at each node. */
function acrossBracing(part: FramingPart, load: Float64Array): Float64Array {
  const across = new Float64Array(load.length);
  part.nodes.forEach((_, k) => {
    const ways = part.braced[k] ?? [];
    const left = ways.reduce<Vec3>((force, way) => subtract(force, scale(way, dot(force, way))), at(load, k));
    across.set(left, 3 * k);
  });
  return across;
}

/** Lays on the load what the frames hold it with. */
function addHeldByFrames(part: FramingPart, moved: Float64Array, load: Float64Array): void {
  for (const { node, direction, ofFrames } of part.holds)
    if (ofFrames) put(load, node, scale(direction, -HELD_BY_THE_BUILDING * dot(direction, at(moved, node))));
}

function answerOf(
  part: FramingPart,
  bars: readonly AxialBar[],
  q: Float64Array,
  axial: Float64Array,
  residual: number,
  load: Float64Array,
  slack: readonly BarId[],
): PartAnswer {
  const forces = new Map<BarId, number>();
  const moments = new Map<BarId, number>();
  const elongations = new Map<BarId, number>();
  const displacements = new Map<string, Vec3>();
  const internal = new Float64Array(load.length);
  part.nodes.forEach((id, k) => {
    displacements.set(id, at(q, k));
  });
  part.pieces.forEach(({ bar, bending, isDiagonal }, index) => {
    const piece = bars[index];
    if (!piece) return;
    const force = axial[index] ?? 0;
    const known = forces.get(bar);
    // Of a member in several pieces the one squeezed most is told: that is what it is checked for.
    const tells = isDiagonal ? Math.abs(force) > Math.abs(known ?? 0) : force < (known ?? 0);
    if (known === undefined || tells) forces.set(bar, force);
    if (isDiagonal) {
      const stretch = dot(piece.direction, subtract(at(q, piece.j), at(q, piece.i)));
      elongations.set(bar, (elongations.get(bar) ?? 0) + stretch);
    }
    put(internal, piece.i, scale(piece.direction, -force));
    put(internal, piece.j, scale(piece.direction, force));
    if (bending) {
      const { shear, most } = bent(part.pieces[index] as Piece, q, 3 * part.nodes.length);
      moments.set(bar, Math.max(moments.get(bar) ?? 0, most));
      put(internal, piece.i, scale(bending.across, shear));
      put(internal, piece.j, scale(bending.across, -shear));
    }
  });
  const reactions = new Map<string, Vec3>();
  part.nodes.forEach((id, k) => {
    if (!part.standing.has(k)) return;
    reactions.set(id, subtract(at(internal, k), at(load, k)));
  });
  return {
    kind: 'balanced',
    forces,
    moments,
    elongations,
    slack,
    displacements,
    reactions,
    residual,
    state: q,
  };
}

const at = (values: Float64Array, node: number): Vec3 => [
  values[3 * node] ?? 0,
  values[3 * node + 1] ?? 0,
  values[3 * node + 2] ?? 0,
];

function put(values: Float64Array, node: number, force: Vec3): void {
  values.set(add(at(values, node), force), 3 * node);
}

/** Shear at end i along `across`, and the greatest moment, of a piece that bends. N, N·mm. */
function bent({ axial, bending }: Piece, q: Float64Array, turns: number): { shear: number; most: number } {
  if (!bending) return { shear: 0, most: 0 };
  const { EI, across, turnI, turnJ } = bending;
  const L = axial.length;
  const chord = dot(across, subtract(at(q, axial.j), at(q, axial.i))) / L;
  const turn = (unknown: number | null): number | null =>
    unknown === null ? null : (q[turns + unknown] ?? 0) / TURN_ARM;
  const [a, b] = [turn(turnI), turn(turnJ)];
  let [Mi, Mj] = [0, 0];
  if (a !== null && b !== null) {
    Mi = ((2 * EI) / L) * (2 * (a - chord) + (b - chord));
    Mj = ((2 * EI) / L) * (2 * (b - chord) + (a - chord));
  } else if (a !== null) Mi = ((3 * EI) / L) * (a - chord);
  else if (b !== null) Mj = ((3 * EI) / L) * (b - chord);
  return { shear: (Mi + Mj) / L, most: Math.max(Math.abs(Mi), Math.abs(Mj)) };
}

/** Energy of bending as rank-one terms: EI/L (3 s² + d²), with s the mean turn and d the half difference of the end turns from the chord; half of it with a hinge. */
function* bendingEntries(part: FramingPart): Generator<readonly [number, number, number]> {
  const first = 3 * part.nodes.length;
  for (const { axial, bending } of part.pieces) {
    if (!bending) continue;
    const { EI, across, turnI, turnJ } = bending;
    const L = axial.length;
    const unknowns = [0, 1, 2].flatMap((c) => [3 * axial.i + c, 3 * axial.j + c]);
    const chord = [0, 1, 2].flatMap((c) => [-(across[c] ?? 0) / L, (across[c] ?? 0) / L]);
    const turn = 1 / TURN_ARM;
    if (turnI !== null && turnJ !== null) {
      const all = [...unknowns, first + turnI, first + turnJ];
      // Mean turn less the chord's, and half the difference of the ends' turns.
      yield* rankOne(all, [...chord.map((w) => -w), turn / 2, turn / 2], (12 * EI) / L);
      yield* rankOne(all, [...chord.map(() => 0), turn / 2, -turn / 2], (4 * EI) / L);
    } else {
      const only = turnI ?? turnJ;
      if (only !== null)
        yield* rankOne([...unknowns, first + only], [...chord.map((w) => -w), turn], (3 * EI) / L);
    }
  }
}

function* holdEntries(part: FramingPart, ofFrames: number): Generator<readonly [number, number, number]> {
  for (const hold of part.holds)
    yield* rankOne(
      [3 * hold.node, 3 * hold.node + 1, 3 * hold.node + 2],
      hold.direction,
      hold.ofFrames ? ofFrames : HELD_BY_THE_BUILDING,
    );
}

function* tieEntries(part: FramingPart): Generator<readonly [number, number, number]> {
  for (const { i, j, direction } of part.ties) {
    const unknowns = [0, 1, 2].flatMap((c) => [3 * i + c, 3 * j + c]);
    const row = direction.flatMap((part) => [part, -part]);
    yield* rankOne(unknowns, row, HELD_BY_THE_BUILDING);
  }
}

function* rankOne(
  unknowns: readonly number[],
  row: readonly number[],
  stiffness: number,
): Generator<readonly [number, number, number]> {
  for (let a = 0; a < unknowns.length; a++)
    for (let b = a; b < unknowns.length; b++) {
      const value = stiffness * (row[a] ?? 0) * (row[b] ?? 0);
      const [i, j] = [unknowns[a] ?? 0, unknowns[b] ?? 0];
      if (value !== 0) yield i <= j ? [i, j, value] : [j, i, value];
    }
}

/** Nodes that move by more than this share of the most are named. */
const NAMED = 0.3;

function noWay(part: FramingPart, bars: readonly AxialBar[], motion: Float64Array): NoWay {
  const sizes = part.nodes.map((_, k) => Math.hypot(...at(motion, k)));
  const most = sizes.reduce((a, b) => Math.max(a, b), 0);
  const moving = part.nodes
    .map((node, k) => ({ node, size: sizes[k] ?? 0, direction: at(motion, k) }))
    .filter(({ size }) => size > NAMED * most)
    .sort((a, b) => b.size - a.size)
    .map(({ node, size, direction }) => ({ node, direction: scale(direction, 1 / size) }));
  const named = new Set(moving.map(({ node }) => node));
  const slackened = bars
    .filter((bar) => {
      const stretch = dot(bar.direction, subtract(at(motion, bar.j), at(motion, bar.i)));
      return bar.tensionOnly && stretch < -1e-3 * most;
    })
    .map(({ id }) => id);
  return {
    bays: part.bays.filter(({ nodes }) => nodes.some((node) => named.has(node))).map(({ id }) => id),
    moving,
    slackened: [...new Set(slackened)],
  };
}
