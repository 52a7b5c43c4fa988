/** The axes in the corner of the drawing, seen from anywhere. */
import { describe, expect, it } from 'vitest';
import { triadInk } from '../../../renderer/scene/drawing/cornerInk.ts';
import { quarterTurned, type ViewDirections } from '../../../renderer/scene/view/namedView.ts';

const SHEET = { width: 700, height: 480, pxPerMm: 0.05, centre: [0, 0, 0] } as const;
const ALONG_Y: ViewDirections = { right: [1, 0, 0], up: [0, 0, 1], towards: [0, -1, 0] };
const PLAN: ViewDirections = { right: [1, 0, 0], up: [0, 1, 0], towards: [0, 0, 1] };

/** The view turned about the upright, degrees, and looking down by so many. */
function seen(turn: number, down: number): ViewDirections {
  const [a, d] = [(turn * Math.PI) / 180, (down * Math.PI) / 180];
  const [c, s, cd, sd] = [Math.cos(a), Math.sin(a), Math.cos(d), Math.sin(d)];
  return { right: [c, s, 0], up: [-s * sd, c * sd, cd], towards: [s * cd, -c * cd, sd] };
}

const names = (view: ViewDirections) =>
  triadInk({ ...SHEET, ...view }).flatMap((ink) => (ink.kind === 'words' ? [ink] : []));

describe('the names of the axes', () => {
  it('never lie on one another, and never leave the sheet, however the view is turned', () => {
    const views = [ALONG_Y, PLAN, quarterTurned(PLAN), quarterTurned(quarterTurned(PLAN))];
    for (let turn = 0; turn < 360; turn += 3) for (const down of [0, 9, 36, 80]) views.push(seen(turn, down));
    for (const view of views) {
      const all = names(view);
      all.forEach(({ at, text }, index) => {
        expect(at[0], text).toBeGreaterThan(6);
        expect(at[1], text).toBeLessThan(SHEET.height - 2);
        // Letters of 12 px: nearer than 9 they touch.
        for (const other of all.slice(index + 1))
          expect(Math.hypot(other.at[0] - at[0], other.at[1] - at[1])).toBeGreaterThan(9);
      });
    }
  });
});

describe('a plan turned a quarter', () => {
  it('has to the right what it had upwards, and is seen from the same side', () => {
    const { right, up, towards } = quarterTurned(PLAN);
    expect(right).toEqual([0, 1, 0]);
    expect(up.map((each) => each + 0)).toEqual([-1, 0, 0]);
    expect(towards).toEqual(PLAN.towards);
  });
});
