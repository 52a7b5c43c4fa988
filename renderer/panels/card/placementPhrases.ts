import type { AngleBar } from '../../../core/layout/model.ts';
import { isCentred } from '../../../core/section/barShape.ts';

export interface PlacementPhrase {
  readonly about: 'forces' | 'side' | 'leg' | 'heel';
  /** Empty where nothing need be said. */
  readonly says: string;
}

/** How a diagonal is placed, in a few words each, always as many of them, so that two placements can be held against each other. */
export function placementPhrases(angle: AngleBar): readonly PlacementPhrase[] {
  const { spec, side, stock } = angle;
  const shape = stock?.outline.shape;
  const noLegs = shape !== undefined || stock?.kind === 'equal';
  return [
    { about: 'forces', says: spec.countedOn === 'tension' ? 'Tension only' : 'Tension and compression' },
    {
      about: 'side',
      says: shape && isCentred(shape) ? 'gusset through its middle' : `${side} side of gusset`,
    },
    { about: 'leg', says: noLegs ? '' : `${spec.legInPlane} leg in plane` },
    { about: 'heel', says: shape ? '' : `heel ${spec.heel}` },
  ];
}
