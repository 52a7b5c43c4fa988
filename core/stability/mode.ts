import type { Vec2 } from '../geometry/vector.ts';
import { LoadedSystem } from './assembly.ts';
import { type Mesh, meshOf, principalMotions } from './mesh.ts';
import type { BarProblem, BucklingMode, ModePoint } from './model.ts';
import { type Unknowns, unknownsOf } from './unknowns.ts';

/** Parts of each piece between stations: enough to draw, and for shares of energy to four digits. */
export const PARTS = 16;

/** The shape in which the bar bows at a critical load factor found by `criticalLoad`. */
export function bucklingMode(problem: BarProblem, factor: number): BucklingMode {
  const mesh = meshOf(problem, PARTS);
  const unknowns = unknownsOf(mesh);
  const bar = new LoadedSystem([{ problem, mesh, unknowns }]);
  // A hair off the root keeps the factors finite; inverse iteration then picks the one shape that hardly resists.
  bar.tried(factor * (1 - 1e-9));
  const shape = nullShape(bar);
  return modeOf(problem, mesh, unknowns, shape);
}

export function nullShape(bar: LoadedSystem): Float64Array {
  const { size } = bar;
  // A start without symmetry, the same every time.
  const x = Float64Array.from({ length: size }, (_, k) => Math.sin(1 + 2.3 * k));
  for (let sweep = 0; sweep < 4; sweep++) {
    bar.solve(x);
    const most = x.reduce((largest, value) => Math.max(largest, Math.abs(value)), 0);
    for (let k = 0; k < size; k++) x[k] = (x[k] ?? 0) / most;
  }
  return x;
}

interface NodeFields {
  readonly at: number;
  readonly w: readonly number[];
  readonly slope: readonly number[];
}

function fieldsAtNodes(mesh: Mesh, unknowns: Unknowns, x: Float64Array): readonly NodeFields[] {
  return mesh.nodes.map((node, k) => {
    const w = new Array<number>(mesh.fields).fill(0);
    const slope = new Array<number>(mesh.fields).fill(0);
    for (const unknown of unknowns.ofNode[k] ?? []) {
      const into = unknown.of === 'displacement' ? w : slope;
      unknown.weights.forEach((weight, field) => {
        into[field] = (into[field] ?? 0) + weight * (x[unknown.index] ?? 0);
      });
    }
    return { at: node.at, w, slope };
  });
}

/** Largest displacement among the nodes, before anything is scaled. */
export function largestMovement(mesh: Mesh, unknowns: Unknowns, solution: Float64Array): number {
  return fieldsAtNodes(mesh, unknowns, solution).reduce(
    (most, { w: [a = 0, b = 0] }) => Math.max(most, Math.hypot(a, b)),
    0,
  );
}

/**
 * A solution read as the shape of one bar.
 *
 * @param rest a movement that is none, in the solution's own measure
 */
export function modeOf(
  problem: BarProblem,
  mesh: Mesh,
  unknowns: Unknowns,
  solution: Float64Array,
  rest = 0,
): BucklingMode {
  const nodes = fieldsAtNodes(mesh, unknowns, solution);
  const { E, section, length } = problem;
  const points = nodes.map((node) => pointOf(problem, node));
  const largest = largestPoint(problem, nodes, points);
  const size = sizeOf(largest);
  if (!(size > rest)) return atRest(points);
  // Of the two signs take the one that moves towards +x, or +y, where it moves most.
  const [x, y] = largest.displacement;
  const scale = x + 1e-9 * y < 0 ? -1 / size : 1 / size;
  const shape = points.map(
    ({ at, displacement, twist }): ModePoint => ({
      at,
      displacement: [displacement[0] * scale, displacement[1] * scale],
      twist: twist * scale,
    }),
  );
  const energies = [E * section.Iv * bendingOf(nodes, 0), E * section.Iu * bendingOf(nodes, 1)] as const;
  const total = energies[0] + energies[1];
  const leading = energies[0] >= energies[1] ? 0 : 1;
  return {
    shape,
    energyAboutV: energies[0] / total,
    energyAboutU: energies[1] / total,
    halfWaves: halfWavesOf(nodes, leading),
    symmetry: symmetryOf(shape, length),
    largestAt: largest.at,
    directionAtLargest: [x * scale, y * scale],
  };
}

const atRest = (points: readonly ModePoint[]): BucklingMode => ({
  shape: points.map(({ at }) => ({ at, displacement: [0, 0], twist: 0 })),
  energyAboutV: 0,
  energyAboutU: 0,
  halfWaves: 0,
  symmetry: 'symmetric',
  largestAt: 0,
  directionAtLargest: [0, 0],
});

/** The centroid's displacement; from the shear centre to the centroid it is θ × (−s). */
function pointOf(
  { section, twist: twisting }: BarProblem,
  { at, w }: Pick<NodeFields, 'at' | 'w'>,
): ModePoint {
  const { weak, strong } = principalMotions(section.alpha);
  const [sx, sy] = twisting ? section.shearCentre : [0, 0];
  const [a = 0, b = 0, twist = 0] = w;
  return {
    at,
    displacement: [a * weak[0] + b * strong[0] + twist * sy, a * weak[1] + b * strong[1] - twist * sx],
    twist,
  };
}

const sizeOf = ({ displacement: [x, y] }: ModePoint): number => Math.hypot(x, y);

/** A later point must beat an earlier one by this share: of two crests that are alike the first is named. */
const CLEARLY = 1 + 1e-6;
/** Steps in the parts beside the largest node. */
const STEPS = 40;

/** Where the bar moves most: the largest node, then the cubics beside it. */
function largestPoint(
  problem: BarProblem,
  nodes: readonly NodeFields[],
  points: readonly ModePoint[],
): ModePoint {
  const crest = points.reduce((best, point, k) => {
    const known = points[best];
    return known && sizeOf(point) > sizeOf(known) * CLEARLY ? k : best;
  }, 0);
  let largest = points[crest];
  if (!largest) throw new Error('a shape without points');
  for (const k of [crest - 1, crest]) {
    const [p, q] = [nodes[k], nodes[k + 1]];
    if (!p || !q) continue;
    for (let step = 1; step < STEPS; step++) {
      const point = pointOf(problem, between(p, q, step / STEPS));
      if (sizeOf(point) > sizeOf(largest) * (1 + 1e-12)) largest = point;
    }
  }
  return largest;
}

/** On the cubic through displacement and slope at both ends, `s` of the way. */
function between(p: NodeFields, q: NodeFields, s: number): Pick<NodeFields, 'at' | 'w'> {
  const h = q.at - p.at;
  const rest = 1 - s;
  const w = p.w.map(
    (first, field) =>
      first * rest * rest * (1 + 2 * s) +
      (q.w[field] ?? 0) * s * s * (1 + 2 * rest) +
      h * s * rest * ((p.slope[field] ?? 0) * rest - (q.slope[field] ?? 0) * s),
  );
  return { at: p.at + h * s, w };
}

/** ∫ w″² dz of one field, from the cubic through displacement and slope at both ends of each part. */
function bendingOf(nodes: readonly NodeFields[], field: number): number {
  let sum = 0;
  for (let k = 0; k + 1 < nodes.length; k++) {
    const [p, q] = [nodes[k], nodes[k + 1]];
    if (!p || !q) continue;
    const h = q.at - p.at;
    const rise = ((q.w[field] ?? 0) - (p.w[field] ?? 0)) / h;
    const [s, t] = [p.slope[field] ?? 0, q.slope[field] ?? 0];
    // Curvature at the ends of a cubic; the integral of its square over the part.
    const first = (6 * rise - 4 * s - 2 * t) / h;
    const last = (-6 * rise + 2 * s + 4 * t) / h;
    sum += (h * (first * first + first * last + last * last)) / 3;
  }
  return sum;
}

function halfWavesOf(nodes: readonly NodeFields[], field: number): number {
  const values = nodes.map(({ w }) => w[field] ?? 0);
  const noise = 1e-4 * values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
  const signs = values.filter((value) => Math.abs(value) > noise).map(Math.sign);
  return 1 + signs.slice(1).filter((sign, k) => sign !== signs[k]).length;
}

function symmetryOf(shape: readonly ModePoint[], length: number): BucklingMode['symmetry'] {
  const at = (z: number): Vec2 => {
    const k = shape.findIndex((point) => point.at >= z - length * 1e-9);
    const [p, q] = [shape[Math.max(0, k - 1)], shape[k]];
    if (!p || !q) return [0, 0];
    const s = q.at === p.at ? 1 : (z - p.at) / (q.at - p.at);
    return [
      p.displacement[0] + s * (q.displacement[0] - p.displacement[0]),
      p.displacement[1] + s * (q.displacement[1] - p.displacement[1]),
    ];
  };
  let even = 0;
  let odd = 0;
  for (const { at: z, displacement } of shape) {
    const mirror = at(length - z);
    even = Math.max(even, Math.hypot(displacement[0] - mirror[0], displacement[1] - mirror[1]));
    odd = Math.max(odd, Math.hypot(displacement[0] + mirror[0], displacement[1] + mirror[1]));
  }
  return even < 0.01 ? 'symmetric' : odd < 0.01 ? 'antisymmetric' : 'unsymmetric';
}
