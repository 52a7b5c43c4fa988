import type { Crossing } from '../layout/model.ts';
import { criticalLoad } from '../stability/criticalLoad.ts';
import { type PairProblem, pairCriticalLoad } from '../stability/pair.ts';
import {
  type BowingBar,
  bareBar,
  pairBar,
  realProblem,
  rigidHolds,
  type Steel,
  withTwist,
} from './barProblems.ts';
import { criticalOf, loadOf } from './critical.ts';
import { offeredStations } from './grips.ts';
import type { Bowing, PartnerState, TwistEffect } from './model.ts';

/** The crossing at which a bar's partner is taken with its own bowing and force. */
export interface Partner {
  readonly bar: BowingBar;
  readonly crossing: Crossing;
  /** Tension in the partner over compression in the bar. */
  readonly tensionShare: number;
  readonly shareFrom: PartnerState['shareFrom'];
}

/** Twist counts where it lowers the critical load by more than this. */
const TWIST_COUNTS = 0.01;

/** Levels 2 and 3 for one diagonal. */
export function bowingOf(bar: BowingBar, partner: Partner | null, steel: Steel): Bowing {
  const bare = bareBar(bar, steel);
  const rigidProblem = { ...bare, holds: rigidHolds(bar) };
  const rigidLoad = loadOf(rigidProblem);
  const springProblem = realProblem(bar, steel);
  const springLoad = loadOf(springProblem);
  const twist = twistEffect(bar, steel, springProblem, springLoad);
  const pair = partner ? pairProblem(bar, partner, steel) : null;
  const bowing = pair ? (pairCriticalLoad(pair).N ?? springLoad) : springLoad;
  const twisting = twist.governs ? twist.ratio : 1;
  const { slenderness } = bar.restraint.governing;
  const byRule = (Math.PI ** 2 * steel.E * bar.section.area) / ruleSlenderness(bar) ** 2;
  return {
    bar: bar.bar.id,
    stations: offeredStations(bar, steel, rigidLoad),
    rigid: criticalOf(rigidLoad, bar.section, steel.E),
    real: criticalOf(bowing * twisting, bar.section, steel.E),
    ruleError: slenderness > 0 ? (byRule / rigidLoad - 1) * 100 : 0,
    twist,
    partner: partner ? stateOf(bar, partner, steel, twisting) : null,
    unsupported: null,
  };
}

/** The rule itself, whatever the user sets by hand. */
function ruleSlenderness({ restraint }: BowingBar): number {
  const spans = restraint.spans.reduce((most, span) => Math.max(most, span.slenderness), 0);
  return Math.max(spans, restraint.bound?.slenderness ?? 0);
}

function twistEffect(
  bar: BowingBar,
  steel: Steel,
  problem: ReturnType<typeof bareBar>,
  without: number,
): TwistEffect {
  const { N } = criticalLoad(withTwist(problem, bar, steel), { second: false });
  const ratio = (N ?? without) / without;
  return { ratio, governs: ratio < 1 - TWIST_COUNTS };
}

/** The pair as the bar in question sees it. */
export function pairProblem(bar: BowingBar, partner: Partner, steel: Steel): PairProblem {
  const normal = bar.angle.placement.outOfPlane;
  return {
    bar: pairBar(bar, partner.crossing, 1, steel, normal),
    partner: pairBar(partner.bar, partner.crossing, -partner.tensionShare, steel, normal),
  };
}

/** @param twisting what twist leaves of a load, as in the real figure */
function stateOf(bar: BowingBar, partner: Partner, steel: Steel, twisting: number): PartnerState {
  const { bar: other, crossing, tensionShare } = partner;
  const cutBar = crossing.join?.kind === 'cut' ? crossing.join.cutBar : null;
  const slack =
    tensionShare > 0 ? pairCriticalLoad(pairProblem(bar, { ...partner, tensionShare: 0 }, steel)).N : null;
  return {
    bar: other.bar.id,
    crossing: crossing.id,
    tensionShare,
    shareFrom: partner.shareFrom,
    cut: cutBar === null ? 'neither' : cutBar === bar.bar.key ? 'this bar' : 'partner',
    slackLoad: slack === null ? null : slack * twisting,
  };
}
