import type { Assessment } from '../../assessment.ts';
import type { BayLayout } from '../../layout/model.ts';
import type { RowVerdict, ScheduleRow } from '../../schedule/model.ts';
import { AXES } from '../../section/model.ts';
import { grouped } from '../../units/figures.ts';
import { showLength, showMass, showSlenderness } from '../../units/quantity.ts';
import { inlineSign, statusSign } from '../elevation/signs.ts';
import { nearnessFill } from '../hatches.ts';
import { type Markup, markup } from '../markup.ts';
import { placedText } from '../placedText.ts';
import type { ReportOptions } from '../reportOptions.ts';
import { designationText } from '../words.ts';
import { axisName } from './axisName.ts';

const ABSENT = '–';

/** The schedule of a bay's diagonals: what to make, then how each stands. */
export function scheduleSheet(assessment: Assessment, bay: BayLayout, { units }: ReportOptions): Markup {
  const rows = assessment.schedule.filter((row) => row.bay === bay.id);
  if (rows.length === 0) return markup`<h2>Schedule of diagonals</h2><p>The bay has no diagonals.</p>`;
  const length = (mm: number): string => showLength(mm, units, 'bare');
  const lengthUnit = units === 'us' ? 'ft-in' : 'mm';
  const massUnit = units === 'us' ? 'lb' : 'kg';
  const made = rows.map(
    (row) =>
      markup`<tr><td class="l"><b>${row.mark}</b></td><td>${String(row.numberOff)}</td><td class="l">${row.hand}</td><td class="l">${designationText(row.section)}, ${row.grade}</td><td class="l">${placed(row, assessment)}</td><td>${length(row.setOutLength)}</td><td>${length(row.setBackI)}; ${length(row.setBackJ)}</td><td>${length(row.cutLength)}${row.pieces.length > 1 ? markup`<br>${row.pieces.map(length).join(' + ')}` : null}</td><td class="wrap">${row.crossingHoles.length > 0 ? row.crossingHoles.map(length).join('; ') : ABSENT}</td><td>${row.packer === null ? ABSENT : showLength(row.packer, units, units === 'us' ? 'bare' : 'small')}</td><td>${row.massEach === null ? ABSENT : showMass(row.massEach, units, 'bare')}</td><td>${row.massTotal === null ? ABSENT : showMass(row.massTotal, units, 'bare')}</td></tr>`,
  );
  const checked = rows.map(
    (row) =>
      markup`<tr><td class="l"><b>${row.mark}</b></td><td class="l wrap">${row.joins.length > 0 ? row.joins.join('; ') : ABSENT}</td>${AXES.map((axis) => markup`<td>${row.unbraced === null ? ABSENT : emphasised(length(row.unbraced[axis]), row.governing?.axis === axis)}</td>`)}<td>${row.governing === null ? ABSENT : governingAxis(row.governing)}</td><td>${chip(row)}</td><td>${showSlenderness(row.limit)}</td><td>${verdictText(row.handling)}</td><td class="l">${reading(row)}</td></tr>`,
  );
  const letters = AXES.map(
    (axis) => markup`<th>L<sub>${axisName(axis, assessment.practice)}</sub><br>${lengthUnit}</th>`,
  );
  return markup`<h2>Schedule of diagonals</h2>
<table class="t"><thead><tr><th class="l">Mark</th><th>Off</th><th class="l">Hand</th><th class="l">Section and grade</th><th class="l">Placed</th><th>Set-out<br>${lengthUnit}</th><th>Set-backs i<br>and j, ${lengthUnit}</th><th>Cut<br>${lengthUnit}</th><th>Holes from<br>end A, ${lengthUnit}</th><th>Packer</th><th>Each<br>${massUnit}</th><th>Total<br>${massUnit}</th></tr></thead><tbody>${made}</tbody></table>
<table class="t second"><thead><tr><th class="l">Mark</th><th class="l">At its crossings</th>${letters}<th>Axis</th><th>In service<br>L/r</th><th>Limit</th><th>Handling<br>L/r</th><th class="l">Reading</th></tr></thead><tbody>${checked}</tbody></table>`;
}

/** Side and heel, and which leg lies in the plane where the legs differ. */
function placed(row: ScheduleRow, { layout }: Assessment): Markup {
  const leg =
    row.shape !== null || layout.bars.get(row.bar)?.angle?.stock?.kind === 'equal'
      ? null
      : markup`<br>${row.legInPlane} leg in plane`;
  return markup`${placedText(row)}${leg}`;
}

function emphasised(text: string, strong: boolean): Markup {
  return strong ? markup`<b>${text}</b>` : markup`${text}`;
}

function governingAxis({ axis, angle, basis }: NonNullable<ScheduleRow['governing']>): string {
  const name = axis === 'free' ? `free ${grouped(angle ?? 0, 0)}°` : axis;
  switch (basis) {
    case 'span':
      return name;
    case 'exact':
      return `${name}, exact`;
    case 'override':
      return `${name}, by hand`;
    default:
      return basis satisfies never;
  }
}

const CHIP = 34;

/** The slenderness in service with a bar as long as its part of the limit. */
function chip({ inService, limit }: ScheduleRow): Markup {
  if (inService === null) return markup`${ABSENT}`;
  const nearness = inService.slenderness / limit;
  const long = Math.min(1, nearness) * (CHIP - 2);
  return markup`<svg class="chip" width="${CHIP}" height="11" aria-hidden="true"><rect x=".6" y=".6" width="${CHIP - 1.2}" height="9.8" fill="#fff" stroke="#000"/><rect x="1" y="1" width="${long}" height="9" fill="url(#${nearnessFill(nearness)})"/></svg><b>${showSlenderness(inService.slenderness, limit)}</b>`;
}

function verdictText(verdict: RowVerdict | null): string {
  return verdict === null ? ABSENT : showSlenderness(verdict.slenderness, verdict.limit);
}

/** How the verdict that the practice asks for reads. */
function reading(row: ScheduleRow): Markup {
  const asked = [row.inService, row.handling].find((verdict) => verdict?.asked) ?? row.inService;
  if (!asked) return markup`${inlineSign(statusSign('unknown'))} not in stock`;
  return markup`${inlineSign(statusSign(asked.ok ? 'within' : 'over'))} ${asked.ok ? 'within' : 'over'}`;
}
