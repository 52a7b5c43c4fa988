import type { JSX } from 'react';
import type { AngleBar, Layout } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { END_HOLDS_WORDS, endsHoldOf } from '../../../core/restraint/endWords.ts';
import type { Restraint, Station } from '../../../core/restraint/model.ts';
import { columnLength } from '../../controls/figures.ts';
import { JoinMark, type JoinShape } from '../../glyphs/JoinGlyph.tsx';
import { endText } from '../recipe/EndFields.tsx';
import { interiorOf } from './stations.ts';

interface LaneHeadProps {
  readonly restraint: Restraint;
  readonly angle: AngleBar;
  readonly layout: Layout;
  readonly along: (at: number) => number;
  readonly width: number;
  readonly units: UnitSystem;
}

/** One row of stations above all lanes: the ends, and what meets the bar between. */
export function LaneHead({ restraint, angle, layout, along, width, units }: LaneHeadProps): JSX.Element {
  const interior = interiorOf(restraint);
  const many = interior.length > 2;
  const last = restraint.stations.at(-1);
  const start = along(restraint.stations[0]?.at ?? 0);
  const end = along(last?.at ?? 1);
  const room = interior.length === 0 || (interior.length === 1 && width > 360);
  return (
    <>
      <text className="lane-quiet" x="0" y="11">
        axis, r
      </text>
      <text className="lane-strong" x={start} y="11">
        i
      </text>
      <text className="lane-strong" x={end} y="11" textAnchor="end">
        j
      </text>
      {!many && room && (
        <>
          <text className="lane-quiet" x={start + 10} y="11">
            {shortEnd(angle, 'i', units)}
          </text>
          <text className="lane-quiet" x={end - 10} y="11" textAnchor="end">
            {shortEnd(angle, 'j', units)}
          </text>
        </>
      )}
      {many && (
        <>
          <text className="lane-quiet" x={start} y="26">
            0
          </text>
          <text className="lane-quiet" x={end} y="26" textAnchor="end">
            {columnLength(last?.at ?? 0, units)}
          </text>
        </>
      )}
      {interior.map(({ station, index }) => (
        <StationMark
          key={index}
          station={station}
          x={along(station.at)}
          shape={shapeOf(station, layout)}
          many={many}
          units={units}
        />
      ))}
    </>
  );
}

interface StationMarkProps {
  readonly station: Station;
  readonly x: number;
  readonly shape: JoinShape;
  readonly many: boolean;
  readonly units: UnitSystem;
}

function StationMark({ station, x, shape, many, units }: StationMarkProps): JSX.Element {
  if (!many)
    return (
      <>
        <g transform={`translate(${x} 7)`}>
          <JoinMark join={shape} />
        </g>
        <text className="lane-quiet" x={x + 10} y="11">
          {columnLength(station.at, units)}
        </text>
      </>
    );
  return (
    <>
      <g transform={`translate(${x - 9} 6) scale(.92)`}>
        <JoinMark join={shape} />
      </g>
      <text className="lane-strong" x={x} y="10">
        {station.label}
      </text>
      <text className="lane-quiet" x={x} y="26" textAnchor="middle">
        {columnLength(station.at, units)}
      </text>
    </>
  );
}

/** How the station's first crossing is joined; a bar that ends there has an end. */
export function shapeOf(station: Station, layout: Layout): JoinShape {
  const [id] = station.crossings;
  if (id === undefined) return 'end';
  return layout.crossings.get(id)?.join?.kind ?? 'unmarked';
}

/** "gusset, 2 × M16", without what leg it is by; of an end that does not hold both ways, what it does hold. */
function shortEnd(angle: AngleBar, end: 'i' | 'j', units: UnitSystem): string {
  const holds = endsHoldOf(angle)[end];
  return holds === 'both'
    ? `gusset, ${endText(angle.ends[end], units).split(',')[0] ?? ''}`
    : END_HOLDS_WORDS[holds];
}
