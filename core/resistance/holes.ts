/** Holes for bolts: how they are made, what is deducted for them, and how near they may stand. Each practice's rule is a row of data. mm. */
import type { Confidence } from '../practice/model.ts';
import type { PracticeId } from '../project/model.ts';

const INCH = 25.4;

/** Hole over bolt, for bolts up to a size. */
interface Clearance {
  readonly upTo: number;
  readonly more: number;
}

interface HoleRule {
  readonly metric: readonly Clearance[];
  /** For bolts in eighths of an inch, where the practice has holes of its own for them. */
  readonly inch?: readonly Clearance[];
  readonly clause: string;
  readonly confidence: Confidence;
}

const ANY = Number.POSITIVE_INFINITY;
const TWO_THEN_THREE: readonly Clearance[] = [
  { upTo: 24, more: 2 },
  { upTo: ANY, more: 3 },
];
const ONE_TWO_THREE: readonly Clearance[] = [
  { upTo: 14, more: 1 },
  { upTo: 24, more: 2 },
  { upTo: ANY, more: 3 },
];

/** Practice-facts H3; the holes of M12 and M14 outside EN and IS are less sure than the rest. */
export const HOLE_RULES: Readonly<Record<PracticeId, HoleRule>> = {
  sans10162: { metric: TWO_THEN_THREE, clause: '22.3.5', confidence: 'from memory, verify' },
  csaS16: { metric: TWO_THEN_THREE, clause: '22.3.5', confidence: 'from memory, sure' },
  aisc360: {
    metric: [
      { upTo: 22, more: 2 },
      { upTo: ANY, more: 3 },
    ],
    // 1/8 in above 7/8 in since 360-16.
    inch: [
      { upTo: 0.875 * INCH, more: INCH / 16 },
      { upTo: ANY, more: INCH / 8 },
    ],
    clause: 'Tables J3.3, J3.3M',
    confidence: 'from memory, sure',
  },
  en1993: { metric: ONE_TWO_THREE, clause: 'EN 1090-2 Table 11', confidence: 'from memory, sure' },
  as4100: { metric: TWO_THEN_THREE, clause: '14.3.5.2', confidence: 'from memory, sure' },
  is800: { metric: ONE_TWO_THREE, clause: 'Table 19', confidence: 'from memory, sure' },
};

/** A bolt sized in eighths of an inch. Metric sizes lie no nearer to eighths than 0.1 mm. */
const isInch = (bolt: number): boolean => Math.abs(bolt - (Math.round(bolt / (INCH / 8)) * INCH) / 8) < 0.02;

/** Diameter of a normal round hole. */
export function normalHole(practice: PracticeId, bolt: number): number {
  const { metric, inch } = HOLE_RULES[practice];
  const clearances = inch && isInch(bolt) ? inch : metric;
  // A hundredth of a millimetre forgives sizes that were converted from inches.
  return bolt + (clearances.find(({ upTo }) => bolt <= upTo + 0.01)?.more ?? 0);
}

interface Deduction {
  /** Over the made hole, whatever way it is made. */
  readonly always: number;
  /** Over the made hole for bolts in eighths of an inch, where it differs. */
  readonly alwaysInch?: number;
  /** Over the made hole if it is punched full size. */
  readonly punched: number;
  readonly clause: string;
  readonly confidence: Confidence;
}

/** Practice-facts B0. SANS and CSA let the 2 mm go where holes are known to be drilled; a bracing schedule does not know. */
export const DEDUCTIONS: Readonly<Record<PracticeId, Deduction>> = {
  sans10162: { always: 2, punched: 0, clause: '12.3.2', confidence: 'from memory, sure' },
  csaS16: { always: 2, punched: 0, clause: '12.3.2', confidence: 'read in a source' },
  aisc360: {
    always: 2,
    alwaysInch: INCH / 16,
    punched: 0,
    clause: 'B4.3b',
    confidence: 'from memory, sure',
  },
  en1993: { always: 0, punched: 0, clause: 'EN 1993-1-1 6.2.2.2', confidence: 'from memory, sure' },
  as4100: { always: 0, punched: 2, clause: '9.1.10', confidence: 'from memory, verify' },
  is800: { always: 0, punched: 2, clause: '6.3.1, 3.6.1', confidence: 'from memory, verify' },
};

export interface MadeHole {
  readonly boltDiameter: number;
  /** Made size. */
  readonly hole: number;
}

export interface DeductedWidth {
  readonly width: number;
  /** "hole + 2 mm". */
  readonly formula: string;
}

/** Width taken off the section for one hole. */
export function deductedWidth(practice: PracticeId, made: MadeHole, punched: boolean): DeductedWidth {
  const { always, alwaysInch, punched: ifPunched, clause } = DEDUCTIONS[practice];
  const inch = alwaysInch !== undefined && isInch(made.boltDiameter);
  const more = (inch ? alwaysInch : always) + (punched ? ifPunched : 0);
  const says = more === 0 ? 'hole' : inch ? 'hole + 1/16 in' : `hole + ${more} mm`;
  return { width: made.hole + more, formula: `${says} (${clause})` };
}

/** A least distance as a multiple, or from a table by bolt. */
interface Least {
  readonly times: number;
  readonly of: 'bolt' | 'hole';
  /** Bolt up to this size, distance; beyond the table the multiple holds. */
  readonly table?: readonly (readonly [bolt: number, distance: number])[];
}

interface DistanceRule {
  readonly pitch: Least;
  readonly end: Least;
  /** With one or two bolts in line, where more is asked then. */
  readonly endOfFew?: Least;
  readonly edge: Least;
  readonly clause: string;
  readonly confidence: Confidence;
}

const times = (factor: number, of: Least['of']): Least => ({ times: factor, of });

/** Rolled, sawn or machine-cut edges. CSA S16 Table 6; 3/4 in read in a source, the others from memory. */
const CANADIAN_EDGE: Least = {
  times: 1.25,
  of: 'bolt',
  table: [
    [16, 22],
    [19.06, 25],
    [20, 26],
    [22.3, 28],
    [24, 30],
    [INCH, 32],
    [27, 34],
    [30, 38],
    [36, 46],
  ],
};

/** AISC 360 Tables J3.4 and J3.4M; beyond them 1.25 bolts, which the tables nearly are. */
const AMERICAN_EDGE: Least = {
  times: 1.25,
  of: 'bolt',
  table: [
    [0.5 * INCH, 0.75 * INCH],
    [0.625 * INCH, 0.875 * INCH],
    [16, 22],
    [0.75 * INCH, INCH],
    [20, 26],
    [22, 28],
    [0.875 * INCH, 1.125 * INCH],
    [24, 30],
    [INCH, 1.25 * INCH],
    [27, 34],
    [1.125 * INCH, 1.5 * INCH],
    [30, 38],
    [1.25 * INCH, 1.625 * INCH],
    [36, 46],
  ],
};

export const DISTANCE_RULES: Readonly<Record<PracticeId, DistanceRule>> = {
  sans10162: {
    pitch: times(2.7, 'bolt'),
    end: CANADIAN_EDGE,
    endOfFew: times(1.5, 'bolt'),
    edge: CANADIAN_EDGE,
    clause: '22.3, as CSA S16',
    confidence: 'from memory, verify',
  },
  csaS16: {
    pitch: times(2.7, 'bolt'),
    end: CANADIAN_EDGE,
    endOfFew: times(1.5, 'bolt'),
    edge: CANADIAN_EDGE,
    clause: '22.3, Table 6',
    confidence: 'from memory, verify',
  },
  aisc360: {
    pitch: times(8 / 3, 'bolt'),
    end: AMERICAN_EDGE,
    edge: AMERICAN_EDGE,
    clause: 'J3.3, J3.4',
    confidence: 'from memory, verify',
  },
  en1993: {
    pitch: times(2.2, 'hole'),
    end: times(1.2, 'hole'),
    edge: times(1.2, 'hole'),
    clause: 'EN 1993-1-8 Table 3.3',
    confidence: 'from memory, sure',
  },
  as4100: {
    pitch: times(2.5, 'bolt'),
    // A sawn end, a rolled edge.
    end: times(1.5, 'bolt'),
    edge: times(1.25, 'bolt'),
    clause: '9.5 (9.6 in 1998)',
    confidence: 'from memory, verify',
  },
  is800: {
    pitch: times(2.5, 'bolt'),
    end: times(1.5, 'hole'),
    edge: times(1.5, 'hole'),
    clause: '10.2.2, 10.2.4.2',
    confidence: 'from memory, verify',
  },
};

export interface LeastDistances {
  readonly pitch: number;
  readonly end: number;
  readonly edge: number;
  readonly clause: string;
  readonly confidence: Confidence;
}

/**
 * Least pitch along the force, distance to a sawn end and to a rolled edge, from centres of bolts.
 *
 * @param inLine bolts in one line along the force
 */
export function leastDistances(practice: PracticeId, made: MadeHole, inLine: number): LeastDistances {
  const { pitch, end, endOfFew, edge, clause, confidence } = DISTANCE_RULES[practice];
  const least = (rule: Least): number =>
    rule.table?.find(([bolt]) => made.boltDiameter <= bolt + 0.01)?.[1] ??
    rule.times * (rule.of === 'bolt' ? made.boltDiameter : made.hole);
  return {
    pitch: least(pitch),
    end: endOfFew && inLine <= 2 ? Math.max(least(end), least(endOfFew)) : least(end),
    edge: least(edge),
    clause,
    confidence,
  };
}
