/** What struts and beams show when they are squeezed. */
import type { MemberChecks } from '../checks/model.ts';
import { sayUsed, showForce } from '../units/loads.ts';
import type { Finding } from './model.ts';
import { type FindingSubject, grouped } from './subject.ts';

const blank = {
  crossing: null,
  breaksLimit: false,
  value: null,
  limit: null,
  quantity: 'none',
  path: null,
} as const;

/** Only of members that something squeezes. */
export function memberFindings(subject: FindingSubject): readonly Finding[] {
  const squeezed = [...subject.members.values()].filter(({ compression }) => compression !== null);
  const bayOf = ({ bar }: MemberChecks): string => subject.layout.bars.get(bar)?.bay ?? '';
  return grouped(squeezed, bayOf).flatMap((all) => [
    ...tooWeak(subject, all),
    ...tooSlender(subject, all),
    ...unchecked(subject, all),
  ]);
}

/** On thicknesses that were taken and not given, a figure is something to look into and no proof. */
const sureness = ({ plates }: MemberChecks): Pick<Finding, 'severity' | 'breaksLimit'> =>
  plates.assumed
    ? { severity: 'look into', breaksLimit: false }
    : { severity: 'must fix', breaksLimit: true };

const assumedWords = ({ plates }: MemberChecks): string =>
  plates.assumed ? ' Its thicknesses are not given, and were taken: give them.' : '';

/** Alike members in one. */
const alike = ({ member, grade }: MemberChecks): string => JSON.stringify([member, grade]);

function tooWeak(subject: FindingSubject, all: readonly MemberChecks[]): readonly Finding[] {
  const units = subject.project.settings.units;
  const used = ({ check }: MemberChecks): number => check?.utilisation ?? 0;
  return grouped(
    all.filter((each) => used(each) > 1),
    alike,
  ).flatMap((group): readonly Finding[] => {
    const worst = group.reduce((most, each) => (used(each) > used(most) ? each : most));
    const { check, compression } = worst;
    if (!check || !compression) return [];
    const { resistance } = check;
    return [
      {
        ...blank,
        ...sureness(worst),
        id: `strut-weak:${group[0]?.bar ?? ''}`,
        kind: 'strut too weak',
        bay: subject.layout.bars.get(worst.bar)?.bay ?? '',
        bars: group.map(({ bar }) => bar),
        title: `${worst.member.name}: squeezed too far, compression ${sayUsed(used(worst))}`,
        detail: `${showForce(compression.force, units)} in ${compression.name} against ${showForce(resistance.resistance ?? 0, units)} by ${resistance.standard} ${resistance.clause} (${resistance.confidence}).${assumedWords(worst)} Choose a heavier member in the bay’s fields.`,
        value: used(worst),
        limit: 1,
        quantity: 'ratio',
      },
    ];
  });
}

function tooSlender(subject: FindingSubject, all: readonly MemberChecks[]): readonly Finding[] {
  const over = all.filter(
    ({ slenderness, limit }) => (slenderness ?? 0) > (limit ?? Number.POSITIVE_INFINITY),
  );
  return grouped(over, alike).flatMap((group): readonly Finding[] => {
    const worst = group.reduce((most, each) =>
      (each.slenderness ?? 0) > (most.slenderness ?? 0) ? each : most,
    );
    const { slenderness, limit } = worst;
    if (slenderness === null || limit === null) return [];
    return [
      {
        ...blank,
        ...sureness(worst),
        id: `strut-slender:${group[0]?.bar ?? ''}`,
        kind: 'strut too slender',
        bay: subject.layout.bars.get(worst.bar)?.bay ?? '',
        bars: group.map(({ bar }) => bar),
        title: `${worst.member.name}: L/r ${slenderness.toFixed(0)} in compression, over ${limit}`,
        detail: `It is squeezed in ${worst.compression?.name ?? ''} and held only at its ends.${assumedWords(worst)} Choose a member with a greater radius in the bay’s fields.`,
        value: slenderness,
        limit,
        quantity: 'slenderness',
      },
    ];
  });
}

function unchecked(subject: FindingSubject, all: readonly MemberChecks[]): readonly Finding[] {
  const open = all.flatMap((each) => {
    const why =
      each.unknown ?? (each.check && each.check.resistance.resistance === null ? whyNot(each) : null);
    return why === null ? [] : [{ each, why }];
  });
  return grouped(open, ({ each, why }) => `${alike(each)} ${why}`).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first) return [];
    return [
      {
        ...blank,
        id: `strut-unchecked:${first.each.bar}`,
        kind: 'strut not checked',
        severity: 'look into',
        bay: subject.layout.bars.get(first.each.bar)?.bay ?? '',
        bars: group.map(({ each }) => each.bar),
        title: `${first.each.member.name} is squeezed and not checked`,
        detail: first.why,
      },
    ];
  });
}

function whyNot({ check }: MemberChecks): string {
  const unmet = (check?.resistance.conditions ?? []).filter(({ met }) => !met);
  return `No rule for compression applies here: ${unmet.map(({ says, found }) => (found === null ? says : `${says} (${found})`)).join('; ')}.`;
}
