import type { Axis } from '../section/model.ts';
import { showLength, showRadius, showSlenderness } from '../units/quantity.ts';
import type { Finding } from './model.ts';
import { type FindingSubject, grouped, isAre, type Judged, judgedIn, marksInWords } from './subject.ts';

/** Over the limit in service, and over it as fabricated: one finding for bars of a bay that share size, axis and figure. */
export function slendernessFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const all = judgedIn(subject, bay);
    const over = all.filter(({ inService }) => inService && !inService.ok);
    const inService = grouped(over, sameCause).map((group) => serviceFinding(subject, group));
    const stiff = all.filter(({ handling }) => handling && !handling.ok);
    return [...inService, ...(stiff.length > 0 ? [handlingFinding(subject, stiff)] : [])];
  });
}

function sameCause({ bar, angle, restraint, inService }: Judged): string {
  const axis = restraint?.governing.axis ?? '';
  return [bar.plane, angle.spec.section, angle.spec.legInPlane, axis, inService?.slenderness.toFixed(0)].join(
    '|',
  );
}

/** Whether a figure over the limit breaks something the practice or the user asks for; advice does not have to be followed, but it is broken. */
function severityOf(judged: Judged, asked: boolean): Finding['severity'] {
  if (!asked) return 'note';
  return judged.limit.standing === 'advice' ? 'look into' : 'must fix';
}

function serviceFinding(subject: FindingSubject, group: readonly Judged[]): Finding {
  const worst = worstOf(group, (each) => each.inService?.slenderness ?? 0);
  const { bar, restraint, inService, limit } = worst;
  const units = subject.project.settings.units;
  const governing = restraint?.governing;
  const asked = inService?.asked ?? true;
  const way = governing ? wayOf(worst) : '';
  return {
    id: `slender:${bar.id}`,
    kind: 'too slender in service',
    severity: severityOf(worst, asked),
    breaksLimit: asked,
    bay: bar.bay,
    bars: group.map((each) => each.bar.id),
    crossing: null,
    title: `${marksInWords(group)} ${isAre(group)} too slender${way}`,
    detail:
      inService?.bound != null
        ? `Worked out exactly, with its holds rigid, it reads ${showSlenderness(inService.slenderness, limit.limit)} (the rule's safe bound is ${showSlenderness(inService.bound, limit.limit)}); the limit is ${limit.limit} (${limit.clause}).`
        : governing
          ? `${showLength(governing.length, units, 'spoken')} over a radius of ${showRadius(governing.radius, units)} gives ${showSlenderness(governing.slenderness, limit.limit)}; the limit is ${limit.limit} (${limit.clause}).`
          : '',
    value: inService?.slenderness ?? null,
    limit: limit.limit,
    quantity: 'slenderness',
    path: null,
  };
}

/** " out of the plane", " in the plane", or by the axis where it is neither. */
function wayOf({ angle, restraint }: Judged): string {
  if (restraint?.governing.basis !== 'span') return '';
  const free = restraint.governing.freeDirection;
  if (!free) return ', free every way about v';
  const { x, y, inPlane } = angle.placement;
  const across = Math.abs(
    free[0] * (x[0] * inPlane[0] + x[1] * inPlane[1] + x[2] * inPlane[2]) +
      free[1] * (y[0] * inPlane[0] + y[1] * inPlane[1] + y[2] * inPlane[2]),
  );
  if (across > 0.985) return ' in the plane';
  if (across < 0.174) return ' out of the plane';
  const axis: Axis | 'free' = restraint.governing.axis;
  return axis === 'free' ? ' in a direction between its axes' : ` about ${axis}`;
}

function handlingFinding(subject: FindingSubject, group: readonly Judged[]): Finding {
  const worst = worstOf(group, (each) => each.handling?.slenderness ?? 0);
  const { bar, handling, limit } = worst;
  const units = subject.project.settings.units;
  const asked = handling?.asked ?? false;
  return {
    id: `handling:${bar.bay}`,
    kind: 'too slender to handle',
    severity: severityOf(worst, asked),
    breaksLimit: asked,
    bay: bar.bay,
    bars: group.map((each) => each.bar.id),
    crossing: null,
    title: `${marksInWords(group)} ${isAre(group)} limp to handle`,
    detail: handling
      ? `As fabricated, ${showLength(handling.length, units, 'spoken')} over the least radius ${showRadius(handling.radius, units)} gives ${showSlenderness(handling.slenderness, handling.limit)}, over ${handling.limit}. ${asked ? 'The practice asks for this verdict.' : 'The practice does not ask for it; mind lifting, stacking and transport.'}`
      : '',
    value: handling?.slenderness ?? null,
    limit: limit.limit,
    quantity: 'slenderness',
    path: null,
  };
}

function worstOf(group: readonly Judged[], figure: (judged: Judged) => number): Judged {
  return group.reduce((worst, each) => (figure(each) > figure(worst) ? each : worst));
}
