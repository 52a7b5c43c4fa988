import type { EndsHold } from '../restraint/endWords.ts';
import type { BarShape } from '../section/barShape.ts';
import type { Axis } from '../section/model.ts';

/** One line of the bracing schedule: one diagonal. The JSON form of the command line; lengths mm, masses kg. Documented in README.md. */
export interface ScheduleRow {
  readonly mark: string;
  readonly bay: string;
  readonly bar: string;
  readonly numberOff: number;
  readonly hand: 'either' | 'left' | 'right';
  readonly section: string;
  readonly grade: string;
  readonly countedOn: 'tension' | 'both';
  readonly setOutLength: number;
  readonly setBackI: number;
  readonly setBackJ: number;
  readonly cutLength: number;
  /** Lengths of the pieces of a cut bar; one entry otherwise, and none where no steel is left. */
  readonly pieces: readonly number[];
  readonly crossingHoles: readonly number[];
  /** Of anything but a single angle: what it is. */
  readonly shape: BarShape['kind'] | null;
  readonly legInPlane: 'longer' | 'shorter';
  readonly heel: 'up' | 'down';
  readonly side: 'near' | 'far';
  readonly packer: number | null;
  readonly massEach: number | null;
  readonly massTotal: number | null;
  /** Same as massEach. */
  readonly mass: number | null;
  /** What is done at each crossing, in words. */
  readonly joins: readonly string[];
  /** Null where the section is not in stock, or no steel is left. */
  readonly unbraced: Readonly<Record<Axis, number>> | null;
  readonly radius: Readonly<Record<Axis, number>> | null;
  readonly slenderness: Readonly<Record<Axis, number>> | null;
  readonly governing: {
    readonly axis: Axis | 'free';
    readonly angle: number | null;
    readonly length: number;
    readonly radius: number;
    readonly slenderness: number;
    readonly basis: 'span' | 'exact' | 'override';
  } | null;
  /** Of a bar with mixed holds: the rule's safe bound, beside the exact figure that governs. Null for the others. */
  readonly bound: { readonly length: number; readonly radius: number; readonly slenderness: number } | null;
  readonly limit: number;
  readonly handling: RowVerdict | null;
  readonly inService: RowVerdict | null;
  /** Greatest pull and squeeze in the combinations for strength, N; null where nothing acts. */
  readonly force: { readonly tension: number; readonly compression: number } | null;
  /** Demand over resistance of the check that is used most; null where nothing acts or nothing is known. */
  readonly utilisation: number | null;
  /** "net rupture, end i, 13.2(a)(iii)"; null as above. */
  readonly governingCheck: string | null;
  /** What each end holds of the bar's movement across itself; 'both' unless marked otherwise. */
  readonly endsHold: EndsHold;
  readonly overrides: readonly {
    readonly axis: Axis;
    readonly length: number | null;
    readonly factor: number;
    readonly reason: string;
  }[];
  readonly reason: string;
  /** Titles of the findings that name this bar. */
  readonly findings: readonly {
    readonly id: string;
    readonly kind: string;
    readonly severity: string;
    readonly title: string;
  }[];
}

export interface RowVerdict {
  readonly slenderness: number;
  readonly limit: number;
  readonly ok: boolean;
  readonly asked: boolean;
}
