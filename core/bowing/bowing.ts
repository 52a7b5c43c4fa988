import type { Crossing } from '../layout/model.ts';
import { criticalLoad } from '../stability/criticalLoad.ts';
import { type PairBar, type PairProblem, pairCriticalLoad } from '../stability/pair.ts';
import {
  type BowingBar,
  bareBar,
  gripOf,
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
  const { N, twist } = (partner && pairLoad(bar, partner, steel)) ?? singleLoad(bar, steel);
  const { slenderness } = bar.restraint.governing;
  const byRule = (Math.PI ** 2 * steel.E * bar.section.area) / ruleSlenderness(bar) ** 2;
  return {
    bar: bar.bar.id,
    stations: offeredStations(bar, steel, rigidLoad),
    rigid: criticalOf(rigidLoad, bar.section, steel.E),
    real: criticalOf(N, bar.section, steel.E),
    ruleError: slenderness > 0 ? (byRule / rigidLoad - 1) * 100 : 0,
    twist,
    partner: partner ? stateOf(bar, partner, steel) : null,
    unsupported: null,
  };
}

/** A critical load with what twist takes of it, where it takes enough to count. */
export interface RealLoad {
  readonly N: number;
  readonly twist: TwistEffect;
}

/** The bar on springs as soft as its holds are. */
export function singleLoad(bar: BowingBar, steel: Steel): RealLoad {
  const problem = realProblem(bar, steel);
  const bowing = loadOf(problem);
  return realLoad(bowing, criticalLoad(withTwist(problem, bar, steel), { second: false }).N);
}

/** With all counted holds rigid, and twist: what a bar is worth before its framing is known, N. */
export function rigidLoadWithTwist(
  bar: Pick<BowingBar, 'angle' | 'section' | 'restraint'>,
  steel: Steel,
): number {
  const problem = { ...bareBar(bar, steel), holds: rigidHolds(bar) };
  return Math.min(loadOf(problem), loadOf(withTwist(problem, bar, steel)));
}

/** The bar and its partner together, each with its own bowing, twist and force; null when nothing presses either of them. */
export function pairLoad(bar: BowingBar, partner: Partner, steel: Steel): RealLoad | null {
  const bowing = pairCriticalLoad(pairProblem(bar, partner, steel)).N;
  return bowing === null ? null : realLoad(bowing, pairCriticalLoad(twistingPair(bar, partner, steel)).N);
}

function realLoad(bowing: number, twisting: number | null): RealLoad {
  const ratio = bowing > 0 ? (twisting ?? bowing) / bowing : 1;
  const governs = ratio < 1 - TWIST_COUNTS;
  return { N: governs ? bowing * ratio : bowing, twist: { ratio, governs } };
}

/** The rule itself, whatever the user sets by hand. */
function ruleSlenderness({ restraint }: BowingBar): number {
  const spans = restraint.spans.reduce((most, span) => Math.max(most, span.slenderness), 0);
  return Math.max(spans, restraint.bound?.slenderness ?? 0);
}

/** The pair as the bar in question sees it, bowing alone. */
export function pairProblem(bar: BowingBar, partner: Partner, steel: Steel): PairProblem {
  const normal = bar.angle.placement.outOfPlane;
  return {
    bar: pairBar(bar, partner.crossing, 1, steel, normal),
    partner: pairBar(partner.bar, partner.crossing, -partner.tensionShare, steel, normal),
  };
}

/** And with twist: each bar is gripped at its bolts, by its partner and by whatever else holds it. */
export function twistingPair(bar: BowingBar, partner: Partner, steel: Steel): PairProblem {
  const pair = pairProblem(bar, partner, steel);
  const twisting = (one: PairBar, of: BowingBar): PairBar => ({
    ...one,
    problem: withTwist(one.problem, of, steel),
    grip: gripOf(of),
  });
  return { bar: twisting(pair.bar, bar), partner: twisting(pair.partner, partner.bar) };
}

function stateOf(bar: BowingBar, partner: Partner, steel: Steel): PartnerState {
  const { bar: other, crossing, tensionShare } = partner;
  const cutBar = crossing.join?.kind === 'cut' ? crossing.join.cutBar : null;
  return {
    bar: other.bar.id,
    crossing: crossing.id,
    tensionShare,
    shareFrom: partner.shareFrom,
    cut: cutBar === null ? 'neither' : cutBar === bar.bar.key ? 'this bar' : 'partner',
    slackLoad: tensionShare > 0 ? (pairLoad(bar, { ...partner, tensionShare: 0 }, steel)?.N ?? null) : null,
  };
}
