import { type BarShape, isCentred } from '../section/barShape.ts';

interface Placed {
  readonly shape: BarShape['kind'] | null;
  readonly side: 'near' | 'far';
  readonly heel: 'up' | 'down';
}

/** How a diagonal lies against its gusset, in a few words. Only an angle has a heel. */
export function placedText({ shape, side, heel }: Placed): string {
  if (shape === null) return `${side}, heel ${heel}`;
  return isCentred({ kind: shape }) ? 'on the middle' : side;
}
