import type { Bowing, NamedMechanism } from '../bowing/model.ts';
import type { BarChecks, MemberChecks } from '../checks/model.ts';
import type { Forces } from '../forces/model.ts';
import type { AngleBar, Bar, BarId, BayLayout, Layout } from '../layout/model.ts';
import type { LimitInForce, Practice, Verdict } from '../practice/model.ts';
import type { Project } from '../project/model.ts';
import type { Holdings } from '../restraint/heldNodes.ts';
import type { Restraint } from '../restraint/model.ts';
import type { FreeWays } from '../restraint/movable.ts';

/** One diagonal with what is known of it before findings are made. */
export interface Judged {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly restraint: Restraint | null;
  /** The ways in which it turns freely, its ends being marked as they are; null for a bar that is kept in place. */
  readonly turns: FreeWays | null;
  readonly limit: LimitInForce;
  readonly handling: Verdict | null;
  readonly inService: Verdict | null;
  /** Levels 2 and 3; null where they were not asked for or the bar is not assessed. */
  readonly bowing: Bowing | null;
  /** Resistances against what acts; null where they were not asked for. */
  readonly checks: BarChecks | null;
}

/** What findings are made from. */
export interface FindingSubject extends FindingInput {
  /** Place of each bay in the project. */
  readonly places: ReadonlyMap<string, number>;
}

export interface FindingInput {
  readonly project: Project;
  readonly practice: Practice;
  readonly layout: Layout;
  /** Which nodes the bracing holds in place. */
  readonly holdings: Holdings;
  readonly diagonals: ReadonlyMap<BarId, Judged>;
  /** Struts and beams. */
  readonly members: ReadonlyMap<BarId, MemberChecks>;
  /** Null where nothing acts. */
  readonly forces: Forces | null;
  /** Ways in which a bay can move without resistance, by bay. */
  readonly movable: ReadonlyMap<string, readonly NamedMechanism[]>;
}

export function judgedIn(subject: FindingSubject, bay: BayLayout): readonly Judged[] {
  return bay.diagonals.flatMap((id) => subject.diagonals.get(id) ?? []);
}

/** Marks in a row: "D1", "D1 and D2", "D1, D2 and D3", "D1 to D8" for a run of the program's own marks. */
export function marksInWords(judged: readonly Judged[]): string {
  const marks = judged.map(({ bar }) => bar.mark);
  const numbers = marks
    .map((mark) => /^D(\d+)$/.exec(mark)?.[1])
    .map((digits) => (digits ? Number(digits) : Number.NaN));
  const first = numbers[0] ?? Number.NaN;
  if (marks.length > 3 && numbers.every((value, k) => value === first + k))
    return `${marks[0]} to ${marks.at(-1)}`;
  if (marks.length > 6) return `${marks.slice(0, 5).join(', ')} and ${marks.length - 5} more`;
  return marks.length > 1 ? `${marks.slice(0, -1).join(', ')} and ${marks.at(-1)}` : (marks[0] ?? '');
}

export const isAre = (judged: readonly unknown[]): 'is' | 'are' => (judged.length > 1 ? 'are' : 'is');

/** Members of a list that share a key, in order of first appearance. */
export function grouped<T>(items: readonly T[], keyOf: (item: T) => string): readonly (readonly T[])[] {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    const list = groups.get(key);
    if (list) list.push(item);
    else groups.set(key, [item]);
  }
  return [...groups.values()];
}

/** "bays[2]" for paths into the project file. */
export function bayPath(subject: FindingSubject, bay: string): string {
  return `bays[${subject.places.get(bay) ?? -1}]`;
}
