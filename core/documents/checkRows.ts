import type { Assessment } from '../assessment.ts';
import type { Check, Demand } from '../checks/model.ts';
import type { Resistance, Steel } from '../resistance/model.ts';

/** One diagonal's checks as the command line writes them: N, mm, N/mm². Documented in README.md. */
export interface CheckRow {
  readonly mark: string;
  readonly bay: string;
  readonly bar: string;
  readonly section: string;
  readonly steel: Steel | null;
  readonly tension: Demand | null;
  readonly compression: Demand | null;
  readonly slackIn: readonly string[];
  readonly status: string;
  readonly governing: CheckLine | null;
  readonly checks: readonly CheckLine[];
  /** Why nothing could be checked; null otherwise. */
  readonly unknown: string | null;
}

/** A resistance with what acts on it. */
export interface CheckLine extends Resistance {
  readonly demand: Demand | null;
  readonly utilisation: number | null;
}

export function checkRows({ layout, diagonals }: Assessment): readonly CheckRow[] {
  return [...diagonals.values()].flatMap(({ bar: id, checks }) => {
    const bar = layout.bars.get(id);
    if (!bar?.angle || !checks) return [];
    return [
      {
        mark: bar.mark,
        bay: bar.bay,
        bar: id,
        section: bar.angle.stock?.designation ?? bar.angle.spec.section,
        steel: checks.steel,
        tension: checks.tension,
        compression: checks.compression,
        slackIn: checks.slackIn,
        status: checks.status,
        governing: checks.governing && lineOf(checks.governing),
        checks: checks.checks.map(lineOf),
        unknown: checks.unknown,
      },
    ];
  });
}

const lineOf = ({ resistance, demand, utilisation }: Check): CheckLine => ({
  ...resistance,
  demand,
  utilisation,
});
