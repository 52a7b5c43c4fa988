/**
 * What a bar and its ends resist by one design standard. N, mm, N/mm²; every result is plain data that carries its own working.
 * Rules come from memory or from secondary sources unless marked otherwise; each says how sure it is.
 */
import type { Confidence } from '../practice/model.ts';
import type { PracticeId } from '../project/model.ts';
import type { SectionProperties } from '../section/model.ts';

/** Yield stress, tensile strength and moduli, N/mm². */
export interface Steel {
  /** As the user wrote it: "S355JR". */
  readonly grade: string;
  readonly fy: number;
  readonly fu: number;
  readonly E: number;
  readonly G: number;
  /** Where fy and fu come from. */
  readonly source: string;
  readonly confidence: Confidence;
}

/** What the user may choose about a practice. Null takes what the practice recommends. */
export interface ResistanceOptions {
  /** AISC 360 only: load and resistance factors, or allowable strength. */
  readonly method: 'LRFD' | 'ASD';
  /** EN 1993 only. */
  readonly partialFactors: {
    readonly gammaM0: number | null;
    readonly gammaM1: number | null;
    readonly gammaM2: number | null;
  };
  /** EN 1993 only: block tearing of an angle by one leg taken as loaded off its middle (3.10) or through it (3.9). */
  readonly blockTearing: 'off the middle' | 'through the middle';
  /** Holes punched full size: some practices deduct more. */
  readonly punchedHoles: boolean;
  /** What the gusset gives the end of a strut: IS 800 Table 12. */
  readonly gussetFixity: 'fixed' | 'hinged';
}

/** A quantity says how a value is shown and in which unit. */
export type Quantity =
  | 'length'
  | 'area'
  | 'secondMoment'
  | 'torsion'
  | 'warping'
  | 'stress'
  | 'force'
  | 'ratio'
  | 'slenderness'
  | 'count'
  | 'factor';

/** One named intermediate value: "net area", "A_n", 718, area, "A_g − n d_h t". */
export interface Step {
  readonly name: string;
  /** As engineers write it, with _ before a subscript: "A_n", "λ̄_v", "φ". */
  readonly symbol: string;
  readonly value: number;
  readonly quantity: Quantity;
  /** In symbols; the screen puts the values beside it. Absent for what is given. */
  readonly formula?: string;
}

/** Something that must hold for the rule to apply: "at least two bolts at each end". */
export interface Condition {
  readonly says: string;
  readonly met: boolean;
  /** What is there, when it is not met: "one bolt at end i". */
  readonly found: string | null;
}

export type ResistanceKind =
  | 'gross yield'
  | 'net rupture'
  | 'block shear'
  | 'bolt shear'
  | 'bolt bearing'
  | 'weld'
  | 'compression, critical load'
  | 'compression, lengths by the practice'
  | 'compression, one leg';

/** One check: what is resisted and why. */
export interface Resistance {
  readonly kind: ResistanceKind;
  /** "Net section rupture, shear lag of one leg". */
  readonly title: string;
  readonly against: 'tension' | 'compression' | 'either';
  /** End of the bar it is about; null for the whole bar. */
  readonly end: 'i' | 'j' | null;
  /** Design resistance (or allowable, ASD), N; null where the rule gives none for what is there: `conditions` say why. */
  readonly resistance: number | null;
  readonly standard: string;
  /** "13.2(a)(iii)". */
  readonly clause: string;
  readonly confidence: Confidence;
  /** The rule is this practice's own; false where it is borrowed as an engineering choice, which `note` says. */
  readonly ownRule: boolean;
  readonly conditions: readonly Condition[];
  /** All conditions are met. A least distance of the end that is broken is told as one, and the resistance still stands. */
  readonly applies: boolean;
  /** In order of working; the last is the resistance itself. */
  readonly steps: readonly Step[];
  /** A caution in a sentence, or null. */
  readonly note: string | null;
}

/**
 * The shape as resistance needs it. Legs only for angles. Of a pair `properties` are those of both angles, thickness and legs those of one;
 * of a flat the connected leg is its width and the gauge is from one edge; of a tube the connected leg is its diameter or side and the thickness its wall;
 * of a rod the area alone counts in tension.
 */
export interface ResistingSection {
  readonly designation: string;
  readonly shape: SectionShape;
  readonly properties: SectionProperties;
  /** Outside length of the leg against the gusset (an angle), mm. */
  readonly connectedLeg: number;
  readonly outstandingLeg: number;
  readonly thickness: number;
  readonly rootRadius: number;
  /** From the face against the gusset to the centroid, mm. */
  readonly offCentroid: number;
  /** Plates of a shape that has no legs and is no tube, for whether they buckle before they yield; left out where they are not looked at. */
  readonly plates?: readonly Plate[];
}

/** A plate held along one edge (flange, stem) or along both (web). mm. */
export interface Plate {
  readonly name: 'flange' | 'web' | 'stem';
  /** Of an I or a tee half the flange, of a channel the whole; of a web what is clear between flanges; of a stem the whole depth. */
  readonly width: number;
  readonly thickness: number;
}

export type SectionShape =
  | 'angle'
  | 'angles back to back'
  | 'starred angles'
  | 'flat'
  | 'rod'
  | 'tee'
  | 'channel'
  | 'I section'
  | 'round tube'
  | 'square tube';

/** How one end is fixed, ready for the checks. mm. */
export interface ResistingEnd {
  readonly end: 'i' | 'j';
  /** Of a rod "bolted" means a thread and a nut. */
  readonly kind: 'bolted' | 'welded';
  /** All bolts, half of them through the other leg where both are held, and how many rows (gauge lines along a leg) they stand in. */
  readonly bolts: number;
  readonly rows: 1 | 2;
  /** Bolts of the second row stand half a pitch farther on. */
  readonly staggered: boolean;
  readonly boltDiameter: number;
  /** Made size of the hole, mm. */
  readonly hole: number;
  readonly pitch: number;
  /** From the last bolt to the end of the bar. */
  readonly endDistance: number;
  /** Heel to the (first) row; to the second from the first. */
  readonly gauge: number;
  readonly rowSpacing: number;
  /** From the row farther from the heel to the toe. */
  readonly edgeDistance: number;
  readonly legs: 'one' | 'both';
  readonly boltGrade: string;
  /** Threads in the plane of shear. */
  readonly threadsInShear: boolean;
  /** Length of each of two welds along the bar, and leg size of the weld. */
  readonly weldLength: number;
  readonly weldSize: number;
  readonly gusset: number;
}

export interface TensionQuestion {
  readonly practice: PracticeId;
  readonly section: ResistingSection;
  readonly steel: Steel;
  readonly ends: readonly [ResistingEnd, ResistingEnd];
  readonly options: ResistanceOptions;
}

export interface CompressionQuestion extends Omit<TensionQuestion, 'ends'> {
  /** Those that matter to an angle by one leg; empty for a member of the frame. */
  readonly ends: readonly ResistingEnd[];
  /** System length between the working points, mm. */
  readonly length: number;
  /** Unbraced lengths by the marks, K = 1, mm. */
  readonly unbraced: { readonly x: number; readonly y: number; readonly u: number; readonly v: number };
  /** Greatest length free to twist, mm. */
  readonly twistLength: number;
  /** Elastic critical load with the real holds, twist included where it counts, N; null where it was not found. */
  readonly criticalLoad: number | null;
  /** Bars of a truss in one plane, or of a lattice in space. */
  readonly system: 'planar' | 'space';
  /** Crossed and joined between its ends: one-leg rules then speak of the whole length between working points. */
  readonly joinedBetween: boolean;
  /** A load acts across it between its ends, own weight apart. Left out: none does. */
  readonly loadedAcross?: boolean;
  /** A plate is too slender to yield, and `steel` already has the yield stress that it allows. */
  readonly slenderPlate?: boolean;
  /** Of lengths that the user set by hand: the axis, and why. Left out: none is. */
  readonly lengthsByHand?: readonly { readonly axis: string; readonly reason: string }[];
}
