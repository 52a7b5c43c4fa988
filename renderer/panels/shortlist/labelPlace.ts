/** Where a name stands beside its dot: of a few places round it, the one that covers the least. */
import type { Candidate, Shortlist } from '../../../core/shortlist/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { shownSection } from '../../controls/figures.ts';
import { condensedWidth } from '../../controls/textWidth.ts';
import { candidateKey } from './candidateKey.ts';
import type { Chart } from './chart.ts';

export interface PlacedLabel {
  readonly key: string;
  readonly left: number;
  readonly wide: number;
  readonly baseline: number;
  readonly text: string;
  /** A line from the dot to a name that stands off; null when it stands close. */
  readonly leader: string | null;
}

type Dot = readonly [number, number];

const DEEP = 14;
/** px from the dot, right and down; the nearest first. */
const OFFSETS: readonly Dot[] = [
  [14, 4],
  [-4, 22],
  [-4, -13],
  [18, 34],
  [18, -28],
  [24, 52],
  [24, -46],
  [40, 70],
  [40, -66],
];

export function placedLabel(
  candidate: Candidate,
  chart: Chart,
  list: Shortlist,
  dots: readonly Dot[],
  others: readonly PlacedLabel[],
): PlacedLabel {
  const key = candidateKey(candidate);
  const isFirst = list.first !== null && key === candidateKey(list.first);
  const says = candidate.isPresent ? ' now' : isFirst ? ', lightest that passes' : '';
  const text = `${shownSection(candidate.designation)}${says}: ${showSlenderness(candidate.slenderness, candidate.limit)}`;
  const wide = condensedWidth(text, 12, 600);
  const [x, y] = chart.at(candidate);
  const places = OFFSETS.flatMap(([right, down]) => [
    { left: x + right, baseline: y + down, right },
    { left: x - right - wide, baseline: y + down, right },
  ]);
  const limit = chart.y(list.limit);
  let best = places[0] ?? { left: x, baseline: y, right: 0 };
  let least = Number.POSITIVE_INFINITY;
  places.forEach((place, index) => {
    const cost = costOf(place, wide, chart, limit, dots, others) + index * 0.15;
    if (cost < least) {
      least = cost;
      best = place;
    }
  });
  const far = Math.abs(best.baseline - y) > 24;
  const nearest = best.left > x ? best.left - 3 : best.left + wide + 3;
  return {
    key,
    left: best.left,
    wide,
    baseline: best.baseline,
    text,
    leader: far ? `M${x} ${y}L${nearest} ${best.baseline - 4}` : null,
  };
}

/** Dots and names covered, the limit line struck through, room left. */
function costOf(
  { left, baseline }: { readonly left: number; readonly baseline: number },
  wide: number,
  chart: Chart,
  limit: number,
  dots: readonly Dot[],
  others: readonly PlacedLabel[],
): number {
  const top = baseline - DEEP + 3;
  const bottom = baseline + 3;
  const right = left + wide;
  if (left < chart.left + 2 || right > chart.right || top < chart.top || bottom > chart.bottom) return 1000;
  const covered = dots.filter(
    ([x, y]) => x > left - 6 && x < right + 6 && y > top - 5 && y < bottom + 5,
  ).length;
  const struck = limit > top - 3 && limit < bottom + 3 ? 4 : 0;
  const met = others.filter(
    (other) =>
      other.left < right + 6 &&
      left < other.left + other.wide + 6 &&
      Math.abs(other.baseline - baseline) < DEEP,
  ).length;
  // The word "limit" stands at the right end, just above its line.
  const onWord = right > chart.right - 60 && bottom > limit - 20 && top < limit ? 5 : 0;
  return covered + struck + met * 8 + onWord;
}
