import type { PushTest } from '../../../core/frame/pushing.ts';

/** The greatest push is drawn as about this share of the bar's length. */
const SHARE = 0.3;

/** How many times its size a movement is drawn: a round number, one for all directions, so that what is stiff is seen to be. */
export function pushTimes(test: PushTest, most: number, length: number): number {
  const soft = test.ellipse?.soft;
  if (soft === undefined || !(most > 0)) return 1;
  const wanted = (SHARE * length) / (most / soft);
  const power = 10 ** Math.floor(Math.log10(wanted));
  const round = [8, 6, 5, 4, 3, 2, 1].find((each) => each * power <= wanted) ?? 1;
  return Math.max(1, round * power);
}
