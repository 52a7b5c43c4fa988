/** The diagonals of one tier or panel between two members; shared by walls and roofs. */
import type { Pattern } from '../../project/model.ts';
import { diagonalBar, type SketchBar } from '../sketch.ts';

export interface TierCorners {
  readonly lowerLeft: string;
  readonly lowerRight: string;
  readonly upperLeft: string;
  readonly upperRight: string;
  /** Middle of the member below and above, where a peaked or vee tier meets it. */
  readonly lowerMiddle: string;
  readonly upperMiddle: string;
}

/** Ends i below, ends j above, so that "end A" is the lower end on every drawing. */
export function tierDiagonals(
  id: string,
  pattern: Pattern,
  at: TierCorners,
  plane: string,
  face: { readonly first: SketchBar['face']; readonly second: SketchBar['face'] },
): readonly SketchBar[] {
  const bar = (name: string, i: string, j: string, side: SketchBar['face']) =>
    diagonalBar(`${id}.${name}`, 'diagonal', [i, j], plane, side);
  switch (pattern) {
    case 'crossed':
      return [
        bar('rise', at.lowerLeft, at.upperRight, face.first),
        bar('fall', at.lowerRight, at.upperLeft, face.second),
      ];
    case 'rising':
      return [bar('rise', at.lowerLeft, at.upperRight, face.second)];
    case 'falling':
      return [bar('fall', at.lowerRight, at.upperLeft, face.second)];
    case 'peaked':
      return [
        bar('left', at.lowerLeft, at.upperMiddle, face.second),
        bar('right', at.lowerRight, at.upperMiddle, face.second),
      ];
    case 'vee':
      return [
        bar('left', at.lowerMiddle, at.upperLeft, face.second),
        bar('right', at.lowerMiddle, at.upperRight, face.second),
      ];
    case 'open':
      return [];
    default:
      return pattern satisfies never;
  }
}
