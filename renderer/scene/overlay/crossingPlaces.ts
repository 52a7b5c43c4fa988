import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { Crossing, CrossingId, Layout } from '../../../core/layout/model.ts';
import { from, heading } from '../drawing/ink.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';

/** How far a glyph moves along its diagonal where another is in its place, px. */
const ASIDE = 27;
/** Glyphs nearer than this lie on one another, px: the pointer reaches the upper one alone. */
const ON_ONE_ANOTHER = 9;
/** So many steps to either side are tried. */
const MOST_STEPS = 6;

/**
 * Where the glyphs of crossings stand on the sheet. Where two diagonals and a purlin meet at one point, the diagonals' own glyph keeps
 * the point, and those of the purlin stand a little along the diagonal that each belongs to; so do crossings that lie behind each other as
 * they are seen, as those of all tiers do from above.
 */
export function crossingPlaces(
  view: SheetView,
  layout: Layout,
  crossings: readonly Crossing[],
): ReadonlyMap<CrossingId, Vec2> {
  const taken = new TakenPlaces();
  const places = new Map<CrossingId, Vec2>();
  const inOrder = [...crossings].sort((a, b) => RANK[a.kind] - RANK[b.kind]);
  for (const crossing of inOrder) {
    const at = onSheet(view, crossing.at);
    const place = taken.isFree(at) ? at : aside(view, layout, crossing, at, taken);
    taken.take(place);
    places.set(crossing.id, place);
  }
  return places;
}

function aside(view: SheetView, layout: Layout, crossing: Crossing, at: Vec2, taken: TakenPlaces): Vec2 {
  const direction = layout.bars.get(crossing.a)?.direction ?? [1, 0, 0];
  const way = upSheet(heading(directionOnSheet(view, direction), 0.05 * view.pxPerMm) ?? [1, 0]);
  for (let step = 1; step <= MOST_STEPS; step++)
    for (const side of [step, -step]) {
      const place = from(at, way, side * ASIDE);
      if (taken.isFree(place)) return place;
    }
  return from(at, way, ASIDE);
}

const RANK: Readonly<Record<Crossing['kind'], number>> = { diagonals: 0, line: 1, member: 2 };

function upSheet(way: Vec2): Vec2 {
  return way[1] > 0 ? [-way[0], -way[1]] : way;
}

/** Places on the sheet by squares as wide as glyphs may be near, so that each looks at its neighbours alone. */
class TakenPlaces {
  readonly #squares = new Map<string, Vec2[]>();

  isFree([x, y]: Vec2): boolean {
    const [column, row] = squareOf([x, y]);
    for (let i = column - 1; i <= column + 1; i++)
      for (let j = row - 1; j <= row + 1; j++)
        for (const [a, b] of this.#squares.get(`${i} ${j}`) ?? [])
          if (Math.hypot(a - x, b - y) < ON_ONE_ANOTHER) return false;
    return true;
  }

  take(place: Vec2): void {
    const key = squareOf(place).join(' ');
    const here = this.#squares.get(key);
    if (here) here.push(place);
    else this.#squares.set(key, [place]);
  }
}

const squareOf = ([x, y]: Vec2): readonly [number, number] => [
  Math.floor(x / ON_ONE_ANOTHER),
  Math.floor(y / ON_ONE_ANOTHER),
];
