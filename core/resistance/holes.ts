/** Holes for bolts: how they are made, what is deducted for them, and how near they may stand. mm. */
import type { Confidence } from '../practice/model.ts';
import type { PracticeId } from '../project/model.ts';

/** Diameter of a normal round hole. Practice-facts H3, from memory, sure, but for M12 and M14 outside EN and IS. */
export function normalHole(practice: PracticeId, bolt: number): number {
  switch (practice) {
    case 'en1993':
    case 'is800':
      return bolt + (bolt <= 14 ? 1 : bolt <= 24 ? 2 : 3);
    case 'sans10162':
    case 'csaS16':
    case 'as4100':
      return bolt + (bolt <= 24 ? 2 : 3);
    case 'aisc360':
      return bolt + inInches(bolt, bolt <= 22.5 ? 2 : 3);
    default:
      return practice satisfies never;
  }
}

/** AISC's inch bolts have 1/16 in up to 7/8 and 1/8 above. */
function inInches(bolt: number, metric: number): number {
  const eighths = bolt / 3.175;
  const isInch = Math.abs(eighths - Math.round(eighths)) < 0.01;
  if (!isInch) return metric;
  return bolt <= 22.3 ? 25.4 / 16 : 25.4 / 8;
}

/** Width taken off the section for a hole, B4.3b, 12.3.2 and their like. */
export function deductedWidth(practice: PracticeId, hole: number, punched: boolean): number {
  switch (practice) {
    case 'sans10162':
    case 'csaS16':
    // Unless holes are known to be drilled; a schedule does not know.
    case 'aisc360':
      return hole + 2;
    case 'en1993':
      return hole;
    case 'as4100':
    case 'is800':
      return hole + (punched ? 2 : 0);
    default:
      return practice satisfies never;
  }
}

export interface LeastDistances {
  readonly pitch: number;
  readonly end: number;
  readonly edge: number;
  readonly clause: string;
  readonly confidence: Confidence;
}

/** Least pitch along the force, distance to the end and to a rolled edge, from centres of bolts. */
export function leastDistances(practice: PracticeId, bolt: number, hole: number): LeastDistances {
  switch (practice) {
    case 'en1993':
      return {
        pitch: 2.2 * hole,
        end: 1.2 * hole,
        edge: 1.2 * hole,
        clause: 'EN 1993-1-8 Table 3.3',
        confidence: 'from memory, sure',
      };
    case 'aisc360':
      return {
        pitch: (8 / 3) * bolt,
        end: 1.25 * bolt,
        edge: 1.25 * bolt,
        clause: 'J3.3, Table J3.4M (taken as 1.25 d)',
        confidence: 'from memory, verify',
      };
    case 'sans10162':
    case 'csaS16':
      return {
        pitch: 2.7 * bolt,
        end: 1.5 * bolt,
        edge: 1.25 * bolt,
        clause: '22.3',
        confidence: 'from memory, verify',
      };
    case 'as4100':
      return {
        pitch: 2.5 * bolt,
        end: 1.5 * bolt,
        edge: 1.25 * bolt,
        clause: '9.5 (9.6 in 1998)',
        confidence: 'from memory, verify',
      };
    case 'is800':
      return {
        pitch: 2.5 * bolt,
        end: 1.5 * hole,
        edge: 1.5 * hole,
        clause: '10.2.2, 10.2.4',
        confidence: 'from memory, sure',
      };
    default:
      return practice satisfies never;
  }
}
