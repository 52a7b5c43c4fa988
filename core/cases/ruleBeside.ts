import { heldBy } from '../restraint/directions.ts';
import { governingOf } from '../restraint/governing.ts';
import { laneOf } from '../restraint/lanes.ts';
import type { Held, Lane, Station } from '../restraint/model.ts';
import { freeDirectionRule } from '../restraint/rule.ts';
import type { Axis } from '../section/model.ts';
import type { BarCase, SolvedRule } from './model.ts';

/** Holds nearer than this share of the length stand at one place, as they do for the critical load. */
const ONE_PLACE = 1e-4;

/** The free-direction rule for the same bar, ends taken as pinned; null where some hold is a spring. */
export function ruleBeside({ section, problem }: BarCase, exact: number | null): SolvedRule | null {
  const { holds, length, E } = problem;
  if (exact === null || holds.some(({ stiffness }) => stiffness !== 'rigid' && stiffness > 0)) return null;
  const stations = stationsOf(problem);
  const lane = (axis: Axis): Lane => laneOf(axis, section, stations, []);
  const lanes: Readonly<Record<Axis, Lane>> = { x: lane('x'), y: lane('y'), u: lane('u'), v: lane('v') };
  const governing = governingOf(section, freeDirectionRule(section, stations), lanes, length);
  const N = (Math.PI ** 2 * E * section.area) / governing.slenderness ** 2;
  return {
    unbraced: {
      x: lanes.x.unbraced,
      y: lanes.y.unbraced,
      u: lanes.u.unbraced,
      v: lanes.v.unbraced,
    },
    slenderness: governing.slenderness,
    axis: governing.axis,
    basis: governing.basis === 'mixed bound' ? 'mixed bound' : 'span',
    N,
    difference: (N / exact - 1) * 100,
  };
}

function stationsOf({ holds, length }: BarCase['problem']): readonly Station[] {
  const rigid = holds
    .filter(
      ({ at, stiffness }) =>
        stiffness === 'rigid' && at > length * ONE_PLACE && at < length * (1 - ONE_PLACE),
    )
    .sort((a, b) => a.at - b.at);
  const places: { at: number; directions: (readonly [number, number])[] }[] = [];
  for (const { at, direction } of rigid) {
    const last = places.at(-1);
    if (last && at - last.at <= length * ONE_PLACE) last.directions.push(direction);
    else places.push({ at, directions: [direction] });
  }
  return [
    station(0, { ways: 2 }),
    ...places.map(({ at, directions }) => station(at, heldBy(directions))),
    station(length, { ways: 2 }),
  ];
}

const station = (at: number, held: Held): Station => ({
  at,
  label: '',
  crossings: [],
  claims: [],
  held,
  twistHeld: false,
});
