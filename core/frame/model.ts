/** A bay as an elastic frame in space. N, mm, rad; global coordinates. */
import type { Vec3 } from '../geometry/vector.ts';
import type { BarId } from '../layout/model.ts';

/** A point of the frame with three displacements and three rotations. */
export interface FrameNode {
  readonly name: string;
  readonly at: Vec3;
  /** Displaces with this node: bolts tie displacements, not rotations. Its own index when it displaces for itself. */
  readonly movesWith: number;
  /** Fixed in place and against turning. */
  readonly fixed: boolean;
  /**
   * In which it is solved for; global when left out. Those of the plane that holds it keep what does not give apart from what does, so that
   * a plane that lies askew in space costs no digits.
   */
  readonly axes?: NodeAxes;
}

/** Three unit vectors square to each other. */
export type NodeAxes = readonly [Vec3, Vec3, Vec3];

/** A straight prismatic piece of a bar between two nodes. */
export interface FrameElement {
  readonly bar: BarId;
  readonly i: number;
  readonly j: number;
  readonly length: number;
  readonly direction: Vec3;
  /** Unit vectors square to the bar in which it bends independently, p × q along the bar; EI against motion along each, N·mm². */
  readonly p: Vec3;
  readonly q: Vec3;
  readonly EIp: number;
  readonly EIq: number;
  readonly EA: number;
  readonly GJ: number;
  /** Rotations let free at an end, by the axis of turning. */
  readonly releases: readonly Release[];
  /** Axial force it carries already, tension positive, N: stiffens or softens its bending. */
  readonly tension: number;
}

export interface Release {
  readonly end: 'i' | 'j';
  readonly about: Vec3;
}

/** A stiffness from a node to the ground, or to another node, in one direction. */
export interface FrameSpring {
  readonly node: number;
  readonly other: number | null;
  readonly kind: 'displacement' | 'rotation';
  readonly direction: Vec3;
  readonly stiffness: number;
}

export interface Frame {
  readonly nodes: readonly FrameNode[];
  readonly elements: readonly FrameElement[];
  readonly springs: readonly FrameSpring[];
  /** Where along each bar its nodes stand: from end i, mm, with the node. */
  readonly along: ReadonlyMap<BarId, readonly NodeAlong[]>;
}

export interface NodeAlong {
  readonly at: number;
  readonly node: number;
}

/** Displacement of a node: three displacements, mm, and three rotations, rad. */
export type NodeMotion = readonly [number, number, number, number, number, number];

/** A way the frame can move without resistance. */
export interface Mechanism {
  /** Nodes that move, the one that moves most first, with the direction of their displacement; largest displacement 1. */
  readonly moving: readonly { readonly node: number; readonly displacement: Vec3 }[];
  /** Bars with an end that moves. */
  readonly bars: readonly BarId[];
}
