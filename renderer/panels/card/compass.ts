/** The ring round the section: which ways the bar is free to move, and which are held. */
import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { Crossing } from '../../../core/layout/model.ts';
import type { Restraint, Station } from '../../../core/restraint/model.ts';

export interface Compass {
  /** Every way free, one way and its opposite, or none. Section plane. */
  readonly free: 'every way' | Vec2 | 'no way';
  /** "at D1", "between i and D1", "over the whole bar". */
  readonly where: string;
  /** The stations that hold there: "D1, P2". Empty where none does. */
  readonly heldBy: string;
}

/** Of the chosen crossing's station, else of the length that governs. */
export function compassOf(restraint: Restraint, crossing: Crossing | null): Compass {
  const station =
    crossing === null
      ? undefined
      : restraint.stations.find(({ crossings }) => crossings.includes(crossing.id));
  if (station !== undefined)
    return { free: freeAt(station), where: `at ${station.label}`, heldBy: station.label };
  const { governing, stations } = restraint;
  return {
    free: governing.freeDirection ?? 'every way',
    where: placeOf(governing.from, governing.to, stations),
    heldBy: stations
      .filter(({ at, held }) => held.ways > 0 && at > governing.from + SAME && at < governing.to - SAME)
      .map(({ label }) => label)
      .join(', '),
  };
}

function freeAt({ held }: Station): Compass['free'] {
  if (held.ways === 0) return 'every way';
  if (held.ways === 2) return 'no way';
  const [x, y] = held.direction;
  return [-y, x];
}

/** mm within which a length reaches a station. */
const SAME = 1;

function placeOf(from: number, to: number, stations: readonly Station[]): string {
  const first = stations[0];
  const last = stations.at(-1);
  if (first === undefined || last === undefined) return '';
  if (from <= first.at + SAME && to >= last.at - SAME) return '';
  const label = (at: number): string =>
    stations.find((station) => Math.abs(station.at - at) < SAME)?.label ?? '';
  return `between ${label(from)} and ${label(to)}`;
}
