/** Bays as frames: what they offer, that they are in equilibrium, symmetric where the bay is, and named where they can move. */
import { describe, expect, it } from 'vitest';
import { namedMechanism } from '../../../core/bowing/mechanismNames.ts';
import { movementUnder } from '../../../core/frame/push.ts';
import { pushTest } from '../../../core/frame/pushing.ts';
import { dot, type Vec3 } from '../../../core/geometry/vector.ts';
import { GUSSETED } from '../../../core/project/endFixity.ts';
import { restraintContext } from '../../../core/restraint/restraint.ts';
import { times } from '../../../core/sparse/symmetricMatrix.ts';
import { bay, free, knee, line, roof, STRUT, wall } from '../assess/given/bays.ts';
import {
  along,
  type Built,
  built,
  crossed,
  diagonal,
  HINGED,
  offeredAtCrossing,
  withMember,
} from './bayGiven.ts';
import { E, G } from './given.ts';

const BOLTED = { joins: { 't1.fall+t1.rise': { kind: 'bolted' } } } as const;

/** Directions of a crossed rectangle in its plane: across the first bar, and what the formulas of METHODS.md need. */
function rectangle(width: number, height: number) {
  const length = Math.hypot(width, height);
  return { length, theta: 2 * Math.atan2(Math.min(width, height), Math.max(width, height)) };
}

describe('what a crossing partner offers', () => {
  const ACROSS_SHORTER = [1, 0] as const;
  const ACROSS_LONGER = [0, 1] as const;

  // METHODS.md, "The push test": k⊥ = k_p k_c sin²θ/(k_p cos²θ + k_c), k = EA/ℓ₁ + EA/ℓ₂ of the partner and of the bar itself.
  it.each([
    [8000, 1410],
    [8000, 2500],
    [6000, 4000],
    [5000, 5000],
  ])(
    'is in the plane what the formula says within a thousandth: diagonals of a rectangle of %d by %d',
    (width, height) => {
      const { length, theta } = rectangle(width, height);
      const of = built(crossed([width, height], '50x50x5'));
      const { section } = diagonal(of, 'B/ab');
      const k = (4 * E * section.area) / length;
      const formula = (k * k * Math.sin(theta) ** 2) / (k * Math.cos(theta) ** 2 + k);
      // Longer leg in the plane: an equal angle's second leg.
      const offered = along(offeredAtCrossing(of, 'B/ab'), ACROSS_LONGER);
      expect(Math.abs(offered / formula - 1)).toBeLessThan(0.001);
      // 75 to 1200 times what two half-waves need at 3 m (METHODS.md); longer bars are rigid for each other all the more.
      expect(offered / ((16 * Math.PI ** 2 * E * section.Iv) / length ** 3)).toBeGreaterThan(75);
    },
  );

  it('is by bending a little more than the formula: the partner’s own, in the plane', () => {
    // Hinged ends: 48EI/L³ across the partner; clamped by stiff gussets: 192EI/L³. Its other way is free to follow, so I is that of unsymmetric bending when hinged.
    const [width, height] = [8000, 1410];
    const { length, theta } = rectangle(width, height);
    for (const [ends, clamped] of [
      [HINGED, 48],
      [GUSSETED, 192],
    ] as const) {
      const of = built(crossed([width, height], '50x50x5'), ends);
      const { section } = diagonal(of, 'B/ab');
      const k = (4 * E * section.area) / length;
      const bending = (I: number): number => (clamped * E * I) / length ** 3;
      // Along the bar c, along the partner e, and across the partner n: M = k c cᵀ + k e eᵀ + b n nᵀ; k⊥ = 1/tᵀM⁻¹t.
      const across = (b: number): number => {
        const [c, s] = [Math.cos(theta), Math.sin(theta)];
        const [xx, xy, yy] = [k + k * c * c + b * s * s, (k - b) * c * s, k * s * s + b * c * c];
        return (xx * yy - xy * xy) / xx;
      };
      const offered = along(offeredAtCrossing(of, 'B/ab'), ACROSS_LONGER);
      const least = bending((2 * section.Iu * section.Iv) / (section.Iu + section.Iv));
      expect(offered).toBeGreaterThan(across(least) * (1 - 1e-6));
      expect(offered).toBeLessThan(across(bending(section.Ixx)) * (1 + 1e-6));
      // And that is 0.04 % and less than 0.2 % of the whole at this flat angle.
      expect(offered / across(0) - 1).toBeLessThan(0.002);
    }
  });

  it('is out of the plane 48EI/L³ of an unloaded partner that runs through, and nothing of one that is cut', () => {
    const { length } = rectangle(6000, 4000);
    for (const [name, which] of [
      ['70x70x6', 'Iyy'],
      ['125x75x8', 'Iyy'],
    ] as const) {
      const of = built(crossed([6000, 4000], name));
      const { section } = diagonal(of, 'B/ab');
      // Longer leg in the plane: it moves along the shorter, held along the longer by the crossing.
      const offered = along(offeredAtCrossing(of, 'B/ab'), ACROSS_SHORTER);
      expect(Math.abs(offered / ((48 * E * section[which]) / length ** 3) - 1)).toBeLessThan(0.0005);
      const cut = built(crossed([6000, 4000], name, { kind: 'cut', cutBar: 'cd' }));
      expect(along(offeredAtCrossing(cut, 'B/ab'), ACROSS_SHORTER)).toBeLessThan(1e-4);
      // The plate carries the push in the plane all the same.
      expect(along(offeredAtCrossing(cut, 'B/ab'), ACROSS_LONGER)).toBeGreaterThan(10_000);
    }
  });

  it('is nothing where nothing is joined', () => {
    const of = built(crossed([6000, 4000], '70x70x6', { kind: 'none' }));
    expect(() => offeredAtCrossing(of, 'B/ab')).toThrow('offered nothing');
  });

  it('is less when the partner is pressed, and more when it is pulled', () => {
    const out = (tension: number): number => {
      const of = built(crossed([6000, 4000], '70x70x6'), HINGED, { tension: new Map([['B/cd', tension]]) });
      return along(offeredAtCrossing(of, 'B/ab'), ACROSS_SHORTER);
    };
    // METHODS.md, "Taut partner": (4T/L)/(1 − tanh τ/τ), τ = (L/2)√(T/EI).
    const { length } = rectangle(6000, 4000);
    const { section } = diagonal(built(crossed([6000, 4000], '70x70x6')), 'B/cd');
    for (const T of [2000, 20_000, 200_000]) {
      const tau = (length / 2) * Math.sqrt(T / (E * section.Iyy));
      expect(Math.abs(out(T) / ((4 * T) / length / (1 - Math.tanh(tau) / tau)) - 1)).toBeLessThan(0.1);
    }
    expect(out(-2000)).toBeLessThan(out(0));
    expect(out(2000)).toBeGreaterThan(out(0));
  });
});

describe('every kind of bay', () => {
  const bays = [
    [
      'a wall bay with a joined crossing',
      bay(
        wall(6000, [
          [4000, 'crossed'],
          [3600, 'peaked'],
        ]),
        BOLTED,
      ),
    ],
    [
      'a wall bay with rails',
      bay(wall(6000, [[4000, 'crossed']], [line('G1', 1000)]), {
        joins: { ...BOLTED.joins, 'G1+t1.rise': { kind: 'purlin', boltsAcross: 2 } },
      }),
    ],
    [
      'a wall bay with a cut diagonal',
      bay(wall(6000, [[4000, 'crossed']]), {
        joins: { 't1.fall+t1.rise': { kind: 'cut', cutBar: 't1.rise' } },
      }),
    ],
    [
      'a roof bay',
      bay(
        roof(
          6000,
          8,
          [
            [4000, 'crossed'],
            [4000, 'crossed'],
          ],
          [line('P1', 2000)],
        ),
        { joins: { 'a.p1.fall+a.p1.rise': { kind: 'welded' } } },
      ),
    ],
    ['knees', bay(knee())],
    ['a bay drawn freely', crossed([6000, 4000], '100x75x8')],
  ] as const;
  const FORCE: Vec3 = [300, -200, 500];

  it.each(bays)('%s is in equilibrium under a push on any of its nodes', (_, given) => {
    for (const ends of [HINGED, GUSSETED]) {
      const { solver, frame } = built(given, ends);
      expect(solver.mechanisms()).toEqual([]);
      frame.nodes.forEach((__, node) => {
        const load = solver.loadOf([{ node, force: FORCE }]);
        const carried = times(solver.matrix, solver.solve(load));
        carried.forEach((value, row) => {
          expect(Math.abs(value - (load[row] ?? 0))).toBeLessThan(1e-9 * Math.hypot(...FORCE));
        });
      });
    }
  });

  it.each(bays)('%s moves at one node for a push on another as the other way round', (_, given) => {
    const { solver, frame } = built(given);
    const ways: readonly Vec3[] = [
      [1, 0, 0],
      [0, 1, 0],
      [0.6, 0, 0.8],
    ];
    const nodes = frame.nodes.map((__, k) => k).filter((k) => (solver.displacementOf[k] ?? -1) >= 0);
    const moves = nodes.map((node) => ways.map((way) => solver.solve(solver.loadOf([{ node, force: way }]))));
    const at = (x: Float64Array | undefined, node: number, way: Vec3): number => {
      const [a, b, c] = solver.motionOf(x ?? new Float64Array(solver.size), node);
      return dot([a, b, c], way);
    };
    nodes.forEach((a, i) => {
      nodes.forEach((b, j) => {
        ways.forEach((d, m) => {
          ways.forEach((g, n) => {
            const there = at(moves[i]?.[m], b, g);
            const back = at(moves[j]?.[n], a, d);
            const size = Math.max(Math.abs(at(moves[i]?.[m], a, d)), Math.abs(at(moves[j]?.[n], b, g)));
            expect(Math.abs(there - back)).toBeLessThan(1e-9 * size + 1e-18);
          });
        });
      });
    });
  });
});

describe('a symmetric bay', () => {
  it('offers its two diagonals the same, and moves them alike', () => {
    const of = built(bay(wall(6000, [[4000, 'crossed']]), BOLTED), GUSSETED);
    const [rise, fall] = ['B/t1.rise', 'B/t1.fall'].map((id) => offeredAtCrossing(of, id));
    if (!rise || !fall) throw new Error('no diagonals');
    expect(rise.ellipse.stiff / fall.ellipse.stiff).toBeCloseTo(1, 9);
    expect(rise.ellipse.soft / fall.ellipse.soft).toBeCloseTo(1, 9);
  });

  it('gives mirrored movements for mirrored pushes', () => {
    const of = built(bay(wall(6000, [[4000, 'crossed']]), BOLTED), GUSSETED, {
      extraPlaces: new Map([
        ['B/t1.rise', [2000]],
        ['B/t1.fall', [2000]],
      ]),
    });
    const nodeAt = (id: string): number =>
      of.frame.along.get(id)?.find(({ at }) => Math.abs(at - 2000) < 1)?.node ?? -1;
    const left = movementUnder(of.solver, nodeAt('B/t1.rise'), [1, 0, 0.5]);
    const right = movementUnder(of.solver, nodeAt('B/t1.fall'), [-1, 0, 0.5]);
    const size = Math.hypot(...left);
    expect(Math.abs(left[0] + right[0])).toBeLessThan(1e-9 * size);
    expect(Math.abs(left[2] - right[2])).toBeLessThan(1e-9 * size);
  });
});

describe('the push test', () => {
  const given = bay(wall(6000, [[4000, 'crossed']]), BOLTED);
  const of = built(given, GUSSETED);
  const bar = diagonal(of, 'B/t1.rise');
  const test = (at: number) =>
    pushTest(
      of.layout,
      restraintContext(of.layout).holdings,
      of.bay,
      { E, G, ends: GUSSETED, tension: new Map() },
      { bar: bar.id, at, axes: bar.angle.placement },
    );

  it('gives at the place pushed what the ellipse says, and nothing at the supports', () => {
    const pushed = test(2500);
    const own = pushed?.alongX.find(({ bar: id }) => id === bar.id);
    const here = own?.points.find(({ at }) => Math.abs(at - 2500) < 1);
    const [xx = 0, xy = 0, yy = 0] = pushed?.ellipse?.matrix ?? [];
    const flexibility = yy / (xx * yy - xy * xy);
    expect(dot(here?.displacement ?? [0, 0, 0], bar.angle.placement.x) / flexibility).toBeCloseTo(1, 8);
    // Its foot is a foundation.
    expect(Math.hypot(...(own?.points[0]?.displacement ?? [1, 0, 0]))).toBe(0);
  });

  it('is far stiffer in the plane than out of it at the crossing, and softer away from it', () => {
    const crossing = test(bar.length / 2)?.ellipse;
    const quarter = test(bar.length / 4)?.ellipse;
    expect((crossing?.stiff ?? 0) / (crossing?.soft ?? 1)).toBeGreaterThan(1000);
    expect(quarter?.stiff ?? 0).toBeLessThan(crossing?.stiff ?? 0);
  });

  it('moves every diagonal of the bay with its points in order', () => {
    for (const { points } of test(2500)?.alongY ?? [])
      expect(points.map(({ at }) => at)).toEqual([...points.map(({ at }) => at)].sort((a, b) => a - b));
    expect(test(2500)?.alongY.map(({ bar: id }) => id)).toEqual(['B/t1.rise', 'B/t1.fall']);
  });
});

describe('a bay with a hold missing', () => {
  const corners: Readonly<Record<string, Vec3>> = {
    a: [0, 0, 0],
    b: [4000, 0, 0],
    c: [0, 0, 3000],
    d: [4000, 0, 3000],
  };
  const struts = [
    ['ac', 'a', 'c', 'strut'],
    ['bd', 'b', 'd', 'strut'],
    ['cd', 'c', 'd', 'strut'],
  ] as const;
  const named = (of: Built) =>
    of.solver.mechanisms().map((mechanism) => namedMechanism(of.frame, of.bay, mechanism));

  it('without a diagonal sways: both heads move to the side, and the three struts with them', () => {
    const of = built(
      bay(withMember(free(corners, [...struts, ['ab', 'a', 'b']], { free: ['c', 'd'] }), STRUT)),
    );
    const [mechanism, ...others] = of.solver.mechanisms();
    expect(others).toEqual([]);
    expect(mechanism?.moving.map(({ node }) => of.frame.nodes[node]?.name).sort()).toEqual([
      'node c',
      'node d',
    ]);
    for (const { displacement } of mechanism?.moving ?? []) {
      expect(Math.abs(displacement[0])).toBeCloseTo(1, 6);
      expect(Math.hypot(displacement[1], displacement[2])).toBeLessThan(1e-6);
    }
    expect([...(mechanism?.bars ?? [])].sort()).toEqual(['B/ac', 'B/bd', 'B/cd']);
    expect(named(of)[0]?.says).toMatch(/node c to the (right|left), node d to the (right|left)/);
  });

  it('with the diagonal stands', () => {
    const of = built(
      bay(withMember(free(corners, [...struts, ['ad', 'a', 'd']], { free: ['c', 'd'] }), STRUT)),
    );
    expect(of.solver.mechanisms()).toEqual([]);
  });

  it('with a diagonal whose end nothing holds swings about its other end', () => {
    const of = built(
      bay(
        free(
          { a: [0, 0, 0], b: [4000, 0, 3000], c: [4000, 0, 0], d: [0, 0, 3000] },
          [
            ['ab', 'a', 'b'],
            ['cd', 'c', 'd'],
          ],
          {
            free: ['b'],
          },
        ),
      ),
    );
    const [mechanism, ...others] = of.solver.mechanisms();
    expect(others).toEqual([]);
    // Three, four, five: square to the bar.
    const [moving] = mechanism?.moving ?? [];
    expect(of.frame.nodes[moving?.node ?? -1]?.name).toBe('node b');
    expect(Math.abs(moving?.displacement[0] ?? 0)).toBeCloseTo(0.6, 6);
    expect(Math.abs(moving?.displacement[2] ?? 0)).toBeCloseTo(0.8, 6);
    expect(mechanism?.bars).toEqual(['B/ab']);
    expect(named(of)[0]?.says).toMatch(/^node b (up|down)$/);
  });

  it('joined to its partner it is held again', () => {
    const free4 = free(
      { a: [0, 0, 0], b: [4000, 0, 3000], c: [4000, 0, 0], d: [0, 0, 3000] },
      [
        ['ab', 'a', 'b'],
        ['cd', 'c', 'd'],
      ],
      { free: ['b'] },
    );
    expect(built(bay(free4, { joins: { 'ab+cd': { kind: 'bolted' } } })).solver.mechanisms()).toEqual([]);
  });

  it('floating altogether moves in as many ways as a bar in a plane can', () => {
    const of = built(
      bay(
        free(
          { a: [0, 0, 0], b: [4000, 0, 3000], c: [4000, 0, 0], d: [0, 0, 3000] },
          [
            ['ab', 'a', 'b'],
            ['cd', 'c', 'd'],
          ],
          {
            free: ['a', 'b'],
          },
        ),
      ),
    );
    expect(of.solver.mechanisms()).toHaveLength(3);
  });

  it('never answers with a number that is none', () => {
    for (const recipe of [
      withMember(free(corners, [...struts, ['ab', 'a', 'b']], { free: ['c', 'd'] }), STRUT),
      withMember(free(corners, struts, { free: ['a', 'b', 'c', 'd'] }), STRUT),
    ]) {
      const { solver, frame } = built(bay(recipe));
      frame.nodes.forEach((_, node) => {
        for (const value of movementUnder(solver, node, [1, 1, 1])) expect(Number.isFinite(value)).toBe(true);
      });
    }
  });
});
