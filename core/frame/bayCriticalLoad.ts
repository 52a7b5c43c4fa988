import type { BarId } from '../layout/model.ts';
import { RootSearch } from '../stability/criticalLoad.ts';
import type { Frame, Mechanism, NodeMotion } from './model.ts';
import { FrameSolver } from './solver.ts';

export interface BayCritical {
  /** Lowest factor on the given forces at which the bay buckles; null when no force compresses anything, or the bay is a mechanism. */
  readonly factor: number | null;
  /** Motion of each node of the frame at buckling, largest displacement 1. */
  readonly mode: readonly NodeMotion[];
  readonly mechanisms: readonly Mechanism[];
  readonly trials: number;
}

/**
 * Lowest critical load factor of an assembled bay under given axial forces: exact bending functions in every piece, the same root count as for
 * single bars. Torsion under axial force is left to the single bar.
 *
 * @param shares axial force of each bar per unit of the factor, N, tension positive
 * @param guess a factor of about the right size, such as the lowest of the single bars
 */
export function bayCriticalLoad(
  frame: Frame,
  shares: ReadonlyMap<BarId, number>,
  guess: number,
): BayCritical {
  const plain = new FrameSolver(frame);
  const mechanisms = plain.mechanisms();
  const compressed = [...shares.values()].some((share) => share < 0);
  if (!compressed || mechanisms.length > 0 || plain.criticalLoadsBelow > 0)
    return { factor: null, mode: [], mechanisms, trials: 0 };
  const solverAt = (factor: number): FrameSolver =>
    new FrameSolver(
      {
        ...frame,
        elements: frame.elements.map((element) => ({
          ...element,
          tension: factor * (shares.get(element.bar) ?? 0),
        })),
      },
      plain.symbolic,
    );
  const search = new RootSearch({
    tried: (factor) => {
      const solver = solverAt(factor);
      return {
        below: solver.criticalLoadsBelow,
        clamped: solver.hiddenCount,
        logDeterminant: solver.logDeterminant,
      };
    },
  });
  const factor = search.root(1, guess, 1e-9);
  return { factor, mode: modeOf(solverAt(factor * (1 - 1e-8)), frame), mechanisms, trials: search.trials };
}

function modeOf(solver: FrameSolver, frame: Frame): readonly NodeMotion[] {
  let x: Float64Array = Float64Array.from({ length: solver.size }, (_, k) => Math.sin(1 + 2.3 * k));
  for (let sweep = 0; sweep < 4; sweep++) {
    x = solver.solve(x);
    let most = 0;
    for (const value of x) most = Math.max(most, Math.abs(value));
    for (let k = 0; k < x.length; k++) x[k] = (x[k] ?? 0) / most;
  }
  const motions = frame.nodes.map((_, node) => solver.motionOf(x, node));
  const largest = motions.reduce((most, [a, b, c]) => Math.max(most, Math.hypot(a, b, c)), 0);
  return motions.map(([a, b, c, d, e, f]) => [
    a / largest,
    b / largest,
    c / largest,
    d / largest,
    e / largest,
    f / largest,
  ]);
}
