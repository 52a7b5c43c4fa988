import { type RefObject, useId } from 'react';
import { DETAIL_RADIUS } from './detailPlace.ts';

/** Until there is something to show in it. One object, so that no render puts it back over what the view has set. */
const HIDDEN = { display: 'none' } as const;

/** The round frame of a detail. It is moved into place, and its faces painted, together with the ink of the view. */
export function Detail({
  frame,
  faces,
}: {
  readonly frame: RefObject<SVGGElement | null>;
  readonly faces: RefObject<SVGGElement | null>;
}) {
  const clip = useId();
  return (
    <g ref={frame} className="scene-detail" style={HIDDEN}>
      <clipPath id={clip}>
        <circle r={DETAIL_RADIUS} />
      </clipPath>
      <circle className="scene-detail-paper" r={DETAIL_RADIUS} />
      <g clipPath={`url(#${clip})`}>
        <g ref={faces} />
      </g>
      <circle className="scene-detail-frame" r={DETAIL_RADIUS} />
    </g>
  );
}
