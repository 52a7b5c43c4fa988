import type { Finding } from '../../findings/model.ts';
import { grouped } from '../../units/figures.ts';
import { inlineSign, severitySign } from '../elevation/signs.ts';
import { type Markup, markup } from '../markup.ts';
import type { ReportedRemedy, ReportOptions } from '../reportOptions.ts';

/** Findings with what they say and what would answer them. */
export function findingsTable(findings: readonly Finding[], options: ReportOptions): Markup {
  if (findings.length === 0) return markup`<p>Nothing was found.</p>`;
  const hasRemedies = options.remedies !== undefined;
  const answers = hasRemedies ? markup`<th class="l answers">Would answer it</th>` : null;
  return markup`<table class="t"><thead><tr><th class="l">Finding</th><th class="l">Bay</th><th class="l">What it is</th>${answers}</tr></thead><tbody>${findings.map(
    (finding) =>
      markup`<tr><td class="l">${inlineSign(severitySign(finding.severity))} ${finding.severity}</td><td class="l">${finding.bay}</td><td class="l wrap"><b>${finding.title}.</b> ${finding.detail}</td>${hasRemedies ? markup`<td class="l wrap">${remedyWords(finding, options)}</td>` : null}</tr>`,
  )}</tbody></table>`;
}

/** Findings that name one bar, in a line each. */
export function findingLines(findings: readonly Finding[], options: ReportOptions): Markup {
  return markup`<ul class="found">${findings.map((finding) => {
    const remedies = remedyWords(finding, options);
    return markup`<li>${inlineSign(severitySign(finding.severity))}<span><b>${finding.title}.</b> ${finding.detail}${remedies === '' ? null : markup` <i>Would answer it:</i> ${remedies}.`}</span></li>`;
  })}</ul>`;
}

function remedyWords({ id }: Finding, { remedies }: ReportOptions): string {
  return (remedies?.get(id) ?? []).map(withEffect).join('; ');
}

/** "Change to 90×90×7 (344 → 266)"; a figure that stays is not told. */
function withEffect({ label, effect }: ReportedRemedy): string {
  const { before, after } = effect;
  if (before === null || after === null || Math.round(before) === Math.round(after)) return label;
  return `${label} (${grouped(before, 0)} → ${grouped(after, 0)})`;
}
