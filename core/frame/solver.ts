import { dot, type Vec3 } from '../geometry/vector.ts';
import type { BarId } from '../layout/model.ts';
import { eliminationOrder } from '../sparse/eliminationOrder.ts';
import { analysed, type Factored, factored, type Symbolic, solved } from '../sparse/factor.ts';
import { MatrixGatherer, type SymmetricMatrix } from '../sparse/symmetricMatrix.ts';
import { type CountedStiffness, ELEMENT_SIZE, elementWithCount } from './elementStiffness.ts';
import type { Frame, FrameElement, Mechanism, NodeAxes, NodeMotion } from './model.ts';
import { diagonalIn, intoAxes, outOfAxes, turnElement } from './nodeAxes.ts';

/** A force on a node, N. */
export interface NodeForce {
  readonly node: number;
  readonly force: Vec3;
}

/** Share of a bar's bending stiffness that stands for none: some hundred times rounding, and far below what anything real has. */
const TRACE = 1e-13;

/** A frame assembled and factored, ready to be pushed. */
export class FrameSolver {
  readonly frame: Frame;
  readonly matrix: SymmetricMatrix;
  /** First unknown of the displacements and of the rotations of each node, in its axes; −1 where fixed. */
  readonly displacementOf: Int32Array;
  readonly rotationOf: Int32Array;
  readonly #units = new Map<number, Float64Array>();
  readonly #factors: Factored;
  #hidden = 0;

  /** @param symbolic of a frame of the same build with other forces in its bars */
  constructor(frame: Frame, symbolic: Symbolic | null = null) {
    this.frame = frame;
    const { nodes } = frame;
    this.displacementOf = new Int32Array(nodes.length).fill(-1);
    this.rotationOf = new Int32Array(nodes.length).fill(-1);
    let size = 0;
    nodes.forEach((node, k) => {
      if (leader(frame, k) === k && !isFixed(frame, k)) {
        this.displacementOf[k] = size;
        size += 3;
      }
      if (!node.fixed) {
        this.rotationOf[k] = size;
        size += 3;
      }
    });
    nodes.forEach((_, k) => {
      this.displacementOf[k] = this.displacementOf[leader(frame, k)] ?? -1;
    });
    const gatherer = new MatrixGatherer(size, frame.elements.length * 78);
    const gross = this.#assemble(gatherer, size);
    this.matrix = gatherer.matrix();
    this.#factors = factored(this.matrix, symbolic ?? analysed(this.matrix, this.#order(size)), gross);
  }

  get size(): number {
    return this.matrix.size;
  }

  get symbolic(): Symbolic {
    return this.#factors.symbolic;
  }

  /** Critical load factors below the forces now in the bars (Wittrick and Williams, 1971). */
  get criticalLoadsBelow(): number {
    return this.#factors.negative + this.#hidden;
  }

  /** The part of that count that has poles in the determinant. */
  get hiddenCount(): number {
    return this.#hidden;
  }

  get logDeterminant(): number {
    return this.#factors.diagonal.reduce((sum, pivot) => sum + Math.log(Math.abs(pivot)), 0);
  }

  /** Unknowns of an element or spring in its own order; −1 where held. */
  unknownsOf(i: number, j: number): readonly number[] {
    const three = (first: number): number[] => (first < 0 ? [-1, -1, -1] : [first, first + 1, first + 2]);
    return [
      ...three(this.displacementOf[i] ?? -1),
      ...three(this.rotationOf[i] ?? -1),
      ...three(this.displacementOf[j] ?? -1),
      ...three(this.rotationOf[j] ?? -1),
    ];
  }

  solve(load: Float64Array): Float64Array {
    return solved(this.#factors, load);
  }

  /** Displacements under a load of one on an unknown. Bars that end at one node ask for the same. */
  solveUnit(unknown: number): Float64Array {
    const known = this.#units.get(unknown);
    if (known) return known;
    const load = new Float64Array(this.size);
    load[unknown] = 1;
    const found = this.solve(load);
    this.#units.set(unknown, found);
    return found;
  }

  loadOf(forces: readonly NodeForce[]): Float64Array {
    const load = new Float64Array(this.size);
    for (const { node, force } of forces) {
      const first = this.displacementOf[node] ?? -1;
      if (first < 0) continue;
      const own = intoAxes(this.displacementAxes(node), force);
      for (let k = 0; k < 3; k++) load[first + k] = (load[first + k] ?? 0) + (own[k] ?? 0);
    }
    return load;
  }

  motionOf(x: Float64Array, node: number): NodeMotion {
    const at = (first: number, k: number): number => (first < 0 ? 0 : (x[first + k] ?? 0));
    const d = this.displacementOf[node] ?? -1;
    const r = this.rotationOf[node] ?? -1;
    return [
      ...outOfAxes(this.displacementAxes(node), [at(d, 0), at(d, 1), at(d, 2)]),
      ...outOfAxes(this.#rotationAxes(node), [at(r, 0), at(r, 1), at(r, 2)]),
    ];
  }

  /** Axes in which a node's displacement is counted: those of the node that it displaces with. */
  displacementAxes(node: number): NodeAxes | undefined {
    return this.frame.nodes[leader(this.frame, node)]?.axes;
  }

  #rotationAxes(node: number): NodeAxes | undefined {
    return this.frame.nodes[node]?.axes;
  }

  /** Stiffness of an element in the order of `unknownsOf`, in the axes of its nodes. */
  stiffnessOf(element: FrameElement): CountedStiffness {
    const stiffness = elementWithCount(element);
    turnElement(stiffness.K, this.#axesOf(element));
    return stiffness;
  }

  #axesOf({ i, j }: FrameElement): readonly (NodeAxes | undefined)[] {
    return [i, j].flatMap((node) => [this.displacementAxes(node), this.#rotationAxes(node)]);
  }

  /** Ways to move without resistance in which some node displaces. A rotation that nothing resists and that moves nothing is no mechanism. */
  mechanisms(): readonly Mechanism[] {
    const found: Mechanism[] = [];
    for (const unknown of this.#factors.vanished) {
      const mechanism = this.#mechanismOf(unknown);
      // The loose rotations of a node that moves take its motion with them.
      if (mechanism && !found.some((known) => isSameMotion(known, mechanism))) found.push(mechanism);
    }
    return found;
  }

  #mechanismOf(unknown: number): Mechanism | null {
    const { symbolic, diagonal } = this.#factors;
    const load = new Float64Array(this.size);
    load[unknown] = diagonal[symbolic.place[unknown] ?? 0] ?? 0;
    const x = this.solve(load);
    const displacement = (k: number): Vec3 => {
      const [a, b, c] = this.motionOf(x, k);
      return [a, b, c];
    };
    const sizes = this.frame.nodes.map((_, k) => Math.hypot(...displacement(k)));
    const most = Math.max(...sizes, 0);
    let turning = 0;
    for (let k = 0; k < this.size; k++) turning = Math.max(turning, Math.abs(x[k] ?? 0));
    if (most <= 1e-6 * turning) return null;
    const moving = sizes
      .map((size, node) => ({ size, node }))
      .filter(({ size }) => size > 1e-3 * most)
      .sort((a, b) => b.size - a.size)
      .map(({ node }) => {
        const [a, b, c] = displacement(node);
        return { node, displacement: [a / most, b / most, c / most] as const };
      });
    const moved = new Set(moving.map(({ node }) => node));
    const bars = new Set<BarId>();
    for (const { i, j, bar } of this.frame.elements) if (moved.has(i) || moved.has(j)) bars.add(bar);
    return { moving, bars: [...bars] };
  }

  /** Returns what each diagonal entry is put together from. */
  #assemble(gatherer: MatrixGatherer, size: number): Float64Array {
    const gross = new Float64Array(size);
    for (const element of this.frame.elements) {
      const { K, hidden, gross: own } = this.stiffnessOf(element);
      this.#hidden += hidden;
      const unknowns = this.unknownsOf(element.i, element.j);
      addBlock(gatherer, unknowns, K, ELEMENT_SIZE);
      const diagonal = diagonalIn(this.#axesOf(element), own);
      unknowns.forEach((unknown, k) => {
        if (unknown >= 0) gross[unknown] = (gross[unknown] ?? 0) + (diagonal[k] ?? 0);
      });
      this.#addTrace(gatherer, element);
    }
    for (const spring of this.frame.springs) {
      const first = spring.kind === 'displacement' ? this.displacementOf : this.rotationOf;
      const unknowns: number[] = [];
      const weights: number[] = [];
      const put = (node: number, sign: number): void => {
        const at = first[node] ?? -1;
        if (at < 0) return;
        const axes = spring.kind === 'displacement' ? this.displacementAxes(node) : this.#rotationAxes(node);
        intoAxes(axes, spring.direction).forEach((d, k) => {
          unknowns.push(at + k);
          weights.push(sign * d);
        });
      };
      put(spring.node, 1);
      if (spring.other !== null) put(spring.other, -1);
      for (let a = 0; a < unknowns.length; a++)
        for (let b = a; b < unknowns.length; b++) {
          const value = spring.stiffness * (weights[a] ?? 0) * (weights[b] ?? 0);
          const same = unknowns[a] === unknowns[b] && a !== b;
          if (value !== 0) gatherer.add(unknowns[a] ?? 0, unknowns[b] ?? 0, same ? 2 * value : value);
        }
    }
    return gross;
  }

  /** Where all bars of a node are hinged, what is left of its rotation is rounding, of either sign. This makes it positive, whichever way it lies in space. */
  #addTrace(gatherer: MatrixGatherer, { i, j, EIp, EIq, length }: FrameElement): void {
    const trace = (TRACE * 4 * (EIp + EIq)) / length;
    for (const first of [this.rotationOf[i] ?? -1, this.rotationOf[j] ?? -1])
      if (first >= 0) for (let k = 0; k < 3; k++) gatherer.add(first + k, first + k, trace);
  }

  /** Joints are ordered as wholes, three unknowns at a time. */
  #order(size: number): Int32Array {
    const groups = size / 3;
    const neighbours = Array.from({ length: groups }, () => new Set<number>());
    for (let c = 0; c < size; c++)
      for (let k = this.matrix.start[c] ?? 0; k < (this.matrix.start[c + 1] ?? 0); k++) {
        const a = Math.floor(c / 3);
        const b = Math.floor((this.matrix.row[k] ?? 0) / 3);
        if (a === b) continue;
        neighbours[a]?.add(b);
        neighbours[b]?.add(a);
      }
    const order = new Int32Array(size);
    eliminationOrder(neighbours.map((set) => [...set])).forEach((group, k) => {
      for (let c = 0; c < 3; c++) order[3 * k + c] = 3 * group + c;
    });
    return order;
  }
}

/** To and fro is one motion. */
function isSameMotion(a: Mechanism, b: Mechanism): boolean {
  const other = new Map(b.moving.map(({ node, displacement }) => [node, displacement]));
  const square = ({ moving }: Mechanism): number =>
    moving.reduce((sum, { displacement: d }) => sum + dot(d, d), 0);
  const both = a.moving.reduce((sum, { node, displacement }) => {
    const d = other.get(node);
    return d ? sum + dot(displacement, d) : sum;
  }, 0);
  return both * both > 0.999 * square(a) * square(b);
}

function leader(frame: Frame, node: number): number {
  let at = node;
  for (let next = frame.nodes[at]?.movesWith ?? at; next !== at; next = frame.nodes[at]?.movesWith ?? at)
    at = next;
  return at;
}

function isFixed(frame: Frame, node: number): boolean {
  return frame.nodes[node]?.fixed ?? false;
}

/** Adds an element's block; two of its unknowns may be one and the same. */
function addBlock(
  gatherer: MatrixGatherer,
  unknowns: readonly number[],
  K: Float64Array,
  size: number,
): void {
  for (let a = 0; a < size; a++) {
    const i = unknowns[a] ?? -1;
    if (i < 0) continue;
    for (let b = a; b < size; b++) {
      const j = unknowns[b] ?? -1;
      const value = K[a * size + b] ?? 0;
      // Zeros too: the pattern must be the same whatever the forces in the bars.
      if (j < 0) continue;
      gatherer.add(i, j, a !== b && i === j ? 2 * value : value);
    }
  }
}

export const component = (motion: NodeMotion, direction: Vec3): number =>
  dot([motion[0], motion[1], motion[2]], direction);
