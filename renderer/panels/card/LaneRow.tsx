import type { JSX } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showLength, showRadius, showSlenderness } from '../../../core/units/quantity.ts';
import { condensedWidth } from '../../controls/textWidth.ts';
import { nearnessFill, nearnessInk } from '../../theme/nearness.ts';
import { type DrawnLane, LANE_DEEP, type LaneChip, type LanePiece } from './laneDrawing.ts';

interface LaneRowProps {
  readonly lane: DrawnLane;
  readonly letter: string;
  /** x of both ends of the bar. */
  readonly ends: readonly [number, number];
  readonly limit: number;
  readonly units: UnitSystem;
}

/** One strip: its pieces with length and slenderness, its cuts, and the chips that say why. */
export function LaneRow({ lane, letter, ends, limit, units }: LaneRowProps): JSX.Element {
  const { top } = lane;
  return (
    <>
      <text className="lane-letter" x="0" y={top + 15.5}>
        {letter}
      </text>
      <text
        className="lane-quiet"
        x={letter.length > 1 ? 21 : 14}
        y={top + 15.5}
        fontSize={letter.length > 1 ? 11 : 12}
      >
        {letter.length > 1 ? '' : showRadius(lane.radius, units, 'bare')}
      </text>
      {lane.pieces.map((piece) => (
        <Piece key={piece.from} piece={piece} top={top} limit={limit} units={units} byHand={lane.override} />
      ))}
      {lane.before !== null && (
        <>
          {lane.before.pieces.map((piece) => (
            <rect
              key={piece.from}
              x={piece.left}
              y={lane.before?.top}
              width={Math.max(1, piece.right - piece.left - 1)}
              height="5"
              fill={piece.step === 'over' ? 'url(#hatch-fine)' : nearnessFill(piece.step)}
            />
          ))}
          <text className="lane-was" x="34" y={lane.before.top + 7} textAnchor="end">
            {showSlenderness(lane.before.slenderness, limit)}
          </text>
        </>
      )}
      {ends.map((x, end) => (
        <path
          key={x}
          className={lane.endsStop[end] ? 'lane-stop' : 'lane-claimed'}
          d={`M${x} ${top - 2}v${LANE_DEEP + 4}`}
        />
      ))}
      {lane.cuts.map(({ x, stops, claimed }) =>
        stops ? (
          <g key={x}>
            <path d={`M${x} ${top - 2}v${LANE_DEEP + 5}`} stroke="var(--panel)" strokeWidth="6" />
            <path className="lane-stop" d={`M${x} ${top - 2}v${LANE_DEEP + 5}`} />
          </g>
        ) : (
          claimed && <path key={x} className="lane-claimed" d={`M${x} ${top - 3}v${LANE_DEEP + 6}`} />
        ),
      )}
      {lane.chips.map((chip) => (
        <Chip key={chip.x} chip={chip} />
      ))}
    </>
  );
}

interface PieceProps {
  readonly piece: LanePiece;
  readonly top: number;
  readonly limit: number;
  readonly units: UnitSystem;
  readonly byHand: boolean;
}

function Piece({ piece, top, limit, units, byHand }: PieceProps): JSX.Element {
  const { left, right, step } = piece;
  const length = byHand ? 'by hand' : showLength(piece.counts, units, 'spoken');
  const figure = showSlenderness(piece.slenderness, limit);
  const both = condensedWidth(length, 12) + 8 + condensedWidth(figure, 12, 600);
  const alone = condensedWidth(figure, 12, 600);
  const room = piece.textRoom - 10;
  const wide = both <= room ? both : alone <= room ? alone : 0;
  const fill = step === 'over' ? 'var(--ink)' : nearnessInk(step);
  return (
    <>
      <rect
        x={left}
        y={top}
        width={Math.max(1, right - left)}
        height={LANE_DEEP}
        fill={step === 'over' ? 'url(#hatch)' : nearnessFill(step)}
      />
      {step === 'over' && wide > 0 && (
        <rect
          x={piece.textAt - wide / 2 - 6}
          y={top + 2.5}
          width={wide + 12}
          height="17"
          rx="2"
          fill="var(--panel)"
        />
      )}
      {wide > 0 && (
        <text x={piece.textAt} y={top + 15.3} textAnchor="middle" style={{ fill }}>
          {wide === both && <tspan>{length}</tspan>}
          <tspan dx={wide === both ? 8 : 0} fontWeight="600">
            {figure}
          </tspan>
        </text>
      )}
    </>
  );
}

function Chip({ chip }: { readonly chip: LaneChip }): JSX.Element {
  return (
    <>
      <rect
        className="lane-chip"
        x={chip.x + 0.5}
        y={chip.y + 0.5}
        width={chip.wide - 1}
        height="14"
        rx="2"
        strokeDasharray={chip.dashed ? '3 2' : undefined}
      />
      {chip.claimed && (
        <path
          d="M4 .6 7.8 7.4H.2Z"
          fill="none"
          stroke="var(--ink)"
          strokeWidth="1.2"
          transform={`translate(${chip.x + 6} ${chip.y + 3.4})`}
        />
      )}
      <text
        className="lane-chip-text"
        x={chip.x + chip.wide / 2 + (chip.claimed ? 7 : 0)}
        y={chip.y + 11.5}
        textAnchor="middle"
      >
        {chip.text}
      </text>
    </>
  );
}
