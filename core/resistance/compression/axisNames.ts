import type { Axis } from '../../section/model.ts';
import type { SectionShape } from '../model.ts';

/** "about the axis along the shorter leg": x runs along the shorter leg of an angle and y along the longer. */
export function aboutAxis(axis: Axis, shape: SectionShape): string {
  switch (axis) {
    case 'u':
      return 'about the major axis';
    case 'v':
      return 'about the minor axis';
    case 'x':
    case 'y':
      return shape === 'angle' ? `about the axis ${alongAxis(axis, shape)}` : `about ${axis}`;
    default:
      return axis satisfies never;
  }
}

/** "along the shorter leg". */
export function alongAxis(axis: 'x' | 'y', shape: SectionShape): string {
  if (shape !== 'angle') return `along ${axis}`;
  return axis === 'x' ? 'along the shorter leg' : 'along the longer leg';
}
