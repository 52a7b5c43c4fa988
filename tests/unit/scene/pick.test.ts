import { describe, expect, it } from 'vitest';
import { along } from '../../../core/geometry/vector.ts';
import { pickedBar, targetsOf } from '../../../renderer/scene/geometry/pick.ts';
import { steelwork } from '../../../renderer/scene/geometry/steelwork.ts';
import { isClick, pressAfter } from '../../../renderer/scene/pointer/press.ts';
import { pointerReach, sightAt } from '../../../renderer/scene/pointer/sight.ts';
import { namedView } from '../../../renderer/scene/view/namedView.ts';
import { onSheet, type SheetView } from '../../../renderer/scene/view/sheetView.ts';
import { crossedWall, laidOut } from './given/bays.ts';

const layout = laidOut(crossedWall());
const bay = layout.bays[0] ?? null;
const targets = targetsOf(steelwork(layout, 'true'), (id) => layout.bars.get(id)?.angle != null);

/** The wall of 6 m by 4 m in the middle of a sheet of 800 by 600 px. */
const sheet = (view: 'elevation' | 'axonometric'): SheetView => ({
  ...namedView(view, bay),
  centre: [3000, 0, 2000],
  pxPerMm: 0.1,
  width: 800,
  height: 600,
});

function picked(view: SheetView, key: string, part: number): string | null {
  const bar = layout.bars.get(`W1/${key}`);
  if (!bar) throw new Error(`no bar ${key}`);
  const at = onSheet(view, along(bar.from, bar.direction, part * bar.length));
  return pickedBar(targets, sightAt(view, at), pointerReach(view));
}

describe('picking a bar', () => {
  for (const name of ['elevation', 'axonometric'] as const) {
    it(`takes the bar that is pointed at in the ${name}`, () => {
      expect(picked(sheet(name), 't1.rise', 0.3)).toBe('W1/t1.rise');
      expect(picked(sheet(name), 't1.fall', 0.3)).toBe('W1/t1.fall');
    });
  }

  it('takes the nearer of two bars that cross', () => {
    // The falling diagonal lies on the near face of the gusset, which an elevation sees first.
    expect(picked(sheet('elevation'), 't1.rise', 0.5)).toBe('W1/t1.fall');
  });

  it('forgives a miss by a few px, and no more', () => {
    const view = sheet('elevation');
    const bar = layout.bars.get('W1/t1.rise');
    if (!bar) throw new Error('no bar');
    const [x, y] = onSheet(view, along(bar.from, bar.direction, 0.3 * bar.length));
    // A 70 mm leg is 7 px wide here: 4 to 5 px off the line of bolts leaves the steel on either side.
    expect(pickedBar(targets, sightAt(view, [x, y - 9]), pointerReach(view))).toBe('W1/t1.rise');
    expect(pickedBar(targets, sightAt(view, [x, y - 40]), pointerReach(view))).toBeNull();
  });

  it('takes nothing from behind a column', () => {
    const view = sheet('elevation');
    expect(pickedBar(targets, sightAt(view, onSheet(view, [0, 0, 2000])), pointerReach(view))).toBeNull();
  });
});

describe('a press', () => {
  const down = { kind: 'down', at: [10, 10], primary: true } as const;

  it('is a click when the pointer stays within four px', () => {
    const pressed = pressAfter({ state: 'idle' }, down);
    expect(isClick(pressAfter(pressed, { kind: 'move', at: [13, 11] }))).toBe(true);
  });

  it('is a drag, and no click, once it has travelled farther, even if it comes back', () => {
    const pressed = pressAfter({ state: 'idle' }, down);
    const away = pressAfter(pressed, { kind: 'move', at: [30, 10] });
    expect(isClick(pressAfter(away, { kind: 'move', at: [10, 10] }))).toBe(false);
  });

  it('is no click when a second finger or another button joins in', () => {
    const pressed = pressAfter({ state: 'idle' }, down);
    expect(isClick(pressAfter(pressed, { ...down, primary: false }))).toBe(false);
  });
});
