import type { Vec2 } from '../geometry/vector.ts';
import type { AxialPiece, EndRotation, Hold } from '../stability/model.ts';
import { type CaseReader, shown } from './caseReader.ts';
import type { BarCase } from './model.ts';
import { readPoint, readSection } from './readSection.ts';

/** Pieces of the force may miss each other by this share of the length. */
const TOUCHING = 1e-6;

/** Null when it has no length, without which no place on it can be judged. */
export function readBarCase(reader: CaseReader, id: string, type: BarCase['type']): BarCase | null {
  const twisting = type === 'bar-flexural-torsional';
  const length = reader.at('L').number('above zero');
  if (length !== reader.at('L').value) return null;
  const section = readSection(reader.at('section'), twisting);
  const [endI, endJ] = readEnds(reader.at('ends'));
  return {
    type,
    id,
    section,
    problem: {
      E: reader.at('E').number('above zero'),
      length,
      section,
      holds: reader
        .at('stations')
        .list()
        .flatMap((station) => readStation(station, length, twisting)),
      axial: readAxial(reader.at('axial'), length),
      endI,
      endJ,
      twist: twisting
        ? {
            G: reader.at('G').number('above zero'),
            heldAt: reader
              .at('twist_fixed_at')
              .list()
              .map((each) => readPlace(each, length)),
          }
        : null,
    },
  };
}

function readPlace(reader: CaseReader, length: number): number {
  const z = reader.number('zero or more');
  if (z <= length * (1 + 1e-9)) return Math.min(z, length);
  reader.problem(`${z} is past the end of the bar, which is ${length} long.`, 'Give mm from the end z = 0.');
  return 0;
}

/** One hold, or several at one place: in a list `holds`, or as lists of directions and stiffnesses. */
function readStation(reader: CaseReader, length: number, twisting: boolean): readonly Hold[] {
  reader.object('a station with z, direction_deg and k');
  const at = readPlace(reader.at('z'), length);
  const holds = reader.at('holds');
  if (holds.isGiven)
    return holds
      .list()
      .map((each) => readHold(each.object('a hold with direction_deg and k'), at, reader, twisting));
  const [directions, stiffnesses] = [reader.at('direction_deg'), reader.at('k')];
  if (!directions.isList) return [readHold(reader, at, reader, twisting)];
  const each = stiffnesses.isList ? stiffnesses.list() : [];
  if (stiffnesses.isList && each.length !== directions.list().length)
    stiffnesses.problem(
      'There are not as many as directions.',
      'Give one for each of direction_deg, or one for all.',
    );
  return directions.list().map((direction, k) => ({
    at,
    direction: unitAt(direction.number()),
    stiffness: readStiffness(each[k] ?? stiffnesses),
    ...gripOf(reader, reader, twisting),
  }));
}

function readHold(reader: CaseReader, at: number, station: CaseReader, twisting: boolean): Hold {
  return {
    at,
    direction: unitAt(reader.at('direction_deg').number()),
    stiffness: readStiffness(reader.at('k')),
    ...gripOf(reader, station, twisting),
  };
}

/** Where it grips counts only with twist; what the station says holds for those of its holds that say nothing. */
function gripOf(hold: CaseReader, station: CaseReader, twisting: boolean): Pick<Hold, 'grip'> {
  if (!twisting) return {};
  const own = hold.at('point_rel_centroid');
  return { grip: readPoint(own.isGiven ? own : station.at('point_rel_centroid'), [0, 0]) };
}

function readStiffness(reader: CaseReader): number | 'rigid' {
  if (reader.value === 'rigid') return 'rigid';
  const { value } = reader;
  if (typeof value === 'number' && Number.isFinite(value) && value >= 0) return value;
  reader.problem(
    reader.isGiven ? `${shown(value)} is no stiffness.` : 'It is not given.',
    'Give a number, zero or more, or “rigid”.',
  );
  return 0;
}

/** Unit vector at an angle from x towards y, degrees; along the axes without rounding. */
function unitAt(degrees: number): Vec2 {
  const quarters = degrees / 90;
  if (Number.isInteger(quarters)) {
    const turned = ((quarters % 4) + 4) % 4;
    return (
      (
        [
          [1, 0],
          [0, 1],
          [-1, 0],
          [0, -1],
        ] as const
      )[turned] ?? [1, 0]
    );
  }
  const turn = (degrees * Math.PI) / 180;
  return [Math.cos(turn), Math.sin(turn)];
}

/** In order, from end to end. One piece of compression when nothing is said. */
function readAxial(reader: CaseReader, length: number): readonly AxialPiece[] {
  if (!reader.isGiven) return [{ from: 0, to: length, share: 1 }];
  const pieces = reader
    .list()
    .map((piece) => ({
      from: piece.object('a piece with z0, z1 and p').at('z0').number('zero or more'),
      to: piece.at('z1').number('above zero'),
      share: piece.at('p').number(),
    }))
    .sort((a, b) => a.from - b.from);
  const ends = [0, ...pieces.map(({ to }) => to)];
  const starts = [...pieces.map(({ from }) => from), length];
  const gap = ends.findIndex((end, k) => Math.abs((starts[k] ?? 0) - end) > length * TOUCHING);
  if (gap >= 0)
    reader.problem(
      `After ${ends[gap] ?? 0} the next piece begins at ${starts[gap] ?? 0}, or the bar ends there.`,
      `Give pieces z0…z1 that follow one another from 0 to ${length}.`,
    );
  return pieces;
}

/** Both ends stay in place; what they do against turning is a spring, or rigid, and nothing when nothing is said. */
function readEnds(reader: CaseReader): readonly [EndRotation, EndRotation] {
  const inWords = typeof reader.value === 'string' ? reader : reader.at('translation');
  if (inWords.isGiven && !isPinnedInWords(inWords.text()))
    inWords.problem(
      `${shown(inWords.value)} is not understood.`,
      'Ends are held in x and y, and against twist, and free to warp; give what they do against turning as rotational_springs.',
    );
  const springs = reader.at('rotational_springs');
  return [readEnd(springs.at('z0')), readEnd(springs.at('zL'))];
}

/** Words are taken as long as they say no more than what is done anyway. */
function isPinnedInWords(text: string): boolean {
  const said = text.toLowerCase();
  const held = /fixed in x and y|translation[^;,]*(and twist )?fixed|pinned|fork/.test(said);
  const other =
    /(x|y|translations?) (is |are )?free|one end|warping (is |are )?(fixed|held|prevented)|rotations? (is |are )?(fixed|held|clamped)|cantilever/.test(
      said,
    );
  return held && !other;
}

function readEnd(reader: CaseReader): EndRotation {
  const way = (name: string) => {
    const given = reader.at(name);
    return given.isGiven ? readStiffness(given) : 0;
  };
  return { alongX: way('on_slope_ux'), alongY: way('on_slope_uy') };
}
