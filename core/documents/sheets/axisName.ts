import type { Practice } from '../../practice/model.ts';
import type { Axis } from '../../section/model.ts';

/** "y", or "y (z)" where the practice has another letter for that axis. */
export function axisName(axis: Axis, practice: Practice): string {
  const own = practice.axisLetters[axis];
  return own === axis ? axis : `${axis} (${own})`;
}
