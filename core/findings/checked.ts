/** What the checks of resistance show. */
import type { Check } from '../checks/model.ts';
import { silentChecks } from '../checks/sectionChecks.ts';
import { ECCENTRICITY_LEFT_OUT } from '../resistance/compression/compressionResistances.ts';
import { sayUsed, showForce } from '../units/loads.ts';
import type { Finding } from './model.ts';
import { type FindingSubject, grouped, isAre, type Judged, judgedIn, marksInWords } from './subject.ts';

const blank = {
  crossing: null,
  breaksLimit: false,
  value: null,
  limit: null,
  quantity: 'none',
  path: null,
} as const;

export function checkedFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const all = judgedIn(subject, bay);
    return [
      ...exceeded(subject, all),
      ...unchecked(subject, all),
      ...offMiddle(subject, all),
      ...endDetails(all),
    ];
  });
}

/** Alike bars in one: the same section and the same check. */
function exceeded(subject: FindingSubject, all: readonly Judged[]): readonly Finding[] {
  const units = subject.project.settings.units;
  const over = all.filter(({ checks }) => (checks?.governing?.utilisation ?? 0) > 1);
  return grouped(
    over,
    ({ angle, checks }) => `${angle.spec.section} ${checks?.governing?.resistance.kind ?? ''}`,
  ).flatMap((group): readonly Finding[] => {
    const worst = group.reduce((most, each) => (used(each) > used(most) ? each : most));
    const check = worst.checks?.governing;
    if (!check?.demand || check.resistance.resistance === null) return [];
    const { resistance, demand } = check;
    return [
      {
        ...blank,
        id: `resistance:${worst.bar.bay}:${group[0]?.bar.key ?? ''}:${resistance.kind}`,
        kind: 'resistance exceeded',
        severity: 'must fix',
        breaksLimit: true,
        bay: worst.bar.bay,
        bars: group.map(({ bar }) => bar.id),
        title: `${marksInWords(group)} ${isAre(group)} too weak: ${resistance.title.toLowerCase()} ${sayUsed(used(worst))}`,
        detail: `${worst.bar.mark} carries ${showForce(demand.force, units)} in ${demand.name}; it resists ${showForce(resistance.resistance ?? 0, units)} by ${resistance.standard} ${resistance.clause} (${resistance.confidence})${resistance.end === null ? '' : `, at end ${resistance.end}`}.`,
        value: used(worst),
        limit: 1,
        quantity: 'ratio',
      },
    ];
  });
}

const used = ({ checks }: Judged): number => checks?.governing?.utilisation ?? 0;

/** Loaded, and some check that it needs gives no figure. */
function unchecked(subject: FindingSubject, all: readonly Judged[]): readonly Finding[] {
  if (!subject.forces) return [];
  const open = all.flatMap((judged) => {
    const { checks } = judged;
    if (!checks || !judged.angle.stock || !judged.restraint) return [];
    if (checks.unknown !== null) return [{ judged, why: checks.unknown }];
    const silent = silentChecks(checks);
    return silent.length > 0 ? [{ judged, why: whyNot(silent) }] : [];
  });
  return grouped(open, ({ why }) => why).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first) return [];
    const judged = group.map((each) => each.judged);
    return [
      {
        ...blank,
        id: `unchecked:${first.judged.bar.id}`,
        kind: 'not checked',
        severity: 'must fix',
        breaksLimit: true,
        bay: first.judged.bar.bay,
        bars: judged.map(({ bar }) => bar.id),
        title: `${marksInWords(judged)} ${isAre(judged)} not checked for what ${judged.length > 1 ? 'they carry' : 'it carries'}`,
        detail: first.why,
      },
    ];
  });
}

/** Squeezed, held off its centroid, and judged through it, since no rule for that is met. */
function offMiddle(subject: FindingSubject, all: readonly Judged[]): readonly Finding[] {
  const units = subject.project.settings.units;
  const found = all.filter(
    ({ checks }) =>
      checks?.compression && (checks.compressionBy?.note?.includes(ECCENTRICITY_LEFT_OUT) ?? false),
  );
  const why = ({ checks }: Judged): string => {
    const rule = checks?.checks.find(({ resistance }) => resistance.kind === 'compression, one leg');
    const unmet = (rule?.resistance.conditions ?? []).filter(({ met }) => !met);
    const said = unmet.map(({ says, found: is }) => (is === null ? says : `${says} (${is})`)).join('; ');
    return rule
      ? `The rule for one leg, ${rule.resistance.standard} ${rule.resistance.clause}, does not apply: ${said}.`
      : 'No rule held here counts with its eccentricity.';
  };
  return grouped(found, (judged) => `${judged.angle.spec.section} ${why(judged)}`).flatMap(
    (group): readonly Finding[] => {
      const [first] = group;
      const force = first?.checks?.compression?.force;
      if (!first || force === undefined) return [];
      return [
        {
          ...blank,
          id: `off-middle:${first.bar.id}`,
          kind: 'squeezed off its middle',
          severity: 'look into',
          bay: first.bar.bay,
          bars: group.map(({ bar }) => bar.id),
          title: `${marksInWords(group)} ${isAre(group)} squeezed off the middle, and judged through it`,
          detail: `${first.bar.mark} takes ${showForce(force, units)}. ${why(first)} The figure through the centroid leaves the eccentricity out: a beam-column check is still due.`,
        },
      ];
    },
  );
}

function whyNot(silent: readonly Check[]): string {
  const failed = silent
    .flatMap(({ resistance }) => resistance.conditions.filter(({ met }) => !met))
    .map(({ says, found }) => (found === null ? says : `${says} (${found})`));
  const against = [...new Set(silent.map(({ resistance }) => resistance.title.toLowerCase()))].join(', ');
  return `No rule held here gives a figure for ${against}${failed.length > 0 ? `: ${[...new Set(failed)].join('; ')}` : ''}.`;
}

/** Edges, ends and pitches below the least, and single bolts. */
function endDetails(all: readonly Judged[]): readonly Finding[] {
  const broken = all.flatMap((judged) => {
    const says = (judged.checks?.checks ?? [])
      .filter(({ resistance }) => resistance.kind === 'bolt bearing' || resistance.kind === 'weld')
      .flatMap(({ resistance }) => resistance.conditions.filter(({ met }) => !met))
      .map(({ says: what, found }) => (found === null ? what : `${what}: ${found}`));
    return says.length > 0 ? [{ judged, says: [...new Set(says)].join('; ') }] : [];
  });
  return grouped(broken, ({ says }) => says).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first) return [];
    const judged = group.map((each) => each.judged);
    return [
      {
        ...blank,
        id: `end-detail:${first.judged.bar.id}`,
        kind: 'end detail too small',
        severity: 'look into',
        bay: first.judged.bar.bay,
        bars: judged.map(({ bar }) => bar.id),
        title: `The ends of ${marksInWords(judged)} break a least distance`,
        detail: `${first.says}.`,
      },
    ];
  });
}
