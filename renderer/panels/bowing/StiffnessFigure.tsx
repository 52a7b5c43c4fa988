import { type JSX, useId } from 'react';
import type { OfferedStation } from '../../../core/bowing/model.ts';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import { halfAxis } from '../../glyphs/stiffnessScale.ts';
import type { SeenSection } from '../card/sectionGeometry.ts';

/** tens: half-axes by the tens of the stiffness. true: half-axes by the movement under one and the same push. */
export type FigureScale = 'tens' | 'true';

interface StiffnessFigureProps {
  readonly name: string;
  readonly offered: OfferedStation;
  readonly seen: SeenSection;
  readonly scale: FigureScale;
  /** Of the two axes the one that the true scale is chosen for. */
  readonly axis: 'soft' | 'stiff';
  /** Width and height, px. */
  readonly size: number;
  /** Rings for what is wanted of a hold, N/mm. */
  readonly wanted: readonly { readonly stiffness: number; readonly kind: 'ideal' | 'needed' }[];
}

/** Room for the profile inside the ring, as a share of its radius. */
const REACH = 0.52;

/** What the framing offers at a station, looking along the bar: far out is soft, close in is stiff. */
export function StiffnessFigure({
  name,
  offered,
  seen,
  scale,
  axis,
  size,
  wanted,
}: StiffnessFigureProps): JSX.Element {
  const clip = useId();
  const middle = size / 2;
  const ring = middle - 2;
  const { stiff, soft, stiffWay } = offered.ellipse;
  const way = seen.inPicture(stiffWay);
  const [a, b] = halfAxes(stiff, soft, scale, axis);
  const turn = (Math.atan2(-way[1], way[0]) * 180) / Math.PI;
  const reach = Math.max(...seen.outline.map(([x, y]) => Math.hypot(x, y)));
  const perMm = (REACH * ring) / reach;
  const end = ([x, y]: Vec2, half: number): readonly [Vec2, Vec2] => [
    [middle + x * half, middle - y * half],
    [middle - x * half, middle + y * half],
  ];
  return (
    <svg className="stiffness-figure" width={size} height={size} role="img" aria-label={name}>
      <clipPath id={clip}>
        <circle cx={middle} cy={middle} r={ring} />
      </clipPath>
      <circle className="figure-ring" cx={middle} cy={middle} r={ring} />
      <path
        className="figure-angle"
        d={closed(seen.outline.map(([x, y]): Vec2 => [middle + x * perMm, middle - y * perMm]))}
      />
      {[seen.inPlane, seen.outOfPlane].map((direction) => (
        <path key={String(direction)} className="section-axis" d={lineOf(end(direction, ring - 3))} />
      ))}
      {scale === 'tens' &&
        wanted.map(({ stiffness, kind }) => (
          <circle
            key={`${kind} ${stiffness}`}
            className={`figure-wanted ${kind}`}
            cx={middle}
            cy={middle}
            r={ring * halfAxis(stiffness)}
          />
        ))}
      <g clipPath={`url(#${clip})`}>
        <ellipse
          className="figure-ellipse"
          rx={a * ring}
          ry={b * ring}
          transform={`translate(${middle} ${middle}) rotate(${turn.toFixed(2)})`}
        />
      </g>
      <circle cx={middle} cy={middle} r="2" fill="var(--ink)" />
    </svg>
  );
}

/** On the true scale the axis that is looked at takes this share of the ring, so that its ends are seen inside it. */
export const FILLED = 0.7;

/** Half-axes along the stiffer way and square to it, as shares of the ring. */
function halfAxes(
  stiff: number,
  soft: number,
  scale: FigureScale,
  axis: 'soft' | 'stiff',
): readonly [number, number] {
  if (scale === 'tens') return [halfAxis(stiff), halfAxis(soft)];
  const fills = axis === 'soft' ? soft : stiff;
  // The other axis may run far out of the ring; past a thousand rings a line is a line.
  return [Math.min(1000, (FILLED * fills) / stiff), Math.min(1000, (FILLED * fills) / soft)];
}

function lineOf([a, b]: readonly [Vec2, Vec2]): string {
  return `M${a[0]} ${a[1]}L${b[0]} ${b[1]}`;
}

function closed(points: readonly Vec2[]): string {
  return `M${points.map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`;
}
