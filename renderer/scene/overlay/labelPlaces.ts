import type { Vec2 } from '../../../core/geometry/vector.ts';
import { type Box, crosses, grown, inside, overlap } from '../view/box.ts';

/** A label that wants a place beside its bar. */
export interface LabelWish {
  readonly key: string;
  readonly width: number;
  readonly height: number;
  /** The bar on the sheet, end i first. */
  readonly bar: readonly [Vec2, Vec2];
  /** Placed first, and never left out. */
  readonly must: boolean;
  /** Of the others those of greater weight are placed first. */
  readonly weight?: number;
}

export interface LabelPlace {
  readonly box: Box;
  /** Where its leader meets the bar, and where it meets the box. */
  readonly onBar: Vec2;
  readonly onBox: Vec2;
  /** Which of the candidates it is; given back next time, it keeps a label from hopping while the view turns. */
  readonly candidate: number;
}

/** Parts of the bar at which a label is tried, in order of preference. */
const PARTS = [0.72, 0.28, 0.64, 0.36, 0.8, 0.2, 0.56, 0.44] as const;
/** Where the label stands from there. */
const SIDES = ['right', 'left', 'above', 'below'] as const;

/** Length of a leader, px; a longer one where there is no fair place with the shorter. */
const LEADERS = [16, 40, 84, 140] as const;
const OF_A_LEADER = PARTS.length * SIDES.length;

/** Price of a wrong place. Covering a glyph, a ring or words a little costs more than any plain preference; labels never cover one another. */
const COST = {
  preference: 0.35,
  coveredPx: 0.3,
  outside: 500,
  onALine: 2.5,
  keepingPlace: -4,
  longer: 1.5,
} as const;

/** A label whose best place costs more is left out, unless it must be there. */
const TOO_DEAR = 14;

/**
 * Places for labels beside their bars: clear of each other, and of what is in the way and of the edges as far as may be. One after another,
 * those that must be shown first, then by weight; good, not optimal.
 *
 * @param inTheWay boxes that labels should not cover
 * @param lines that labels had better not cover, besides the bars
 * @param previous candidates taken last time, by key
 * @returns places by key; a label without a fair place is missing
 */
export function labelPlaces(
  wishes: readonly LabelWish[],
  inTheWay: readonly Box[],
  lines: readonly (readonly [Vec2, Vec2])[],
  sheet: Box,
  previous: ReadonlyMap<string, number>,
): ReadonlyMap<string, LabelPlace> {
  const labels: Box[] = [];
  const places = new Map<string, LabelPlace>();
  const inks = [...wishes.map((wish) => wish.bar), ...lines];
  const costOf = (wish: LabelWish, place: LabelPlace): number => {
    if (labels.some((box) => overlap(place.box, box) > 0)) return Number.POSITIVE_INFINITY;
    return (
      (place.candidate % OF_A_LEADER) * COST.preference +
      inTheWay.reduce((sum, box) => sum + overlap(place.box, box) * COST.coveredPx, 0) +
      (inside(place.box, sheet) ? 0 : COST.outside) +
      inks.filter((ink) => crosses(ink, place.box)).length * COST.onALine +
      (previous.get(wish.key) === place.candidate ? COST.keepingPlace : 0)
    );
  };
  const inOrder = wishes.toSorted(
    (a, b) => Number(b.must) - Number(a.must) || (b.weight ?? 0) - (a.weight ?? 0),
  );
  for (const wish of inOrder) {
    const had = Math.floor((previous.get(wish.key) ?? 0) / OF_A_LEADER);
    let best: LabelPlace | null = null;
    let least = Number.POSITIVE_INFINITY;
    for (const [far, leader] of LEADERS.entries()) {
      // With the longer leader only where the shorter finds nothing fair, or where it stands on a longer one already.
      if (far > had && least <= TOO_DEAR) break;
      for (const place of candidates(wish, far, leader)) {
        const cost = costOf(wish, place) + far * COST.longer;
        if (cost >= least) continue;
        least = cost;
        best = place;
      }
    }
    if (best === null || (least > TOO_DEAR && !wish.must)) continue;
    const kept = wish.must ? { ...best, ...pulledInside(best, sheet) } : best;
    labels.push(grown(kept.box, 2));
    places.set(wish.key, kept);
  }
  return places;
}

function candidates(wish: LabelWish, far: number, leader: number): readonly LabelPlace[] {
  const [i, j] = wish.bar;
  return PARTS.flatMap((part, p) =>
    SIDES.map((side, s): LabelPlace => {
      const onBar: Vec2 = [i[0] + (j[0] - i[0]) * part, i[1] + (j[1] - i[1]) * part];
      return {
        ...beside(onBar, side, wish, leader),
        onBar,
        candidate: far * OF_A_LEADER + p * SIDES.length + s,
      };
    }),
  );
}

function beside(
  at: Vec2,
  side: (typeof SIDES)[number],
  { width, height }: LabelWish,
  leader: number,
): Pick<LabelPlace, 'box' | 'onBox'> {
  const [x, y] = at;
  switch (side) {
    case 'right':
      return placed(x + leader, y - height / 2, [x + leader, y]);
    case 'left':
      return placed(x - leader - width, y - height / 2, [x - leader, y]);
    case 'above':
      return placed(x - width / 2, y - leader - height, [x, y - leader]);
    case 'below':
      return placed(x - width / 2, y + leader, [x, y + leader]);
    default:
      return side satisfies never;
  }

  function placed(left: number, top: number, onBox: Vec2): Pick<LabelPlace, 'box' | 'onBox'> {
    return { box: { left, top, width, height }, onBox };
  }
}

function pulledInside(place: LabelPlace, sheet: Box): Pick<LabelPlace, 'box' | 'onBox'> {
  const left = clamp(place.box.left, sheet.left, sheet.left + sheet.width - place.box.width);
  const top = clamp(place.box.top, sheet.top, sheet.top + sheet.height - place.box.height);
  const box = { ...place.box, left, top };
  return {
    box,
    onBox: [clamp(place.onBox[0], left, left + box.width), clamp(place.onBox[1], top, top + box.height)],
  };
}

function clamp(value: number, low: number, high: number): number {
  return Math.min(Math.max(value, low), Math.max(low, high));
}
