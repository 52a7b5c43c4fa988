import type { AngleOutline, SectionProperties } from '../section/model.ts';

export type CatalogueId = 'en' | 'us' | 'au';

/** One stock angle, ready to use. */
export interface StockAngle {
  /** As shown and as kept in project files, e.g. "70x70x6". */
  readonly designation: string;
  readonly catalogue: CatalogueId | 'own';
  readonly kind: 'equal' | 'unequal';
  readonly outline: AngleOutline;
  readonly properties: SectionProperties;
  /** Whether A, I and r come from the outline or are carried as published. */
  readonly basis: 'computed' | 'published';
  /** kg/m. */
  readonly massPerMetre: number;
  /**
   * Of a section carried as published, what its table prints of the major axis: second moment, mm⁴, and angle from axis x, rad. To read: `properties` has them from the
   * other printed figures, within the table's rounding, so that the radius in every direction agrees with the printed radii.
   */
  readonly printed?: { readonly Iu: number; readonly alpha: number };
}

/** A stock list with where its figures come from. Rows in the order of the source. */
export interface Catalogue {
  readonly id: CatalogueId;
  readonly name: string;
  readonly standard: string;
  readonly source: string;
  readonly angles: readonly StockAngle[];
}

export type Catalogues = Readonly<Record<CatalogueId, Catalogue>>;

/** A row of the user's own list: dimensions only is enough. Kept in the project, so that the file stands alone. */
export interface OwnAngle {
  readonly designation: string;
  readonly longLeg: number;
  readonly shortLeg: number;
  readonly thickness: number;
  readonly rootRadius: number;
  readonly toeRadius: number;
}

export type FoundAngle =
  | { readonly ok: true; readonly angle: StockAngle }
  /** Nearest designations by what was typed, at most five. */
  | { readonly ok: false; readonly typed: string; readonly nearest: readonly string[] };

/** The angles a project may use: its own list first, then its chosen catalogue, then the others. */
export interface Stock {
  /** Looks a designation up, tolerant of how people type ("L70×70×6", "70 x 70 x 6", "L3x3x1/4", "90x90x8EA"). */
  find(typed: string): FoundAngle;
  /** The angles that the shortlist tries: the project's own list and its chosen catalogue. */
  readonly choices: readonly StockAngle[];
}
