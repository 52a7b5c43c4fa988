/** What the checks of tension are given, for the tests: N, mm, N/mm². */
import type { PracticeId } from '../../core/project/model.ts';
import type {
  Resistance,
  ResistanceKind,
  ResistanceOptions,
  ResistingEnd,
  ResistingSection,
  TensionQuestion,
} from '../../core/resistance/model.ts';
import { tensionResistances } from '../../core/resistance/tension/tensionResistances.ts';
import { angleProperties } from '../../core/section/angleProperties.ts';
import type { SectionProperties } from '../../core/section/model.ts';

export const PRACTICES: readonly PracticeId[] = [
  'sans10162',
  'csaS16',
  'aisc360',
  'en1993',
  'as4100',
  'is800',
];

export const OPTIONS: ResistanceOptions = {
  method: 'LRFD',
  partialFactors: { gammaM0: null, gammaM1: null, gammaM2: null },
  blockTearing: 'off the middle',
  punchedHoles: false,
  gussetFixity: 'hinged',
};

/** An angle from its outline, by its longer leg unless said. */
export function angleOf(
  longLeg: number,
  shortLeg: number,
  thickness: number,
  rootRadius: number,
  by: 'longer' | 'shorter' = 'longer',
): ResistingSection {
  const outline = { longLeg, shortLeg, thickness, rootRadius, toeRadius: rootRadius / 2 };
  return angleFrom(angleProperties(outline), longLeg, shortLeg, thickness, by);
}

/** An angle with figures as printed: area and the distance from the connected face to the centroid. */
export function printedAngle(
  longLeg: number,
  shortLeg: number,
  thickness: number,
  area: number,
  offCentroid: number,
): ResistingSection {
  const outline = { longLeg, shortLeg, thickness, rootRadius: 0, toeRadius: 0 };
  const properties = { ...angleProperties(outline), area };
  return { ...angleFrom(properties, longLeg, shortLeg, thickness, 'longer'), offCentroid };
}

function angleFrom(
  properties: SectionProperties,
  longLeg: number,
  shortLeg: number,
  thickness: number,
  by: 'longer' | 'shorter',
): ResistingSection {
  const longer = by === 'longer';
  return {
    designation: `${longLeg}x${shortLeg}x${thickness}`,
    shape: 'angle',
    properties,
    connectedLeg: longer ? longLeg : shortLeg,
    outstandingLeg: longer ? shortLeg : longLeg,
    thickness,
    rootRadius: 0,
    offCentroid: longer ? properties.centroidX : properties.centroidY,
  };
}

/** A flat bar, bolted or welded on its broad side. */
export function flatOf(width: number, thickness: number): ResistingSection {
  // Of its properties tension asks for the area alone.
  const { properties } = printedAngle(100, 100, 10, width * thickness, thickness / 2);
  return {
    designation: `${width}x${thickness}`,
    shape: 'flat',
    properties,
    connectedLeg: width,
    outstandingLeg: 0,
    thickness,
    rootRadius: 0,
    offCentroid: thickness / 2,
  };
}

/** A round rod; bolted means threaded with a nut. */
export function rodOf(diameter: number): ResistingSection {
  const flat = flatOf(diameter, diameter);
  const area = (Math.PI / 4) * diameter * diameter;
  return { ...flat, shape: 'rod', properties: { ...flat.properties, area } };
}

/** A bolted end; the edge distance follows from the leg. */
export function boltedEnd(leg: number, given: Partial<ResistingEnd>): ResistingEnd {
  const end: ResistingEnd = {
    end: 'i',
    kind: 'bolted',
    bolts: 2,
    rows: 1,
    staggered: false,
    boltDiameter: 20,
    hole: 22,
    pitch: 70,
    endDistance: 40,
    gauge: 55,
    rowSpacing: 0,
    edgeDistance: 0,
    legs: 'one',
    boltGrade: '8.8',
    threadsInShear: true,
    weldLength: 0,
    weldSize: 6,
    gusset: 10,
    ...given,
  };
  return { ...end, edgeDistance: leg - end.gauge - end.rowSpacing };
}

export const weldedEnd = (leg: number, weldLength: number, given: Partial<ResistingEnd> = {}): ResistingEnd =>
  boltedEnd(leg, { kind: 'welded', weldLength, ...given });

export function questionOf(
  practice: PracticeId,
  section: ResistingSection,
  strength: { readonly fy: number; readonly fu: number },
  end: ResistingEnd,
  options: Partial<ResistanceOptions> = {},
): TensionQuestion {
  return {
    practice,
    section,
    steel: {
      grade: 'as given',
      ...strength,
      E: 200_000,
      G: 77_000,
      source: 'the test',
      confidence: 'from memory, sure',
    },
    ends: [
      { ...end, end: 'i' },
      { ...end, end: 'j' },
    ],
    options: { ...OPTIONS, ...options },
  };
}

/** The check of that kind, at end i. */
export function checkOf(question: TensionQuestion, kind: ResistanceKind): Resistance {
  const found = tensionResistances(question).find((each) => each.kind === kind && each.end !== 'j');
  if (!found) throw new Error(`no check of ${kind}`);
  return found;
}

/** kN. */
export function kN(question: TensionQuestion, kind: ResistanceKind): number {
  const { resistance, conditions } = checkOf(question, kind);
  if (resistance === null)
    throw new Error(
      `no ${kind}: ${conditions
        .filter(({ met }) => !met)
        .map(({ says, found }) => `${says} (${found})`)
        .join('; ')}`,
    );
  return resistance / 1000;
}

/** The value of the step with that symbol. */
export function stepOf({ steps }: Resistance, symbol: string): number {
  const step = steps.find((each) => each.symbol === symbol);
  if (!step) throw new Error(`no step ${symbol} among ${steps.map((each) => each.symbol).join(', ')}`);
  return step.value;
}
