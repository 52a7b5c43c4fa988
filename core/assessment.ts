import type { Bowing } from './bowing/model.ts';
import type { BarChecks, MemberChecks } from './checks/model.ts';
import type { Finding, Severity } from './findings/model.ts';
import type { Forces } from './forces/model.ts';
import type { BarId, Layout } from './layout/model.ts';
import type { LimitInForce, Practice, Verdict } from './practice/model.ts';
import type { Project } from './project/model.ts';
import type { Restraint } from './restraint/model.ts';
import type { FreeWays } from './restraint/movable.ts';
import type { ScheduleRow } from './schedule/model.ts';

/** Everything derived from a project. Plain data (Maps included): it crosses to and from workers as it is. */
export interface Assessment {
  readonly project: Project;
  readonly practice: Practice;
  readonly layout: Layout;
  readonly diagonals: ReadonlyMap<BarId, DiagonalAssessment>;
  /** Struts and beams in compression; empty where resistances were not asked for. */
  readonly members: ReadonlyMap<BarId, MemberChecks>;
  /** Forces of every combination; null where nothing acts. */
  readonly forces: Forces | null;
  /** Must-fix first, then by bay order. */
  readonly findings: readonly Finding[];
  readonly schedule: readonly ScheduleRow[];
  readonly bays: ReadonlyMap<string, BaySummary>;
  readonly counts: Readonly<Record<Severity, number>>;
  /** True when some finding breaks a limit. */
  readonly breaksLimit: boolean;
}

export interface DiagonalAssessment {
  readonly bar: BarId;
  /** Null when the section is not in stock, the bar has no length left, or it turns freely: a finding says so. */
  readonly restraint: Restraint | null;
  /** The ways in which it turns freely, its ends being marked as they are; null for a bar that is kept in place. */
  readonly turns: FreeWays | null;
  readonly limit: LimitInForce;
  readonly handling: Verdict | null;
  readonly inService: Verdict | null;
  /** By stiffness and by critical load; null where not asked for or not assessed. */
  readonly bowing: Bowing | null;
  /** Resistances against what acts; null where not asked for. */
  readonly checks: BarChecks | null;
  /** 0…: worst asked slenderness over limit. */
  readonly nearness: number | null;
  readonly status: 'over' | 'near' | 'within' | 'unknown';
  /** Why it bows where it does, in a sentence or two, in the project's units. */
  readonly reason: string;
  readonly findings: readonly string[];
}

export interface BaySummary {
  readonly bay: string;
  readonly bars: number;
  readonly diagonals: number;
  readonly worst: { readonly bar: BarId; readonly slenderness: number; readonly limit: number } | null;
  /** Diagonals that turn without resistance, their ends being marked as they are: they have no slenderness, and are worse than any. */
  readonly turning: number;
  readonly mass: number;
  /** "2 tiers, crossed" */
  readonly says: string;
}
