import type { RefObject } from 'react';
import { JOIN_NAMES, UNMARKED } from '../../../core/documents/words.ts';
import type { Crossing } from '../../../core/layout/model.ts';
import type { JoinKind } from '../../../core/project/model.ts';
import { JoinGlyph, type JoinShape } from '../../glyphs/JoinGlyph.tsx';
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
  element,
}: {
  readonly crossings: readonly Crossing[];
  readonly scale: AngleScale;
  readonly element: RefObject<HTMLDivElement | null>;
}) {
  const present = new Set<JoinShape>(crossings.map((one) => one.join?.kind ?? 'unmarked'));
  const shown = ORDER.filter((shape) => present.has(shape));
  return (
    <div ref={element} className="scene-legend">
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
