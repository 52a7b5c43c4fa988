/** How bars are made and held at their ends: single bolts, and pairs of angles that must act as one. */
import { angleProperties } from '../section/angleProperties.ts';
import type { AngleSizes } from '../section/barShape.ts';
import { showLength } from '../units/quantity.ts';
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

export function detailFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const all = judgedIn(subject, bay);
    return [...oneBolt(all), ...battens(subject, all)];
  });
}

/** Common practice, no source. A rod has its one nut. */
function oneBolt(all: readonly Judged[]): readonly Finding[] {
  const found = all.filter(
    ({ angle }) =>
      angle.stock?.outline.shape?.kind !== 'rod' &&
      [angle.ends.i, angle.ends.j].some(({ kind, bolts }) => kind === 'bolted' && bolts === 1),
  );
  return grouped(found, ({ angle }) => angle.spec.section).map(
    (group): Finding => ({
      ...blank,
      id: `one-bolt:${group[0]?.bar.id ?? ''}`,
      kind: 'one bolt at an end',
      severity: 'note',
      bay: group[0]?.bar.bay ?? '',
      bars: group.map(({ bar }) => bar.id),
      title: `${marksInWords(group)} ${isAre(group)} held by one bolt at an end`,
      detail:
        'Two at least are usual (common practice, no source): one that works loose is then not the end of the bar, and rules for compression by one leg count on two.',
    }),
  );
}

/** Most of one angle's slenderness between battens in a tie: AISC 360 D4, from memory, sure; borrowed by the others. */
const TIE = 300;

export interface BattenRule {
  /** Most slenderness of one angle between battens. */
  readonly most: number;
  readonly says: string;
}

/** How slender one of a pair may be between what joins it to the other. */
export function battenRule(
  practice: FindingSubject['practice']['id'],
  { angle, inService, checks }: Pick<Judged, 'angle' | 'inService' | 'checks'>,
): BattenRule {
  const squeezed = angle.spec.countedOn === 'both' || (checks?.compression ?? null) !== null;
  if (!squeezed) return { most: TIE, says: 'AISC 360 D4 (from memory, sure)' };
  if (practice === 'en1993')
    return angle.stock?.outline.shape?.kind === 'starred angles'
      ? { most: 70, says: 'EN 1993-1-1 Table 6.9 (from memory, verify)' }
      : { most: 15, says: 'EN 1993-1-1 Table 6.9 (from memory, verify)' };
  return {
    most: 0.75 * (inService?.slenderness ?? TIE),
    says: 'three quarters of that of the pair, AISC 360 E6.2 (from memory, sure)',
  };
}

/** Slenderness of one of the pair between battens. */
export function betweenBattens({ angle }: Pick<Judged, 'angle'>, count: number): number | null {
  const one = oneOf(angle);
  return one && angle.cut.total / (count + 1) / angleProperties(one).rv;
}

function oneOf(angle: Judged['angle']): AngleSizes | null {
  const shape = angle.stock?.outline.shape;
  return shape?.kind === 'angles back to back' || shape?.kind === 'starred angles' ? shape.angle : null;
}

function battens(subject: FindingSubject, all: readonly Judged[]): readonly Finding[] {
  const { units } = subject.project.settings;
  const found = all.flatMap((judged) => {
    const count = judged.angle.spec.battens ?? 0;
    const slenderness = betweenBattens(judged, count);
    const rule = battenRule(subject.practice.id, judged);
    return slenderness !== null && slenderness > rule.most ? [{ judged, count, slenderness, rule }] : [];
  });
  return grouped(found, ({ judged, rule }) => `${judged.angle.spec.section} ${rule.says}`).flatMap(
    (group): readonly Finding[] => {
      const worst = group.reduce((most, each) => (each.slenderness > most.slenderness ? each : most));
      const { judged, count, slenderness, rule } = worst;
      const marks = group.map((each) => each.judged);
      return [
        {
          ...blank,
          id: `battens:${marks[0]?.bar.id ?? ''}`,
          kind: 'battens too far apart',
          severity: 'look into',
          bay: judged.bar.bay,
          bars: marks.map(({ bar }) => bar.id),
          title: `The angles of ${marksInWords(marks)} are joined too seldom to act as one`,
          detail: `With ${count === 0 ? 'no battens' : `${count} battens`} between its ends, ${judged.bar.mark} has ${showLength(judged.angle.cut.total / (count + 1), units)} from one to the next: L/r of one angle ${slenderness.toFixed(0)}, at most ${rule.most.toFixed(0)} by ${rule.says}.`,
          value: slenderness,
          limit: rule.most,
          quantity: 'slenderness',
        },
      ];
    },
  );
}
