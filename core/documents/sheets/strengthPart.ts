import type { BarChecks, Check } from '../../checks/model.ts';
import type { UnitSystem } from '../../project/model.ts';
import { showForce, showUse } from '../../units/loads.ts';
import { type Markup, markup } from '../markup.ts';
import { workingLines } from '../workingLines.ts';

/** What a bar and its ends resist against what acts: every check in a line, and the working of the one that governs. */
export function strengthPart(checks: BarChecks, units: UnitSystem): Markup | null {
  if (checks.unknown !== null) return markup`<h3>Strength</h3><p>${checks.unknown}</p>`;
  const { governing, steel } = checks;
  if (governing === null) return null;
  const demand = [
    checks.tension === null
      ? null
      : `pulled ${showForce(checks.tension.force, units)} in ${checks.tension.name}`,
    checks.compression === null
      ? null
      : `squeezed ${showForce(checks.compression.force, units)} in ${checks.compression.name}`,
    checks.slackIn.length === 0 ? null : `slack in ${checks.slackIn.length} of the combinations`,
  ].filter((part) => part !== null);
  const acts = demand.length > 0 ? `${demand.join('; ')}.` : 'Nothing acts: resistances alone.';
  const stress = steel
    ? ` f_y ${steel.fy}, f_u ${steel.fu} N/mm² (${steel.source}, ${steel.confidence}).`
    : '';
  return markup`<div class="keep"><h3>Strength<small>${acts}</small></h3><p>Steel ${steel?.grade ?? ''}:${plain(stress)}</p><table class="t"><thead><tr><th class="l">Check</th><th class="l">Clause</th><th class="l">Source</th><th>Acts</th><th>Resists</th><th>Used</th></tr></thead><tbody>${checks.checks.map((check) => row(check, check === governing, units))}</tbody></table></div>
<div class="keep"><h3>Working of the check that governs<small>${governing.resistance.title}, ${governing.resistance.standard} ${governing.resistance.clause}</small></h3>${working(governing, units)}</div>`;
}

function row({ resistance, demand, utilisation }: Check, governs: boolean, units: UnitSystem): Markup {
  const unmet = resistance.conditions.filter(({ met }) => !met).map(({ says }) => says);
  const name = `${resistance.title}${resistance.end === null ? '' : `, end ${resistance.end}`}`;
  return markup`<tr class="${governs ? 'governs' : ''}"><td class="l wrap">${governs ? markup`<b>${name}</b>` : name}${unmet.length > 0 ? markup`<br>not met: ${unmet.join('; ')}` : null}</td><td class="l wrap">${resistance.clause}</td><td class="l">${resistance.confidence}${resistance.ownRule ? '' : ', borrowed'}</td><td>${demand === null ? '–' : showForce(demand.force, units)}</td><td>${resistance.resistance === null ? '–' : showForce(resistance.resistance, units)}</td><td><b>${showUse(utilisation)}</b></td></tr>`;
}

function working({ resistance }: Check, units: UnitSystem): Markup {
  const lines = workingLines(resistance, units);
  return markup`<table class="t"><tbody>${lines.map(({ name, symbol, formula, values, result }) => markup`<tr><td class="l wrap">${name}</td><td class="l wrap">${plain(symbol)}${formula === null ? '' : ` = ${plain(formula)}`}${values === null ? '' : ` = ${values}`}</td><td><b>${result}</b></td></tr>`)}</tbody></table>${resistance.note === null ? null : markup`<p>${resistance.note}</p>`}`;
}

/** Printed without low-set letters: "A_g" as "Ag". */
const plain = (symbols: string): string => symbols.replaceAll('_', '');
