import { type JSX, useId } from 'react';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { CompassRing } from './CompassRing.tsx';
import type { Compass } from './compass.ts';
import type { SeenSection } from './sectionGeometry.ts';
import { CENTRE, RING } from './sectionPicture.ts';

interface SectionInPlaceProps {
  readonly name: string;
  readonly seen: SeenSection;
  /** Thickness of the gusset, mm. */
  readonly gusset: number;
  readonly compass: Compass;
  readonly partner: readonly Vec2[] | null;
  readonly units: UnitSystem;
}

const WIDTH = 216;
const HEIGHT = 204;
/** Room that the angle may take inside the ring, px from the centroid. */
const REACH = 71;

/** The true profile against its gusset, the partner dashed, the four axes, and the ring of held and free ways. */
export function SectionInPlace({
  name,
  seen,
  gusset,
  compass,
  partner,
  units,
}: SectionInPlaceProps): JSX.Element {
  const clip = useId();
  const reach = Math.max(...seen.outline.map(([x, y]) => Math.hypot(x, y)));
  const perMm = REACH / reach;
  const onSheet = ([x, y]: Vec2): Vec2 => [CENTRE[0] + x * perMm, CENTRE[1] - y * perMm];
  return (
    <svg className="section-picture" width={WIDTH} height={HEIGHT} role="img" aria-label={name}>
      <clipPath id={clip}>
        <circle cx={CENTRE[0]} cy={CENTRE[1]} r={RING - 5} />
      </clipPath>
      <g clipPath={`url(#${clip})`}>
        <path className="section-gusset" d={closed(gussetCorners(seen, gusset).map(onSheet))} />
        {partner !== null && <path className="section-partner" d={closed(partner.map(onSheet))} />}
        <path
          className="section-angle"
          fillRule="evenodd"
          d={
            closed(seen.outline.map(onSheet)) + (seen.hollow === null ? '' : closed(seen.hollow.map(onSheet)))
          }
        />
      </g>
      {(['x', 'y', 'u', 'v'] as const).map((axis) => (
        <AxisLine key={axis} name={axis} direction={seen.axes[axis]} />
      ))}
      <circle cx={CENTRE[0]} cy={CENTRE[1]} r="2" fill="var(--ink)" />
      <CompassRing free={typeof compass.free === 'string' ? compass.free : seen.inPicture(compass.free)} />
      <ScaleMark perMm={perMm} units={units} />
    </svg>
  );
}

function gussetCorners(seen: SeenSection, thickness: number): readonly Vec2[] {
  const [ox, oy] = seen.outOfPlane;
  const [px, py] = seen.inPlane;
  const far = 400;
  const corner = (off: number, along: number): Vec2 => {
    const o = seen.gussetAt + off;
    return [ox * o + px * along, oy * o + py * along];
  };
  const half = thickness / 2;
  return [corner(-half, -far), corner(half, -far), corner(half, far), corner(-half, far)];
}

function AxisLine({
  name,
  direction: [dx, dy],
}: {
  readonly name: string;
  readonly direction: Vec2;
}): JSX.Element {
  const long = RING - 9;
  const [x, y] = [dx * long, -dy * long];
  // The letter stands at the lower or left end, u and v a little further in, where the arcs leave room.
  const sign = y - x * 0.5 > 0 ? 1 : -1;
  const at = name === 'x' || name === 'y' ? 0.84 : 0.8;
  return (
    <>
      <path
        className="section-axis"
        d={`M${CENTRE[0] - x} ${CENTRE[1] - y}L${CENTRE[0] + x} ${CENTRE[1] + y}`}
      />
      <text
        className="section-letter"
        textAnchor="middle"
        x={CENTRE[0] + sign * x * at + (Math.abs(x) < Math.abs(y) ? -9 : 0)}
        y={CENTRE[1] + sign * y * at + (Math.abs(x) < Math.abs(y) ? 4 : 14)}
      >
        {name}
      </text>
    </>
  );
}

function ScaleMark({ perMm, units }: { readonly perMm: number; readonly units: UnitSystem }): JSX.Element {
  const mm = units === 'us' ? 25.4 : 20;
  const wide = mm * perMm;
  return (
    <>
      <path d={`M2 196h${wide}M2 193v6M${2 + wide} 193v6`} stroke="var(--ink2)" fill="none" />
      <text className="section-scale" x={wide + 7} y="200">
        {units === 'us' ? '1 in' : '20 mm'}
      </text>
    </>
  );
}

function closed(points: readonly Vec2[]): string {
  return `M${points.map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`;
}
