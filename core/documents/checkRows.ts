import type { Assessment } from '../assessment.ts';
import type { Check, Demand } from '../checks/model.ts';
import type { LengthOverride, Role } from '../project/model.ts';
import type { Resistance, Steel } from '../resistance/model.ts';

/** Checks of one diagonal, strut or beam as the command line writes them: N, mm, N/mm². Documented in README.md. */
export interface CheckRow {
  readonly mark: string;
  readonly bay: string;
  readonly bar: string;
  readonly role: Role;
  readonly section: string;
  readonly steel: Steel | null;
  readonly tension: Demand | null;
  readonly compression: Demand | null;
  readonly slackIn: readonly string[];
  /** Lengths and factors set by hand, each with its reason. */
  readonly overrides: readonly LengthOverride[];
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

/** The diagonals, then the struts and beams that something squeezes. */
export function checkRows(assessment: Assessment): readonly CheckRow[] {
  return [...diagonalRows(assessment), ...memberRows(assessment)];
}

function diagonalRows({ layout, diagonals }: Assessment): readonly CheckRow[] {
  return [...diagonals.values()].flatMap(({ bar: id, checks }) => {
    const bar = layout.bars.get(id);
    if (!bar?.angle || !checks) return [];
    return [
      {
        mark: bar.mark,
        bay: bar.bay,
        bar: id,
        role: bar.role,
        section: bar.angle.stock?.designation ?? bar.angle.spec.section,
        steel: checks.steel,
        tension: checks.tension,
        compression: checks.compression,
        slackIn: checks.slackIn,
        overrides: bar.angle.mark.overrides ?? [],
        status: checks.status,
        governing: checks.governing && lineOf(checks.governing),
        checks: checks.checks.map(lineOf),
        unknown: checks.unknown,
      },
    ];
  });
}

function memberRows({ layout, members }: Assessment): readonly CheckRow[] {
  return [...members.values()].flatMap((each) => {
    const bar = layout.bars.get(each.bar);
    if (!bar || each.compression === null) return [];
    const line = each.check && lineOf(each.check);
    return [
      {
        mark: bar.mark,
        bay: bar.bay,
        bar: each.bar,
        role: bar.role,
        section: each.member.name,
        steel: each.steel,
        tension: each.tension,
        compression: each.compression,
        slackIn: [],
        overrides: [],
        status: each.status,
        governing: line,
        checks: line ? [line] : [],
        unknown: each.unknown,
      },
    ];
  });
}

const lineOf = ({ resistance, demand, utilisation }: Check): CheckLine => ({
  ...resistance,
  demand,
  utilisation,
});
