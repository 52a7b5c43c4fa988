import type { Assessment, DiagonalAssessment } from '../../assessment.ts';
import type { AngleBar, Bar, Plane } from '../../layout/model.ts';
import type { Verdict } from '../../practice/model.ts';
import type { EndConnection, LengthOverride, UnitSystem } from '../../project/model.ts';
import { endsHoldOf, endsMarkedFree } from '../../restraint/endWords.ts';
import type { Restraint } from '../../restraint/model.ts';
import { isCentred } from '../../section/barShape.ts';
import { AXES, type Axis } from '../../section/model.ts';
import { grouped } from '../../units/figures.ts';
import { showLength, showMass, showMassPerMetre, showRadius, showSlenderness } from '../../units/quantity.ts';
import { MM_PER_INCH } from '../../units/unitSystem.ts';
import { numberedClaims } from '../claimNumbers.ts';
import { sectionInPlace } from '../elevation/sectionInPlace.ts';
import { inlineSign, statusSign } from '../elevation/signs.ts';
import { NEARNESS_FILLS } from '../hatches.ts';
import { laneStrips } from '../laneStrips.ts';
import { listed } from '../listed.ts';
import { type Markup, markup } from '../markup.ts';
import { overrideWords } from '../overrideWords.ts';
import type { ReportOptions } from '../reportOptions.ts';
import { designationText, STATUS_NAMES } from '../words.ts';
import { slendernessWorking } from '../working.ts';
import { axisName } from './axisName.ts';
import { checkTable } from './checkTable.ts';
import { findingLines } from './findingsList.ts';
import { holdsTable } from './holdsTable.ts';
import { strengthPart } from './strengthPart.ts';

/** One diagonal for the checker, and the marks of others that are the same in all but place: section, lanes, holds, verdicts with their working, what was set by hand, findings, boxes. */
export function diagonalSheet(
  assessment: Assessment,
  bar: Bar,
  angle: AngleBar,
  diagonal: DiagonalAssessment,
  alike: readonly string[],
  options: ReportOptions,
): Markup {
  const { units } = options;
  const { restraint } = diagonal;
  const findings = assessment.findings.filter(({ bars }) => bars.includes(bar.id));
  const section = designationText(angle.stock?.designation ?? angle.spec.section);
  const head = markup`<h2 class="bar">${bar.mark} · ${section} · ${showLength(bar.length, units, 'spoken')} set-out<small>${alike.length > 0 ? `the same for ${listed(alike)}; ` : ''}${bar.bay}, ${STATUS_NAMES[diagonal.status]}</small></h2>`;
  const found =
    findings.length > 0
      ? markup`<div class="keep last"><h3>Findings</h3>${findingLines(findings, options)}</div>`
      : null;
  if (restraint === null)
    return markup`<section class="diagonal">${head}<p>${placedWords(bar, angle, assessment, units)}</p><p>${diagonal.reason}</p>${found}</section>`;

  const claims = numberedClaims(restraint);
  const plane = planeOf(assessment, bar);
  const overrides = angle.mark.overrides ?? [];
  return markup`<section class="diagonal"><div class="keep">${head}<div class="topline"><div>${plane ? sectionInPlace(bar, angle, plane, restraint) : null}</div><div>${axisTable(assessment, angle, restraint, diagonal.limit.limit, units)}<p>${placedWords(bar, angle, assessment, units)}</p><p class="key"><svg width="22" height="8"><path class="free" d="M0 4h22"/></svg> free over the governing length <svg width="22" height="10"><path class="held" d="M0 8h22"/><path class="edl" d="M2 7l2-4M7 7l2-4M12 7l2-4M17 7l2-4"/></svg> held; seen from i</p></div></div>
<h3>Lanes<small>one strip an axis, cut where a station stops that motion; numbers are those of the holds</small></h3>${laneStrips(restraint, diagonal.limit.limit, claims, units)}<p class="key fills">${NEARNESS_FILLS.map(({ fill, words }) => markup`<svg width="26" height="10"><rect x=".5" y=".5" width="25" height="9" fill="url(#${fill})" stroke="#000" stroke-width=".8"/></svg> ${words} `)}</p></div>
<div class="keep"><h3>Why it bows there</h3><p>${diagonal.reason}</p>${overrides.length > 0 ? overridesTable(overrides, units) : null}${endMarks(angle)}<div class="two verdicts">${verdictBox('in service: governing free direction, restraints in place', diagonal.inService, diagonal, units)}${verdictBox('handling: as fabricated, over the least radius', diagonal.handling, diagonal, units)}</div></div>
<h3>Holds between the ends</h3>${holdsTable(restraint, claims, units)}${diagonal.checks ? strengthPart(diagonal.checks, units) : null}${found}</section>`;
}

/** Ends that are marked as holding less than both ways; null where none is. */
function endMarks(angle: AngleBar): Markup | null {
  const said = listed(endsMarkedFree({ endsHold: endsHoldOf(angle) }));
  return said === '' ? null : markup`<p><b>Marked</b>: ${said}.</p>`;
}

function overridesTable(overrides: readonly LengthOverride[], units: UnitSystem): Markup {
  return checkTable(
    overrides.map((override) => markup`<b>Set by hand</b>, about ${overrideWords(override, units)}.`),
  );
}

function planeOf({ layout }: Assessment, bar: Bar): Plane | undefined {
  return layout.bays.find(({ id }) => id === bar.bay)?.planes.find(({ id }) => id === bar.plane);
}

function axisTable(
  { practice }: Assessment,
  angle: AngleBar,
  restraint: Restraint,
  limit: number,
  units: UnitSystem,
): Markup {
  const properties = angle.stock?.properties;
  const inertia: Readonly<Record<Axis, number>> = properties
    ? { x: properties.Ixx, y: properties.Iyy, u: properties.Iu, v: properties.Iv }
    : { x: 0, y: 0, u: 0, v: 0 };
  const [radiusUnit, inertiaUnit] = units === 'us' ? ['in', 'in⁴'] : ['mm', 'cm⁴'];
  return markup`<table class="t"><thead><tr><th class="l">Axis</th><th>r, ${radiusUnit}</th><th>I, ${inertiaUnit}</th><th>L</th><th>L/r</th><th class="l pad">bending about it moves the bar</th></tr></thead><tbody>${AXES.map(
    (axis) => {
      const lane = restraint.lanes[axis];
      const governs = restraint.governing.axis === axis ? 'governs' : '';
      return markup`<tr class="${governs}"><td class="l"><b>${axisName(axis, practice)}</b>${axis === 'v' ? ', least' : ''}</td><td>${showRadius(lane.radius, units, 'bare')}</td><td>${inertiaText(inertia[axis], units)}</td><td>${showLength(lane.unbraced, units, 'spoken')}</td><td><b>${showSlenderness(lane.slenderness, limit)}</b></td><td class="l pad">${motionWords(axis, angle)}</td></tr>`;
    },
  )}</tbody></table>`;
}

/** cm⁴ or in⁴ to three figures or more. */
function inertiaText(mm4: number, units: UnitSystem): string {
  const value = units === 'us' ? mm4 / MM_PER_INCH ** 4 : mm4 / 1e4;
  return grouped(value, value < 10 ? 2 : value < 1000 ? 1 : 0);
}

function motionWords(axis: Axis, { spec, mark, stock }: AngleBar): string {
  const turned = (mark.roll ?? 0) !== 0 ? ', before its roll' : '';
  switch (axis) {
    case 'x':
      return (spec.legInPlane === 'longer' ? 'in the plane, across' : 'out of the plane') + turned;
    case 'y':
      return (spec.legInPlane === 'longer' ? 'out of the plane' : 'in the plane, across') + turned;
    case 'u':
    case 'v': {
      const degrees = stock
        ? ` (u lies ${grouped((stock.properties.alpha * 180) / Math.PI, 1)}° from x)`
        : '';
      return axis === 'u' ? `along v${degrees}` : 'along u';
    }
    default:
      return axis satisfies never;
  }
}

function placedWords(bar: Bar, angle: AngleBar, { layout }: Assessment, units: UnitSystem): string {
  const { spec, side, cut, mass, stock } = angle;
  const [i, j] = [bar.i, bar.j].map((id) => layout.nodes.get(id)?.label ?? id);
  const counted = spec.countedOn === 'tension' ? 'Tension only' : 'Tension and compression';
  const leg = stock?.kind === 'equal' ? 'one leg' : `${spec.legInPlane} leg`;
  const roll = angle.mark.roll ? `, rolled ${grouped(angle.mark.roll, 0)}°` : '';
  const weight = mass === null ? '' : `, ${showMass(mass, units)}`;
  const area = stock
    ? ` ${stock.basis === 'published' ? 'Properties as published' : 'Properties from the outline'}, ${showMassPerMetre(stock.massPerMetre, units)}.`
    : ' Not in stock: no properties.';
  const shape = stock?.outline.shape;
  const onSide = `${side === 'near' ? 'Near' : 'Far'} side of the gusset`;
  const placed = shape
    ? isCentred(shape)
      ? 'The gusset through its middle'
      : onSide
    : `${onSide}, heel ${spec.heel}, ${leg} in the plane`;
  return `From ${i} (i) to ${j} (j). ${placed}${roll}. ${counted}, ${spec.grade}. Ends: i ${endWords(angle.ends.i, units)}; j ${endWords(angle.ends.j, units)}. Cut ${showLength(cut.total, units, 'spoken')}${weight}.${area}`;
}

function endWords(end: EndConnection, units: UnitSystem): string {
  const setBack = `set back ${showLength(end.setBack, units)}`;
  return end.kind === 'welded'
    ? `welded, ${setBack}`
    : `${end.bolts} × M${grouped(end.boltDiameter, 0)} in ${end.legs === 'both' ? 'both legs' : 'one leg'}, ${setBack}`;
}

function verdictBox(
  words: string,
  verdict: Verdict | null,
  { limit }: DiagonalAssessment,
  units: UnitSystem,
): Markup {
  if (verdict === null) return markup`<div class="verdict"><em>${words}</em><span>not assessed</span></div>`;
  const { slenderness, length, radius, ok, asked } = verdict;
  return markup`<div class="verdict ${asked ? 'asked' : ''}"><em>${words}</em><b>${showSlenderness(slenderness, verdict.limit)}</b><span>limit ${showSlenderness(verdict.limit)}${limit.clause === '' ? '' : `, ${limit.clause}`}</span><span class="said">${inlineSign(statusSign(ok ? 'within' : 'over'))} ${ok ? 'within' : 'over'}${asked ? '' : ', for note'}</span><em>${slendernessWorking(length, radius, slenderness, units)}</em></div>`;
}
