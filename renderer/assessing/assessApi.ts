/** What the workers do for the window. Everything that crosses is plain data. */
import type { Assessment } from '../../core/assessment.ts';
import type { CatalogueId, OwnAngle } from '../../core/catalogue/model.ts';
import type { PushTest } from '../../core/frame/pushing.ts';
import type { BarId, CrossingId } from '../../core/layout/model.ts';
import type { Join, Project } from '../../core/project/model.ts';
import type { Remedy } from '../../core/remedies/model.ts';
import type { Shortlist, ShortlistOptions } from '../../core/shortlist/model.ts';
import type { BarStudy, Reliance } from '../../core/study/model.ts';

import type { AssessmentHead, AssessmentPart } from './assessmentParts.ts';

/** A project with a number of its own, by which a worker knows whether it has assessed it already. */
export interface Snapshot {
  readonly serial: number;
  readonly project: Project;
}

export interface AssessAnswer {
  readonly assessment: Assessment;
  /** ms. */
  readonly took: number;
}

/** What one join would do at a crossing, found by marking it so and assessing again. */
export interface JoinReading {
  readonly join: Join;
  readonly bars: readonly BarReading[];
}

export interface BarReading {
  readonly bar: BarId;
  readonly inPlane: HoldReading;
  readonly outOfPlane: HoldReading;
  readonly twist: HoldReading;
  /** Null when the bar cannot be assessed. */
  readonly slenderness: number | null;
  readonly limit: number;
  readonly status: 'over' | 'near' | 'within' | 'unknown';
}

/** held: counted. claimed: the mark claims it, but it does not count. */
export type HoldReading = 'held' | 'claimed' | 'nothing';

/** One stock angle as a field offers it. */
export interface SectionChoice {
  readonly designation: string;
  readonly kind: 'equal' | 'unequal';
  readonly own: boolean;
  /** kg/m. */
  readonly massPerMetre: number;
}

export interface StockChoices {
  /** "EN 10056-1". */
  readonly name: string;
  readonly source: string;
  readonly choices: readonly SectionChoice[];
}

/** What a typed designation means, whatever list it is in; the nearest ones where it means nothing. */
export interface SectionFound {
  /** Null where no list has it. */
  readonly designation: string | null;
  readonly nearest: readonly string[];
}

export interface AssessApi {
  assess(snapshot: Snapshot): AssessAnswer;
  /** Places in the project of the bays whose critical loads are not remembered. */
  unremembered(snapshot: Snapshot): readonly number[];
  /** Remembers what comes through the port. */
  keep(port: MessagePort): void;
  /** Assesses; the rest is fetched part by part. */
  head(snapshot: Snapshot): { readonly head: AssessmentHead; readonly parts: number };
  part(snapshot: Snapshot, k: number): AssessmentPart;
  remedies(snapshot: Snapshot, finding: string): readonly Remedy[];
  readings(snapshot: Snapshot, crossing: CrossingId): readonly JoinReading[];
  shortlist(snapshot: Snapshot, bars: readonly BarId[], options: ShortlistOptions): Shortlist;
  study(snapshot: Snapshot, bar: BarId): BarStudy | null;
  /** The bar pushed at a place, mm from its end i. */
  push(snapshot: Snapshot, bar: BarId, at: number): PushTest | null;
  reliance(snapshot: Snapshot, bay: string): readonly Reliance[];
  stock(catalogue: CatalogueId, own: readonly OwnAngle[]): StockChoices;
  section(catalogue: CatalogueId, own: readonly OwnAngle[], typed: string): SectionFound;
  /** One HTML document that stands alone. */
  report(snapshot: Snapshot, print: { readonly date: string; readonly fonts: string }): string;
  scheduleCsv(snapshot: Snapshot): string;
  scheduleJson(snapshot: Snapshot): string;
}
