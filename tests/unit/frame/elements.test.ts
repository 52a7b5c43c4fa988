/** The frame's pieces against formulas of the strength of materials, wherever they lie in space. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ELEMENT_SIZE, elementStiffness } from '../../../core/frame/elementStiffness.ts';
import type { Frame } from '../../../core/frame/model.ts';
import { FrameSolver } from '../../../core/frame/solver.ts';
import { add, cross, dot, scale, subtract, type Vec3 } from '../../../core/geometry/vector.ts';
import { times } from '../../../core/sparse/symmetricMatrix.ts';
import { runs } from '../../properties/given/runs.ts';
import { type Axes, anyAxes, element, frame, line, node, STIFFNESS } from './given.ts';

const L = 3000;
const { EIp, EIq, EA, GJ } = STIFFNESS;
/** Stiffnesses apart by up to 10⁶ in one matrix leave ten figures. */
const FIGURES = 1e-9;
const near = (actual: number, expected: number, beside = Math.abs(expected)): void =>
  void expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThan(FIGURES * beside);

/** Displacement and rotation of a node under forces and moments. */
function moved(
  of: Frame,
  loads: readonly { readonly node: number; readonly force?: Vec3; readonly moment?: Vec3 }[],
  at: number,
): { readonly u: Vec3; readonly r: Vec3 } {
  const solver = new FrameSolver(of);
  const load = new Float64Array(solver.size);
  for (const { node: k, force, moment } of loads)
    for (const [first, vector] of [
      [solver.displacementOf[k] ?? -1, force],
      [solver.rotationOf[k] ?? -1, moment],
    ] as const)
      vector?.forEach((value, c) => {
        if (first >= 0) load[first + c] = (load[first + c] ?? 0) + value;
      });
  const [a, b, c, d, e, f] = solver.motionOf(solver.solve(load), at);
  return { u: [a, b, c], r: [d, e, f] };
}

const cantilever = (axes: Axes): Frame => line(axes, [0, L], { first: true, last: false });

describe('one piece', () => {
  it('resists no motion of a rigid body', () => {
    fc.assert(
      fc.property(
        anyAxes,
        anyAxes,
        fc.integer({ min: 1, max: 1000 }),
        ({ e, p }, { e: turn, p: shift }, size) => {
          const nodes = [node([100, -50, 20], 0), node(add([100, -50, 20], scale(e, L)), 1)];
          const K = elementStiffness(element(nodes, [0, 1], p));
          const x = nodes.flatMap(({ at }) => [
            ...add(scale(shift, size), cross(scale(turn, 0.01), at)),
            ...scale(turn, 0.01),
          ]);
          const force = (row: number): number =>
            x.reduce((sum, value, k) => sum + (K[row * ELEMENT_SIZE + k] ?? 0) * value, 0);
          const most = Math.max(...K.map(Math.abs)) * Math.max(...x.map(Math.abs));
          for (let row = 0; row < ELEMENT_SIZE; row++)
            expect(Math.abs(force(row))).toBeLessThan(1e-13 * most);
        },
      ),
      runs(100),
    );
  });

  it('is symmetric, with or without a force in it or releases', () => {
    fc.assert(
      fc.property(anyAxes, fc.constantFrom(0, 2e5, -3e4), fc.boolean(), ({ e, p, q }, tension, released) => {
        const nodes = [node([0, 0, 0], 0), node(scale(e, L), 1)];
        const free = released ? [{ end: 'i', about: p } as const, { end: 'j', about: q } as const] : [];
        const K = elementStiffness(element(nodes, [0, 1], p, { tension }, free));
        const most = Math.max(...K.map(Math.abs));
        for (let i = 0; i < ELEMENT_SIZE; i++)
          for (let j = 0; j < i; j++)
            expect(
              Math.abs((K[i * ELEMENT_SIZE + j] ?? 0) - (K[j * ELEMENT_SIZE + i] ?? 0)),
            ).toBeLessThanOrEqual(1e-14 * most);
      }),
      runs(60),
    );
  });
});

describe('the patch test', () => {
  it('carries a constant stretch through pieces of any length without a force between them', () => {
    fc.assert(
      fc.property(
        anyAxes,
        fc.uniqueArray(fc.integer({ min: 1, max: 99 }), { minLength: 2, maxLength: 5 }),
        (axes, cuts) => {
          const places = [0, ...cuts.sort((a, b) => a - b).map((k) => k * 50), 5000];
          const last = places.length - 1;
          const bar = line(axes, places, { first: true, last: false });
          places.forEach((at, k) => {
            const { u } = moved(bar, [{ node: last, force: scale(axes.e, 1e5) }], k);
            near(dot(u, axes.e), (1e5 * at) / EA, 3);
            near(Math.hypot(...subtract(u, scale(axes.e, dot(u, axes.e)))), 0, 3);
          });
        },
      ),
      runs(60),
    );
  });

  it('gives between pieces what one piece gives', () => {
    fc.assert(
      fc.property(anyAxes, fc.integer({ min: 1, max: 19 }), (axes, cut) => {
        const two = line(axes, [0, (cut * L) / 20, L], { first: true, last: false });
        const force: Vec3 = [300, -200, 500];
        const whole = moved(cantilever(axes), [{ node: 1, force }], 1);
        const pieces = moved(two, [{ node: 2, force }], 2);
        whole.u.forEach((value, k) => {
          near(pieces.u[k] ?? 0, value, Math.hypot(...whole.u));
        });
      }),
      runs(60),
    );
  });
});

describe('a cantilever, whichever way it lies', () => {
  it('gives PL³/3EI along each principal way, and turns by PL²/2EI', () => {
    fc.assert(
      fc.property(anyAxes, (axes) => {
        const { p, q } = axes;
        for (const [way, EI, turn] of [
          [p, EIp, q],
          [q, EIq, scale(p, -1)],
        ] as const) {
          const { u, r } = moved(cantilever(axes), [{ node: 1, force: scale(way, 1000) }], 1);
          const expected = (1000 * L ** 3) / (3 * EI);
          near(dot(u, way), expected);
          near(Math.hypot(...subtract(u, scale(way, dot(u, way)))), 0, expected);
          near(dot(r, turn), (1000 * L ** 2) / (2 * EI));
        }
      }),
      runs(60),
    );
  });

  it('bends about both axes under a slanting load', () => {
    fc.assert(
      fc.property(anyAxes, fc.integer({ min: 0, max: 360 }), (axes, degrees) => {
        const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
        const { u } = moved(
          cantilever(axes),
          [{ node: 1, force: add(scale(axes.p, 1000 * c), scale(axes.q, 1000 * s)) }],
          1,
        );
        const unitDeflection = (1000 * L ** 3) / 3;
        near(dot(u, axes.p), (unitDeflection * c) / EIp, unitDeflection / EIp);
        near(dot(u, axes.q), (unitDeflection * s) / EIq, unitDeflection / EIp);
      }),
      runs(60),
    );
  });

  it('gives ML²/2EI and ML/EI to a moment, and TL/GJ to a torque', () => {
    fc.assert(
      fc.property(anyAxes, (axes) => {
        const { e, p, q } = axes;
        const bent = moved(cantilever(axes), [{ node: 1, moment: scale(q, 1e6) }], 1);
        near(dot(bent.u, p), (1e6 * L ** 2) / (2 * EIp));
        near(dot(bent.r, q), (1e6 * L) / EIp);
        const twisted = moved(cantilever(axes), [{ node: 1, moment: scale(e, 1e6) }], 1);
        near(dot(twisted.r, e), (1e6 * L) / GJ);
        near(Math.hypot(...twisted.u), 0, L);
      }),
      runs(60),
    );
  });
});

describe('a bar between two supports, whichever way it lies', () => {
  const middle = (
    axes: Axes,
    free: { first?: readonly Vec3[]; last?: readonly Vec3[] },
    tension = 0,
  ): Frame => line(axes, [0, L / 2, L], { first: true, last: true }, { tension }, free);
  const deflection = (of: Frame, way: Vec3): number =>
    dot(moved(of, [{ node: 1, force: scale(way, 1000) }], 1).u, way);

  // Textbook cases of a load at mid-span.
  it('gives PL³/192EI clamped, 7PL³/768EI propped, PL³/48EI hinged', () => {
    fc.assert(
      fc.property(anyAxes, (axes) => {
        const { p, q } = axes;
        const unitDeflection = (1000 * L ** 3) / EIp;
        near(deflection(middle(axes, {}), p), unitDeflection / 192);
        near(deflection(middle(axes, { last: [q] }), p), (7 * unitDeflection) / 768);
        near(deflection(middle(axes, { first: [q], last: [q] }), p), unitDeflection / 48);
        // A hinge about one axis leaves the other clamped.
        near(deflection(middle(axes, { first: [q], last: [q] }), q), (1000 * L ** 3) / EIq / 192);
      }),
      runs(60),
    );
  });

  it('is stiffened by a pull and softened by a push', () => {
    // Timoshenko and Gere, §1.3 and after: PL³/48EI × 3(u − tanh u)/u³ pulled, 3(tan u − u)/u³ pressed, u = (L/2)√(N/EI).
    fc.assert(
      fc.property(anyAxes, fc.integer({ min: 1, max: 140 }), (axes, hundredths) => {
        const { p, q } = axes;
        const u = hundredths / 100;
        const N = (4 * EIp * u * u) / L ** 2;
        const plain = (1000 * L ** 3) / (48 * EIp);
        const free = { first: [q], last: [q] };
        near(deflection(middle(axes, free, N), p), (plain * 3 * (u - Math.tanh(u))) / u ** 3, plain * 100);
        near(deflection(middle(axes, free, -N), p), (plain * 3 * (Math.tan(u) - u)) / u ** 3, plain * 100);
      }),
      runs(100),
    );
  });

  it('carries nothing past a hinge: a chain of two hinged pieces is a mechanism', () => {
    const axes: Axes = { e: [1, 0, 0], p: [0, 1, 0], q: [0, 0, 1] };
    const nodes = [node([0, 0, 0], 0, true), node([1000, 0, 0], 1), node([2000, 0, 0], 2, true)];
    const free = (end: 'i' | 'j') => [{ end, about: axes.q } as const];
    const chain = frame(nodes, [
      element(nodes, [0, 1], axes.p, {}, [...free('i'), ...free('j')]),
      element(nodes, [1, 2], axes.p, {}, [...free('i'), ...free('j')]),
    ]);
    const [mechanism, ...others] = new FrameSolver(chain).mechanisms();
    expect(others).toEqual([]);
    expect(mechanism?.moving.map(({ node: k }) => k)).toEqual([1]);
    expect(Math.abs(mechanism?.moving[0]?.displacement[1] ?? 0)).toBeCloseTo(1, 9);
    expect(mechanism?.bars).toEqual(['b0-1', 'b1-2']);
  });
});

describe('any frame', () => {
  /** A ring of bars over four nodes on the ground and four above, all joints stiff. */
  const box = anyAxes.map(({ p }) => {
    const corners: Vec3[] = [
      [0, 0, 0],
      [4000, 0, 0],
      [4000, 3000, 0],
      [0, 3000, 0],
    ];
    const nodes = [...corners, ...corners.map(([x, y]): Vec3 => [x + 200, y - 100, 3500])].map((at, k) =>
      node(at, k, k < 4),
    );
    const pairs: (readonly [number, number])[] = [
      [0, 4],
      [1, 5],
      [2, 6],
      [3, 7],
      [4, 5],
      [5, 6],
      [6, 7],
      [7, 4],
      [0, 5],
      [3, 6],
    ];
    return frame(
      nodes,
      pairs.map((pair, k) => element(nodes, pair, p, { EA: STIFFNESS.EA * (1 + k / 10) })),
    );
  });
  const push = fc.tuple(
    fc.integer({ min: 4, max: 7 }),
    anyAxes.map(({ e }) => e),
  );

  it('moves at one place for a push at another as the other way round (Maxwell and Betti)', () => {
    fc.assert(
      fc.property(box, push, push, (of, [a, d], [b, g]) => {
        const there = dot(moved(of, [{ node: a, force: d }], b).u, g);
        const back = dot(moved(of, [{ node: b, force: g }], a).u, d);
        near(there, back, Math.hypot(...moved(of, [{ node: a, force: d }], b).u));
      }),
      runs(80),
    );
  });

  it('is in equilibrium: what is left over is below a thousand-millionth of the load', () => {
    fc.assert(
      fc.property(box, push, (of, [k, force]) => {
        const solver = new FrameSolver(of);
        const load = solver.loadOf([{ node: k, force: scale(force, 1000) }]);
        const carried = times(solver.matrix, solver.solve(load));
        for (let row = 0; row < solver.size; row++)
          expect(Math.abs((carried[row] ?? 0) - (load[row] ?? 0))).toBeLessThan(1000 * 1e-9);
      }),
      runs(60),
    );
  });

  it('tied nodes displace as one', () => {
    const axes: Axes = { e: [1, 0, 0], p: [0, 1, 0], q: [0, 0, 1] };
    // Two crossing beams, clamped, tied at their middles: they share the load by their stiffness.
    const nodes = [
      node([-1500, 0, 0], 0, true),
      node([0, 0, 0], 1),
      node([1500, 0, 0], 2, true),
      node([0, -1500, 0], 3, true),
      { ...node([0, 0, 0], 4), movesWith: 1 },
      node([0, 1500, 0], 5, true),
    ];
    const up: Vec3 = [0, 0, 1];
    const crossing = frame(nodes, [
      element(nodes, [0, 1], up),
      element(nodes, [1, 2], up),
      element(nodes, [3, 4], axes.e, { EIq: 5e10 }),
      element(nodes, [4, 5], axes.e, { EIq: 5e10 }),
    ]);
    // The first bends along z by EIp, the second by EIq, the way that is square to its p.
    const stiffness = (192 * (EIp + 5e10)) / L ** 3;
    for (const k of [1, 4])
      near(moved(crossing, [{ node: 4, force: scale(up, 1000) }], k).u[2], 1000 / stiffness);
  });
});
