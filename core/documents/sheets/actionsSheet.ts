import type { Assessment } from '../../assessment.ts';
import { LEANING } from '../../forces/leaning.ts';
import type { Load } from '../../project/actions.ts';
import type { UnitSystem } from '../../project/model.ts';
import { showForce, showMovement } from '../../units/loads.ts';
import { showLoad } from '../../units/loadUnits.ts';
import { showLength } from '../../units/quantity.ts';
import { type Markup, markup } from '../markup.ts';

/** What acts, how it is combined, and what each combination does to the bays; null where nothing acts. */
export function actionsSheet(
  { project, practice, forces, layout }: Assessment,
  units: UnitSystem,
): Markup | null {
  const { actions } = project;
  if (!actions || forces === null) return null;
  const leaning = LEANING[practice.id];
  const cases = actions.cases.map(
    ({ id, name, kind, selfWeight, reverses, loads }) =>
      markup`<tr><td class="l"><b>${id}</b></td><td class="l">${name}</td><td class="l">${kind}${reverses ? ', either way' : ''}</td><td class="l wrap">${[...(selfWeight ? ['own weight of the bars'] : []), ...loads.map((load) => loadWords(load, units))].join('; ')}</td></tr>`,
  );
  const states = forces.states.map((state) => {
    const taut = [...state.forces].filter(([id, force]) => force > 1 && layout.bars.get(id)?.angle);
    const greatest = taut.reduce<readonly [string, number] | null>(
      (most, each) => (most === null || each[1] > most[1] ? each : most),
      null,
    );
    const drift = state.drifts.reduce((most, { elastic }) => Math.max(most, Math.abs(elastic)), 0);
    const noWay =
      state.noWay.length > 0
        ? `no way to carry it in ${state.noWay.flatMap(({ bays }) => bays).join(', ')}`
        : '';
    return markup`<tr><td class="l wrap">${state.name}</td><td class="l">${state.use}</td><td>${greatest === null ? '–' : `${layout.bars.get(greatest[0])?.mark ?? ''} ${showForce(greatest[1], units)}`}</td><td>${String(state.slack.size)}</td><td>${showMovement(drift, units)}</td><td class="l">${noWay}</td></tr>`;
  });
  return markup`<section class="actions"><h2>What acts</h2><table class="t"><thead><tr><th class="l">Case</th><th class="l">Name</th><th class="l">Kind</th><th class="l">Loads</th></tr></thead><tbody>${cases}</tbody></table>
<h2>Combinations<small>out of plumb: ${String(leaning.share)} of the vertical loads, ${practice.name} ${leaning.clause} (${leaning.confidence})</small></h2><table class="t"><thead><tr><th class="l">Combination</th><th class="l">For</th><th>Pulled most</th><th>Slack</th><th>Moves</th><th class="l"></th></tr></thead><tbody>${states}</tbody></table></section>`;
}

/** "gable of R1 0.75 kN/m² on rafter 1". */
function loadWords(load: Load, units: UnitSystem): string {
  const along = (parts: readonly number[], of: 'force' | 'perLength'): string =>
    parts
      .map((part, k) => (part === 0 ? null : `${'XYZ'[k]} ${showLoad(part, of, units)}`))
      .filter((part) => part !== null)
      .join(', ');
  switch (load.kind) {
    case 'node':
      return `${load.node}: ${along(load.force, 'force')}`;
    case 'line':
      return `along ${load.bar}: ${along(load.perMetre, 'perLength')}`;
    case 'shortened':
      return `${load.bar} ${showLength(Math.abs(load.by), units, 'small')} ${load.by < 0 ? 'too long' : 'short'}`;
    case 'gable':
      return `gable of ${load.bay} ${showLoad(load.pressure, 'pressure', units)} on rafter ${load.rafter}`;
    case 'side':
      return `wall on ${load.bay} ${showLoad(load.pressure, 'pressure', units)} over ${showLength(load.width, units, 'spoken')}`;
    case 'bowed':
      return `rafters of ${load.bay} not straight: ${load.rafters} with ${showLoad(load.squeeze, 'force', units)} each, bracing gives its span/${load.gives} (EN 1993-1-1 5.3.3, borrowed by other practices; from memory, sure)`;
    default:
      return load satisfies never;
  }
}
