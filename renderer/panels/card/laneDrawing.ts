/** Where everything on the lanes stands, px: strips, pieces, cuts, chips, the governing flag. Numbers are those of the assessment. */
import type { Governing, Lane, Restraint } from '../../../core/restraint/model.ts';
import { AXES, type Axis } from '../../../core/section/model.ts';
import { condensedWidth } from '../../controls/textWidth.ts';
import { type NearnessStep, nearnessStep } from '../../theme/nearness.ts';
import { chipText } from './laneWords.ts';
import { interiorOf } from './stations.ts';

export const LANE_DEEP = 22;
export const LANE_LEFT = 46;
const RIGHT_MARGIN = 4;
const CHIP_DEEP = 15;
const FLAG_DEEP = 18;
/** The thin strip below a lane that shows it before the change on trial. */
const BEFORE_DEEP = 6;

export interface LanePiece {
  readonly from: number;
  /** The length it counts as, mm. */
  readonly counts: number;
  readonly left: number;
  readonly right: number;
  readonly slenderness: number;
  readonly step: NearnessStep;
  /** Middle and width of the widest part that no cut mark stands in. */
  readonly textAt: number;
  readonly textRoom: number;
}

export interface LaneChip {
  readonly x: number;
  readonly y: number;
  readonly wide: number;
  readonly text: string;
  readonly dashed: boolean;
  readonly claimed: boolean;
}

export interface DrawnLane {
  readonly axis: Axis | 'free';
  readonly radius: number;
  readonly top: number;
  readonly pieces: readonly LanePiece[];
  /** Whether end i and end j stop the motion. */
  readonly endsStop: readonly [boolean, boolean];
  readonly cuts: readonly { readonly x: number; readonly stops: boolean; readonly claimed: boolean }[];
  readonly chips: readonly LaneChip[];
  readonly governs: boolean;
  readonly override: boolean;
  /** Pieces as they were, with the slenderness then; null when they are the same. */
  readonly before: {
    readonly pieces: readonly LanePiece[];
    readonly slenderness: number;
    readonly top: number;
  } | null;
}

export interface Flag {
  readonly x: number;
  readonly y: number;
  readonly wide: number;
  readonly text: string;
}

export interface LaneDrawing {
  readonly height: number;
  readonly along: (at: number) => number;
  readonly lanes: readonly DrawnLane[];
  readonly flag: Flag | null;
  readonly outline: { readonly left: number; readonly right: number; readonly top: number } | null;
}

export interface LaneInput {
  readonly restraint: Restraint;
  readonly before: Restraint | null;
  readonly limit: number;
  readonly width: number;
  /** The slenderness that is held against the limit: of mixed holds the exact one, where the rule only gives a bound. */
  readonly governs: number;
  readonly flagText: string;
}

export function laneDrawing({
  restraint,
  before,
  limit,
  width,
  governs: read,
  flagText,
}: LaneInput): LaneDrawing {
  const { stations, governing } = restraint;
  const first = stations[0]?.at ?? 0;
  const last = stations.at(-1)?.at ?? 1;
  const right = width - RIGHT_MARGIN;
  const along = (at: number): number => LANE_LEFT + ((right - LANE_LEFT) * (at - first)) / (last - first);
  const many = interiorOf(restraint).length > 2;
  const headDeep = many ? 34 : 20;
  const ownLane = governing.axis === 'free' || governing.basis === 'mixed bound';
  const governs = (axis: Axis | 'free'): boolean => (ownLane ? axis === 'free' : axis === governing.axis);

  const lanes: DrawnLane[] = [];
  let y = headDeep;
  for (const axis of [...AXES, ...(ownLane ? (['free'] as const) : [])]) {
    const lane = axis === 'free' ? null : restraint.lanes[axis];
    const wasLane = before === null || axis === 'free' ? null : before.lanes[axis];
    const changed = wasLane !== null && lane !== null && differs(wasLane, lane);
    const chips = lane === null ? [] : chipsOf(lane, restraint, along, many, width);
    // The flag needs room above: the gap below the header, or the row of chips of the lane before.
    if (governs(axis) && y - headDeep === 0) y += FLAG_DEEP - 2;
    else if (governs(axis) && many) y += FLAG_DEEP - 6;
    const claimedAbove = many && chips.length > 0;
    if (claimedAbove && !governs(axis)) y += CHIP_DEEP - 3;
    const top = y;
    const below = changed ? BEFORE_DEEP + 3 : 0;
    lanes.push({
      axis,
      radius: lane === null ? governing.radius : lane.radius,
      top,
      pieces:
        lane === null
          ? [governingPiece(governing, read, along, limit)]
          : piecesOf(lane, along, limit, ticksAt(lane, restraint, along)),
      endsStop: lane?.endsStop ?? [true, true],
      cuts: lane === null ? [] : cutsOf(lane, restraint, along),
      chips: chips.map((chip) => ({ ...chip, y: many ? top - CHIP_DEEP - 1 : top + LANE_DEEP + below + 3 })),
      governs: governs(axis),
      override: lane?.override != null,
      before:
        changed && wasLane !== null
          ? {
              pieces: piecesOf(wasLane, along, limit, []),
              slenderness: wasLane.slenderness,
              top: top + LANE_DEEP + 2,
            }
          : null,
    });
    y = top + LANE_DEEP + below + (many ? 7 : chips.length > 0 ? CHIP_DEEP + 7 : 8);
  }
  const governingLane = lanes.find((lane) => lane.governs) ?? null;
  return {
    height: y + (many ? 0 : -2),
    along,
    lanes,
    flag:
      governingLane === null
        ? null
        : flagOf(
            {
              lane: governingLane,
              lanes,
              start: along(governing.from),
              end: along(governing.to),
              right,
              many,
            },
            flagText,
          ),
    outline:
      governingLane === null
        ? null
        : { left: along(governing.from), right: along(governing.to), top: governingLane.top },
  };
}

function differs(a: Lane, b: Lane): boolean {
  return Math.abs(a.slenderness - b.slenderness) > 0.5 || a.pieces.length !== b.pieces.length;
}

function piecesOf(
  lane: Lane,
  along: (at: number) => number,
  limit: number,
  marks: readonly number[],
): readonly LanePiece[] {
  return lane.pieces.map(({ from, to, counts }) => {
    // A length set by hand stands for the whole lane.
    const slenderness = lane.override === null ? counts / lane.radius : lane.slenderness;
    const left = along(from);
    const right = along(to);
    const inside = [left, ...marks.filter((x) => x > left + 2 && x < right - 2), right];
    const gaps = inside.slice(1).map((x, index) => [inside[index] ?? left, x] as const);
    const widest = Math.max(...gaps.map(([a, b]) => b - a));
    const [a, b] = gaps.find(([p, q]) => q - p > widest - 1) ?? [left, right];
    return {
      from,
      counts,
      left,
      right,
      slenderness,
      step: nearnessStep(slenderness / limit),
      textAt: (a + b) / 2,
      textRoom: b - a,
    };
  });
}

/** Where ticks stand in a lane: its cuts, some of which lie within a piece that runs on to a free end, and holds that were claimed and do not count. */
function ticksAt(lane: Lane, restraint: Restraint, along: (at: number) => number): readonly number[] {
  return cutsOf(lane, restraint, along)
    .filter(({ stops, claimed }) => stops || claimed)
    .map(({ x }) => x);
}

function governingPiece(
  governing: Governing,
  slenderness: number,
  along: (at: number) => number,
  limit: number,
): LanePiece {
  const left = along(governing.from);
  const right = along(governing.to);
  return {
    from: governing.from,
    counts: governing.to - governing.from,
    left,
    right,
    slenderness,
    step: nearnessStep(slenderness / limit),
    textAt: (left + right) / 2,
    textRoom: right - left,
  };
}

function cutsOf(lane: Lane, restraint: Restraint, along: (at: number) => number): DrawnLane['cuts'] {
  return lane.cuts.map((cut) => {
    const station = restraint.stations[cut.station];
    return {
      x: along(cut.at),
      stops: cut.stops,
      claimed: station !== undefined && !cut.stops && chipText(cut, station).claimed,
    };
  });
}

function chipsOf(
  lane: Lane,
  restraint: Restraint,
  along: (at: number) => number,
  many: boolean,
  width: number,
): readonly Omit<LaneChip, 'y'>[] {
  const chips: Omit<LaneChip, 'y'>[] = [];
  const wanted = lane.cuts.flatMap((cut) => {
    const station = restraint.stations[cut.station];
    if (station === undefined) return [];
    const text = chipText(cut, station);
    return many && !text.claimed ? [] : [{ cut, text }];
  });
  wanted.forEach(({ cut, text }, index) => {
    const x = along(cut.at);
    const nextX = wanted[index + 1] === undefined ? width : along(wanted[index + 1]?.cut.at ?? width);
    const previousEnd =
      chips.at(-1) === undefined ? LANE_LEFT - 4 : (chips.at(-1)?.x ?? 0) + (chips.at(-1)?.wide ?? 0) + 3;
    const room = wanted.length === 1 ? width - LANE_LEFT : Math.min(nextX - x, x - previousEnd) * 2 - 4;
    const long = chipWidth(text.long, text.claimed);
    const chosen = long <= room ? text.long : text.short;
    const wide = chipWidth(chosen, text.claimed);
    if (wide > room + 40) return;
    const left = Math.max(previousEnd, Math.min(x - wide / 2, width - wide));
    chips.push({ x: left, wide, text: chosen, dashed: !cut.stops, claimed: text.claimed });
  });
  return chips;
}

function chipWidth(text: string, claimed: boolean): number {
  return condensedWidth(text, 11) + 12 + (claimed ? 14 : 0);
}

interface FlagPlace {
  readonly lane: DrawnLane;
  readonly lanes: readonly DrawnLane[];
  readonly start: number;
  readonly end: number;
  readonly right: number;
  readonly many: boolean;
}

/** Above the governing piece, at its right end unless a chip stands there; shortened where the whole does not fit. */
function flagOf({ lane, lanes, start, end, right, many }: FlagPlace, text: string): Flag {
  const y = lane.top - FLAG_DEEP;
  const near = lanes
    .flatMap((each) => each.chips)
    .filter((chip) => chip.y + CHIP_DEEP > y && chip.y < y + FLAG_DEEP);
  const clear = (x: number, wide: number): boolean =>
    near.every((chip) => chip.x > x + wide + 2 || chip.x + chip.wide < x - 2);
  for (const said of [text, SHORT_FLAG]) {
    const wide = condensedWidth(said, 12, 600) + 28;
    const atRight = Math.max(LANE_LEFT, Math.min(right + 1, end + 1) - wide);
    const atLeft = Math.min(Math.max(LANE_LEFT, start) - 1, right - wide);
    const places = many ? [atLeft, atRight] : [atRight, atLeft];
    const x = places.find((place) => clear(place, wide));
    if (x !== undefined) return { x, y, wide, text: said };
  }
  const wide = condensedWidth(SHORT_FLAG, 12, 600) + 28;
  return { x: right + 1 - wide, y, wide, text: SHORT_FLAG };
}

const SHORT_FLAG = 'governs';
