/**
 * Two bars that cross and are joined there: each with its own holds and force, sharing the displacement out of the plane at the crossing. The forces grow together:
 * a taut partner stiffens the bar in question, a compressed one softens it. METHODS.md, "Taut partner".
 */
import type { Vec2 } from '../geometry/vector.ts';
import { LoadedSystem } from './assembly.ts';
import { RootSearch } from './criticalLoad.ts';
import { meshOf, principalMotions } from './mesh.ts';
import { modeOf, nullShape, PARTS } from './mode.ts';
import { type BarProblem, type BucklingMode, type CriticalLoad, PINNED } from './model.ts';
import { type SpecialNode, type Unknowns, unknownsOf } from './unknowns.ts';

/** One of the two bars as the crossing sees it. */
export interface PairBar {
  /** Its axial shares are per unit of the load factor: a taut partner has shares below zero. */
  readonly problem: BarProblem;
  /** mm from end i. */
  readonly crossingAt: number;
  /** Out of the plane, in its own section plane; unit vector. */
  readonly outOfPlane: Vec2;
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
  const most = largestShare(pair.bar);
  if (!(Math.max(most, largestShare(pair.partner)) > 0))
    return { factor: null, N: null, second: null, trials: 0 };
  const { system } = systemOf(pair, 1);
  const search = new RootSearch(system);
  const factor = search.root(1, eulerGuess(pair));
  const second = wanted.second ? search.root(2, factor) : null;
  return {
    factor,
    N: factor * (most > 0 ? most : largestShare(pair.partner)),
    second,
    trials: search.trials,
  };
}

/** The shape of the bar in question when the pair buckles. */
export function pairMode(pair: PairProblem, factor: number): BucklingMode {
  const { system, mesh, unknowns } = systemOf(pair, PARTS);
  system.tried(factor * (1 - 1e-9));
  return modeOf(pair.bar.problem, mesh, unknowns, nullShape(system));
}

const largestShare = ({ problem }: PairBar): number =>
  problem.axial.reduce((largest, piece) => Math.max(largest, piece.share), 0);

function eulerGuess({ bar, partner }: PairProblem): number {
  const guesses = [bar, partner].flatMap((each) => {
    const share = largestShare(each);
    const { E, length, section } = each.problem;
    return share > 0 ? [(Math.PI * Math.PI * E * section.Iv) / (length * length * share)] : [];
  });
  return Math.min(...guesses);
}

function systemOf({ bar, partner }: PairProblem, split: number) {
  const mesh = meshOf(withPlace(bar), split);
  const unknowns = unknownsOf(
    mesh,
    0,
    specialOf(
      bar,
      mesh.nodes.map(({ at }) => at),
      null,
    ),
  );
  const other = meshOf(withPlace(partner), 1);
  const shared = sharedIndex(
    bar,
    mesh.nodes.map(({ at }) => at),
    unknowns,
  );
  const others = unknownsOf(
    other,
    unknowns.size,
    specialOf(
      partner,
      other.nodes.map(({ at }) => at),
      shared,
    ),
  );
  const system = new LoadedSystem([
    { problem: bar.problem, mesh, unknowns: { ...unknowns, width: others.size } },
    { problem: partner.problem, mesh: other, unknowns: { ...others, width: others.size } },
  ]);
  return { system, mesh, unknowns };
}

/** A hold of no stiffness puts a node at the crossing. */
function withPlace(bar: PairBar): BarProblem {
  const { problem, crossingAt, outOfPlane } = bar;
  return { ...problem, holds: [...problem.holds, { at: crossingAt, direction: outOfPlane, stiffness: 0 }] };
}

function fieldsDirection({ problem, outOfPlane: [x, y] }: PairBar): readonly number[] {
  const { weak, strong } = principalMotions(problem.section.alpha);
  return [x * weak[0] + y * weak[1], x * strong[0] + y * strong[1]];
}

function specialOf(bar: PairBar, places: readonly number[], index: number | null): SpecialNode {
  const direction = fieldsDirection(bar);
  return { node: crossingNode(bar, places), shared: { direction, index }, hinge: bar.cut ? direction : null };
}

function crossingNode({ crossingAt }: PairBar, places: readonly number[]): number {
  return places.reduce(
    (best, at, k) => (Math.abs(at - crossingAt) < Math.abs((places[best] ?? 0) - crossingAt) ? k : best),
    0,
  );
}

function sharedIndex(bar: PairBar, places: readonly number[], unknowns: Unknowns): number {
  const first = unknowns.ofNode[crossingNode(bar, places)]?.[0];
  if (!first) throw new Error('a crossing without a displacement of its own');
  return first.index;
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
