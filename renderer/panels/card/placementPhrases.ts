import type { AngleBar } from '../../../core/layout/model.ts';

/** How a diagonal is placed, in a few words each, always as many of them, so that two placements can be held against each other; empty where nothing need be said. */
export function placementPhrases(angle: AngleBar): readonly string[] {
  const { spec, side, stock } = angle;
  const equal = stock?.kind === 'equal';
  return [
    spec.countedOn === 'tension' ? 'Tension only' : 'Tension and compression',
    `${side} side of gusset`,
    equal ? '' : `${spec.legInPlane} leg in plane`,
    `heel ${spec.heel}`,
  ];
}
