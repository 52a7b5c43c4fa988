import { endsHoldOf, endsMarkedFree } from '../restraint/endWords.ts';
import type { Finding } from './model.ts';
import { bayPath, type FindingSubject, type Judged, judgedIn } from './subject.ts';

/** Bars that turn without resistance, because an end is marked as holding less than both ways and too little else holds them. */
export function turningFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) =>
    judgedIn(subject, bay).flatMap((judged) => (judged.turns ? [turningFinding(subject, judged)] : [])),
  );
}

function turningFinding(subject: FindingSubject, judged: Judged): Finding {
  const { bar } = judged;
  return {
    id: `turns:${bar.id}`,
    kind: 'bar can move',
    severity: 'must fix',
    breaksLimit: true,
    bay: bar.bay,
    bars: [bar.id],
    crossing: null,
    title: `${bar.mark} can move ${waysInWords(judged)}`,
    detail: `${turningSentence(judged)} Hold the end, or join the bar to what holds it.`,
    value: null,
    limit: null,
    quantity: 'none',
    path: `${bayPath(subject, bar.bay)}.${placeOfMark(judged)}`,
  };
}

/** With the bar if the mark is the bar's own, else with the bay's diagonals. */
function placeOfMark({ bar, angle }: Judged): string {
  const end = (['endI', 'endJ'] as const).find((each) => angle.mark[each]?.holds !== undefined);
  return end ? `bars.${bar.key}.${end}.holds` : 'diagonals.ends.holds';
}

/** "As marked, end j holds in the plane only. Fewer than two places hold D1 out of the plane, so …" */
export function turningSentence(judged: Judged): string {
  const { bar, angle } = judged;
  return `As marked, ${endsMarkedFree({ endsHold: endsHoldOf(angle) }).join(' and ')}. Fewer than two places hold ${bar.mark} ${waysInWords(judged)}, so it turns there without resistance and has no slenderness in service.`;
}

function waysInWords({ turns }: Judged): string {
  const [way, other] = turns ?? [];
  if (way === undefined) return 'across itself';
  if (other !== undefined) return 'in the plane and out of it';
  return way === 'in plane' ? 'in the plane' : 'out of the plane';
}
