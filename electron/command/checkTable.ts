import type { CheckLine, CheckRow } from '../../core/documents/checkRows.ts';
import { oneLine } from '../../core/documents/oneLine.ts';
import { overrideWords } from '../../core/documents/overrideWords.ts';
import { textTable } from '../../core/documents/textTable.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import { showForce, showUse } from '../../core/units/loads.ts';

/** Every check of every diagonal, and of the struts and beams that are squeezed, the one used most marked; then what could not be checked, and what comes from memory. */
export function checkTable(rows: readonly CheckRow[], units: UnitSystem): string {
  if (rows.length === 0) return 'No diagonals.\n';
  const table = textTable(
    [
      { head: 'Bar', align: 'left' },
      { head: 'Section', align: 'left' },
      { head: 'Check', align: 'left' },
      { head: 'Clause', align: 'left' },
      { head: 'Acts', align: 'right' },
      { head: 'Resists', align: 'right' },
      { head: 'Used', align: 'right' },
      { head: '', align: 'left' },
    ],
    rows.flatMap((row) => row.checks.map((check) => lineOf(row, check, units))),
  );
  const unknown = rows
    .filter((row) => row.unknown !== null)
    .map((row) => `${nameOf(row)}: ${row.unknown ?? ''}`);
  const byHand = rows.flatMap((row) =>
    row.overrides.map((override) => `* ${nameOf(row)}, set by hand: ${overrideWords(override, units)}`),
  );
  return `${[table, ...[...unknown, ...byHand].map(oneLine), SOURCES].join('\n')}\n`;
}

const SOURCES =
  'Clauses tagged “verify” are from memory: check them against the standard in hand before use. All figures are an aid, not a proof.';

/** Members of two bays may be called alike. */
const nameOf = ({ role, mark, bar }: CheckRow): string => (role === 'beam' || role === 'strut' ? bar : mark);

function lineOf(row: CheckRow, check: CheckLine, units: UnitSystem): readonly string[] {
  const governs = row.governing?.kind === check.kind && row.governing.end === check.end;
  const failed = check.conditions.filter(({ met }) => !met).map(({ says }) => says);
  return [
    nameOf(row),
    row.section,
    `${check.title}${check.end === null ? '' : `, end ${check.end}`}${isByHand(row, check) ? ' *' : ''}`,
    `${check.standard} ${check.clause}${check.confidence === 'from memory, verify' ? ' (verify)' : ''}`,
    check.demand === null ? '–' : showForce(check.demand.force, units),
    check.resistance === null ? '–' : showForce(check.resistance, units),
    showUse(check.utilisation),
    [...(governs ? ['governs'] : []), ...(failed.length > 0 ? [`not met: ${failed.join('; ')}`] : [])].join(
      '; ',
    ),
  ];
}

/** A length set by hand goes into what is worked out over lengths. */
const isByHand = ({ overrides }: CheckRow, { kind }: CheckLine): boolean =>
  overrides.length > 0 && kind === 'compression, lengths by the practice';
