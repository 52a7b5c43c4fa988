import type { Assessment } from '../../core/assessment.ts';
import { BAD_INPUT, type ExitCode, FINE, LIMIT_BROKEN } from './exitCode.ts';
import type { Terminal } from './terminal.ts';
import { nearestText } from './trouble.ts';

/**
 * Says on the error stream which sections are in no stock list: where, what, and what to do. All else was assessed.
 *
 * @returns how a command that assesses a project ends
 */
export function exitCodeFor(assessment: Assessment, file: string, terminal: Terminal): ExitCode {
  let isUnknown = false;
  for (const bay of assessment.layout.bays) {
    const unknown = new Map<string, { readonly marks: string[]; readonly nearest: readonly string[] }>();
    for (const id of bay.diagonals) {
      const bar = assessment.layout.bars.get(id);
      if (!bar?.angle || bar.angle.stock !== null) continue;
      const known = unknown.get(bar.angle.spec.section) ?? { marks: [], nearest: bar.angle.nearest };
      known.marks.push(bar.mark);
      unknown.set(bar.angle.spec.section, known);
    }
    for (const [section, { marks, nearest }] of unknown) {
      isUnknown = true;
      terminal.err(
        `${file}: ${bay.id}: ${marks.join(', ')}: the section “${section}” is in no stock list. ${nearestText(nearest)} Choose one of the list, or add it to the project's own list.\n`,
      );
    }
  }
  if (isUnknown) return BAD_INPUT;
  return assessment.breaksLimit ? LIMIT_BROKEN : FINE;
}
