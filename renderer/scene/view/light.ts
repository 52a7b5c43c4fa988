import type { Vec3 } from '../../../core/geometry/vector.ts';
import { dot } from '../../../core/geometry/vector.ts';
import type { ViewDirections } from './namedView.ts';

/**
 * The drawing is lit from over the viewer's left shoulder: [right, up, towards the viewer]. Tops come out light, fronts mid and what
 * is turned to the right dark, whichever way the view turns.
 */
export const LIGHT: Vec3 = [-0.45, 0.8, 0.4];

/** Between these, facing turns to lit, and turned away to facing. The shader of the steel blends between them; flat drawings step. */
export const LIT = { from: 0.5, to: 0.85 } as const;
export const TURNED = { from: -0.1, to: 0.3 } as const;

/** Which tone a face is drawn in: 1 lit, 2 facing, 3 turned away. */
export function toneOf(normal: Vec3, view: ViewDirections): 1 | 2 | 3 {
  const lit =
    dot(normal, view.right) * LIGHT[0] +
    dot(normal, view.up) * LIGHT[1] +
    dot(normal, view.towards) * LIGHT[2];
  if (lit > (LIT.from + LIT.to) / 2) return 1;
  return lit > (TURNED.from + TURNED.to) / 2 ? 2 : 3;
}
