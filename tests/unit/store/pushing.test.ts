import { describe, expect, it } from 'vitest';
import { createStore } from 'zustand/vanilla';
import type { PushTest } from '../../../core/frame/pushing.ts';
import { pushOf } from '../../../core/study/study.ts';
import { NO_PUSH } from '../../../renderer/store/push.ts';
import {
  greatestForce,
  presentForce,
  pushedAt,
  pushPlaces,
  wayVector,
} from '../../../renderer/store/pushing.ts';
import { windowActions } from '../../../renderer/store/windowActions.ts';
import { firstState, type WindowState } from '../../../renderer/store/windowState.ts';
import { crossedTier, FALL, RISE } from '../documents/given.ts';

const assessment = crossedTier({ join: { kind: 'bolted' } });
const test = pushOf(assessment, RISE, 2500);
const angle = assessment.layout.bars.get(RISE)?.angle;
if (!test || !angle) throw new Error('the tier has no such bar');

function begun() {
  const store = createStore<WindowState>(() => firstState('light'));
  const actions = windowActions(store, () => 0);
  actions.selectBar(RISE);
  return { store, actions };
}

describe('where a bar is pushed', () => {
  it('is offered where it is joined, and at its quarter points beside', () => {
    expect(pushPlaces(assessment, RISE)).toEqual([
      { at: 1250, label: null },
      { at: 2500, label: 'D2' },
      { at: 3750, label: null },
    ]);
  });

  it('is its joined place to begin with, its middle where nothing is joined', () => {
    const { store } = begun();
    expect(pushedAt(store.getState(), assessment)).toBe(2500);
    expect(pushedAt(store.getState(), crossedTier({ join: { kind: 'none' } }))).toBe(2500);
  });

  it('is forgotten with the bar that it was meant for', () => {
    const { store, actions } = begun();
    actions.push({ at: 1250, force: [10, 0] });
    expect(pushedAt(store.getState(), assessment)).toBe(1250);
    actions.selectBar(FALL);
    expect(pushedAt(store.getState(), assessment)).toBe(2500);
    actions.push({ way: 'in plane' });
    expect(store.getState().pushing).toEqual({ ...NO_PUSH, bar: FALL, way: 'in plane' });
  });

  it('is left altogether when pushing is turned off', () => {
    const { store, actions } = begun();
    actions.setPushMode(true);
    actions.push({ most: 50 });
    actions.setPushMode(false);
    expect(store.getState().pushing).toEqual(NO_PUSH);
  });
});

describe('how hard a bar is pushed', () => {
  const soft = (stiffness: number): PushTest => ({
    ...test,
    ellipse: test.ellipse && { ...test.ellipse, soft: stiffness },
  });

  // A movement of up to 1/600 of 5 m, 8.3 mm, is small: 1 kN from 120 N/mm on, 0.1 kN from 12 N/mm on.
  it('is a round force under which the bar moves no farther than a linear answer is good for', () => {
    expect([130, 119, 13, 1.3].map((stiffness) => greatestForce(NO_PUSH, soft(stiffness), 5000))).toEqual([
      1000, 100, 100, 10,
    ]);
    expect(greatestForce({ ...NO_PUSH, bar: RISE, most: 42 }, test, 5000)).toBe(42);
    expect(greatestForce({ ...NO_PUSH, bar: FALL, most: 42 }, test, 5000)).toBe(100);
  });

  it('is all of it the way that is set, until a hand says otherwise', () => {
    const [x, y] = wayVector('in plane', angle);
    expect(presentForce({ ...NO_PUSH, bar: RISE, way: 'in plane' }, test, angle, 5000)).toEqual([
      100 * x,
      100 * y,
    ]);
    expect(presentForce({ ...NO_PUSH, bar: RISE, force: [3, 4] }, test, angle, 5000)).toEqual([3, 4]);
  });
});
