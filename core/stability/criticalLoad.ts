import { LoadedSystem, type Trial } from './assembly.ts';
import { type Mesh, meshOf } from './mesh.ts';
import type { BarProblem, CriticalLoad } from './model.ts';
import { unknownsOf } from './unknowns.ts';

/** Relative width at which a root counts as found. */
const TOLERANCE = 1e-11;
const MOST_TRIALS = 400;
/** Critical factors are sought no farther below the guess than this. */
const LEAST = 1e-12;
/** Beside the guess, a load that is none. */
const NO_LOAD = 1e-12;

/**
 * The lowest load factor at which the bar buckles, and the next one: exact for the bar as modelled, no root missed.
 * Roots are bracketed by counting and closed in on by the determinant where it is smooth.
 */
export function criticalLoad(
  problem: BarProblem,
  wanted: { readonly second: boolean } = { second: true },
): CriticalLoad {
  const mesh = meshOf(problem);
  const most = largestShare(mesh);
  if (!(most > 0)) return { factor: null, N: null, second: null, trials: 0 };
  const search = new RootSearch(new LoadedSystem([{ problem, mesh, unknowns: unknownsOf(mesh) }]));
  const { E, length, section } = problem;
  const euler = (Math.PI * Math.PI * E * section.Iv) / (length * length * most);
  const factor = search.root(1, euler);
  const second = wanted.second ? search.root(2, factor) : null;
  return { factor, N: factor * most, second, trials: search.trials };
}

/** Largest compression in any piece per unit of the load factor; 0 when nothing is pressed. */
export const largestShare = ({ pieces }: Mesh): number =>
  pieces.reduce((most, { share }) => Math.max(most, share), 0);

export interface Triable {
  tried(factor: number): Trial;
}

/** Finds critical factors of anything that can be tried at a factor. */
export class RootSearch {
  trials = 0;
  readonly #system: Triable;

  constructor(system: Triable) {
    this.#system = system;
  }

  /** The factor below which fewer than `rank` critical loads lie, and above which at least that many do; 0 for what moves without load. */
  root(rank: number, guess: number, tolerance = TOLERANCE): number {
    let low = guess * (1 - 1e-9);
    let atLow = this.#tried(low);
    while (atLow.below >= rank) {
      if (low < guess * LEAST) throw new Error('the unloaded system is already unstable');
      low /= 2;
      if (low < guess * NO_LOAD) return 0;
      atLow = this.#tried(low);
    }
    let high = low;
    let atHigh = atLow;
    for (let step = 1.5; atHigh.below < rank; step *= 1.3) {
      low = high;
      atLow = atHigh;
      high *= step;
      atHigh = this.#tried(high);
    }
    return this.#closedIn(rank, tolerance, low, atLow, high, atHigh);
  }

  #closedIn(rank: number, tolerance: number, from: number, atFrom: Trial, to: number, atTo: Trial): number {
    let [low, atLow, high, atHigh] = [from, atFrom, to, atTo];
    // Weight of the stale end, as in the Illinois method.
    let lowWeight = 1;
    let highWeight = 1;
    let narrow = 0;
    while (high - low > tolerance * high && this.trials < MOST_TRIALS) {
      const smooth = atLow.clamped === atHigh.clamped && atLow.below === rank - 1 && atHigh.below === rank;
      let next = (low + high) / 2;
      if (smooth && narrow < 3) {
        const ratio =
          (highWeight / lowWeight) * Math.exp(Math.min(500, atHigh.logDeterminant - atLow.logDeterminant));
        next = low + (high - low) / (1 + ratio);
        const least = tolerance * high * 0.4;
        next = Math.min(high - least, Math.max(low + least, next));
      }
      const width = high - low;
      const trial = this.#tried(next);
      if (trial.below >= rank) {
        high = next;
        atHigh = trial;
        lowWeight = highWeight === 1 && smooth ? lowWeight / 2 : 1;
        highWeight = 1;
      } else {
        low = next;
        atLow = trial;
        highWeight = lowWeight === 1 && smooth ? highWeight / 2 : 1;
        lowWeight = 1;
      }
      narrow = high - low > width / 2 ? narrow + 1 : 0;
    }
    return (low + high) / 2;
  }

  #tried(factor: number): Trial {
    this.trials += 1;
    return this.#system.tried(factor);
  }
}
