import { showLength } from '../units/quantity.ts';
import type { Finding } from './model.ts';
import { sagOf } from './sag.ts';
import { bayPath, type FindingSubject, grouped, type Judged, judgedIn, marksInWords } from './subject.ts';

/** What is wrong with, or was decided for, single bars: unknown sections, no steel left, sag, lengths set by hand. */
export function barFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const all = judgedIn(subject, bay);
    return [
      ...grouped(
        all.filter(({ angle }) => !angle.stock),
        ({ angle }) => angle.spec.section,
      ).map((group) => unknownSection(subject, group)),
      ...all.filter(hasNoSteel).map((judged) => noLength(subject, judged)),
      ...sagFindings(subject, all),
      ...all.flatMap((judged) => overrideFinding(subject, judged) ?? []),
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

function unknownSection(subject: FindingSubject, group: readonly Judged[]): Finding {
  const [first] = group;
  if (!first) throw new Error('a group of none');
  const { section } = first.angle.spec;
  const near = first.angle.nearest;
  const path = bayPath(subject, first.bar.bay);
  return {
    ...blank,
    id: `section:${first.bar.bay}:${section}`,
    kind: 'section unknown',
    severity: 'must fix',
    bay: first.bar.bay,
    bars: group.map(({ bar }) => bar.id),
    title: `${section.trim() === '' ? 'A section without a name' : section} is in no stock list`,
    detail: `${marksInWords(group)} cannot be assessed.${near.length > 0 ? ` Nearest: ${near.join(', ')}.` : ''} Choose one that is in stock, or add it to the own stock list.`,
    path: first.angle.mark.section ? `${path}.bars.${first.bar.key}.section` : `${path}.diagonals.section`,
  };
}

const hasNoSteel = ({ angle, restraint, turns }: Judged): boolean =>
  angle.cut.total <= 0 || (angle.stock !== null && restraint === null && turns === null);

function noLength(subject: FindingSubject, { bar, angle }: Judged): Finding {
  const units = subject.project.settings.units;
  return {
    ...blank,
    id: `length:${bar.id}`,
    kind: 'no length left',
    severity: 'must fix',
    breaksLimit: true,
    bay: bar.bay,
    bars: [bar.id],
    title: `The ends of ${bar.mark} leave no steel`,
    detail: `Between set-out points there are ${showLength(bar.length, units)}; the set-backs take ${showLength(angle.cut.startsAt + angle.cut.endsBefore, units)}${angle.cut.pieces.length > 1 ? ' and the cut at the crossing the rest' : ''}. Make the set-backs smaller.`,
    value: angle.cut.total,
    limit: 0,
    quantity: 'length',
    path: `${bayPath(subject, bar.bay)}.diagonals.ends.setBack`,
  };
}

function sagFindings(subject: FindingSubject, all: readonly Judged[]): readonly Finding[] {
  const { sagRatio, units } = subject.project.settings;
  if (sagRatio === null) return [];
  const sagging = all.flatMap((judged) => {
    const { bar, angle, restraint } = judged;
    const sag =
      angle.stock && restraint ? sagOf(bar, angle, angle.stock.properties, restraint.stations) : null;
    return sag && sag.ratio < sagRatio ? [{ judged, sag }] : [];
  });
  const [first] = sagging;
  if (!first) return [];
  const worst = sagging.reduce((most, each) => (each.sag.ratio < most.sag.ratio ? each : most));
  const group = sagging.map(({ judged }) => judged);
  return [
    {
      ...blank,
      id: `sag:${first.judged.bar.bay}`,
      kind: 'sag',
      severity: 'look into',
      bay: first.judged.bar.bay,
      bars: group.map(({ bar }) => bar.id),
      title: `${marksInWords(group)} ${group.length > 1 ? 'sag' : 'sags'} by its length / ${worst.sag.ratio.toFixed(0)}`,
      detail: `Under its own weight, pinned, ${worst.judged.bar.mark} sags ${showLength(worst.sag.sag, units, 'small')} over ${showLength(worst.sag.length, units, 'spoken')}; the project allows length / ${sagRatio}. A sagging bar takes load late: hang it, hold it, or draw it tight.`,
      value: worst.sag.ratio,
      limit: sagRatio,
      quantity: 'ratio',
    },
  ];
}

function overrideFinding(subject: FindingSubject, { bar, angle, restraint }: Judged): Finding | null {
  const overrides = angle.mark.overrides ?? [];
  if (overrides.length === 0) return null;
  const units = subject.project.settings.units;
  const said = overrides.map(({ axis, length, factor, reason }) => {
    const found = restraint?.lanes[axis].found;
    const taken = length === null ? 'the length found' : showLength(length, units, 'spoken');
    const by = factor === 1 ? '' : ` × ${factor}`;
    return `about ${axis}: ${taken}${by}${found === undefined ? '' : ` (found ${showLength(found, units, 'spoken')})`}, because “${reason}”`;
  });
  return {
    ...blank,
    id: `override:${bar.id}`,
    kind: 'override in force',
    severity: 'note',
    bay: bar.bay,
    bars: [bar.id],
    title: `${bar.mark} takes a length set by hand`,
    detail: `${said.join('; ')}.`,
    path: `${bayPath(subject, bar.bay)}.bars.${bar.key}.overrides`,
  };
}
