/**
 * A project as kept in a file. Lengths mm, angles degrees (files and screens use words people type; core turns them to rad where it computes).
 * Everything else, forces, lengths, flags, is derived by `assess`, never stored.
 */
import type { CatalogueId, OwnAngle } from '../catalogue/model.ts';
import type { Vec3 } from '../geometry/vector.ts';
import type { Axis } from '../section/model.ts';
import type { Actions } from './actions.ts';

export const PROJECT_FORMAT = 'tautline-project';
export const PROJECT_VERSION = 1;

export interface Project {
  readonly format: typeof PROJECT_FORMAT;
  readonly version: typeof PROJECT_VERSION;
  readonly name: string;
  readonly settings: Settings;
  /** The user's own stock list. */
  readonly ownStock: readonly OwnAngle[];
  readonly bays: readonly Bay[];
  /** What acts on it; left out while nothing does. */
  readonly actions?: Actions;
}

export type UnitSystem = 'metric' | 'us';
export type PracticeId = 'sans10162' | 'csaS16' | 'aisc360' | 'en1993' | 'as4100' | 'is800';

export interface Settings {
  readonly practice: PracticeId;
  /** Which of the practice's classes of member applies, where it has several (IS 800). Null takes the practice's first. */
  readonly memberClass: string | null;
  /** A limit of the user's own for L/r; null takes the practice's, or 300 where it has none. */
  readonly ownLimit: number | null;
  readonly catalogue: CatalogueId;
  readonly units: UnitSystem;
  /** Sag under own weight is a finding over length / this. Null: not looked at. */
  readonly sagRatio: number | null;
  /** Unbraced lengths between set-out points, or between the centres of the end connections. */
  readonly lengthBasis: 'set-out' | 'connections';
  /** How the ends of diagonals turn; as a gusset lets them unless said: stiff in the plane, a hinge out of it. */
  readonly endFixity?: EndFixity;
  /** What the user chooses about resistances; what is left out goes by the practice. */
  readonly resistance?: ResistanceSettings;
  /** Grades of the user's own: yield stress and tensile strength, N/mm². */
  readonly ownGrades?: readonly OwnGrade[];
}

/** Turning about the normal of the plane, and about the line in the plane across the bar. */
export interface EndFixity {
  readonly inPlane: 'stiff' | 'hinged';
  readonly outOfPlane: 'stiff' | 'hinged';
}

export interface ResistanceSettings {
  /** AISC 360: load and resistance factors, or allowable strength. */
  readonly method?: 'LRFD' | 'ASD';
  /** EN 1993. */
  readonly gammaM0?: number;
  readonly gammaM1?: number;
  readonly gammaM2?: number;
  /** EN 1993: block tearing of an angle held by one leg. */
  readonly blockTearing?: 'off the middle' | 'through the middle';
  /** Holes punched full size. */
  readonly punchedHoles?: boolean;
  /** IS 800: what the gusset gives the end of a strut. */
  readonly gussetFixity?: 'fixed' | 'hinged';
}

export interface OwnGrade {
  readonly grade: string;
  readonly fy: number;
  readonly fu: number;
}

/** A bay takes its place by the origin of its own axes and a turn about the upright. */
export interface Place {
  readonly origin: Vec3;
  /** Degrees, anticlockwise seen from above; 0: the bay's width runs along X. */
  readonly turn: number;
}

export interface Bay {
  /** Short and lasting, as the user sees it: "W1". Letters, digits, hyphen, underscore. */
  readonly id: string;
  readonly name: string;
  readonly place: Place;
  /** How many such bays are built. */
  readonly numberOff: number;
  readonly recipe: Recipe;
  /** What every diagonal of the bay is, unless `bars` says otherwise. */
  readonly diagonals: DiagonalSpec;
  /** By the bar's key inside the bay ("t1.rise"). */
  readonly bars: Readonly<Record<string, BarMark>>;
  /** By the crossing's key inside the bay ("t1.fall+t1.rise"). A crossing without an entry is unmarked. */
  readonly joins: Readonly<Record<string, Join>>;
  /** Tension in one diagonal of a crossing over compression in the other, by the crossing's key; 0 where nothing is said, below 0 when both are compressed. */
  readonly tensionShares?: Readonly<Record<string, number>>;
}

export type Recipe = WallRecipe | RoofRecipe | KneeRecipe | FreeRecipe;
export type RecipeKind = Recipe['kind'];

/** crossed: two diagonals; rising/falling: one, up to the right/left; peaked: two meeting at the middle of the beam above; vee: at the middle below; open: none. */
export type Pattern = 'crossed' | 'rising' | 'falling' | 'peaked' | 'vee' | 'open';
export const PATTERNS: readonly Pattern[] = ['crossed', 'rising', 'falling', 'peaked', 'vee', 'open'];

/** A member that is not a diagonal. Struts and beams are checked for what squeezes them; the others are drawn to size. */
export interface Member {
  readonly name: string;
  readonly shape: 'I' | 'channel' | 'tube' | 'zed';
  readonly depth: number;
  readonly width: number;
  /** Of its web, or of the wall of a tube or a zed; taken at a usual proportion where it is left out. */
  readonly web?: number;
  readonly flange?: number;
  /** That of the bay's diagonals where it is left out. */
  readonly grade?: string;
}

export interface WallRecipe {
  readonly kind: 'wall';
  readonly width: number;
  /** From the ground up. */
  readonly tiers: readonly Tier[];
  readonly columns: Member;
  readonly beams: Member;
  /** Side rails across the bay, `at` above the base. */
  readonly lines: readonly Line[];
  readonly lineMember: Member;
}

export interface Tier {
  /** Lasting: "t1". Bars of the tier are keyed by it. */
  readonly id: string;
  readonly height: number;
  readonly pattern: Pattern;
}

/** A purlin or a side rail across a bay. */
export interface Line {
  /** Lasting: "P1". */
  readonly id: string;
  /** mm from the eaves up the slope, or from the base. */
  readonly at: number;
  readonly heldBy: LineHolder;
}

/** What stops a purlin or rail from moving along itself. A line through a panel point of its own bay is held there in any case. */
export type LineHolder =
  | { readonly kind: 'nothing' }
  /** Runs on to a panel point of another bay of the project. */
  | { readonly kind: 'bay'; readonly bay: string }
  /** A roof or wall diaphragm that the user vouches for. */
  | { readonly kind: 'vouched'; readonly reason: string };

export interface RoofRecipe {
  readonly kind: 'roof';
  /** Distance between the two rafters. */
  readonly width: number;
  /** One, or two meeting at the ridge. */
  readonly slopes: readonly Slope[];
  readonly rafters: Member;
  readonly struts: Member;
  readonly purlin: Member;
  /** Whether the strut along the eaves is there; likewise ridge. */
  readonly eavesStrut: boolean;
  readonly ridgeStrut: boolean;
}

export interface Slope {
  /** Lasting: "a", "b". */
  readonly id: string;
  /** Degrees above level. */
  readonly pitch: number;
  /** From the eaves up; `height` is measured along the slope. */
  readonly panels: readonly Tier[];
  readonly lines: readonly Line[];
}

export interface KneeRecipe {
  readonly kind: 'knee';
  /** Number of purlins that get knees, and their spacing along the chord. */
  readonly count: number;
  readonly spacing: number;
  /** From the lower chord or flange up to the purlins. */
  readonly drop: number;
  /** Degrees above level, 45 as a rule. */
  readonly angle: number;
  readonly sides: 'one' | 'both';
  readonly chord: Member;
  readonly purlin: Member;
}

export interface FreeRecipe {
  readonly kind: 'free';
  readonly nodes: readonly FreeNode[];
  readonly bars: readonly FreeBar[];
  /** Normal of the bay's plane; null takes the plane that fits the nodes best. */
  readonly normal: Vec3 | null;
}

export interface FreeNode {
  readonly id: string;
  readonly at: Vec3;
  /** Held in place by what is not drawn, as the user vouches. */
  readonly support: boolean;
}

export type Role =
  | 'column'
  | 'beam'
  | 'strut'
  | 'rafter'
  | 'purlin'
  | 'rail'
  | 'chord'
  | 'diagonal'
  | 'knee'
  | 'tie';

export interface FreeBar {
  readonly id: string;
  readonly from: string;
  readonly to: string;
  readonly role: Role;
  /** For bars that are not diagonals, knees or ties. */
  readonly member: Member | null;
}

export interface DiagonalSpec {
  /** Designation in the stock list. */
  readonly section: string;
  readonly grade: string;
  readonly countedOn: 'tension' | 'both';
  /** Which leg lies in the plane of the bay, against the gusset. */
  readonly legInPlane: 'longer' | 'shorter';
  /** Heel on the upper or the lower edge of the leg in the plane. */
  readonly heel: 'up' | 'down';
  /** Crossing diagonals on opposite faces of the gusset, or both on the near face. */
  readonly arrangement: 'opposite' | 'same side';
  readonly gusset: number;
  readonly ends: EndConnection;
  /** Of a pair of angles: how many battens or packs join them between the ends, evenly spaced; none unless said. */
  readonly battens?: number;
}

export interface EndConnection {
  readonly kind: 'bolted' | 'welded';
  readonly bolts: number;
  readonly boltDiameter: number;
  readonly pitch: number;
  /** From the last bolt to the end of the bar. */
  readonly endDistance: number;
  /** Heel to bolt line; null takes the usual one for the leg. */
  readonly gauge: number | null;
  readonly legs: 'one' | 'both';
  /** From the set-out point to the nearest bolt; of a welded end, to the end of the bar. */
  readonly setBack: number;
  readonly weldLength: number;
  /** Rows of bolts along the bar, 1 unless said; the second stands `rowSpacing` farther from the heel. */
  readonly rows?: 1 | 2;
  readonly rowSpacing?: number;
  /** The second row stands half a pitch farther on. */
  readonly staggered?: boolean;
  /** "8.8" unless said. */
  readonly boltGrade?: BoltGrade;
  /** Threads lie in the plane of shear; they do unless said. */
  readonly threadsInShear?: boolean;
  /** Leg of the fillet weld, mm; 6 unless said. */
  readonly weldSize?: number;
  /** Which movements of the bar across itself this end holds; both unless said. It holds the bar along itself in any case. */
  readonly holds?: EndHolds;
}

export const END_HOLDS = ['both', 'in plane only', 'out of plane only', 'nothing'] as const;
export type EndHolds = (typeof END_HOLDS)[number];

export const BOLT_GRADES = ['4.6', '8.8', '10.9', 'A325', 'A490'] as const;
export type BoltGrade = (typeof BOLT_GRADES)[number];

/** What differs from the bay's diagonals for one bar. */
export interface BarMark {
  /** The user's own mark, in place of D1, D2, … */
  readonly mark?: string;
  readonly section?: string;
  readonly grade?: string;
  readonly countedOn?: 'tension' | 'both';
  readonly legInPlane?: 'longer' | 'shorter';
  readonly heel?: 'up' | 'down';
  readonly side?: 'near' | 'far';
  /** Extra roll of the section about the bar, degrees. */
  readonly roll?: number;
  readonly endI?: Partial<EndConnection>;
  readonly endJ?: Partial<EndConnection>;
  readonly overrides?: readonly LengthOverride[];
}

/** The user's own unbraced length or factor for one axis, with the reason that every output shows. */
export interface LengthOverride {
  readonly axis: Axis;
  /** mm; null keeps the length found from the marks. */
  readonly length: number | null;
  /** Effective length factor K on it; 1 as a rule. */
  readonly factor: number;
  readonly reason: string;
}

export type Join =
  | { readonly kind: 'none' }
  | { readonly kind: 'bolted' }
  /** Thickness mm; null takes the gap found from the layout. */
  | { readonly kind: 'packed'; readonly packer: number | null }
  /** `cutBar` is the key of the bar that is cut, the other runs through. */
  | { readonly kind: 'cut'; readonly cutBar: string }
  | { readonly kind: 'welded' }
  /** To a purlin or rail; two bolts across hold twist too. */
  | { readonly kind: 'purlin'; readonly boltsAcross: 1 | 2 }
  | { readonly kind: 'hung' };
export type JoinKind = Join['kind'];
