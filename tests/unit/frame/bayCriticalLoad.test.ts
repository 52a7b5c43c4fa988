/** The whole bay's critical load against that of the pair, of the single bar, and of a column by formula. */
import { describe, expect, it } from 'vitest';
import { bayCriticalLoad } from '../../../core/frame/bayCriticalLoad.ts';
import type { FrameSpring } from '../../../core/frame/model.ts';
import { dot, unit2, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import { GUSSETED } from '../../../core/project/endFixity.ts';
import { criticalLoad } from '../../../core/stability/criticalLoad.ts';
import { type BarProblem, type EndRotation, PINNED } from '../../../core/stability/model.ts';
import { type PairBar, pairCriticalLoad } from '../../../core/stability/pair.ts';
import { along, built, crossed, type Diagonal, diagonal, offeredAtCrossing } from './bayGiven.ts';
import { E, element, frame, node, STIFFNESS } from './given.ts';

const SIZES: readonly (readonly [number, number, string])[] = [
  [6000, 4000, '70x70x6'],
  [8000, 1800, '50x50x5'],
  [6000, 4000, '125x75x8'],
];

function inSection({ angle }: Diagonal, way: Vec3): Vec2 {
  return unit2([dot(way, angle.placement.x), dot(way, angle.placement.y)]) ?? [1, 0];
}

function problemOf(bar: Diagonal, share: number, end: EndRotation = PINNED): BarProblem {
  return {
    E,
    length: bar.length,
    section: bar.section,
    holds: [],
    axial: [{ from: 0, to: bar.length, share }],
    endI: end,
    endJ: end,
    twist: null,
  };
}

/** The bar between pinned ends, its partner's end-on stiffness a spring, the way out of the plane shared. */
function pairBar(bar: Diagonal, share: number, normal: Vec3, spring: number, cut: boolean): PairBar {
  const problem = problemOf(bar, share);
  const { inPlane, outOfPlane } = bar.angle.placement;
  const [x, y] = inSection(bar, outOfPlane);
  const sign = dot(outOfPlane, normal) < 0 ? -1 : 1;
  return {
    problem: {
      ...problem,
      holds: [{ at: bar.length / 2, direction: inSection(bar, inPlane), stiffness: spring }],
    },
    crossingAt: bar.length / 2,
    outOfPlane: [x * sign, y * sign],
    cut,
  };
}

const euler = (bar: Diagonal): number => (Math.PI ** 2 * E * bar.section.Iv) / bar.length ** 2;

describe('a bay of one joined crossing, its diagonals hinged at their ends', () => {
  it.each(SIZES)(
    'buckles as the pair does whatever its partner carries: %d by %d, %s',
    (width, height, name) => {
      for (const cut of ['neither', 'cd', 'ab'] as const) {
        const join =
          cut === 'neither' ? ({ kind: 'bolted' } as const) : ({ kind: 'cut', cutBar: cut } as const);
        const of = built(crossed([width, height], name, join));
        const [ab, cd] = [diagonal(of, 'B/ab'), diagonal(of, 'B/cd')];
        const spring = along(offeredAtCrossing(of, 'B/ab'), inSection(ab, ab.angle.placement.inPlane));
        const normal = ab.angle.placement.outOfPlane;
        for (const taut of [-1, -0.4, 0.05, 0.3, 0.7]) {
          const whole = bayCriticalLoad(
            of.frame,
            new Map([
              ['B/ab', -1],
              ['B/cd', taut],
            ]),
            euler(ab),
          );
          const pair = pairCriticalLoad({
            bar: pairBar(ab, 1, normal, spring, cut === 'ab'),
            partner: pairBar(cd, -taut, normal, spring, cut === 'cd'),
          });
          const ratio = (whole.factor ?? 0) / (pair.factor ?? 1);
          // The plate at a cut ties the turns of both bars in the plane, which the pair leaves out: it can only do good, and does where the crossing is at rest.
          if (cut !== 'neither' && (pair.factor ?? 0) > 3.9 * euler(ab)) expect(ratio).toBeGreaterThan(0.999);
          // The pair takes the end-on stiffness of each partner as a spring in one direction; the frame lets the crossing move any way in the plane.
          else expect(Math.abs(ratio - 1), `${cut} cut, T/C ${taut}`).toBeLessThan(0.001);
          expect(whole.mechanisms).toEqual([]);
        }
      }
    },
  );

  it('gives the shape, largest one, at rest at the supports', () => {
    const of = built(crossed([6000, 4000], '125x75x8'));
    const { mode } = bayCriticalLoad(of.frame, new Map([['B/ab', -1]]), euler(diagonal(of, 'B/ab')));
    const sizes = mode.map(([a, b, c]) => Math.hypot(a, b, c));
    expect(Math.max(...sizes)).toBeCloseTo(1, 12);
    for (const { at, node: k } of of.frame.along.get('B/ab') ?? []) if (at === 0) expect(sizes[k]).toBe(0);
    // It leaves the plane, which is upright along X.
    const most = mode[sizes.indexOf(Math.max(...sizes))] ?? [0, 0, 0];
    expect(Math.abs(most[1])).toBeGreaterThan(0.99);
  });
});

describe('a bay whose crossing is not joined', () => {
  it.each(SIZES)('buckles as the single bar between its ends: %d by %d, %s', (width, height, name) => {
    const of = built(crossed([width, height], name, { kind: 'none' }));
    const ab = diagonal(of, 'B/ab');
    const whole = bayCriticalLoad(of.frame, new Map([['B/ab', -1]]), euler(ab));
    expect((whole.factor ?? 0) / euler(ab)).toBeCloseTo(1, 7);
  });

  it('and as the bar held against turning in the plane, where gussets are stiff', () => {
    for (const [width, height, name] of SIZES) {
      const of = built(crossed([width, height], name, { kind: 'none' }), GUSSETED);
      const ab = diagonal(of, 'B/ab');
      // Longer leg in the plane: slopes of the motion along y are held.
      const { N } = criticalLoad(problemOf(ab, 1, { alongX: 0, alongY: 'rigid' }));
      const whole = bayCriticalLoad(of.frame, new Map([['B/ab', -1]]), euler(ab));
      expect((whole.factor ?? 0) / (N ?? 1)).toBeCloseTo(1, 7);
    }
  });
});

describe('what has no critical load', () => {
  it('is a bay that nothing presses', () => {
    const of = built(crossed([6000, 4000], '70x70x6'));
    expect(bayCriticalLoad(of.frame, new Map([['B/ab', 1]]), 1e4)).toMatchObject({
      factor: null,
      mechanisms: [],
    });
  });

  it('is a mechanism, which is named instead', () => {
    const nodes = [node([0, 0, 0], 0, true), node([1000, 0, 0], 1)];
    const loose = frame(nodes, [
      element(nodes, [0, 1], [0, 1, 0], {}, [
        { end: 'i', about: [0, 0, 1] },
        { end: 'i', about: [0, 1, 0] },
      ]),
    ]);
    const { factor, mechanisms } = bayCriticalLoad(loose, new Map([['b0-1', -1]]), 1e4);
    expect(factor).toBeNull();
    expect(mechanisms.length).toBeGreaterThan(0);
  });
});

describe('frames by formula', () => {
  const H = 4000;
  const outwards = (k: number): FrameSpring => ({
    node: k,
    other: null,
    kind: 'displacement',
    direction: [0, 1, 0],
    stiffness: 1e9,
  });

  it('a cantilever buckles at π²EI/4L², in whichever way it is the weaker', () => {
    const nodes = [node([0, 0, 0], 0, true), node([0, 0, H], 1)];
    const { factor } = bayCriticalLoad(
      frame(nodes, [element(nodes, [0, 1], [1, 0, 0])]),
      new Map([['b0-1', -1]]),
      1e4,
    );
    expect((factor ?? 0) / ((Math.PI ** 2 * STIFFNESS.EIp) / (4 * H * H))).toBeCloseTo(1, 7);
  });

  it('two columns under a hinged beam sway together: each carries a cantilever’s load', () => {
    const nodes = [
      node([0, 0, 0], 0, true),
      node([0, 0, H], 1),
      node([5000, 0, H], 2),
      node([5000, 0, 0], 3, true),
    ];
    const hinged = (['i', 'j'] as const).map((end) => ({ end, about: [0, 1, 0] }) as const);
    const portal = frame(
      nodes,
      [
        element(nodes, [0, 1], [1, 0, 0]),
        element(nodes, [1, 2], [0, 0, 1], {}, hinged),
        element(nodes, [3, 2], [1, 0, 0]),
      ],
      [outwards(1), outwards(2)],
    );
    const both = bayCriticalLoad(
      portal,
      new Map([
        ['b0-1', -1],
        ['b3-2', -1],
      ]),
      1e4,
    );
    expect((both.factor ?? 0) / ((Math.PI ** 2 * STIFFNESS.EIp) / (4 * H * H))).toBeCloseTo(1, 6);
    // With the head held too, the columns are fixed at the foot and hinged, or clamped by nothing, at the head: 2.0457 times Euler's load.
    const braced = bayCriticalLoad(
      { ...portal, springs: [...portal.springs, { ...outwards(1), direction: [1, 0, 0] }] },
      new Map([
        ['b0-1', -1],
        ['b3-2', -1],
      ]),
      1e4,
    );
    expect((braced.factor ?? 0) / ((Math.PI ** 2 * STIFFNESS.EIp) / (H * H))).toBeCloseTo(2.0457, 3);
  });
});
