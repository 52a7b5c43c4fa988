import type { Stock, StockAngle } from '../catalogue/model.ts';
import { dot, type Vec3 } from '../geometry/vector.ts';
import type { BarMark, Bay, DiagonalSpec, EndConnection } from '../project/model.ts';
import { extentOf, isCentred } from '../section/barShape.ts';
import { usualGauge } from '../section/gauge.ts';
import type { Placement, Plane } from './model.ts';
import { placementOf } from './placement.ts';
import type { SketchBar } from './sketch.ts';

/** A bar of angle before its crossings are known. */
export interface AngleDraft {
  readonly spec: DiagonalSpec;
  readonly mark: BarMark;
  readonly side: 'near' | 'far';
  readonly ends: { readonly i: EndConnection; readonly j: EndConnection };
  readonly stock: StockAngle | null;
  readonly nearest: readonly string[];
  readonly inclination: number;
  readonly placement: Placement;
}

const NO_MARK: BarMark = {};
/** Gauge to draw with while the section is unknown, mm. */
const UNKNOWN_GAUGE = 40;

/** The bay's diagonals with the bar's own marks laid over, its section looked up and put in place. */
export function angleDraft(
  bay: Bay,
  sketch: SketchBar,
  direction: Vec3,
  plane: Plane,
  stock: Stock,
): AngleDraft {
  const mark = bay.bars[sketch.key] ?? NO_MARK;
  const base = bay.diagonals;
  const named: DiagonalSpec = {
    ...base,
    section: mark.section ?? base.section,
    grade: mark.grade ?? base.grade,
    countedOn: mark.countedOn ?? base.countedOn,
    legInPlane: mark.legInPlane ?? base.legInPlane,
    heel: mark.heel ?? base.heel,
  };
  const side = mark.side ?? (base.arrangement === 'opposite' ? sketch.face.opposite : sketch.face.sameSide);
  const found = stock.find(named.section);
  const angle = found.ok ? found.angle : null;
  const shape = angle?.outline.shape ?? null;
  // Only an angle has a leg to turn.
  const spec: DiagonalSpec = shape ? { ...named, legInPlane: 'longer' } : named;
  const ends = {
    i: mark.endI ? { ...base.ends, ...mark.endI } : base.ends,
    j: mark.endJ ? { ...base.ends, ...mark.endJ } : base.ends,
  };
  return {
    spec,
    mark,
    side,
    ends,
    stock: angle,
    nearest: found.ok ? [] : found.nearest,
    inclination: inclinationOf(direction, plane),
    placement: placementOf({
      direction,
      plane,
      spec,
      side,
      roll: mark.roll ?? 0,
      gauge: ends.i.gauge ?? (angle ? gaugeOf(angle, spec.legInPlane) : UNKNOWN_GAUGE),
      standsOff: shape && isCentred(shape) ? -extentOf(shape)[0] / 2 : spec.gusset / 2,
    }),
  };
}

/** To the level in an upright plane, whatever way the bar runs; along the eaves in a slope. Degrees. */
function inclinationOf(direction: Vec3, plane: Plane): number {
  const upright = Math.abs(plane.normal[2]) < 1e-6;
  const angle = upright
    ? Math.asin(Math.min(1, Math.abs(direction[2])))
    : Math.acos(Math.min(1, Math.abs(dot(direction, plane.right))));
  return (angle * 180) / Math.PI;
}

export function legInPlaneOf(angle: StockAngle, legInPlane: DiagonalSpec['legInPlane']): number {
  return legInPlane === 'longer' ? angle.outline.longLeg : angle.outline.shortLeg;
}

export function standingLegOf(angle: StockAngle, legInPlane: DiagonalSpec['legInPlane']): number {
  return legInPlane === 'longer' ? angle.outline.shortLeg : angle.outline.longLeg;
}

function gaugeOf(angle: StockAngle, legInPlane: DiagonalSpec['legInPlane']): number {
  const { shape } = angle.outline;
  // A pair is bolted on the line of its angles; the others on their middle.
  if (shape && shape.kind !== 'angles back to back') return extentOf(shape)[1] / 2;
  return usualGauge(legInPlaneOf(angle, legInPlane), angle.catalogue === 'us' ? 'us' : 'metric').gauge;
}
