import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PushTest } from '../../../core/frame/pushing.ts';
import { add, along, dot, scale, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import { pushOf, studyOf } from '../../../core/study/study.ts';
import { barShape, bayShape, placeMovement, pushMotion } from '../../../renderer/scene/bowing/drawnMotion.ts';
import { forceOfDrag, type Grip, stiffnessOf } from '../../../renderer/scene/bowing/forceOfDrag.ts';
import { motionInk } from '../../../renderer/scene/bowing/motionInk.ts';
import { isOnPushedPlace, placeUnder } from '../../../renderer/scene/bowing/placeUnder.ts';
import { pushInk } from '../../../renderer/scene/bowing/pushInk.ts';
import { forceAfterKey, placeAfterKey, pushKey } from '../../../renderer/scene/bowing/pushKeys.ts';
import { pushTimes } from '../../../renderer/scene/bowing/pushScale.ts';
import { dragOf, NOT_PUSHING, pushToolAfter } from '../../../renderer/scene/bowing/pushTool.ts';
import { stiffnessInk } from '../../../renderer/scene/bowing/stiffnessInk.ts';
import { type Ink, wordsBox } from '../../../renderer/scene/drawing/ink.ts';
import { type Box, inside, overlap } from '../../../renderer/scene/view/box.ts';
import { namedView } from '../../../renderer/scene/view/namedView.ts';
import { directionOnSheet, onSheet, type SheetView } from '../../../renderer/scene/view/sheetView.ts';
import { wayVector } from '../../../renderer/store/pushing.ts';
import { crossedTier, FALL, RISE } from '../documents/given.ts';

const assessment = crossedTier({ join: { kind: 'bolted' } });
const { layout } = assessment;
const bay = layout.bays[0];
const bar = layout.bars.get(RISE);
const angle = bar?.angle;
const test = pushOf(assessment, RISE, 2500);
if (!bay || !bar || !angle || !test?.ellipse) throw new Error('the tier has no such bar');
const { ellipse } = test;

const view: SheetView = {
  ...namedView('axonometric', bay),
  centre: [1500, 0, 2000],
  pxPerMm: 0.1,
  width: 800,
  height: 700,
};
const outOfPlane = wayVector('out of plane', angle);
const inPlane = wayVector('in plane', angle);

describe('what a push does, as it is drawn', () => {
  it('is the answers to one newton, scaled by the force and added', () => {
    const [x, y] = [placeMovement(test, [1, 0]), placeMovement(test, [0, 1])];
    const both = placeMovement(test, [200, -30]);
    both.forEach((mm, k) => {
      expect(mm).toBeCloseTo(200 * (x[k] ?? 0) - 30 * (y[k] ?? 0), 9);
    });
  });

  // 48EI/L³ from the partner and as much from the bar itself: 2 × 28.33 N/mm for 70×70×6, I = 368 840, over 5 m (METHODS.md, "The push test").
  // To 0.1 %, the accuracy of the rounding of I.
  it('moves the place by the force over the stiffness', () => {
    const force: Vec2 = [100 * outOfPlane[0], 100 * outOfPlane[1]];
    const stiffness = (2 * 48 * 200_000 * 368_840) / 5000 ** 3;
    expect(stiffnessOf(test, outOfPlane) / stiffness).toBeCloseTo(1, 3);
    expect(Math.hypot(...placeMovement(test, force)) / (100 / stiffness)).toBeCloseTo(1, 3);
  });

  it('is drawn so many times its size for every bar alike', () => {
    const motion = pushMotion(layout, test, [100, 0], 50);
    const twice = pushMotion(layout, test, [100, 0], 100);
    expect(motion.lines.map((line) => line.bar).sort()).toEqual([FALL, RISE].sort());
    motion.lines.forEach((line, k) => {
      line.points.forEach((point, p) => {
        const other = twice.lines[k]?.points[p]?.by ?? [0, 0, 0];
        point.by.forEach((mm, axis) => {
          expect(other[axis]).toBeCloseTo(2 * mm, 9);
        });
      });
    });
  });

  it('takes a round scale at which the soft way is well seen and no movement is drawn smaller than it is', () => {
    expect(pushTimes(test, 100, 5000)).toBe(800); // 0.3·5000 mm over 100 N / 56.7 N/mm is 850.
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e6, noNaN: true }), (force) => {
        const times = pushTimes(test, force, 5000);
        expect(times).toBeGreaterThanOrEqual(1);
        if (times > 1) expect((times * force) / ellipse.soft).toBeLessThanOrEqual(1500.001);
      }),
      { seed: 7, numRuns: 100 },
    );
  });
});

describe('the words of a push', () => {
  const force: Vec2 = [300 * outOfPlane[0], 300 * outOfPlane[1]];
  const motion = pushMotion(layout, test, force, 200);
  const sheet: Box = { left: 0, top: 0, width: view.width, height: view.height };
  type Words = Extract<Ink, { readonly kind: 'words' }>;
  const wordsIn = (inks: readonly Ink[]): readonly Words[] => inks.filter((ink) => ink.kind === 'words');

  it('go where there is room, and are left out where there is none', () => {
    const free = wordsIn(motionInk(view, layout, motion, 1));
    expect(free.map(({ key }) => key).sort()).toEqual([FALL, RISE].map((id) => `motion ${id} word`).sort());
    const taken = free.map(wordsBox);
    const moved = wordsIn(motionInk(view, layout, motion, 1, taken));
    expect(moved).toHaveLength(2);
    for (const word of moved) for (const box of taken) expect(overlap(wordsBox(word), box)).toBe(0);
    expect(wordsIn(motionInk(view, layout, motion, 1, [sheet]))).toEqual([]);
  });

  it.each(['top', 'right', 'bottom', 'left'] as const)(
    'stay on the sheet with the arrow when the place has moved near its %s',
    (edge) => {
      // Towards that edge, and away from it.
      const across = scale(edge === 'left' || edge === 'right' ? view.right : view.up, 300);
      const at = onSheet(view, along(bar.from, bar.direction, 2500));
      // The sheet is moved so that the place lies 30 px from its edge, where an arrow of 67 px has no room.
      const to: Vec2 = [
        edge === 'left' ? 30 : edge === 'right' ? view.width - 30 : view.width / 2,
        edge === 'top' ? 30 : edge === 'bottom' ? view.height - 30 : view.height / 2,
      ];
      const shift = [to[0] - at[0], to[1] - at[1]] as const;
      const near: SheetView = {
        ...view,
        centre: add(
          view.centre,
          add(scale(view.right, -shift[0] / view.pxPerMm), scale(view.up, shift[1] / view.pxPerMm)),
        ),
      };
      const place = onSheet(near, along(bar.from, bar.direction, 2500));
      expect(Math.hypot(place[0] - to[0], place[1] - to[1])).toBeLessThan(0.01); // Rounding.
      const inks = [1, -1].flatMap((sign) =>
        pushInk(near, {
          bar,
          at: 2500,
          force: scale(across, sign),
          most: 300,
          by: [0, 0, 0],
          forceSays: '0.300 kN',
          movementSays: '5.30 mm',
        }),
      );
      for (const word of wordsIn(inks)) expect(inside(wordsBox(word), sheet)).toBe(true);
      const heads = inks.flatMap((ink) => (ink.kind === 'path' && ink.key === 'push head' ? [ink.d] : []));
      expect(heads).toHaveLength(2);
      for (const [x = 0, y = 0] of heads.map((d) => /M(\S+) (\S+?)L/.exec(d)?.slice(1).map(Number) ?? [])) {
        expect(x).toBeGreaterThanOrEqual(0);
        expect(x).toBeLessThanOrEqual(view.width);
        expect(y).toBeGreaterThanOrEqual(0);
        expect(y).toBeLessThanOrEqual(view.height);
      }
    },
  );
});

describe('the force of a drag', () => {
  const grip = (change: Partial<Grip> = {}): Grip => ({
    view,
    angle,
    test,
    way: 'any way',
    most: 1e9,
    times: 100,
    ...change,
  });
  const inSpace = ([x, y]: Vec2): Vec3 =>
    [0, 1, 2].map(
      (k) => x * (angle.placement.x[k] ?? 0) + y * (angle.placement.y[k] ?? 0),
    ) as unknown as Vec3;
  const along = (way: Vec2, mm: number): Vec2 => {
    const [right, down] = directionOnSheet(view, inSpace(way));
    return [right * mm, down * mm];
  };

  it('takes the place as far as the hand went, drawn at its scale', () => {
    // 300 mm as drawn at 100 times its size are 3 mm.
    const force = forceOfDrag(grip(), along(outOfPlane, 300));
    expect(dot(placeMovement(test, force), inSpace(outOfPlane))).toBeCloseTo(3, 6);
  });

  it('stops at the greatest force, so that a stiff way hardly moves', () => {
    const force = forceOfDrag(grip({ most: 100 }), along(inPlane, 300));
    expect(Math.hypot(...force)).toBeCloseTo(100, 9);
    expect(Math.hypot(...placeMovement(test, force))).toBeLessThan(0.01);
  });

  it('means a way by name within 10° of it, and no other way where one is set', () => {
    const near = along([outOfPlane[0] + 0.1 * inPlane[0], outOfPlane[1] + 0.1 * inPlane[1]], 300);
    const [x, y] = forceOfDrag(grip(), near);
    expect(x * inPlane[0] + y * inPlane[1]).toBeCloseTo(0, 9);
    const [p, q] = forceOfDrag(grip({ way: 'in plane' }), near);
    expect(p * outOfPlane[0] + q * outOfPlane[1]).toBeCloseTo(0, 9);
  });

  it('takes upwards for towards the viewer, where the way is seen end on', () => {
    const front: SheetView = { ...view, ...namedView('elevation', bay) };
    const up = forceOfDrag(grip({ view: front, way: 'out of plane' }), [0, -40]);
    expect(dot(inSpace(up), front.towards)).toBeGreaterThan(0);
  });

  it('is nothing without a drag, or where the place moves without resistance', () => {
    expect(forceOfDrag(grip(), [0, 0])).toEqual([0, 0]);
    const loose: PushTest = { ...test, ellipse: null };
    expect(forceOfDrag(grip({ test: loose }), [50, 0])).toEqual([0, 0]);
  });
});

describe('the pointer that pushes', () => {
  const down = { kind: 'down', at: [10, 10], place: 2500 } as const;

  it('presses, drags, and lets go', () => {
    const pressed = pushToolAfter(NOT_PUSHING, down);
    expect(pressed).toEqual({ state: 'pressing', place: 2500, from: [10, 10] });
    expect(pushToolAfter(pressed, { kind: 'move', at: [12, 11] })).toBe(pressed);
    const dragged = pushToolAfter(pressed, { kind: 'move', at: [40, 30] });
    expect(dragOf(dragged)).toEqual([30, 20]);
    expect(dragOf(pushToolAfter(dragged, { kind: 'move', at: [11, 10] }))).toEqual([1, 0]);
    expect(pushToolAfter(dragged, { kind: 'up' })).toEqual(NOT_PUSHING);
    expect(pushToolAfter(dragged, { kind: 'cancel' })).toEqual(NOT_PUSHING);
  });

  it('heeds no second finger, and no movement while it holds nothing', () => {
    const pressed = pushToolAfter(NOT_PUSHING, down);
    expect(pushToolAfter(pressed, { ...down, place: 100 })).toBe(pressed);
    expect(pushToolAfter(NOT_PUSHING, { kind: 'move', at: [1, 1] })).toBe(NOT_PUSHING);
    expect(dragOf(NOT_PUSHING)).toEqual([0, 0]);
  });

  it('takes hold of the bar near its line, at a named place when near one, and nowhere else', () => {
    const i = onSheet(view, bar.from);
    const j = onSheet(view, bar.to);
    const on = (part: number): Vec2 => [i[0] + (j[0] - i[0]) * part, i[1] + (j[1] - i[1]) * part];
    expect(placeUnder(view, bar, on(0.505), [2500])).toBe(2500);
    expect(placeUnder(view, bar, on(0.3), [2500])).toBe(1500);
    expect(placeUnder(view, bar, on(1.2), [2500])).toBeNull();
    expect(placeUnder(view, bar, [on(0.5)[0] + 60, on(0.5)[1]], [2500])).toBeNull();
  });

  it('takes hold of the pushed place where it is drawn, however far from the bar', () => {
    const force: Vec2 = [300 * outOfPlane[0], 300 * outOfPlane[1]];
    const shown = {
      at: 2500,
      places: [],
      way: 'any way',
      test,
      most: 300,
      force,
      byHand: true,
      times: 200,
    } as const;
    const moved = scale(placeMovement(test, force), shown.times);
    const drawn = onSheet(view, add(along(bar.from, bar.direction, 2500), moved));
    expect(placeUnder(view, bar, drawn, [2500])).toBeNull();
    expect(isOnPushedPlace(view, bar, shown, drawn)).toBe(true);
    expect(isOnPushedPlace(view, bar, shown, [drawn[0] + 30, drawn[1]])).toBe(false);
    expect(isOnPushedPlace(view, bar, { ...shown, test: null }, drawn)).toBe(false);
  });
});

describe('the keys that push', () => {
  it('go from place to place, and with shift push in and out of the plane', () => {
    expect(pushKey('ArrowRight', false)).toEqual({ kind: 'place', step: 1 });
    expect(pushKey('ArrowUp', false)).toBeNull();
    expect(pushKey('Home', false)).toBeNull();
    expect(placeAfterKey([1000, 2500, 4000], 2500, 1)).toBe(4000);
    expect(placeAfterKey([1000, 2500, 4000], 1200, -1)).toBe(1000);
    expect(placeAfterKey([1000, 2500, 4000], 4000, 1)).toBe(4000);
  });

  it('add a tenth of the greatest force each, and no more than the greatest in all', () => {
    const up = pushKey('ArrowUp', true);
    if (up?.kind !== 'force') throw new Error('shift and up push');
    let force: Vec2 = [0, 0];
    for (let k = 0; k < 3; k++) force = forceAfterKey(force, up, 100, angle);
    expect(force[0] * outOfPlane[0] + force[1] * outOfPlane[1]).toBeCloseTo(30, 9);
    for (let k = 0; k < 30; k++) force = forceAfterKey(force, up, 100, angle);
    expect(Math.hypot(...force)).toBeCloseTo(100, 9);
  });
});

describe('computed shapes', () => {
  const study = studyOf(assessment, RISE);
  if (!study) throw new Error('the bar is assessed');

  it('are drawn to be seen, with still ends', () => {
    const [line] = barShape(bar, study.mode).lines;
    const far = line?.points.map(({ by }) => Math.hypot(...by)) ?? [];
    // 0.08 of 5 m; the ends of a pinned bar do not move, to the working accuracy of the mode.
    expect(Math.max(...far)).toBeCloseTo(400, 6);
    expect([far[0], far.at(-1)].map((mm) => (mm ?? 1) < 1e-6)).toEqual([true, true]);
  });

  it('of a bay move its farthest place as far, however small its numbers', () => {
    const shape = bayShape(layout, RISE, study.bay.movement);
    const far = shape.lines.flatMap(({ points }) => points.map(({ by }) => Math.hypot(...by)));
    expect(Math.max(...far)).toBeCloseTo(400, 6);
    expect(bayShape(layout, RISE, []).lines).toEqual([]);
  });

  it('swing through the straight bar to the other side', () => {
    const shape = barShape(bar, study.mode);
    const path = (part: number): string =>
      motionInk(view, layout, shape, part)
        .filter((ink) => ink.key === `motion ${RISE} line`)
        .map((ink) => (ink.kind === 'path' ? ink.d : ''))
        .join('');
    expect(path(1)).not.toBe(path(-1));
    // At rest neither ground nor ribs are left.
    expect(motionInk(view, layout, shape, 0).map(({ key }) => key)).toEqual([`motion ${RISE} line`]);
  });
});

describe('the sign for what a station offers', () => {
  it('keeps its size on the sheet however near the view comes', () => {
    const stations = assessment.diagonals.get(RISE)?.bowing?.stations ?? [];
    const reach = (near: SheetView): number => {
      const [ink] = stiffnessInk(near, bar, angle, stations);
      const middle = onSheet(near, [1500, 0, 2000]);
      const points = (ink?.kind === 'path' ? ink.d : '').match(/-?[\d.]+ -?[\d.]+/g) ?? [];
      return Math.max(
        ...points.map((text) => {
          const [x = 0, y = 0] = text.split(' ').map(Number);
          return Math.hypot(x - middle[0], y - middle[1]);
        }),
      );
    };
    expect(stations).toHaveLength(1);
    // A tenth of a px is what paths are rounded to.
    expect(Math.abs(reach(view) - reach({ ...view, pxPerMm: 1 }))).toBeLessThan(0.3);
  });
});
