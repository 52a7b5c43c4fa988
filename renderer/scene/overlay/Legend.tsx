import type { RefObject } from 'react';
import { UNMARKED } from '../../../core/layout/joinWords.ts';
import type { Crossing } from '../../../core/layout/model.ts';
import { JOIN_NAMES } from '../../../core/project/joinNames.ts';
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
  forces,
  element,
}: {
  readonly crossings: readonly Crossing[];
  readonly scale: AngleScale;
  /** What is drawn moved, and how many times its size; null: nothing computed is. */
  readonly motion: { readonly kind: DrawnMotion['kind']; readonly times: number } | null;
  /** Whether forces are drawn. */
  readonly forces: boolean;
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
      {forces && <ForcesKey />}
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

/** What bands and arrows mean. */
function ForcesKey() {
  return (
    <ul className="scene-forces-key">
      <li>
        <KeyPicture d="M1 2h28v8H1ZM8 3 5 6l3 3M22 3l3 3-3 3" fill="var(--sheet)" /> pulled apart
      </li>
      <li>
        <KeyPicture d="M1 2h28v8H1ZM5 3l3 3-3 3M25 3l-3 3 3 3" fill="var(--dg2)" /> pushed together
      </li>
      <li>
        <KeyPicture d="M1 3Q15 14 29 3" fill="none" dash /> slack
      </li>
      <li>
        <KeyPicture d="M1 6h20M21 2l8 4-8 4Z" fill="var(--ink)" /> given
      </li>
      <li>
        <KeyPicture d="M1 4h19V1l9 5-9 5V8H1Z" fill="var(--sheet)" /> answered
      </li>
    </ul>
  );
}

function KeyPicture({
  d,
  fill,
  dash = false,
}: {
  readonly d: string;
  readonly fill: string;
  readonly dash?: boolean;
}) {
  return (
    <svg width="30" height="12" viewBox="0 0 30 12" aria-hidden="true">
      <path
        d={d}
        fill={fill}
        stroke="currentColor"
        strokeWidth="1.2"
        strokeDasharray={dash ? '4 3' : undefined}
      />
    </svg>
  );
}
