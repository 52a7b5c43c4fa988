import type { Assessment } from '../assessment.ts';
import {
  type BowingBar,
  planeWays,
  realProblem,
  type Steel,
  stiffnessAlong,
  withTwist,
} from '../bowing/barProblems.ts';
import { type Partner, pairLoad, pairProblem, singleLoad, twistingPair } from '../bowing/bowing.ts';
import { type BayBowing, bayBowing } from '../bowing/bowings.ts';
import { loadAgainstPartner, loadAgainstPosition } from '../bowing/curves.ts';
import type { Bowing } from '../bowing/model.ts';
import { neededStiffness } from '../bowing/needs.ts';
import { bayCriticalLoad } from '../frame/bayCriticalLoad.ts';
import { bayFrame } from '../frame/bayFrame.ts';
import { type BarMovement, evenPlaces, type PushTest, pushTest } from '../frame/pushing.ts';
import type { Vec2, Vec3 } from '../geometry/vector.ts';
import type { BarId, BayLayout, Placement } from '../layout/model.ts';
import { restraintDemands } from '../practice/restraintDemand.ts';
import { endFixityOf } from '../project/endFixity.ts';
import { restraintContext } from '../restraint/restraint.ts';
import { criticalLoad } from '../stability/criticalLoad.ts';
import { bucklingMode } from '../stability/mode.ts';
import type { BucklingMode } from '../stability/model.ts';
import { pairCriticalLoad, pairMode } from '../stability/pair.ts';
import type { BarStudy, BayStudy, HoldDemands, ModeInSpace, StationNeed } from './model.ts';
import { modeInWords } from './modeWords.ts';

/** A closer look at one bar; null when it is not assessed. */
export function studyOf(assessment: Assessment, bar: BarId): BarStudy | null {
  const scene = sceneOf(assessment, bar);
  if (!scene) return null;
  const { studied, partner, steel, bay } = scene;
  const mode = realMode(studied, partner, steel);
  const { placement } = studied.angle;
  const bowing = assessment.diagonals.get(bar)?.bowing;
  return {
    bar,
    mode: inSpace(mode, placement, studied.restraint.stations[0]?.at ?? 0),
    modeSays: modeInWords(mode),
    needs: needsOf(studied, steel, bowing?.stations.map(({ station }) => station) ?? []),
    againstPartner: partner
      ? { points: loadAgainstPartner(studied, partner, steel), present: partner.tensionShare }
      : null,
    againstPosition: partner
      ? {
          points: loadAgainstPosition(studied, steel),
          present: placeOf(studied, partner) / studied.bar.length,
        }
      : null,
    demands: bowing ? demandsOf(assessment, studied, bowing) : null,
    bay: bayStudy(assessment, bay, scene),
  };
}

function demandsOf(
  assessment: Assessment,
  { bar, angle, restraint }: BowingBar,
  bowing: Bowing,
): HoldDemands | null {
  if (angle.spec.countedOn !== 'both') return null;
  const squeezed = assessment.diagonals.get(bar.id)?.checks?.compression ?? null;
  const critical = bowing.real.N;
  const byLoads = squeezed !== null && squeezed.force >= critical ? squeezed : null;
  const compression = byLoads?.force ?? critical;
  const spacing = restraint.lanes.v.unbraced;
  const counted = bowing.stations.flatMap(({ holds }) => holds.filter((hold) => hold.counted));
  return {
    compression,
    from: byLoads ? { kind: 'combination', name: byLoads.name } : { kind: 'critical load' },
    each: restraintDemands(assessment.practice.id, {
      compression,
      spacing,
      points: Math.max(1, bowing.stations.length),
      misalignment: spacing / 500,
      ...(counted.length > 0 ? { offered: Math.min(...counted.map(({ offered }) => offered)) } : {}),
    }),
  };
}

/** The bar pushed at a place between its ends, in its bay; null when it is not assessed or the place is not on it. */
export function pushOf(assessment: Assessment, bar: BarId, at: number): PushTest | null {
  const found = assessment.layout.bars.get(bar);
  const bay = assessment.layout.bays.find(({ id }) => id === found?.bay);
  if (!found?.angle?.stock || !bay || !(at > 1 && at < found.length - 1)) return null;
  const { holdings } = restraintContext(assessment.layout);
  const { x, y } = found.angle.placement;
  return pushTest(
    assessment.layout,
    holdings,
    bay,
    { ...assessment.practice.steel, ends: endFixityOf(assessment.project.settings), tension: new Map() },
    { bar, at, axes: { x, y } },
  );
}

interface Scene {
  readonly studied: BowingBar;
  readonly partner: Partner | null;
  readonly steel: Steel;
  readonly bay: BayLayout;
  readonly bowing: BayBowing;
}

function sceneOf(assessment: Assessment, id: BarId): Scene | null {
  const { layout, project, practice } = assessment;
  const bayId = layout.bars.get(id)?.bay;
  const bay = layout.bays.find((each) => each.id === bayId);
  const source = project.bays.find((each) => each.id === bayId);
  if (!bay || !source) return null;
  const restraints = new Map(
    [...assessment.diagonals].flatMap(([key, { restraint }]) =>
      restraint ? [[key, restraint] as const] : [],
    ),
  );
  const input = {
    layout,
    context: restraintContext(layout),
    restraints,
    steel: practice.steel,
    ends: endFixityOf(project.settings),
    forces: assessment.forces,
  };
  const bowing = bayBowing(input, bay, source);
  const studied = bowing.bars.get(id);
  return studied
    ? { studied, partner: bowing.partners.get(id) ?? null, steel: practice.steel, bay, bowing }
    : null;
}

/** The shape at the load that is shown: with twist where twist counts. */
function realMode(bar: BowingBar, partner: Partner | null, steel: Steel): BucklingMode {
  const paired = partner && pairLoad(bar, partner, steel);
  if (partner && paired) {
    const pair = (paired.twist.governs ? twistingPair : pairProblem)(bar, partner, steel);
    const { factor } = pairCriticalLoad(pair);
    if (factor !== null) return pairMode(pair, factor);
  }
  const bowing = realProblem(bar, steel);
  const problem = singleLoad(bar, steel).twist.governs ? withTwist(bowing, bar, steel) : bowing;
  const { factor } = criticalLoad(problem, { second: false });
  if (factor === null) throw new Error('a bar without compression has no mode');
  return bucklingMode(problem, factor);
}

function inSpace(mode: BucklingMode, { x, y }: Placement, start: number): ModeInSpace {
  const way = ([a, b]: Vec2): Vec3 => [a * x[0] + b * y[0], a * x[1] + b * y[1], a * x[2] + b * y[2]];
  return {
    points: mode.shape.map(({ at, displacement, twist }) => ({
      at: at + start,
      displacement: way(displacement),
      twist,
    })),
    largestAt: mode.largestAt + start,
    direction: mode.directionAtLargest,
  };
}

function needsOf(bar: BowingBar, steel: Steel, stations: readonly number[]): readonly StationNeed[] {
  const ways = planeWays(bar);
  return stations.flatMap((station) => {
    const at = bar.restraint.stations[station]?.at ?? 0;
    const offered = bar.offered.find((each) => Math.abs(each.at - at) < 1.5);
    if (!offered) return [];
    return (
      [
        ['in plane', ways.inPlane],
        ['out of plane', ways.outOfPlane],
      ] as const
    ).flatMap(([direction, way]) => {
      const needed = neededStiffness(bar, steel, station, way);
      return needed ? [{ station, at, direction, offered: stiffnessAlong(offered, way), needed }] : [];
    });
  });
}

const placeOf = ({ bar }: BowingBar, { crossing }: Partner): number =>
  crossing.a === bar.id ? crossing.onA : crossing.onB;

function bayStudy(assessment: Assessment, bay: BayLayout, { studied, partner, steel }: Scene): BayStudy {
  const { holdings } = restraintContext(assessment.layout);
  const { layout } = assessment;
  const places = new Map(
    bay.diagonals.map((id) => [id, evenPlaces(layout.bars.get(id)?.length ?? 0)] as const),
  );
  // Hinged in the plane, as the single bar is taken, so that the two can be compared.
  const frame = bayFrame(layout, holdings, bay, {
    ...steel,
    ends: { ...endFixityOf(assessment.project.settings), inPlane: 'hinged' },
    tension: new Map(),
    extraPlaces: places,
  });
  const shares = new Map<BarId, number>([[studied.bar.id, -1]]);
  if (partner) shares.set(partner.bar.bar.id, partner.tensionShare);
  const single = partner
    ? pairCriticalLoad(pairProblem(studied, partner, steel)).N
    : criticalLoad(realProblem(studied, steel), { second: false }).N;
  const { factor, mode } = bayCriticalLoad(frame, shares, single ?? 1000);
  const movement = bay.diagonals.flatMap((bar): BarMovement[] => {
    const along = frame.along.get(bar);
    if (!along || mode.length === 0) return [];
    return [
      {
        bar,
        points: along.map(({ at, node }) => {
          const [a = 0, b = 0, c = 0] = mode[node] ?? [];
          return { at, displacement: [a, b, c] };
        }),
      },
    ];
  });
  return { N: factor, ratio: factor !== null && single ? factor / single : null, movement };
}
