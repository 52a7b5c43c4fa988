import type { Frame, Mechanism } from '../frame/model.ts';
import { dot, type Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Plane } from '../layout/model.ts';
import type { NamedMechanism } from './model.ts';

/** So many places say enough of a motion. */
const MOST_PLACES = 3;

/** A mechanism in words: which places move, and which way in the bay's own directions. */
export function namedMechanism(frame: Frame, bay: BayLayout, mechanism: Mechanism): NamedMechanism {
  const plane = bay.planes[0];
  const places = mechanism.moving
    .slice(0, MOST_PLACES)
    .map(({ node, displacement }) =>
      `${frame.nodes[node]?.name ?? 'a node'} ${plane ? wayInWords(displacement, plane) : ''}`.trim(),
    );
  const others = mechanism.moving.length - places.length;
  return { says: `${places.join(', ')}${others > 0 ? ` and ${others} more` : ''}`, bars: mechanism.bars };
}

function wayInWords(d: Vec3, plane: Plane): string {
  const ways: readonly (readonly [number, string, string])[] = [
    [dot(d, plane.right), 'to the right', 'to the left'],
    [dot(d, plane.up), 'up', 'down'],
    [dot(d, plane.normal), 'outwards', 'inwards'],
  ];
  const [most] = [...ways].sort((a, b) => Math.abs(b[0]) - Math.abs(a[0]));
  return most ? (most[0] > 0 ? most[1] : most[2]) : '';
}
