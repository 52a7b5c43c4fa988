import type { JSX } from 'react';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import { CENTRE, RING } from './sectionPicture.ts';

/** Free to either side of the free direction, as the rule counts directions within 10° as one. */
const HALF = (10 * Math.PI) / 180;
const HATCH_STEP = 0.07;

/** A compass of motion: thick where the bar is left free, with earth hatching where it is held. `free` in the picture, up positive. */
export function CompassRing({ free }: { readonly free: 'every way' | 'no way' | Vec2 }): JSX.Element {
  if (free === 'every way') return <circle className="ring-free" cx={CENTRE[0]} cy={CENTRE[1]} r={RING} />;
  if (free === 'no way')
    return (
      <>
        <circle className="ring-held" cx={CENTRE[0]} cy={CENTRE[1]} r={RING} />
        <path className="ring-hatch" d={hatch(0, 2 * Math.PI)} />
      </>
    );
  const towards = Math.atan2(free[1], free[0]);
  const ways = [towards, towards + Math.PI];
  const held = ways.map((way) => [way + HALF, way + Math.PI - HALF] as const);
  return (
    <>
      <path className="ring-held" d={held.map(([from, to]) => arc(from, to)).join('')} />
      <path className="ring-hatch" d={held.map(([from, to]) => hatch(from, to)).join('')} />
      <path className="ring-free" d={ways.map((way) => arc(way - HALF, way + HALF)).join('')} />
      {ways.map((way) => (
        <path key={way} className="ring-arrow" d={arrow(way)} />
      ))}
    </>
  );
}

function at(angle: number, radius: number): string {
  return `${(CENTRE[0] + radius * Math.cos(angle)).toFixed(1)} ${(CENTRE[1] - radius * Math.sin(angle)).toFixed(1)}`;
}

function arc(from: number, to: number): string {
  return `M${at(from, RING)}A${RING} ${RING} 0 ${to - from > Math.PI ? 1 : 0} 0 ${at(to, RING)}`;
}

function hatch(from: number, to: number): string {
  const strokes = Math.round((to - from) / HATCH_STEP);
  return Array.from({ length: strokes + 1 }, (_, index) => {
    const angle = from + ((to - from) * index) / strokes;
    return `M${at(angle, RING)}L${at(angle + 0.045, RING + 5)}`;
  }).join('');
}

function arrow(way: number): string {
  return `M${at(way, RING + 14)}L${at(way + 0.06, RING + 5)}L${at(way - 0.06, RING + 5)}Z`;
}
