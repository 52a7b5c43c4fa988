import { type JSX, useId } from 'react';
import type { StockAngle } from '../../../core/catalogue/model.ts';
import { add, dot, subtract, type Vec2 } from '../../../core/geometry/vector.ts';
import type { Bar, BarId, Crossing, Layout } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { isCentred } from '../../../core/section/barShape.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { type SeenSection, seenPartner, seenSection } from '../card/sectionGeometry.ts';

interface CrossingPictureProps {
  readonly crossing: Crossing;
  readonly layout: Layout;
  readonly readBar: BarId;
  readonly units: UnitSystem;
}

const SIZE = 124;
const MIDDLE = SIZE / 2;
const RADIUS = 60;
/** mm between the faces beyond which a picture of both shows neither. */
const FAR = 60;
/** mm from leg to leg below which the gusset says on which side the other one lies. */
const TOUCH = 0.5;

/** The crossing cut through: both legs at their true distance, the packer and the bolt if there are any. */
export function CrossingPicture({
  crossing,
  layout,
  readBar,
  units,
}: CrossingPictureProps): JSX.Element | null {
  const clip = useId();
  const bar = layout.bars.get(readBar);
  const other = layout.bars.get(crossing.a === readBar ? crossing.b : crossing.a);
  if (bar?.angle?.stock == null || other === undefined) return null;
  if (!isBoltedFaceToFace(bar.angle.stock) || (other.angle?.stock && !isBoltedFaceToFace(other.angle.stock)))
    return <p className="crossing-far">{withoutPicture(crossing, bar, other, units)}</p>;
  if (crossing.gap > FAR)
    return (
      <p className="crossing-far">
        {showLength(crossing.gap, units, 'small')} between {bar.mark} and {other.mark}, for a cleat or hanger
        to bridge.
      </p>
    );
  const seen = seenSection(bar, bar.angle, bar.angle.stock);
  const facing = faceTowards(seen, crossing, other, bar);
  const scale = pictureScale(seen, crossing);
  const centre = facing.centre;
  const onSheet = ([x, y]: Vec2): Vec2 => [
    MIDDLE + (x - centre[0]) * scale,
    MIDDLE - (y - centre[1]) * scale,
  ];
  const partner = other.angle === null ? facing.strip : seenPartner(bar, bar.angle, bar.angle.stock, other);
  const { join } = crossing;
  return (
    <div className="crossing-picture">
      <svg width={SIZE} height={SIZE} role="img" aria-label="Section through the crossing, true to scale">
        <clipPath id={clip}>
          <circle cx={MIDDLE} cy={MIDDLE} r={RADIUS} />
        </clipPath>
        <circle cx={MIDDLE} cy={MIDDLE} r={RADIUS} fill="var(--sheet)" />
        <g clipPath={`url(#${clip})`}>
          {join?.kind === 'packed' && (
            <path className="crossing-packer" d={closed(facing.packer.map(onSheet))} />
          )}
          {partner !== null && <path className="crossing-other" d={closed(partner.map(onSheet))} />}
          <path className="section-angle" d={closed(seen.outline.map(onSheet))} />
          {(join?.kind === 'bolted' || join?.kind === 'packed' || join?.kind === 'purlin') && (
            <>
              <path className="crossing-bolt" d={closed(facing.bolt.map(onSheet))} />
              {facing.heads.map((head) => (
                <path key={head.join()} className="crossing-bolt" d={closed(head.map(onSheet))} />
              ))}
            </>
          )}
        </g>
        <circle cx={MIDDLE} cy={MIDDLE} r={RADIUS} fill="none" stroke="var(--ink)" strokeWidth="1.3" />
      </svg>
      <div>
        <b>Cut through</b>
        <p className="second">true to scale, {bar.mark} in yellow, seen from its end i</p>
        <p className="second">{gapText(crossing, units)}</p>
        {crossing.clash && <p className="crossing-clash">They run into each other.</p>}
      </div>
    </div>
  );
}

/** Rods, tubes and pairs have the gusset through their middle: they meet otherwise than face to face. */
function isBoltedFaceToFace({ outline: { shape } }: StockAngle): boolean {
  return shape === undefined || !isCentred(shape);
}

function withoutPicture({ clash, gap }: Crossing, bar: Bar, other: Bar, units: UnitSystem): string {
  if (clash)
    return `${bar.mark} and ${other.mark} run through each other by ${showLength(-gap, units, 'small')}: the gusset goes through the middle of both. Cut one and plate it.`;
  return gap < TOUCH
    ? `${bar.mark} and ${other.mark} touch, or are bent past each other.`
    : `${showLength(gap, units, 'small')} between ${bar.mark} and ${other.mark}.`;
}

function gapText({ gap }: Crossing, units: UnitSystem): string {
  if (gap < -0.5) return `overlap of ${showLength(-gap, units, 'small')}`;
  return gap < 0.5 ? 'leg to leg' : `${showLength(gap, units, 'small')} between the faces`;
}

interface Facing {
  readonly centre: Vec2;
  readonly packer: readonly Vec2[];
  readonly bolt: readonly Vec2[];
  readonly heads: readonly (readonly Vec2[])[];
  /** The face of a purlin or member as a strip. */
  readonly strip: readonly Vec2[];
}

/** How far a strip of a purlin is drawn, and half the bolt and its head, mm. */
const STRIP = 7;
const HALF_BOLT = 8;
const HALF_HEAD = 13;
const HEAD_DEEP = 9;

/** Where the faces meet: along "out of plane" by `o` and "in plane" by `p`, mm from the centroid of the read bar. */
function faceTowards(seen: SeenSection, crossing: Crossing, other: Bar, bar: Bar): Facing {
  const along = ([x, y]: Vec2, [dx, dy]: Vec2): number => x * dx + y * dy;
  const offs = seen.outline.map((point) => along(point, seen.outOfPlane));
  const ins = seen.outline.map((point) => along(point, seen.inPlane));
  const towards = sideOf(seen, other, bar);
  const thick = bar.angle?.stock?.outline.thickness ?? 6;
  const [least, most] = [Math.min(...offs), Math.max(...offs)];
  // Away from the gusset a bolt grips the leg from behind, within the angle.
  const behind =
    other.angle !== null && bar.angle?.stock?.outline.shape === undefined && towards !== gussetSide(seen);
  const face = behind ? (towards > 0 ? least + thick : most - thick) : towards > 0 ? most : least;
  const otherThick = other.angle?.stock?.outline.thickness ?? STRIP;
  const gap = Math.max(0, crossing.gap);
  const p = (Math.max(...ins) + Math.min(...ins)) / 2;
  const at = (o: number, q: number): Vec2 => [
    seen.outOfPlane[0] * o + seen.inPlane[0] * q,
    seen.outOfPlane[1] * o + seen.inPlane[1] * q,
  ];
  const box = (o1: number, o2: number, half: number): readonly Vec2[] => [
    at(o1, p - half),
    at(o2, p - half),
    at(o2, p + half),
    at(o1, p + half),
  ];
  const far = face + towards * (gap + otherThick);
  const near = face - towards * thick;
  return {
    centre: at(face + (towards * gap) / 2, p),
    packer: box(face, face + towards * gap, 24),
    bolt: box(near - towards * 4, far + towards * 4, HALF_BOLT),
    heads: [box(near, near - towards * HEAD_DEEP, HALF_HEAD), box(far, far + towards * HEAD_DEEP, HALF_HEAD)],
    strip: box(face + towards * gap, far, 400),
  };
}

const gussetSide = ({ gussetAt }: SeenSection): 1 | -1 => (gussetAt >= 0 ? 1 : -1);

/** On which side of the read bar the other one lies, along "out of plane". */
function sideOf(seen: SeenSection, other: Bar, bar: Bar): 1 | -1 {
  const out = bar.angle?.placement.outOfPlane;
  if (bar.angle === null || out === undefined) return gussetSide(seen);
  if (other.angle === null) return dot(other.offset, out) >= 0 ? 1 : -1;
  // Planes may lie apart: what counts is where the legs themselves are.
  const apart = dot(
    subtract(add(other.from, other.angle.placement.heel), add(bar.from, bar.angle.placement.heel)),
    out,
  );
  return Math.abs(apart) < TOUCH ? gussetSide(seen) : apart > 0 ? 1 : -1;
}

function pictureScale(seen: SeenSection, crossing: Crossing): number {
  const reach = Math.max(...seen.outline.map(([x, y]) => Math.hypot(x, y)));
  return RADIUS / (reach * 1.15 + Math.max(0, crossing.gap));
}

function closed(points: readonly Vec2[]): string {
  return `M${points.map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`;
}
