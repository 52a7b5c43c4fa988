/**
 * Two bars that cross and are joined there: each with its own holds and force, sharing the displacement out of the plane at the crossing, with twist that of the points where they grip each other. The forces grow together:
 * a taut partner stiffens the bar in question, a compressed one softens it. METHODS.md, "Taut partner".
 */
import type { Vec2 } from '../geometry/vector.ts';
import { LoadedSystem } from './assembly.ts';
import { largestShare, RootSearch } from './criticalLoad.ts';
import { type Mesh, type MeshNode, meshOf, rowOf } from './mesh.ts';
import { largestMovement, modeOf, nullShape, PARTS } from './mode.ts';
import { type BarProblem, type BucklingMode, type CriticalLoad, PINNED } from './model.ts';
import { type SpecialNode, unknownsOf } from './unknowns.ts';
import type { Way } from './ways.ts';

/** One of the two bars as the crossing sees it. */
export interface PairBar {
  /** Its axial shares are per unit of the load factor: a taut partner has shares below zero. */
  readonly problem: BarProblem;
  /** mm from end i. */
  readonly crossingAt: number;
  /** Out of the plane, in its own section plane; unit vector. */
  readonly outOfPlane: Vec2;
  /** Where its partner grips it, relative to the centroid, mm. The centroid when left out; counts only where twist is looked at, which both bars do or neither. */
  readonly grip?: Vec2;
  /** Cut at the crossing and plated: a hinge out of the plane. */
  readonly cut: boolean;
}

export interface PairProblem {
  /** The bar in question. */
  readonly bar: PairBar;
  readonly partner: PairBar;
}

/**
 * Lowest load factor at which the pair buckles. `N` is the largest compression in the bar in question at that factor, or of its
 * partner where only that is compressed; null when nothing is compressed.
 */
export function pairCriticalLoad(
  pair: PairProblem,
  wanted: { readonly second: boolean } = { second: false },
): CriticalLoad {
  const { system, mesh, partnerMesh } = systemOf(pair, 1);
  const [own, others] = [largestShare(mesh), largestShare(partnerMesh)];
  if (!(Math.max(own, others) > 0)) return { factor: null, N: null, second: null, trials: 0 };
  const search = new RootSearch(system);
  const guess = Math.min(eulerFactor(pair.bar.problem, own), eulerFactor(pair.partner.problem, others));
  const factor = search.root(1, guess);
  const second = wanted.second ? search.root(2, factor > 0 ? factor : guess) : null;
  return { factor, N: factor * (own > 0 ? own : others), second, trials: search.trials };
}

/** The shape of the bar in question when the pair buckles: at rest, all zeros, when its partner buckles by itself. */
export function pairMode(pair: PairProblem, factor: number): BucklingMode {
  const { system, mesh, unknowns, partnerMesh, partnerUnknowns } = systemOf(pair, PARTS);
  system.tried(factor * (1 - 1e-9));
  const shape = nullShape(system);
  const whole = Math.max(
    largestMovement(mesh, unknowns, shape),
    largestMovement(partnerMesh, partnerUnknowns, shape),
  );
  return modeOf(pair.bar.problem, mesh, unknowns, shape, whole * AT_REST);
}

/** A bar that moves by less than this share of its partner's movement is at rest. */
const AT_REST = 1e-5;

/** Infinite for a bar that nothing presses. */
const eulerFactor = ({ E, length, section }: BarProblem, share: number): number =>
  (Math.PI * Math.PI * E * section.Iv) / (length * length * share);

function systemOf({ bar, partner }: PairProblem, split: number) {
  const mesh = meshOf(withPlace(bar), split);
  const partnerMesh = meshOf(withPlace(partner), split);
  // The shared displacement comes last, so that it lengthens one row alone.
  const shared = freeOf(mesh) - 1 + hinges(bar) + freeOf(partnerMesh) - 1 + hinges(partner);
  const unknowns = unknownsOf(mesh, 0, specialNode(bar, mesh, shared));
  const partnerUnknowns = unknownsOf(partnerMesh, unknowns.end, specialNode(partner, partnerMesh, shared));
  const system = new LoadedSystem([
    { problem: bar.problem, mesh, unknowns },
    { problem: partner.problem, mesh: partnerMesh, unknowns: partnerUnknowns },
  ]);
  return { system, mesh, unknowns, partnerMesh, partnerUnknowns };
}

const freeOf = ({ nodes }: Mesh): number =>
  nodes.reduce((sum, { displacements, slopes }) => sum + displacements.length + slopes.length, 0);

/** A hinge has a slope on either side of it. */
const hinges = ({ cut }: PairBar): number => (cut ? 1 : 0);

/** A hold of no stiffness puts a node at the crossing. */
function withPlace(bar: PairBar): BarProblem {
  const { problem, crossingAt, outOfPlane } = bar;
  return { ...problem, holds: [...problem.holds, { at: crossingAt, direction: outOfPlane, stiffness: 0 }] };
}

function specialNode(bar: PairBar, { nodes, fields }: Mesh, index: number): SpecialNode {
  const { problem, outOfPlane: direction, grip } = bar;
  const row = rowOf(problem, fields, grip ? { direction, grip } : { direction });
  const away = ({ at }: MeshNode): number => Math.abs(at - bar.crossingAt);
  const node = nodes.reduce((best, each, k) => (away(each) < away(nodes[best] ?? each) ? k : best), 0);
  // A plate is a hinge out of the plane; twist goes through it.
  return { node, shared: { row, index }, hinge: bar.cut ? slopeRow(problem, fields, direction) : null };
}

function slopeRow({ section }: BarProblem, fields: 2 | 3, direction: Vec2): Way {
  const row = rowOf({ section }, 2, { direction });
  return fields === 3 ? [...row, 0] : row;
}

/** Two bars in one plane of bending, as in the published theory of crossed pairs: N, mm. */
export interface PlanarBar {
  readonly length: number;
  /** N·mm². */
  readonly EI: number;
  readonly crossingAt: number;
  readonly cut: boolean;
}

/**
 * The planar pair: pinned ends, displacements tied at the crossing, bending out of the plane only.
 * @param tensionShare tension in the partner over compression in the bar; below zero when both are compressed
 */
export function planarPair(bar: PlanarBar, partner: PlanarBar, tensionShare: number): PairProblem {
  return { bar: planarBar(bar, 1), partner: planarBar(partner, -tensionShare) };
}

function planarBar({ length, EI, crossingAt, cut }: PlanarBar, share: number): PairBar {
  // Stiff beyond reach in the plane, so that only the other way is left.
  const section = {
    area: 1,
    Ixx: EI,
    Iyy: 1e6 * EI,
    Iu: 1e6 * EI,
    Iv: EI,
    alpha: Math.PI / 2,
    shearCentre: [0, 0],
    J: 0,
    Iw: 0,
  } as const;
  return {
    problem: {
      E: 1,
      length,
      section,
      holds: [],
      axial: [{ from: 0, to: length, share }],
      endI: PINNED,
      endJ: PINNED,
      twist: null,
    },
    crossingAt,
    outOfPlane: [0, 1],
    cut,
  };
}
