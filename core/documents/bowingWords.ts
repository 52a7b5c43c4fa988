/** The three readings of one bar, by the marks, by stiffness and by critical load, and the sentence that says why they differ. */
import type { DiagonalAssessment } from '../assessment.ts';
import { loadAtSlenderness } from '../bowing/critical.ts';
import type { Bowing, HoldGrip, OfferedStation } from '../bowing/model.ts';
import type { NeededStiffness } from '../bowing/needs.ts';
import type { Bar } from '../layout/model.ts';
import type { Practice, Verdict } from '../practice/model.ts';
import type { Governing } from '../restraint/model.ts';
import { grouped } from '../units/figures.ts';
import { showForce, showStiffness } from '../units/loads.ts';
import { showLength, showSlenderness } from '../units/quantity.ts';
import type { UnitSystem } from '../units/unitSystem.ts';

export interface ReadBar {
  readonly bar: Bar;
  readonly diagonal: DiagonalAssessment;
  readonly practice: Practice;
  readonly units: UnitSystem;
  /** What holds would need, where someone has looked closer; null until then. */
  readonly needs: readonly NeedAt[] | null;
  markOf(bar: string): string;
}

export interface NeedAt {
  readonly station: number;
  readonly direction: HoldGrip['direction'];
  readonly needed: NeededStiffness;
}

export type ReadingName = 'by the marks' | 'by stiffness' | 'by critical load';

/** over, near, within: of the limit. soft: too little to count. weak: counted, and less than the mark claims. firm: as good as rigid. */
export type ReadingState = 'over' | 'near' | 'within' | 'soft' | 'weak' | 'firm' | 'nothing';

export interface Reading {
  readonly name: ReadingName;
  /** The figure alone, with its unit. */
  readonly figure: string;
  readonly says: string;
  readonly state: ReadingState;
  /** "over 300". */
  readonly stateSays: string;
}

export interface ThreeReadings {
  readonly readings: readonly Reading[];
  /** The one that is worst for the bar; null where they agree. */
  readonly worst: ReadingName | null;
  readonly difference: string;
}

/** From this share of the limit on a bar is near it, as in its verdict. */
const NEAR = 0.85;
/** A hold that keeps this share of the rigid critical load is as good as rigid. */
const FIRM = 0.95;
/** Readings whose slendernesses differ by less than this agree. */
const AGREE = 0.02;

/** Null for a bar that is not assessed so far. */
export function threeReadings(given: ReadBar): ThreeReadings | null {
  const { restraint, inService, bowing } = given.diagonal;
  if (restraint === null || inService === null || bowing === null) return null;
  const case_: Case = { ...given, governing: restraint.governing, inService, bowing };
  return {
    readings: [byMarks(case_), byStiffness(case_), byCriticalLoad(case_)],
    worst: worstOf(case_),
    difference: difference(case_),
  };
}

interface Case extends ReadBar {
  readonly governing: Governing;
  readonly inService: Verdict;
  readonly bowing: Bowing;
}

function byMarks({ governing, inService, units }: Case): Reading {
  const over = `over ${showLength(governing.length, units, 'spoken')}`;
  const bound = inService.bound;
  return {
    name: 'by the marks',
    figure: showSlenderness(inService.slenderness, inService.limit),
    says:
      bound !== null
        ? `exact; bound ${showSlenderness(bound)}`
        : governing.axis === 'free'
          ? `about none of the four axes, ${over}`
          : `about ${governing.axis}, ${over}`,
    ...againstLimit(inService.slenderness, inService.limit),
  };
}

function byStiffness(case_: Case): Reading {
  const { bowing, units } = case_;
  const name = 'by stiffness';
  if (bowing.unsupported !== null)
    return { name, figure: '–', says: 'the bay can move', state: 'weak', stateSays: 'holds nothing' };
  const told = holdToTell(bowing);
  if (told === null)
    return { name, figure: '–', says: 'nothing is joined to it', state: 'nothing', stateSays: '' };
  const { hold } = told;
  const at = `${hold.direction} at ${labelOf(case_, told.offered)}`;
  const figure = showStiffness(hold.offered, units);
  if (hold.grip === null)
    return {
      name,
      figure,
      says: `of ${showStiffness(hold.ideal, units, 'bare')} wanted, ${at}`,
      ...(hold.offered < hold.ideal
        ? { state: 'soft', stateSays: 'too soft to count' }
        : { state: 'firm', stateSays: 'not counted' }),
    };
  return {
    name,
    figure,
    says: at,
    state: hold.grip < FIRM ? 'weak' : 'firm',
    stateSays: `grips ${percent(hold.grip)}`,
  };
}

function byCriticalLoad(case_: Case): Reading {
  const { bowing, inService, units, diagonal } = case_;
  const { N, slenderness } = bowing.real;
  const ratio = loadByMarks(case_);
  const twist = bowing.twist.governs ? ', with twist' : '';
  return {
    name: 'by critical load',
    figure: showForce(N, units),
    says: `reads ${showSlenderness(slenderness, inService.limit)}${ratio === null ? '' : `, ${grouped(N / ratio, 2)} of the marks’ load`}${twist}`,
    ...againstLimit(slenderness, diagonal.limit.limit),
  };
}

/** N; null without a section. */
function loadByMarks({ bar, practice, inService }: Case): number | null {
  const area = bar.angle?.stock?.properties.area;
  return area === undefined ? null : loadAtSlenderness(inService.slenderness, area, practice.steel.E);
}

function againstLimit(slenderness: number, limit: number): Pick<Reading, 'state' | 'stateSays'> {
  const state = slenderness > limit ? 'over' : slenderness >= NEAR * limit ? 'near' : 'within';
  return { state, stateSays: `${state} ${limit}` };
}

interface Told {
  readonly offered: OfferedStation;
  readonly hold: HoldGrip;
}

/** The hold that says most: a counted one that is weak, else the way that is left out and comes nearest to none, else the weakest that counts. */
function holdToTell({ stations }: Bowing): Told | null {
  const all = stations.flatMap((offered) => offered.holds.map((hold): Told => ({ offered, hold })));
  const least = (some: readonly Told[], by: (hold: HoldGrip) => number): Told | null =>
    some.reduce<Told | null>(
      (best, each) => (best === null || by(each.hold) < by(best.hold) ? each : best),
      null,
    );
  const counted = least(
    all.filter(({ hold }) => hold.grip !== null),
    ({ grip }) => grip ?? 1,
  );
  if (counted !== null && (counted.hold.grip ?? 1) < FIRM) return counted;
  const left = all.filter(({ hold }) => hold.grip === null);
  return least(left, ({ offered, ideal }) => offered / ideal) ?? counted;
}

function worstOf({ inService, bowing }: Case): ReadingName | null {
  if (bowing.unsupported !== null) return 'by stiffness';
  const change = bowing.real.slenderness / inService.slenderness - 1;
  if (Math.abs(change) < AGREE) return null;
  if (change < 0) return 'by the marks';
  return weakest(bowing) === null ? 'by critical load' : 'by stiffness';
}

function difference(case_: Case): string {
  const { bar, bowing, inService } = case_;
  const { mark } = bar;
  if (bowing.unsupported !== null)
    return `${bowing.unsupported} What the marks read for ${mark} leans on holds that are not there.`;
  const change = bowing.real.slenderness / inService.slenderness - 1;
  if (Math.abs(change) < AGREE) return `${agreement(case_)}${twistToo(bowing)}`;
  return change < 0
    ? `${safeSide(case_)}: the marks are on the safe side by ${percent(-change)} of slenderness.${twistToo(bowing)}`
    : `${unsafeSide(case_)}: the marks are on the unsafe side by ${percent(change)} of slenderness.${isForTwist(case_) ? '' : twistToo(bowing)}`;
}

function agreement({ bar, bowing }: Case): string {
  if (bowing.stations.length === 0)
    return `Nothing is joined to ${bar.mark} between its ends, so the readings are one.`;
  const left = bowing.stations.some(({ holds }) => holds.some(({ grip }) => grip === null));
  return `What the marks count is as good as rigid${left ? ', and what they leave out adds nothing' : ''}: the readings of ${bar.mark} agree.`;
}

function twistToo({ twist }: Bowing): string {
  return twist.governs ? ` Twist is in it, and takes ${percent(1 - twist.ratio)} of the load.` : '';
}

/** What helps although the marks leave it out. */
function safeSide(case_: Case): string {
  const { bar, bowing, inService, units } = case_;
  const helper = helperOf(case_);
  const reads = `${bar.mark} reads ${showSlenderness(bowing.real.slenderness)} instead of ${showSlenderness(inService.slenderness)}`;
  if (helper === null) return `With the stiffness of what is joined ${reads}`;
  const { offered, hold } = helper;
  const label = labelOf(case_, offered);
  const gives = `${label} gives ${showStiffness(hold.offered, units)} ${hold.direction}`;
  const need = case_.needs?.find(
    ({ station, direction }) => station === offered.station && direction === hold.direction,
  )?.needed;
  const { partner } = bowing;
  const isTaut = partner !== null && partner.tensionShare > 0;
  if (isTaut && (need?.forAll == null || hold.offered < need.forAll))
    return `${case_.markOf(partner.bar)}, taut, resists being pushed ${hold.direction} far more than unloaded. With it ${reads}`;
  if (hold.offered >= hold.ideal) return `${gives}, which the marks do not count. With it ${reads}`;
  const tooSoft = `${gives}, too little for a full hold, so the marks leave it out. But`;
  if (need?.forAll != null && hold.offered >= need.forAll)
    return `${tooSoft} ${bar.mark}, held ${otherWay(hold.direction)} already, needs only ${showStiffness(need.forAll, units)} to bow in shorter waves`;
  return `${tooSoft} with it ${reads}`;
}

function helperOf({ bowing }: Case): Told | null {
  const left = bowing.stations.flatMap((offered) =>
    offered.holds.flatMap((hold): Told[] => (hold.grip === null ? [{ offered, hold }] : [])),
  );
  return left.reduce<Told | null>(
    (best, each) =>
      best === null || each.hold.offered / each.hold.ideal > best.hold.offered / best.hold.ideal
        ? each
        : best,
    null,
  );
}

/** What the marks do not see. */
function unsafeSide(case_: Case): string {
  const { bar, bowing, inService, units } = case_;
  const reads = `${bar.mark} reads ${showSlenderness(bowing.real.slenderness)} where the marks say ${showSlenderness(inService.slenderness)}`;
  const weak = weakest(bowing);
  if (weak !== null)
    return `${labelOf(case_, weak.offered)} gives only ${showStiffness(weak.hold.offered, units)} ${weak.hold.direction} and keeps ${percent(weak.hold.grip ?? 0)} of what a rigid hold would; ${reads}`;
  if (isForTwist(case_))
    return `Bowing and twisting together take ${percent(1 - bowing.twist.ratio)} of the load; ${reads}`;
  const { partner } = bowing;
  if (partner !== null && partner.tensionShare < 0)
    return `${case_.markOf(partner.bar)} is squeezed too, and gives way with it; ${reads}`;
  if (partner !== null && partner.cut !== 'neither')
    return `${partner.cut === 'partner' ? case_.markOf(partner.bar) : bar.mark} is cut at the crossing, a hinge out of the plane; ${reads}`;
  return `It bows about both its axes at once, which no span alone shows; ${reads}`;
}

/** Twist takes more than the rest does, or there is nothing else to name. */
function isForTwist({ bowing, inService }: Case): boolean {
  const { real, twist, partner } = bowing;
  if (!twist.governs || weakest(bowing) !== null) return false;
  if (partner === null || (partner.tensionShare >= 0 && partner.cut === 'neither')) return true;
  const bowingAlone = real.slenderness * Math.sqrt(twist.ratio);
  return bowingAlone - inService.slenderness < real.slenderness - bowingAlone;
}

function weakest(bowing: Bowing): Told | null {
  const told = holdToTell(bowing);
  return told?.hold.grip != null && told.hold.grip < FIRM ? told : null;
}

function otherWay(direction: HoldGrip['direction']): string {
  return direction === 'in plane' ? 'out of plane' : 'in plane';
}

function labelOf({ diagonal }: Case, { station }: OfferedStation): string {
  return diagonal.restraint?.stations[station]?.label ?? 'the crossing';
}

const percent = (share: number): string => `${grouped(share * 100, share < 0.0995 ? 1 : 0)} %`;
