import type { Assessment } from '../../../core/assessment.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce } from '../../../core/units/loads.ts';
import type { BarLabel } from '../overlay/barLabel.ts';
import { type ForcesShown, isSlack, shownForce } from './forcesShown.ts';

/** While forces are drawn: a diagonal's mark, how much of it is used, and what it carries. */
export function forceLabel(
  assessment: Assessment,
  bar: Bar,
  shown: ForcesShown,
  units: UnitSystem,
): BarLabel {
  const checks = assessment.diagonals.get(bar.id)?.checks;
  const status =
    checks === null || checks === undefined || checks.status === 'no load' ? 'unknown' : checks.status;
  const force = shownForce(shown, bar.id);
  if (force === null)
    return { mark: bar.mark, status, slenderness: '–', spoken: `${bar.mark}, force not known` };
  if (isSlack(shown, bar.id))
    return { mark: bar.mark, status, slenderness: 'slack', spoken: `${bar.mark}, slack` };
  const figure = showForce(Math.abs(force), units, 'bare');
  const way = Math.abs(force) < 1 ? 'carries nothing' : force > 0 ? 'pulled' : 'squeezed';
  return {
    mark: bar.mark,
    status,
    slenderness: figure,
    spoken: `${bar.mark}, ${way}, ${showForce(Math.abs(force), units)}`,
  };
}
