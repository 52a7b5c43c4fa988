import type { StationStiffness } from '../frame/push.ts';
import { dot, unit2, type Vec2 } from '../geometry/vector.ts';
import type { AngleBar, Bar, Crossing } from '../layout/model.ts';
import type { EndFixity } from '../project/model.ts';
import { inSection } from '../restraint/claims.ts';
import { squareTo } from '../restraint/directions.ts';
import { endsHoldOf } from '../restraint/endWords.ts';
import type { Held, Restraint, Station } from '../restraint/model.ts';
import { bothEndsHold } from '../restraint/rule.ts';
import { endHolds } from '../restraint/stations.ts';
import { isCentred } from '../section/barShape.ts';
import type { SectionProperties } from '../section/model.ts';
import { type BarProblem, type Hold, PINNED } from '../stability/model.ts';
import type { PairBar } from '../stability/pair.ts';

export interface Steel {
  readonly E: number;
  readonly G: number;
}

/** A diagonal with all that its critical load needs. */
export interface BowingBar {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly section: SectionProperties;
  readonly restraint: Restraint;
  /** Offered at its places in the frame; empty when nothing is joined. */
  readonly offered: readonly StationStiffness[];
  /** How its ends turn. */
  readonly ends: EndFixity;
}

/** The bar between its end stations, without holds between them. */
export function bareBar(
  { section, restraint }: Pick<BowingBar, 'section' | 'restraint'>,
  steel: Pick<Steel, 'E'>,
): BarProblem {
  const length = lengthOf(restraint);
  return {
    E: steel.E,
    length,
    section,
    holds: [],
    axial: [{ from: 0, to: length, share: 1 }],
    endI: PINNED,
    endJ: PINNED,
    ...endsThatStay(restraint),
    twist: null,
  };
}

/** Ends that hold both ways are what a problem takes where nothing is said. */
function endsThatStay({ stations }: Restraint): Pick<BarProblem, 'endsStay'> {
  if (bothEndsHold(stations)) return {};
  const [first, last] = [stations[0], stations.at(-1)];
  return { endsStay: { i: first ? waysHeld(first.held) : [], j: last ? waysHeld(last.held) : [] } };
}

function waysHeld(held: Held): readonly Vec2[] {
  switch (held.ways) {
    case 0:
      return [];
    case 1:
      return [held.direction];
    case 2:
      return [
        [1, 0],
        [0, 1],
      ];
    default:
      return held satisfies never;
  }
}

const startOf = ({ stations }: Restraint): number => stations[0]?.at ?? 0;
export const lengthOf = (restraint: Restraint): number =>
  (restraint.stations.at(-1)?.at ?? 0) - startOf(restraint);

/** Interior stations with their index and their place from the first station. */
export function innerStations(
  restraint: Restraint,
): readonly { readonly station: Station; readonly index: number; readonly at: number }[] {
  return restraint.stations
    .map((station, index) => ({ station, index, at: station.at - startOf(restraint) }))
    .slice(1, -1);
}

/** Counted holds as rigid. */
export function rigidHolds({ restraint }: Pick<BowingBar, 'restraint'>): readonly Hold[] {
  return innerStations(restraint).flatMap(({ station, at }) =>
    waysHeld(station.held).map((direction): Hold => ({ at, direction, stiffness: 'rigid' })),
  );
}

/** What the frame offers, as two springs square to each other. */
export function realHolds(bar: BowingBar): readonly Hold[] {
  return bar.offered.flatMap(({ at, ellipse }): Hold[] => {
    const place = at - startOf(bar.restraint);
    return [
      { at: place, direction: ellipse.stiffWay, stiffness: ellipse.stiff },
      { at: place, direction: squareTo(ellipse.stiffWay), stiffness: ellipse.soft },
    ];
  });
}

/** The bar in question with its real holds. In the plane its ends are taken as hinges, on the safe side; out of it they turn as the project says. */
export function realProblem(bar: BowingBar, steel: Steel): BarProblem {
  return { ...bareBar(bar, steel), ...slopesThatStay(bar), holds: realHolds(bar) };
}

/** An end that does not stay in place out of the plane does not keep its slope there either. */
function slopesThatStay(bar: BowingBar): Pick<BarProblem, 'slopesStay'> {
  if (bar.ends.outOfPlane === 'hinged') return {};
  const hold = endsHoldOf(bar.angle);
  const { outOfPlane } = planeWays(bar);
  const kept = (end: 'i' | 'j'): readonly Vec2[] => (endHolds(hold[end], 'out of plane') ? [outOfPlane] : []);
  return { slopesStay: { i: kept('i'), j: kept('j') } };
}

/** "In plane, across" and "out of plane" as unit vectors of the section plane. */
export function planeWays({ angle }: Pick<BowingBar, 'angle'>): {
  readonly inPlane: Vec2;
  readonly outOfPlane: Vec2;
} {
  return {
    inPlane: unit2(inSection(angle, angle.placement.inPlane)) ?? [1, 0],
    outOfPlane: unit2(inSection(angle, angle.placement.outOfPlane)) ?? [0, 1],
  };
}

/** Stiffness against being pushed one way, the other way free to follow. */
export function stiffnessAlong({ ellipse }: Pick<StationStiffness, 'ellipse'>, way: Vec2): number {
  const [xx, xy, yy] = ellipse.matrix;
  const determinant = xx * yy - xy * xy;
  const flexibility = (way[0] * way[0] * yy - 2 * way[0] * way[1] * xy + way[1] * way[1] * xx) / determinant;
  return 1 / flexibility;
}

/** Where a bolt grips the section, from the centroid, mm: on the gauge line, at the face against the gusset, or in the middle where the gusset goes through it. */
export function gripOf({ angle, section }: Pick<BowingBar, 'angle' | 'section'>): Vec2 {
  const { gauge } = angle.placement;
  const shape = angle.stock?.outline.shape;
  if (shape && isCentred(shape)) return [0, gauge - section.centroidY];
  const [x, y] = angle.spec.legInPlane === 'longer' ? [0, gauge] : [gauge, 0];
  return [x - section.centroidX, y - section.centroidY];
}

/** With twist: holds grip at the bolts, twist is held where two bolts across hold it. */
export function withTwist(
  problem: BarProblem,
  bar: Pick<BowingBar, 'angle' | 'section' | 'restraint'>,
  steel: Steel,
): BarProblem {
  const grip = gripOf(bar);
  return {
    ...problem,
    holds: problem.holds.map((hold) => ({ ...hold, grip })),
    twist: {
      G: steel.G,
      heldAt: innerStations(bar.restraint)
        .filter(({ station }) => station.twistHeld)
        .map(({ at }) => at),
    },
  };
}

/**
 * One bar of a crossed pair: real springs everywhere but at the crossing, where only its partner's end-on hold is a spring and the way out of the plane is shared.
 * @param share its axial force per unit of the load factor, compression positive
 * @param normal out of the plane of the bay, the same vector for both bars
 */
export function pairBar(
  bar: BowingBar,
  crossing: Crossing,
  share: number,
  steel: Steel,
  normal: readonly [number, number, number],
): PairBar {
  const at = crossing.a === bar.bar.id ? crossing.onA : crossing.onB;
  const ways = planeWays(bar);
  const place = at - startOf(bar.restraint);
  const here = bar.offered.find((station) => Math.abs(station.at - at) < 1);
  const elsewhere = realHolds({ ...bar, offered: bar.offered.filter((station) => station !== here) });
  const endOn: Hold[] = here
    ? [{ at: place, direction: ways.inPlane, stiffness: stiffnessAlong(here, ways.inPlane) }]
    : [];
  const problem = realProblem(bar, steel);
  const sign = dot(bar.angle.placement.outOfPlane, normal) < 0 ? -1 : 1;
  return {
    problem: {
      ...problem,
      holds: [...elsewhere, ...endOn],
      axial: [{ from: 0, to: problem.length, share }],
    },
    crossingAt: place,
    outOfPlane: [ways.outOfPlane[0] * sign, ways.outOfPlane[1] * sign],
    cut: crossing.join?.kind === 'cut' && crossing.join.cutBar === bar.bar.key,
  };
}
