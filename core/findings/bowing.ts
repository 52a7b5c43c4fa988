import { barName } from '../restraint/trails.ts';
import { showForce, showStiffness } from '../units/loads.ts';
import { showLength } from '../units/quantity.ts';
import type { Finding } from './model.ts';
import { type FindingSubject, grouped, isAre, type Judged, judgedIn, marksInWords } from './subject.ts';

/** A hold that keeps less than this share of the rigid critical load is weaker than the mark claims. */
const WEAK = 0.95;
/** The rule may be this far on the unsafe side, per cent of load, before it is said. */
const UNSAFE = 3;
/** A taut partner without which the bar loses more than this share is one to worry about. */
const LOST = 0.1;

/** What stiffness and critical load show that the marks do not. */
export function bowingFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const all = judgedIn(subject, bay);
    return [
      ...movableFindings(subject, bay.id, all),
      ...all.flatMap((judged) => weakHolds(subject, judged)),
      ...sharedFinding(all, isRuleUnsafe, (group) => ruleUnsafe(subject, group)),
      ...sharedFinding(all, ({ bowing }) => bowing?.twist.governs ?? false, twistGoverns),
      ...squeezedPairs(subject, all),
      ...all.flatMap((judged) => losesPartner(subject, judged) ?? []),
    ];
  });
}

const blank = {
  crossing: null,
  breaksLimit: false,
  value: null,
  limit: null,
  quantity: 'none',
  path: null,
} as const;

function movableFindings(subject: FindingSubject, bay: string, all: readonly Judged[]): readonly Finding[] {
  const movable = subject.movable.get(bay) ?? [];
  const [one] = movable;
  if (!one) return [];
  const touched = new Set(movable.flatMap(({ bars }) => bars));
  return [
    {
      ...blank,
      id: `movable:${bay}`,
      kind: 'bay can move',
      severity: 'must fix',
      bay,
      bars: all.filter(({ bar }) => touched.has(bar.id)).map(({ bar }) => bar.id),
      title: `${bay} can move without resistance`,
      detail: `${one.says}: nothing in the bay stops it${movable.length > 1 ? `, and ${movable.length - 1} other motions` : ''}. Brace the open part, or hold the place.`,
    },
  ];
}

function sharedFinding(
  all: readonly Judged[],
  applies: (judged: Judged) => boolean,
  make: (group: readonly Judged[]) => Finding,
): readonly Finding[] {
  return grouped(
    all.filter(applies),
    ({ bar, angle }) => `${bar.plane}|${angle.spec.section}|${angle.spec.legInPlane}`,
  ).map(make);
}

const first = (group: readonly Judged[]): Judged => {
  const [one] = group;
  if (!one) throw new Error('a group of none');
  return one;
};

function weakHolds(subject: FindingSubject, { bar, restraint, bowing }: Judged): readonly Finding[] {
  const units = subject.project.settings.units;
  return (bowing?.stations ?? []).flatMap((offered) => {
    const station = restraint?.stations[offered.station];
    return offered.holds.flatMap((hold): Finding[] => {
      if (hold.grip === null || hold.grip >= WEAK || !station) return [];
      return [
        {
          ...blank,
          id: `weak:${bar.id}:${station.crossings[0] ?? station.label}:${hold.direction}`,
          kind: 'hold weaker than claimed',
          severity: hold.grip < 0.8 ? 'must fix' : 'look into',
          bay: bar.bay,
          bars: [bar.id],
          crossing: station.crossings[0] ?? null,
          title: `${station.label} holds ${bar.mark} ${hold.direction} less than its mark claims`,
          detail: `At ${showLength(offered.at, units, 'spoken')} the framing offers ${showStiffness(hold.offered, units)} ${hold.direction}; with it the bar keeps ${(hold.grip * 100).toFixed(0)} % of the critical load that a rigid hold gives.`,
          value: hold.grip,
          limit: WEAK,
          quantity: 'ratio',
        },
      ];
    });
  });
}

const isRuleUnsafe = ({ bowing }: Judged): boolean => (bowing?.ruleError ?? 0) > UNSAFE;

function ruleUnsafe(_subject: FindingSubject, group: readonly Judged[]): Finding {
  const worst = group.reduce((most, each) =>
    (each.bowing?.ruleError ?? 0) > (most.bowing?.ruleError ?? 0) ? each : most,
  );
  const error = worst.bowing?.ruleError ?? 0;
  return {
    ...blank,
    id: `rule:${first(group).bar.id}`,
    kind: 'rule unsafe here',
    severity: 'look into',
    bay: worst.bar.bay,
    bars: group.map(({ bar }) => bar.id),
    title: `The rule reads ${marksInWords(group)} ${error.toFixed(1)} % too strong`,
    detail: `With the holds as marked and rigid the exact slenderness is ${(worst.bowing?.rigid.slenderness ?? 0).toFixed(0)}, the rule's ${(worst.restraint?.governing.slenderness ?? 0).toFixed(0)}: the bar bows about both its axes at once, which the spans do not see.`,
    value: error,
    limit: UNSAFE,
  };
}

function twistGoverns(group: readonly Judged[]): Finding {
  const worst = group.reduce((most, each) =>
    (each.bowing?.twist.ratio ?? 1) < (most.bowing?.twist.ratio ?? 1) ? each : most,
  );
  const ratio = worst.bowing?.twist.ratio ?? 1;
  return {
    ...blank,
    id: `twist:${first(group).bar.id}`,
    kind: 'twist governs',
    severity: 'note',
    bay: worst.bar.bay,
    bars: group.map(({ bar }) => bar.id),
    title: `${marksInWords(group)} ${isAre(group)} weakened by twist`,
    detail: `Bowing and twisting together lower the critical load to ${(ratio * 100).toFixed(1)} % of bowing alone; it is in the figure by critical load.`,
    value: ratio,
    limit: 1,
    quantity: 'ratio',
  };
}

function squeezedPairs(subject: FindingSubject, all: readonly Judged[]): readonly Finding[] {
  const squeezed = all.filter(({ bowing }) => (bowing?.partner?.tensionShare ?? 0) < 0);
  return grouped(squeezed, ({ bowing }) => bowing?.partner?.crossing ?? '').map((group): Finding => {
    const { bar, bowing } = first(group);
    const other = bowing?.partner ? barName(subject.layout, bowing.partner.bar) : '';
    return {
      ...blank,
      id: `squeezed:${bowing?.partner?.crossing ?? bar.id}`,
      kind: 'both diagonals squeezed',
      severity: 'look into',
      bay: bar.bay,
      bars: group.map((each) => each.bar.id),
      crossing: bowing?.partner?.crossing ?? null,
      title: `${bar.mark} and ${other} are both squeezed`,
      detail: `With ${Math.abs(bowing?.partner?.tensionShare ?? 0)} of the compression in the partner, the crossing swings out of the plane: the critical load of ${bar.mark} is ${showForce(bowing?.real.N ?? 0, subject.project.settings.units)}.`,
      value: bowing?.partner?.tensionShare ?? null,
      limit: 0,
      quantity: 'ratio',
    };
  });
}

function losesPartner(subject: FindingSubject, { bar, bowing }: Judged): Finding | null {
  const partner = bowing?.partner;
  if (!bowing || !partner || partner.slackLoad === null || bowing.real.N <= 0) return null;
  const kept = partner.slackLoad / bowing.real.N;
  if (kept >= 1 - LOST) return null;
  return {
    ...blank,
    id: `slack:${bar.id}`,
    kind: 'loses support when the partner goes slack',
    severity: 'look into',
    bay: bar.bay,
    bars: [bar.id],
    crossing: partner.crossing,
    title: `${bar.mark} leans on ${barName(subject.layout, partner.bar)} being taut`,
    detail: `With the partner slack, ${bar.mark} keeps ${(kept * 100).toFixed(0)} % of its critical load.`,
    value: kept,
    limit: 1 - LOST,
    quantity: 'ratio',
  };
}
