import type { RefObject } from 'react';
import { JOIN_NAMES, UNMARKED } from '../../../core/documents/words.ts';
import type { Crossing } from '../../../core/layout/model.ts';
import type { JoinKind } from '../../../core/project/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { JoinGlyph, type JoinShape } from '../../glyphs/JoinGlyph.tsx';
import type { DrawnMotion } from '../bowing/drawnMotion.ts';
import type { AngleScale } from '../geometry/steelPart.ts';

const ORDER: readonly JoinShape[] = [
  'bolted',
  'packed',
  'cut',
  'welded',
  'purlin',
  'hung',
  'none',
  'unmarked',
];

/** What the glyphs on the sheet mean, those alone that are on it; and the note on the size of the angles. */
export function Legend({
  crossings,
  scale,
  motion,
  element,
}: {
  readonly crossings: readonly Crossing[];
  readonly scale: AngleScale;
  /** What is drawn moved, and how many times its size; null: nothing computed is. */
  readonly motion: { readonly kind: DrawnMotion['kind']; readonly times: number } | null;
  readonly element: RefObject<HTMLDivElement | null>;
}) {
  const present = new Set<JoinShape>(crossings.map((one) => one.join?.kind ?? 'unmarked'));
  const shown = ORDER.filter((shape) => present.has(shape));
  return (
    <div ref={element} className="scene-legend">
      {motion !== null && (
        <p className="scene-motion-note">
          {motion.kind === 'push'
            ? `linear; movement drawn ${grouped(motion.times, 0)} times its size`
            : 'linear; a shape has no size of its own'}
        </p>
      )}
      {scale === 'doubled' && <p>angles drawn twice their size, set-out true</p>}
      {shown.length > 0 && (
        <ul>
          {shown.map((shape) => (
            <li key={shape}>
              <JoinGlyph join={shape} />
              {nameOf(shape)}
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}

function nameOf(shape: JoinShape): string {
  switch (shape) {
    case 'unmarked':
      return UNMARKED;
    case 'end':
      return 'end';
    default:
      return JOIN_NAMES[shape satisfies JoinKind];
  }
}
