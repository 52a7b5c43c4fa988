/** The sparse factorisation on a row of braced bays, step by step, up to 20 000 bars. */
import type { FrameElement, FrameNode } from '../../core/frame/model.ts';
import { FrameSolver } from '../../core/frame/solver.ts';
import { cross, distance, subtract, unit, type Vec3 } from '../../core/geometry/vector.ts';
import { eliminationOrder } from '../../core/sparse/eliminationOrder.ts';
import { analysed, factored, solved } from '../../core/sparse/factor.ts';
import { MatrixGatherer, type SymmetricMatrix } from '../../core/sparse/symmetricMatrix.ts';
import { timed } from './measured.ts';
import { ms, type Row, row } from './row.ts';

/** A compiled sparse LU with a minimum-degree order takes about this on 20 000 bars, ms; three times that is the goal. */
const COMPILED = 85;
const TIMES = 3;

/** Where bays of a row have their bars: chords above and below, a post and a diagonal; joints in two lines, the lower fixed at every tenth. */
function rowOfBays(bars: number): {
  readonly joints: number;
  readonly bars: readonly (readonly [number, number])[];
} {
  const bays = Math.floor(bars / 4);
  const each = Array.from({ length: bays }, (_, k) => {
    const [a, b, c, d] = [2 * k, 2 * k + 1, 2 * k + 2, 2 * k + 3];
    const diagonal = k % 2 === 0 ? ([a, d] as const) : ([b, c] as const);
    return [[a, c], [b, d], [c, d], diagonal] as const;
  });
  return { joints: 2 * (bays + 1), bars: each.flat() };
}

const placeOf = (joint: number): Vec3 => [Math.floor(joint / 2) * 5000, 0, (joint % 2) * 4000];
const isFixed = (joint: number): boolean => joint % 20 === 0;

/** The row as a frame in its own plane: two displacements and a turn to a joint. */
function inPlane(bars: number): SymmetricMatrix {
  const built = rowOfBays(bars);
  const gatherer = new MatrixGatherer(3 * built.joints, 21 * built.bars.length);
  for (let joint = 0; joint < built.joints; joint++)
    if (isFixed(joint)) for (let k = 0; k < 3; k++) gatherer.add(3 * joint + k, 3 * joint + k, 1e12);
  for (const [i, j] of built.bars) {
    const [from, to] = [placeOf(i), placeOf(j)];
    const h = distance(from, to);
    const [c, , s] = unit(subtract(to, from));
    const [EA, EI] = [1.7e8, 1e11];
    // Stretch, the difference of the turns, and the mean turn against the chord.
    const rows = [
      { k: EA / h, row: [-c, -s, 0, c, s, 0] },
      { k: EI / h, row: [0, 0, 1, 0, 0, -1] },
      { k: (3 * EI) / h, row: [(2 * s) / h, (-2 * c) / h, -1, (-2 * s) / h, (2 * c) / h, -1] },
    ];
    const at = [3 * i, 3 * i + 1, 3 * i + 2, 3 * j, 3 * j + 1, 3 * j + 2];
    for (let a = 0; a < 6; a++)
      for (let b = a; b < 6; b++) {
        let sum = 0;
        for (const { k, row: r } of rows) sum += k * (r[a] ?? 0) * (r[b] ?? 0);
        gatherer.add(at[a] ?? 0, at[b] ?? 0, sum);
      }
  }
  return gatherer.matrix();
}

/** And as a frame in space, as bays are solved: six to a joint. */
function inSpace(bars: number): SymmetricMatrix {
  const built = rowOfBays(bars);
  const nodes = Array.from(
    { length: built.joints },
    (_, joint): FrameNode => ({ name: '', at: placeOf(joint), movesWith: joint, fixed: isFixed(joint) }),
  );
  const elements = built.bars.map(([i, j]): FrameElement => {
    const [from, to] = [placeOf(i), placeOf(j)];
    const direction = unit(subtract(to, from));
    return {
      bar: `${i}-${j}`,
      i,
      j,
      length: distance(from, to),
      direction,
      p: OUT,
      q: cross(direction, OUT),
      EIp: 3e10,
      EIq: 1e11,
      EA: 1.7e8,
      GJ: 8e8,
      releases: [],
      tension: 0,
    };
  });
  return new FrameSolver({ nodes, elements, springs: [], along: new Map() }).matrix;
}

const OUT: Vec3 = [0, -1, 0];

interface Steps {
  readonly bars: number;
  readonly unknowns: number;
  readonly entries: number;
  readonly order: number;
  readonly analyse: number;
  readonly factor: number;
  readonly leastFactor: number;
  readonly solve: number;
}

/** Joints are ordered as wholes, as the frame does. */
function neighboursOf({ size, start, row: rows }: SymmetricMatrix): readonly (readonly number[])[] {
  const sets = Array.from({ length: size / 3 }, () => new Set<number>());
  for (let c = 0; c < size; c++)
    for (let k = start[c] ?? 0; k < (start[c + 1] ?? 0); k++) {
      const [a, b] = [Math.floor(c / 3), Math.floor((rows[k] ?? 0) / 3)];
      if (a === b) continue;
      sets[a]?.add(b);
      sets[b]?.add(a);
    }
  return sets.map((set) => [...set]);
}

function measured(bars: number, matrix: SymmetricMatrix): Steps {
  const neighbours = neighboursOf(matrix);
  const order = timed(() => eliminationOrder(neighbours), 5);
  const joints = eliminationOrder(neighbours);
  const unknowns = Int32Array.from(
    { length: matrix.size },
    (_, k) => 3 * (joints[Math.floor(k / 3)] ?? 0) + (k % 3),
  );
  const analyse = timed(() => analysed(matrix, unknowns), 5);
  const symbolic = analysed(matrix, unknowns);
  const factor = timed(() => factored(matrix, symbolic), 7);
  const factors = factored(matrix, symbolic);
  const load = Float64Array.from({ length: matrix.size }, (_, k) => Math.sin(k));
  return {
    bars,
    unknowns: matrix.size,
    entries: factors.row.length,
    order: order.median,
    analyse: analyse.median,
    factor: factor.median,
    leastFactor: factor.least,
    solve: timed(() => solved(factors, load), 7).median,
  };
}

const rowOf = ({ bars, unknowns, entries, order, analyse, factor, solve }: Steps, what: string): Row =>
  row(
    `${what}: ${bars} bars, ${unknowns} unknowns, ${(entries / 1000).toFixed(0)} thousand entries in L`,
    `order ${ms(order)}, analyse ${ms(analyse)}, factor ${ms(factor)}, solve ${ms(solve)}`,
  );

export function sparse(): readonly Row[] {
  const [least, middle, most] = [2000, 6400, 20_000].map((bars) => measured(bars, inPlane(bars)));
  if (!least || !middle || !most) return [];
  const whole = most.order + most.analyse + most.factor;
  const growth = most.leastFactor / least.leastFactor;
  return [
    ...[least, middle, most].map((steps) => rowOf(steps, 'a row of bays in its plane')),
    row(
      '  order, analysis and factor of 20 000 bars together',
      ms(whole),
      `under ${TIMES * COMPILED} ms`,
      whole < TIMES * COMPILED,
    ),
    row(
      '  growth of the least factor time from 2 000 to 20 000 bars',
      `× ${growth.toFixed(1)}`,
      'about × 10, at most × 14',
      growth <= 14,
    ),
    rowOf(measured(20_000, inSpace(20_000)), 'the same in space'),
  ];
}
