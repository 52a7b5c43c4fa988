/** A project set out: nodes, bars, crossings, with everything needed to draw them. Lengths mm, global coordinates, Z up. */
import type { StockAngle } from '../catalogue/model.ts';
import type { Vec3 } from '../geometry/vector.ts';
import type {
  BarMark,
  DiagonalSpec,
  EndConnection,
  Join,
  JoinKind,
  LineHolder,
  Member,
  RecipeKind,
  Role,
} from '../project/model.ts';

/** "W1/t1.rise": the bay's id, a slash, the bar's key inside the bay. Lasting. */
export type BarId = string;
/** "W1/t1.fall+t1.rise". Lasting. */
export type CrossingId = string;

export interface Layout {
  readonly bays: readonly BayLayout[];
  readonly nodes: ReadonlyMap<string, Node>;
  readonly bars: ReadonlyMap<BarId, Bar>;
  readonly crossings: ReadonlyMap<CrossingId, Crossing>;
}

export interface BayLayout {
  readonly id: string;
  readonly name: string;
  readonly kind: RecipeKind;
  readonly numberOff: number;
  readonly planes: readonly Plane[];
  readonly bars: readonly BarId[];
  /** Bars with lanes and a row in the schedule: diagonals, knees and ties, in order. */
  readonly diagonals: readonly BarId[];
  readonly crossings: readonly CrossingId[];
  readonly nodes: readonly string[];
  /** By the node's key inside the bay, the node that it goes by: another bay's where they have merged. */
  readonly nodeOf: ReadonlyMap<string, string>;
  readonly gussets: readonly Gusset[];
  readonly dimensions: readonly DimensionLine[];
}

/** Plane of a wall, of one slope, or of one pair of knees. `normal` points to the near side. */
export interface Plane {
  readonly id: string;
  readonly origin: Vec3;
  readonly right: Vec3;
  readonly up: Vec3;
  readonly normal: Vec3;
}

export interface Node {
  /** Id of the first bay's node at this place; nodes of other bays within 1 mm merge into it. */
  readonly id: string;
  readonly at: Vec3;
  readonly label: string;
  /** For each bay that takes this node as held in place: why it does. Of the others the bracing must hold it. */
  readonly supports: Readonly<Record<string, NodeSupport>>;
}

export type NodeSupport =
  | { readonly kind: 'foundation' }
  /** The foot of a wall that stands on another bay: held if that bay holds this node. */
  | { readonly kind: 'standing' }
  /** The eaves of a roof bay: held if the bays below hold this node; vouched for if there are none. */
  | { readonly kind: 'eaves' }
  | { readonly kind: 'vouched' };

export interface Bar {
  readonly id: BarId;
  readonly bay: string;
  readonly key: string;
  readonly role: Role;
  /** "D2" for diagonals, knees and ties; "P1" for purlins; the key otherwise. */
  readonly mark: string;
  readonly plane: string;
  /** Node ids. */
  readonly i: string;
  readonly j: string;
  readonly from: Vec3;
  readonly to: Vec3;
  /** Between set-out points, mm. */
  readonly length: number;
  /** Unit vector from i to j. */
  readonly direction: Vec3;
  /** Only for bars of angle: diagonals, knees, ties. */
  readonly angle: AngleBar | null;
  /** Only for the others; null too where a free bar names none. */
  readonly member: Member | null;
  /** Offset of a purlin's, rail's or other member's axis from the line of nodes, for drawing. */
  readonly offset: Vec3;
  /** For purlins and rails: what holds them along themselves, as the project says. */
  readonly line: LineInfo | null;
}

export interface LineInfo {
  readonly id: string;
  readonly heldBy: LineHolder;
  /** Id of a node of its own bay that the line runs through, or null. */
  readonly ownPanelPoint: string | null;
}

export interface AngleBar {
  /** The bay's diagonals with this bar's marks laid over. */
  readonly spec: DiagonalSpec;
  readonly mark: BarMark;
  readonly side: 'near' | 'far';
  readonly ends: { readonly i: EndConnection; readonly j: EndConnection };
  /** Null when the stock lists do not have the section. */
  readonly stock: StockAngle | null;
  readonly nearest: readonly string[];
  /** Degrees between the bar and the level (walls, knees) or the line of the eaves (roofs). */
  readonly inclination: number;
  readonly placement: Placement;
  readonly cut: CutLength;
  /** kg for one bar, all its pieces; null without a section. */
  readonly mass: number | null;
  readonly hand: Hand;
}

/** Where the section sits in space. `x` runs along the shorter leg and `y` along the longer, away from the heel. */
export interface Placement {
  readonly x: Vec3;
  readonly y: Vec3;
  /** Unit vectors of the directions "in plane, across the bar" and "out of plane". */
  readonly inPlane: Vec3;
  readonly outOfPlane: Vec3;
  /** From the set-out line to the heel line, mm. */
  readonly heel: Vec3;
  /** Gauge used: heel to the line of bolts, mm. */
  readonly gauge: number;
}

export interface CutLength {
  /** Steel begins this far from i, and ends this far from j, along the set-out line. */
  readonly startsAt: number;
  readonly endsBefore: number;
  /** Each piece from…to along the set-out line; one, or two when the bar is cut at a crossing. */
  readonly pieces: readonly { readonly from: number; readonly to: number }[];
  /** Sum of the pieces, mm. Not above zero: the ends take more than there is. */
  readonly total: number;
  /** Holes for crossings, measured from end A (i) of the steel, mm. */
  readonly holes: readonly { readonly crossing: CrossingId; readonly fromEndA: number }[];
}

/** Of a bar with unlike ends or an off-centre hole: which of the mirror pair it is; 'either' when turning it end for end gives the same. */
export type Hand = 'either' | 'left' | 'right';

export interface Crossing {
  readonly id: CrossingId;
  readonly bay: string;
  readonly key: string;
  /** Bars a and b; `a` is always a diagonal, knee or tie. */
  readonly a: BarId;
  readonly b: BarId;
  readonly kind: 'diagonals' | 'line' | 'member';
  readonly at: Vec3;
  /** From end i of each, mm. */
  readonly onA: number;
  readonly onB: number;
  /** Acute angle between the bars, degrees. */
  readonly angle: number;
  /** Between the parts that a join takes hold of, mm: what a packer must fill between two diagonals, a cleat to a purlin; below 0 they run into each other. */
  readonly gap: number;
  /** Both on one side, neither cut: they cannot both pass. */
  readonly clash: boolean;
  /** More between them than a join spans: whatever is marked holds nothing. */
  readonly tooFarApart: boolean;
  /** As marked; null: nothing was marked, taken as not joined. */
  readonly join: Join | null;
  /** The joins that make sense here. */
  readonly choices: readonly JoinKind[];
  /** Crossings within 1 mm of each other share a name. */
  readonly point: string;
}

export interface Gusset {
  readonly node: string;
  readonly plane: string;
  readonly corners: readonly Vec3[];
  readonly thickness: number;
  readonly normal: Vec3;
}

/** A set-out dimension to draw beside the bay. */
export interface DimensionLine {
  readonly from: Vec3;
  readonly to: Vec3;
  /** Unit vector in which the line stands off. */
  readonly away: Vec3;
  readonly value: number;
}
