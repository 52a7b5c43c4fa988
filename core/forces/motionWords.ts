import type { Layout } from '../layout/model.ts';
import type { NoWay } from './model.ts';

/** "left head of tier 1 moves right; D1 goes slack". */
export function motionInWords({ moving, slackened }: NoWay, layout: Layout): string {
  const [first, ...others] = moving;
  if (!first) return 'it moves';
  const rest =
    others.length > 0 ? ` with ${others.length} more ${others.length === 1 ? 'place' : 'places'}` : '';
  const slack =
    slackened.length > 0
      ? `, and ${slackened.map((id) => layout.bars.get(id)?.mark ?? id).join(', ')} cannot push`
      : '';
  return `${layout.nodes.get(first.node)?.label ?? first.node} moves ${wayInWords(first.direction)}${rest}${slack}`;
}

function wayInWords([x, y, z]: readonly [number, number, number]): string {
  const [a, b, c] = [Math.abs(x), Math.abs(y), Math.abs(z)];
  if (c >= a && c >= b) return z > 0 ? 'up' : 'down';
  return a >= b ? (x > 0 ? 'along X' : 'against X') : y > 0 ? 'along Y' : 'against Y';
}
