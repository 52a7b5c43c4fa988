import type { ForceRow } from '../../core/documents/forceRows.ts';
import { textTable } from '../../core/documents/textTable.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import { showForce, showMovement } from '../../core/units/loads.ts';

/** Every combination with its bars that carry something, then what moves. */
export function forcesTable(rows: readonly ForceRow[], units: UnitSystem): string {
  return rows.map((row) => oneCombination(row, units)).join('\n');
}

/** Below this, N, a bar carries nothing worth a line. */
const NOTHING = 1;

function oneCombination(row: ForceRow, units: UnitSystem): string {
  const bars = row.bars.filter(({ force, slack }) => slack || Math.abs(force) >= NOTHING);
  const table = textTable(
    [
      { head: 'Bar', align: 'left' },
      { head: 'Mark', align: 'left' },
      { head: 'Force', align: 'right' },
      { head: '', align: 'left' },
    ],
    bars.map(({ bar, mark, force, slack }) => [
      bar,
      mark,
      slack ? '0' : showForce(Math.abs(force), units),
      slack ? 'slack' : force > 0 ? 'pulled' : 'squeezed',
    ]),
  );
  const drifts = row.drifts.map(
    ({ bay, level, elastic, withTakeUp }) =>
      `${bay} ${level} moves ${showMovement(elastic, units)}${
        withTakeUp === null ? '' : `, ${showMovement(withTakeUp, units)} with slack taken up`
      }`,
  );
  const noWay = row.noWay.map(
    ({ bays, says }) => `No way to carry this load in ${bays.join(', ')}: ${says}.`,
  );
  const notes = [...noWay, ...drifts];
  return `${row.id}: ${row.name} (${row.use})\n${table}${notes.length > 0 ? `${notes.join('\n')}\n` : ''}`;
}
