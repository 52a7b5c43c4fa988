import type { Crossing } from './model.ts';

/** Whether a crossing is joined so that one bar can press on the other: marked so, and near enough to be built. */
export function isJoined({ join, tooFarApart }: Crossing): boolean {
  return join !== null && join.kind !== 'none' && join.kind !== 'hung' && !tooFarApart;
}
