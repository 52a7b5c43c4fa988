import type { SolvedCase } from '../../core/cases/model.ts';
import { type TextColumn, textTable } from '../../core/documents/textTable.ts';
import { grouped } from '../../core/units/figures.ts';

const right = (head: string): TextColumn => ({ head, align: 'right' });

const COLUMNS: readonly TextColumn[] = [
  { head: 'case', align: 'left' },
  right('N_cr, N'),
  right('factor'),
  right('second'),
  right('L_eff x'),
  right('y'),
  right('u'),
  right('v, mm'),
  right('slenderness'),
  right('by the rule'),
  { head: 'about', align: 'left' },
  right('load by the rule'),
];

/** The figures in a table, then how each bows, a line a case. */
export function bowTable(solved: readonly SolvedCase[]): string {
  if (solved.length === 0) return 'No case was solved.\n';
  const table = textTable(COLUMNS, solved.map(rowOf));
  const widest = Math.max(...solved.map(({ id }) => id.length));
  const modes = solved.map((each) => `${each.id.padEnd(widest)}  ${each.says}`).join('\n');
  return `${table}\n${modes}\n`;
}

const NOTHING = '–';

const signed = (percent: number): string =>
  Math.abs(percent) < 0.05 ? '0.0 %' : `${percent < 0 ? '' : '+'}${grouped(percent, 1)} %`;

function rowOf(solved: SolvedCase): readonly string[] {
  const whole = (value: number | undefined | null): string =>
    value === undefined || value === null ? NOTHING : grouped(value, value < 1000 ? 1 : 0);
  if (solved.type === 'xbrace-planar') {
    const { id, N, secondN, effectiveLength } = solved;
    // One plane of bending: one effective length, and no section to speak of slenderness.
    return [id, whole(N), whole(N), whole(secondN), whole(effectiveLength), ...Array(7).fill(NOTHING)];
  }
  const { id, critical, rule } = solved;
  const lengths = critical?.effectiveLength;
  return [
    id,
    whole(critical?.N),
    whole(critical?.factor),
    whole(critical?.secondFactor),
    whole(lengths?.x),
    whole(lengths?.y),
    whole(lengths?.u),
    whole(lengths?.v),
    critical ? grouped(critical.slenderness, 1) : NOTHING,
    rule ? grouped(rule.slenderness, 1) : NOTHING,
    rule ? `${rule.axis}${rule.basis === 'mixed bound' ? ' (bound)' : ''}` : NOTHING,
    rule ? signed(rule.difference) : NOTHING,
  ];
}
