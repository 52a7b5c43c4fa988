import type { Assessment } from '../../assessment.ts';
import type { MemberChecks } from '../../checks/model.ts';
import type { BayLayout } from '../../layout/model.ts';
import { showForce, showMoment, showUse } from '../../units/loads.ts';
import { showSlenderness } from '../../units/quantity.ts';
import { type Markup, markup } from '../markup.ts';
import { conditionWords, memberPlacing } from '../memberWords.ts';
import type { ReportOptions } from '../reportOptions.ts';

const ABSENT = '–';

/** A bay's struts and beams that something squeezes; null where nothing does. */
export function memberSheet(
  { layout, members }: Assessment,
  bay: BayLayout,
  { units }: ReportOptions,
): Markup | null {
  const squeezed = bay.bars.flatMap((id) => {
    const checks = members.get(id);
    return checks && checks.compression !== null ? [checks] : [];
  });
  if (squeezed.length === 0) return null;
  const row = (each: MemberChecks): Markup => {
    const { check, compression, slenderness, limit, moment } = each;
    const resists = check?.resistance.resistance ?? null;
    return markup`<tr><td class="l"><b>${layout.bars.get(each.bar)?.mark ?? each.bar}</b></td><td class="l wrap">${each.member.name}<br>${memberPlacing(each, units)}</td><td>${slenderness === null ? ABSENT : `${showSlenderness(slenderness, limit)} of ${limit}`}</td><td>${compression === null ? ABSENT : showForce(compression.force, units)}</td><td>${resists === null ? ABSENT : showForce(resists, units)}</td><td><b>${showUse(check?.utilisation ?? null)}</b></td><td class="l wrap">${notes(each)}${moment > 0 ? ` Bends too, by up to ${showMoment(moment, units)}: not checked here.` : ''}</td></tr>`;
  };
  return markup`<h2>Struts and beams in compression<small>along themselves, K = 1 between what holds them; bending is not checked</small></h2>
<table class="t"><thead><tr><th class="l">Member</th><th class="l">Size, and what it is free over</th><th>L/r</th><th>Acts</th><th>Resists</th><th>Used</th><th class="l">Clause and what to mind</th></tr></thead><tbody>${squeezed.map(row)}</tbody></table>`;
}

function notes({ check, unknown }: MemberChecks): string {
  if (unknown !== null || !check) return unknown ?? '';
  const { standard, clause, confidence, conditions } = check.resistance;
  const unmet = conditions.filter(({ met }) => !met).map(conditionWords);
  return [`${standard} ${clause} (${confidence}).`, ...unmet].join(' ');
}
