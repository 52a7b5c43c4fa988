import type { Assessment } from '../../assessment.ts';
import { showMass, showSlenderness } from '../../units/quantity.ts';
import { inlineSign, severitySign, statusSign } from '../elevation/signs.ts';
import { type Markup, markup } from '../markup.ts';
import { projectState } from '../projectState.ts';
import type { ReportOptions } from '../reportOptions.ts';
import { CATALOGUE_NAMES } from '../words.ts';
import { projectAssumptions } from './assumptions.ts';
import { CAUTION } from './caution.ts';
import { checkTable } from './checkTable.ts';
import { findingsTable } from './findingsList.ts';

/** The first sheet: what this is of, who stands for it, what it covers, what to beware of, the bays, what was found, what it stands on. */
export function titleSheet(assessment: Assessment, options: ReportOptions): Markup {
  const { project, practice, layout } = assessment;
  const { settings } = project;
  const { units, date } = options;
  return markup`<section class="title"><h1>${project.name}<small>bracing, for checking line by line</small></h1>
<div class="cells"><div><em>practice</em><b>${practice.name}</b> ${practice.edition}</div><div><em>units</em><b>${units === 'us' ? 'ft-in, lb' : 'mm, kg'}</b></div><div><em>stock list</em><b>${CATALOGUE_NAMES[settings.catalogue]}</b></div><div><em>state of file</em><b>${projectState(project)}</b></div><div><em>printed</em><b>${date ?? '–'}</b></div></div>
${SIGNATURES}
<div class="two"><div><h2>Scope</h2><p>${scopeWords(assessment)}</p></div><div><h2>Cautions</h2><ul class="found">${cautions(assessment).map((words) => markup`<li>${inlineSign(severitySign('look into'))}<span>${words}</span></li>`)}</ul></div></div>
<h2>Bays</h2><table class="t"><thead><tr><th class="l">Bay</th><th class="l">Name</th><th class="l">What it is</th><th>Off</th><th>Diagonals</th><th>Mass in all</th><th>Worst L/r</th><th>Limit</th><th class="l">At</th></tr></thead><tbody>${layout.bays.map((bay) => bayRow(assessment, bay.id, bay.name, bay.numberOff, options))}</tbody></table>
<h2>Findings<small>${countWords(assessment)}</small></h2>${findingsTable(assessment.findings, options)}
<h2>What it stands on</h2>${checkTable(projectAssumptions(assessment))}<p class="small">Sources are marked “read in a source” or “from memory”. What is marked “from memory, verify” must be looked up in the printed standard before it is relied on.</p></section>`;
}

const SIGNATURES: Markup = markup`<div class="signed">${['laid out', 'checked', 'issued'].map((step) => markup`<div><b>${step}</b><span>by</span><i></i><span>date</span><i class="short"></i></div>`)}</div>`;

function scopeWords({ layout, diagonals, forces }: Assessment): string {
  const bays = layout.bays.length;
  const [bars, many] = [diagonals.size, bays === 1 ? 'one bay' : `${bays} bays`];
  return (
    `${bars === 1 ? 'One diagonal' : `${bars} diagonals`} of angle in ${many}: their set-out, their joins, the length over which each can bow about each axis, and its slenderness against its limit. ` +
    (forces === null
      ? 'Resistances stand alone, since nothing acts. '
      : 'Forces by the combinations given, the resistance of the diagonals and their ends, and that of struts and beams to what squeezes them along themselves. ') +
    'Not covered: bending of struts and beams, columns, rafters, purlins, footings, gusset plates, and the steps of erection.'
  );
}

function cautions(assessment: Assessment): readonly string[] {
  const fromMemory = [...assessment.diagonals.values()].some(
    ({ limit }) => limit.confidence !== 'read in a source',
  );
  return [
    `${CAUTION} Check every figure before use.`,
    'A partly braced frame is dangerous during erection: a bar that this report counts on as held may not be held yet.',
    ...(fromMemory ? ['Clauses of standards are quoted from memory: verify them in print.'] : []),
  ];
}

function countWords({ counts }: Assessment): string {
  return `${counts['must fix']} to fix, ${counts['look into']} to look into, ${counts.note} noted`;
}

function bayRow(
  assessment: Assessment,
  id: string,
  name: string,
  numberOff: number,
  { units }: ReportOptions,
): Markup {
  const summary = assessment.bays.get(id);
  const worst = summary?.worst ?? null;
  const mark = worst ? (assessment.layout.bars.get(worst.bar)?.mark ?? worst.bar) : '–';
  const sign = worst ? inlineSign(statusSign(worst.slenderness > worst.limit ? 'over' : 'within')) : null;
  return markup`<tr><td class="l"><b>${id}</b></td><td class="l wrap">${name}</td><td class="l wrap">${summary?.says ?? ''}</td><td>${String(numberOff)}</td><td>${String(summary?.diagonals ?? 0)}</td><td>${summary ? showMass(summary.mass, units) : '–'}</td><td>${sign} <b>${worst ? showSlenderness(worst.slenderness, worst.limit) : '–'}</b></td><td>${worst ? showSlenderness(worst.limit) : '–'}</td><td class="l">${mark}</td></tr>`;
}
