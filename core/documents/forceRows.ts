import type { Assessment } from '../assessment.ts';
import type { Drift } from '../forces/model.ts';
import { motionInWords } from '../forces/motionWords.ts';

/** One combination as the command line writes it: N, mm; tension positive. Documented in README.md. */
export interface ForceRow {
  readonly id: string;
  readonly combination: string;
  readonly name: string;
  readonly use: 'strength' | 'service';
  readonly factors: Readonly<Record<string, number>>;
  readonly turned: readonly string[];
  readonly bars: readonly {
    readonly bar: string;
    readonly mark: string;
    readonly role: string;
    readonly force: number;
    readonly slack: boolean;
    /** Of diagonals, knees and ties; null for members. */
    readonly elongation: number | null;
    /** Greatest bending moment in the plane, N·mm; 0 for bars that do not bend. */
    readonly moment: number;
    /** Of a slack bar, the compression that it would take if it did not bow away; null otherwise. */
    readonly attracted: number | null;
  }[];
  readonly slack: readonly string[];
  readonly reactions: readonly { readonly node: string; readonly force: readonly number[] }[];
  readonly drifts: readonly Drift[];
  readonly noWay: readonly {
    readonly bays: readonly string[];
    readonly says: string;
    readonly slackened: readonly string[];
  }[];
  readonly residual: number;
}

export function forceRows({ forces, layout }: Assessment): readonly ForceRow[] {
  const markOf = (id: string): string => layout.bars.get(id)?.mark ?? id;
  return (forces?.states ?? []).map((state) => ({
    id: state.id,
    combination: state.combination,
    name: state.name,
    use: state.use,
    factors: state.factors,
    turned: state.turned,
    bars: [...state.forces].map(([bar, force]) => ({
      bar,
      mark: markOf(bar),
      role: layout.bars.get(bar)?.role ?? '',
      force,
      slack: state.slack.has(bar),
      elongation: state.elongations.get(bar) ?? null,
      moment: state.moments.get(bar) ?? 0,
      attracted: state.attracted.get(bar) ?? null,
    })),
    slack: [...state.slack].map(markOf),
    reactions: [...state.reactions].map(([node, force]) => ({ node, force })),
    drifts: state.drifts,
    noWay: state.noWay.map((each) => ({
      bays: each.bays,
      says: motionInWords(each, layout),
      slackened: each.slackened.map(markOf),
    })),
    residual: state.residual,
  }));
}
