import { rigidLoadWithTwist } from '../bowing/bowing.ts';
import { loadAtSlenderness } from '../bowing/critical.ts';
import { type InServiceReading, inServiceSlenderness } from '../bowing/exactSlenderness.ts';
import type { Catalogues, Stock, StockAngle } from '../catalogue/model.ts';
import { stockOf } from '../catalogue/stock.ts';
import { steelOf } from '../checks/barChecks.ts';
import type { BarChecks } from '../checks/model.ts';
import { MOST_USED, sectionChecks, silentChecks } from '../checks/sectionChecks.ts';
import type { Forces } from '../forces/model.ts';
import type { AngleBar, Bar, BarId, Layout, Placement } from '../layout/model.ts';
import type { LimitInForce, Practice } from '../practice/model.ts';
import type { Project } from '../project/model.ts';
import type { Restraint, Station } from '../restraint/model.ts';
import type { FreeWays } from '../restraint/movable.ts';
import { barStations, restraintContext, restraintWith } from '../restraint/restraint.ts';
import { usualGauge } from '../section/gauge.ts';
import { AXES, type Axis } from '../section/model.ts';
import type { Candidate, Shortlist, ShortlistOptions } from './model.ts';

/** What choosing an angle needs to know; an assessment has it and more. */
export interface ShortlistSubject {
  readonly project: Project;
  readonly practice: Practice;
  readonly layout: Layout;
  readonly diagonals: ReadonlyMap<
    BarId,
    { readonly limit: LimitInForce; readonly checks: BarChecks | null; readonly turns: FreeWays | null }
  >;
  /** Forces of the combinations: a candidate must carry what acts. Null where nothing acts. */
  readonly forces: Forces | null;
}

type Leg = 'longer' | 'shorter';

interface Seat {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly limit: number;
  /** What the bar carries; null where nothing acts. */
  readonly demands: Pick<BarChecks, 'tension' | 'compression'> | null;
  /** Longest piece as fabricated, mm. */
  readonly piece: number;
  readonly stations: Readonly<Record<Leg, readonly Station[] | null>>;
}

/**
 * Every stock angle tried in place for bars that must share a size: ranked by mass, the first that passes, and why each lighter one does not.
 * Bars that are not in the layout, or have no length, are left out; with none left the list is empty.
 */
export function shortlist(
  subject: ShortlistSubject,
  catalogues: Catalogues,
  bars: readonly BarId[],
  options: ShortlistOptions,
): Shortlist {
  const { project } = subject;
  const stock = stockOf(project.settings.catalogue, project.ownStock, catalogues);
  const seats = seatsOf(subject, bars);
  const limit = seats.reduce((least, seat) => Math.min(least, seat.limit), Number.POSITIVE_INFINITY);
  const candidates = seats.length > 0 ? tried(stock, subject, seats, options) : [];
  const ranked = candidates.sort((p, q) => p.massPerMetre - q.massPerMetre || p.slenderness - q.slenderness);
  return {
    bars: seats.map((seat) => seat.bar.id),
    limit: Number.isFinite(limit) ? limit : 0,
    neededRadius: neededRadius(seats, stock),
    candidates: ranked,
    first: ranked.find((candidate) => candidate.passes && candidate.fit === null) ?? null,
    passing: ranked.filter((candidate) => candidate.passes).length,
  };
}

function seatsOf(subject: ShortlistSubject, bars: readonly BarId[]): readonly Seat[] {
  const context = restraintContext(subject.layout);
  return bars.flatMap((id): Seat[] => {
    const bar = subject.layout.bars.get(id);
    const diagonal = subject.diagonals.get(id);
    // No angle helps a bar that turns freely.
    if (!bar?.angle || !diagonal || diagonal.turns) return [];
    const { limit, checks } = diagonal;
    const { angle } = bar;
    const basis = subject.project.settings.lengthBasis;
    const turned = (leg: Leg) => barStations(context, bar, withLeg(angle, leg), basis);
    const stations = { longer: turned('longer'), shorter: turned('shorter') };
    if (!stations.longer || !stations.shorter) return [];
    const piece = angle.cut.pieces.reduce((most, each) => Math.max(most, each.to - each.from), 0);
    const demands = subject.forces === null ? null : checks;
    return [{ bar, angle, limit: limit.limit, demands, piece, stations }];
  });
}

function withLeg(angle: AngleBar, leg: Leg): AngleBar {
  if (angle.spec.legInPlane === leg) return angle;
  const { placement } = angle;
  const swapped: Placement = { ...placement, x: placement.y, y: placement.x };
  return { ...angle, spec: { ...angle.spec, legInPlane: leg }, placement: swapped };
}

type Asks = Practice['asks'];

function tried(
  stock: Stock,
  subject: ShortlistSubject,
  seats: readonly Seat[],
  options: ShortlistOptions,
): Candidate[] {
  return stock.choices
    .filter((angle) => isReached(stock, angle))
    .flatMap((angle) => {
      const legs = legsToTry(angle, seats, options);
      return legs.map((leg) => candidateOf(subject, seats, angle, leg));
    });
}

/** Whether its designation leads to this very angle: a namesake on the project's own list stands before one in a catalogue. */
function isReached(stock: Stock, angle: StockAngle): boolean {
  const found = stock.find(angle.designation);
  return found.ok && found.angle === angle;
}

/** An equal angle reads the same with either leg in the plane. */
function legsToTry(angle: StockAngle, seats: readonly Seat[], options: ShortlistOptions): readonly Leg[] {
  const present = seats[0]?.angle.spec.legInPlane ?? 'longer';
  if (angle.kind === 'equal' || options.placements === 'as placed') return [present];
  return ['longer', 'shorter'];
}

interface Reading {
  readonly seat: Seat;
  readonly restraint: Restraint;
  readonly inService: InServiceReading;
  readonly handling: number;
  /** Asked slenderness over limit. */
  readonly share: number;
}

function candidateOf(
  subject: ShortlistSubject,
  seats: readonly Seat[],
  angle: StockAngle,
  leg: Leg,
): Candidate {
  const { asks } = subject.practice;
  const readings = seats.map((seat): Reading => {
    const restraint = restraintWith(seat.bar, seat.angle, seat.stations[leg] ?? [], angle.properties);
    const handling = seat.piece / angle.properties.rv;
    const inService = inServiceSlenderness(angle.properties, restraint);
    const asked = asks === 'handling' ? handling : inService.slenderness;
    return { seat, restraint, inService, handling, share: asked / seat.limit };
  });
  const worst = readings.reduce((most, each) => (each.share > most.share ? each : most));
  const { governing, lanes } = worst.restraint;
  const slenderness = asks === 'handling' ? worst.handling : worst.inService.slenderness;
  const slender = worst.share <= 1;
  const used = slender ? mostUsed(subject, readings, angle, leg) : null;
  const passes = slender && (used === null || used.utilisation <= 1);
  const fits = seats.map((seat) => fitOf(angle, leg, seat.angle));
  const fit = fits.find((reason) => reason !== null) ?? null;
  return {
    designation: angle.designation,
    kind: angle.kind,
    legInPlane: leg,
    massPerMetre: angle.massPerMetre,
    bar: worst.seat.bar.id,
    slenderness,
    axis: asks === 'handling' ? 'v' : governing.axis,
    bySlenderness: {
      x: lanes.x.slenderness,
      y: lanes.y.slenderness,
      u: lanes.u.slenderness,
      v: lanes.v.slenderness,
    },
    handling: worst.handling,
    limit: worst.seat.limit,
    passes,
    utilisation: used?.utilisation ?? null,
    fit,
    why: passes ? fit : slender ? (used?.says ?? null) : whyNot(worst, slenderness, asks),
    isPresent: seats.every(
      ({ angle: now }) =>
        now.stock?.designation === angle.designation &&
        now.stock.catalogue === angle.catalogue &&
        (angle.kind === 'equal' || now.spec.legInPlane === leg),
    ),
  };
}

interface Used {
  readonly utilisation: number;
  readonly says: string;
}

/** What acts on each bar against the candidate in its place, with the present bolts. The critical load is that of the in-service slenderness, or with rigid holds and twist where that is less. */
function mostUsed(
  { project, practice, forces }: ShortlistSubject,
  readings: readonly Reading[],
  stock: StockAngle,
  leg: Leg,
): Used | null {
  const input = { project, practice, forces };
  const all = readings.flatMap(({ seat, restraint, inService }): readonly Used[] => {
    if (!seat.demands) return [];
    const steel = steelOf(input, seat.angle.spec.grade, stock.outline.thickness);
    if (!steel) return [];
    const turned = withLeg(seat.angle, leg);
    const width = leg === 'longer' ? stock.outline.longLeg : stock.outline.shortLeg;
    const { gauge } = usualGauge(width, stock.catalogue === 'us' ? 'us' : 'metric');
    const angle = { ...turned, placement: { ...turned.placement, gauge } };
    const bySlenderness = loadAtSlenderness(inService.slenderness, stock.properties.area, steel.E);
    // Twist is asked of what is squeezed alone: it costs more than all the rest.
    const criticalLoad = seat.demands.compression
      ? Math.min(bySlenderness, rigidLoadWithTwist({ angle, section: stock.properties, restraint }, steel))
      : bySlenderness;
    const found = sectionChecks(
      input,
      { bar: seat.bar, angle, stock, steel, restraint, criticalLoad },
      seat.demands,
    );
    const { governing } = found;
    const [silent] = silentChecks({ ...seat.demands, ...found });
    if (silent)
      return [
        {
          utilisation: MOST_USED,
          says: `${seat.bar.mark}: no figure for ${silent.resistance.title.toLowerCase()}`,
        },
      ];
    if (governing?.utilisation == null) return [];
    const { resistance, demand, utilisation } = governing;
    return [
      {
        utilisation,
        says: `${seat.bar.mark}: ${resistance.title.toLowerCase()}, ${kilo(demand?.force ?? 0)} over ${kilo(resistance.resistance ?? 0)} kN, ${resistance.clause}`,
      },
    ];
  });
  return all.reduce<Used | null>(
    (most, each) => (most === null || each.utilisation > most.utilisation ? each : most),
    null,
  );
}

const kilo = (newtons: number): string => (newtons / 1000).toFixed(1);

function whyNot(worst: Reading, slenderness: number, asks: Asks): string {
  const { seat, restraint } = worst;
  const { axis } = restraint.governing;
  const { length, radius } = worst.inService;
  const [over, r] = asks === 'handling' ? [seat.piece, restraint.lanes.v.radius] : [length, radius];
  const about =
    asks === 'handling' ? 'as fabricated' : axis === 'free' ? 'in its free direction' : `about ${axis}`;
  return `${seat.bar.mark} ${about}: ${over.toFixed(0)} / ${r.toFixed(1)} = ${slenderness.toFixed(slenderness < seat.limit + 0.5 ? 1 : 0)}, over ${seat.limit}`;
}

/** Whether the bolts fit the leg on its usual gauge line; null when they do. */
function fitOf(angle: StockAngle, leg: Leg, seat: AngleBar): string | null {
  const { outline } = angle;
  const width = leg === 'longer' ? outline.longLeg : outline.shortLeg;
  const usual = usualGauge(width, angle.catalogue === 'us' ? 'us' : 'metric');
  const bolts = [seat.ends.i, seat.ends.j].filter((end) => end.kind === 'bolted');
  const largest = bolts.reduce((most, end) => Math.max(most, end.boltDiameter), 0);
  return largest > usual.maxBolt + 0.5
    ? `bolts of ${largest} mm are too large for a leg of ${width} mm (common practice)`
    : null;
}

/** About u and v it depends on how those axes lie in the present section; while that is unknown, on how they lie in an equal angle. */
function neededRadius(seats: readonly Seat[], stock: Stock): Readonly<Record<Axis, number>> {
  const needed: Record<Axis, number> = { x: 0, y: 0, u: 0, v: 0 };
  for (const { bar, angle, limit, stations } of seats) {
    const placed = stations[angle.spec.legInPlane];
    const section = angle.stock ?? stock.choices.find(({ kind }) => kind === 'equal');
    if (!section || !placed) continue;
    const { lanes } = restraintWith(bar, angle, placed, section.properties);
    for (const axis of AXES) needed[axis] = Math.max(needed[axis], lanes[axis].unbraced / limit);
  }
  return needed;
}
