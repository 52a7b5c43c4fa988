/** What the checks of compression are given, for the tests: N, mm, N/mm². */
import type { PracticeId } from '../../core/project/model.ts';
import { compressionResistances } from '../../core/resistance/compression/compressionResistances.ts';
import type {
  CompressionQuestion,
  Resistance,
  ResistanceKind,
  ResistanceOptions,
  ResistingEnd,
  ResistingSection,
} from '../../core/resistance/model.ts';
import type { SectionProperties } from '../../core/section/model.ts';
import { propertiesOf } from '../unit/assess/given/catalogues.ts';
import { boltedEnd, OPTIONS } from './tensionGiven.ts';

export const CRITICAL = 'compression, critical load';
export const LENGTHS = 'compression, lengths by the practice';
export const ONE_LEG = 'compression, one leg';

/** A stock angle, by its longer leg unless said. */
export function stockAngle(designation: string, by: 'longer' | 'shorter' = 'longer'): ResistingSection {
  const [long = 0, short = 0, thickness = 0] = designation.split('x').map(Number);
  return angleWith(propertiesOf(designation), long, short, thickness, by);
}

export function angleWith(
  properties: SectionProperties,
  long: number,
  short: number,
  thickness: number,
  by: 'longer' | 'shorter' = 'longer',
): ResistingSection {
  const longer = by === 'longer';
  return {
    designation: `${long}x${short}x${thickness}`,
    shape: 'angle',
    properties,
    connectedLeg: longer ? long : short,
    outstandingLeg: longer ? short : long,
    thickness,
    rootRadius: 0,
    offCentroid: longer ? properties.centroidX : properties.centroidY,
  };
}

export interface Asked {
  readonly fy: number;
  readonly E?: number;
  readonly G?: number;
  readonly ends?: readonly [Partial<ResistingEnd>, Partial<ResistingEnd>];
  readonly options?: Partial<ResistanceOptions>;
  readonly more?: Partial<CompressionQuestion>;
}

/** A bar with nothing between its ends, two bolts at each. */
export function compressed(
  practice: PracticeId,
  section: ResistingSection,
  length: number,
  { fy, E = 200_000, G = 77_000, ends = [{}, {}], options = {}, more = {} }: Asked,
): CompressionQuestion {
  const end = (name: 'i' | 'j', given: Partial<ResistingEnd>): ResistingEnd =>
    boltedEnd(section.connectedLeg, { ...given, end: name });
  return {
    practice,
    section,
    steel: { grade: 'as given', fy, fu: 1.3 * fy, E, G, source: 'the test', confidence: 'from memory, sure' },
    ends: [end('i', ends[0]), end('j', ends[1])],
    options: { ...OPTIONS, ...options },
    length,
    unbraced: { x: length, y: length, u: length, v: length },
    twistLength: length,
    criticalLoad: null,
    system: 'planar',
    joinedBetween: false,
    ...more,
  };
}

export function compressionOf(question: CompressionQuestion, kind: ResistanceKind): Resistance {
  const found = compressionResistances(question).find((each) => each.kind === kind);
  if (!found) throw new Error(`no check of ${kind}`);
  return found;
}

/** N. */
export function loadOf(question: CompressionQuestion, kind: ResistanceKind): number {
  const { resistance, conditions } = compressionOf(question, kind);
  if (resistance !== null) return resistance;
  const failed = conditions.filter(({ met }) => !met).map(({ says, found }) => `${says} (${found})`);
  throw new Error(`no ${kind}: ${failed.join('; ')}`);
}
