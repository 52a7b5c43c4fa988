import type { Assessment } from '../../../core/assessment.ts';
import type { Finding } from '../../../core/findings/model.ts';
import type { BarId } from '../../../core/layout/model.ts';
import type { Edit } from '../../../core/project/edit.ts';
import type { Remedy } from '../../../core/remedies/model.ts';
import type { Trial } from '../../store/trying.ts';

/** Trying a remedy. The banner tells the figure of the finding's first bar, or of the chosen one when it is among them. */
export function remedyTrial(
  remedy: Remedy,
  finding: Finding,
  assessment: Assessment,
  chosen: BarId | null,
): Trial {
  const bar = chosen !== null && finding.bars.includes(chosen) ? chosen : (finding.bars[0] ?? null);
  return {
    id: remedy.id,
    label: remedy.label,
    where: whereOf(remedy.edits, finding, assessment),
    edits: remedy.edits,
    bar,
  };
}

/** "D1 and D2", or "all of W1" where the whole bay's diagonals change. */
function whereOf(edits: readonly Edit[], finding: Finding, assessment: Assessment): string {
  const whole = edits.find((edit) => edit.kind === 'diagonals');
  if (whole?.kind === 'diagonals') return `all of ${whole.bay}`;
  const marks = finding.bars.map((bar) => assessment.layout.bars.get(bar)?.mark ?? bar);
  if (marks.length === 0) return finding.bay;
  if (marks.length > 3) return `${marks[0]} to ${marks.at(-1)}`;
  return marks.length === 1 ? (marks[0] ?? '') : `${marks.slice(0, -1).join(', ')} and ${marks.at(-1)}`;
}
