/** How the section lies: legs, heel, faces of the gusset, roll. The wall's plane is X–Z and its near side is −Y. */
import { describe, expect, it } from 'vitest';
import type { Vec3 } from '../../../core/geometry/vector.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import type { Placement } from '../../../core/layout/model.ts';
import type { BarMark, DiagonalSpec } from '../../../core/project/model.ts';
import { bay, project, roof, wall } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';
import { expectAt, expectNear } from '../assess/given/near.ts';

function placed(diagonals: Partial<DiagonalSpec> = {}, mark: BarMark = {}, key = 't1.rise'): Placement {
  const made = bay(wall(4000, [[4000, 'crossed']]), { diagonals, bars: { [key]: mark } });
  const placement = layOut(project([made]), stock()).bars.get(`B/${key}`)?.angle?.placement;
  if (!placement) throw new Error('not placed');
  return placement;
}

const H = Math.SQRT1_2;
/** Of the bar rising to the right at 45°: along it, and the two ways across it in the plane. */
const ALONG: Vec3 = [H, 0, H];
const UPPER_LEFT: Vec3 = [-H, 0, H];
const LOWER_RIGHT: Vec3 = [H, 0, -H];
const NEAR: Vec3 = [0, -1, 0];
const FAR: Vec3 = [0, 1, 0];
const times = (v: Vec3, k: number): Vec3 => [v[0] * k, v[1] * k, v[2] * k];
const sum = (a: Vec3, b: Vec3): Vec3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
/** Usual back mark of a leg of 70: 40, of 75: 45, of 125: 80 (practice-facts H2). Half a gusset of 10: 5. */

describe('the leg in the plane', () => {
  it('points down from a heel that is up', () => {
    expectAt(placed({ heel: 'up' }).y, LOWER_RIGHT);
  });

  it('points up from a heel that is down', () => {
    expectAt(placed({ heel: 'down' }).y, UPPER_LEFT);
  });

  it('is the longer or the shorter one, as asked', () => {
    const longer = placed({ section: '125x75x8', legInPlane: 'longer' });
    expectAt(longer.y, LOWER_RIGHT);
    expectAt(longer.x, FAR);
    const shorter = placed({ section: '125x75x8', legInPlane: 'shorter' });
    expectAt(shorter.x, LOWER_RIGHT);
    expectAt(shorter.y, FAR);
  });

  it('has the bolts on the set-out line: the heel lies a back mark away, on the face of the gusset', () => {
    expectAt(placed({ heel: 'up' }).heel, sum(times(UPPER_LEFT, 40), times(FAR, 5)));
    expectNear(placed({ section: '125x75x8', legInPlane: 'longer' }).gauge, 80);
    expectNear(placed({ section: '125x75x8', legInPlane: 'shorter' }).gauge, 45);
    expectAt(
      placed({ section: '125x75x8', legInPlane: 'shorter', heel: 'down', gusset: 12 }).heel,
      sum(times(LOWER_RIGHT, 45), times(FAR, 6)),
    );
  });

  it('takes a gauge of the user before the usual one', () => {
    expectNear(placed({}, { endI: { gauge: 33 } }).gauge, 33);
  });
});

describe('the standing leg', () => {
  it('stands on the far side for the first of a crossed pair, on the near side for the second, when opposite', () => {
    expectAt(placed({}, {}, 't1.rise').x, FAR);
    expectAt(placed({}, {}, 't1.fall').x, NEAR);
  });

  it('stands on the near side for both, when on the same side', () => {
    expectAt(placed({ arrangement: 'same side' }, {}, 't1.rise').x, NEAR);
    expectAt(placed({ arrangement: 'same side' }, {}, 't1.fall').x, NEAR);
  });

  it('stands where the bar’s own mark says', () => {
    expectAt(placed({}, { side: 'near' }).x, NEAR);
    expectAt(placed({}, { side: 'near' }).heel, sum(times(UPPER_LEFT, 40), times(NEAR, 5)));
  });

  it('hangs below a roof, whose near side is above', () => {
    const made = bay(roof(4000, 0, [[4000, 'crossed']]), { diagonals: { arrangement: 'same side' } });
    const layout = layOut(project([made]), stock());
    expectAt(layout.bars.get('B/a.p1.rise')?.angle?.placement.x, [0, 0, -1]);
    expectAt(layout.bars.get('B/a.p1.fall')?.angle?.placement.x, [0, 0, -1]);
    expect(layout.bars.get('B/a.p1.rise')?.angle?.side).toBe('far');
  });
});

describe('directions across the bar', () => {
  it('are in the plane and out of it, square to the bar and to each other', () => {
    const { inPlane, outOfPlane } = placed();
    const dot = (a: Vec3, b: Vec3) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    expectNear(dot(inPlane, ALONG), 0);
    expectNear(Math.abs(dot(inPlane, UPPER_LEFT)), 1);
    expectNear(Math.abs(dot(outOfPlane, NEAR)), 1);
  });
});

describe('a rolled section', () => {
  it('turns about the bar by the roll, right-handed from end i to end j, and the plane stays', () => {
    // e × (lower right) for e along the bar: ALONG × LOWER_RIGHT = [0·(−H) − H·0, H·H − H·(−H), 0] = [0, 1, 0] = FAR.
    const rolled = placed({}, { roll: 30 });
    const [c, s] = [Math.cos(Math.PI / 6), Math.sin(Math.PI / 6)];
    expectAt(rolled.y, sum(times(LOWER_RIGHT, c), times(FAR, s)));
    // ALONG × FAR = −LOWER_RIGHT.
    expectAt(rolled.x, sum(times(FAR, c), times(LOWER_RIGHT, -s)));
    expectAt(rolled.inPlane, placed().inPlane);
  });

  it('by 360° comes back to where it was', () => {
    expectAt(placed({}, { roll: 360 }).y, placed().y);
  });
});
