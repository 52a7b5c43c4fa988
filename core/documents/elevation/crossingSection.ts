import { add, dot, scale, type Vec3 } from '../../geometry/vector.ts';
import { joinName } from '../../layout/joinWords.ts';
import type { AngleBar, Bar, Crossing, Layout, Plane } from '../../layout/model.ts';
import type { UnitSystem } from '../../project/model.ts';
import { outlinePolygon } from '../../section/outlinePath.ts';
import { showLength } from '../../units/quantity.ts';
import { listed } from '../listed.ts';
import { type Markup, markup } from '../markup.ts';
import { placedText } from '../placedText.ts';
import { closedPath } from './path.ts';
import { acrossOf, type Point } from './view.ts';

export interface CrossingSection {
  readonly svg: Markup;
  readonly caption: string;
}

const WIDTH = 226;
const HEIGHT = 122;
/** For the dimension of the gap, below. */
const FOOT = 24;
const ARC_STEPS = 6;

/**
 * Two diagonals at their crossing, each cut square to itself and set beside the other with its true distance from the middle of the
 * gusset: near side to the left. Null where a section is not in stock.
 */
export function crossingSection(
  crossing: Crossing,
  layout: Layout,
  plane: Plane,
  units: UnitSystem,
): CrossingSection | null {
  const [a, b] = [layout.bars.get(crossing.a), layout.bars.get(crossing.b)];
  const cuts = [a, b].flatMap((bar) => (bar ? (cutThrough(bar, plane) ?? []) : []));
  if (cuts.length < 2) return null;

  const all = cuts.flatMap(({ outline }) => outline);
  const [left, right] = [Math.min(...all.map(([x]) => x)), Math.max(...all.map(([x]) => x))];
  const [low, high] = [Math.min(...all.map(([, y]) => y)), Math.max(...all.map(([, y]) => y))];
  const pxPerMm = Math.min((WIDTH - 40) / (right - left), (HEIGHT - FOOT - 10) / (high - low));
  const onSheet = ([x, y]: Point): Point => [
    20 + (x - left) * pxPerMm + (WIDTH - 40 - (right - left) * pxPerMm) / 2,
    10 + (high - y) * pxPerMm,
  ];
  const middle = onSheet([0, 0])[0];
  const base = 10 + (high - low) * pxPerMm;

  const drawn = cuts.map(({ outline, bar, angle }, index) => {
    const label = labelPlace(outline, onSheet);
    // Bars that run into each other lie on one another here, and share a label.
    const hides = crossing.clash && index > 0;
    const name = crossing.clash ? listed(cuts.map((cut) => cut.bar.mark)) : bar.mark;
    return markup`<path class="${hides ? 'edh' : angle.side === 'far' ? 'cutfar' : 'cutnear'}" d="${closedPath(outline.map(onSheet))}"/><text class="strong halo" x="${label[0]}" y="${label[1]}" text-anchor="middle">${hides ? '' : name}</text>`;
  });
  const faces = facesOf(cuts, crossing);
  const gap =
    faces === null
      ? null
      : markup`${packer(crossing, faces, onSheet, low, high)}<path class="dim" d="M${onSheet([faces[0], 0])[0]} ${base + 2}v18M${onSheet([faces[1], 0])[0]} ${base + 2}v18M${onSheet([faces[0], 0])[0] - 16} ${base + 16}H${onSheet([faces[1], 0])[0] + 16}"/><text x="${onSheet([faces[1], 0])[0] + 20}" y="${base + 20}">${showLength(crossing.gap, units, 'small')}</text>`;
  return {
    svg: markup`<svg width="${WIDTH}" height="${base + FOOT}" viewBox="0 0 ${WIDTH} ${base + FOOT}" role="img" aria-label="Section at the crossing">${drawn}<path class="ax" d="M${middle} 2V${base + 12}"/>${gap}</svg>`,
    caption: captionOf(cuts, crossing),
  };
}

interface Cut {
  readonly bar: Bar;
  readonly angle: AngleBar;
  /** mm from the middle of the gusset to the right (away from the near side), and up the plane. */
  readonly outline: readonly Point[];
}

function cutThrough(bar: Bar, plane: Plane): Cut | null {
  const { angle } = bar;
  const across = acrossOf(plane, bar.direction);
  if (angle?.stock == null || across === null) return null;
  const up = dot(across, plane.up) < 0 ? scale(across, -1) : across;
  const { heel, x, y } = angle.placement;
  const outline = outlinePolygon(angle.stock.outline, ARC_STEPS).map(([alongShort, alongLong]): Point => {
    const at: Vec3 = add(add(heel, scale(x, alongShort)), scale(y, alongLong));
    return [-dot(at, plane.normal), dot(at, up)];
  });
  return { bar, angle, outline };
}

/** The faces that meet, mm, where the bars lie one on each side. */
function facesOf(cuts: readonly Cut[], { gap }: Crossing): readonly [number, number] | null {
  const near = cuts.find(({ angle }) => angle.side === 'near');
  const far = cuts.find(({ angle }) => angle.side === 'far');
  if (!near || !far || gap < 0) return null;
  return [Math.max(...near.outline.map(([x]) => x)), Math.min(...far.outline.map(([x]) => x))];
}

/** The packer, as long as the legs that it lies between. */
function packer(
  crossing: Crossing,
  [from, to]: readonly [number, number],
  onSheet: (at: Point) => Point,
  low: number,
  high: number,
): Markup | null {
  if (crossing.join?.kind !== 'packed') return null;
  const middle = (low + high) / 2;
  const half = (high - low) / 4;
  return markup`<path class="packer" d="${closedPath(
    (
      [
        [from, middle - half],
        [to, middle - half],
        [to, middle + half],
        [from, middle + half],
      ] as const
    ).map(onSheet),
  )}"/>`;
}

/** In the open corner between the legs. */
function labelPlace(outline: readonly Point[], onSheet: (at: Point) => Point): Point {
  const [xs, ys] = [outline.map(([x]) => x), outline.map(([, y]) => y)];
  const middle: Point = [(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2];
  const heel = outline[0] ?? middle;
  const away = 0.18;
  const [x, y] = onSheet([
    middle[0] + (middle[0] - heel[0]) * away,
    middle[1] + (middle[1] - heel[1]) * away,
  ]);
  return [x, y + 4];
}

function captionOf(cuts: readonly Cut[], { join, clash, gap }: Crossing): string {
  const placed = cuts
    .map(({ bar, angle }) => {
      const shape = angle.stock?.outline.shape?.kind ?? null;
      return `${bar.mark} ${placedText({ shape, side: angle.side, heel: angle.spec.heel })}`;
    })
    .join('; ');
  if (clash)
    return `${placed}. Both cannot pass: they run into each other by ${Math.round(-gap)} mm. ${sentence(joinName(join))}.`;
  return `${placed}. ${sentence(joinName(join))}.`;
}

function sentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
