import type { Point } from './view.ts';

/** A closed outline for the `d` of a path, px to the hundredth. */
export function closedPath(points: readonly Point[]): string {
  return `${openPath(points)}Z`;
}

export function openPath(points: readonly Point[]): string {
  return points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${px(x)} ${px(y)}`).join('');
}

function px(value: number): string {
  return String(Math.round(value * 100) / 100);
}
