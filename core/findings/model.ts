import type { BarId, CrossingId } from '../layout/model.ts';

export type FindingKind =
  | 'too slender in service'
  | 'too slender to handle'
  | 'crossing unmarked'
  | 'mark given twice'
  | 'names what is not there'
  | 'too far apart to join'
  | 'hold without a holder'
  | 'clash'
  | 'no partner'
  | 'beam takes the pull'
  | 'steep or flat'
  | 'out of the plane'
  | 'sag'
  | 'override in force'
  | 'section unknown'
  | 'no length left'
  | 'packer differs'
  | 'bay can move'
  | 'bar can move'
  | 'end held by nothing'
  | 'hold weaker than claimed'
  | 'rule unsafe here'
  | 'twist governs'
  | 'both diagonals squeezed'
  | 'loses support when the partner goes slack'
  | 'load on nothing'
  | 'turnings left out'
  | 'no way to carry a load'
  | 'reversed load not carried'
  | 'beam bends under the pull'
  | 'squeezed with no partner'
  | 'too stocky to go slack'
  | 'pretension lost'
  | 'moves far before it works'
  | 'resistance exceeded'
  | 'not checked'
  | 'end detail too small'
  | 'one bolt at an end'
  | 'battens too far apart'
  | 'squeezed off its middle'
  | 'strut too weak'
  | 'strut too slender'
  | 'strut not checked';

export type Severity = 'must fix' | 'look into' | 'note';

export interface Finding {
  /** Lasting while its cause lasts: kind and place. */
  readonly id: string;
  readonly kind: FindingKind;
  readonly severity: Severity;
  /** True when a limit that the practice or the user set is broken: the command line then ends with 1. */
  readonly breaksLimit: boolean;
  readonly bay: string;
  readonly bars: readonly BarId[];
  readonly crossing: CrossingId | null;
  readonly title: string;
  readonly detail: string;
  /** The figure that made it, and what it is held against; already without units for slenderness, mm for lengths. */
  readonly value: number | null;
  readonly limit: number | null;
  readonly quantity: 'slenderness' | 'length' | 'angle' | 'ratio' | 'none';
  /** Path in the project file, where one value is the cause. */
  readonly path: string | null;
}
