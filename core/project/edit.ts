/** Changes to a project as plain data: the store, the remedies and undo all speak this one language. */

import type { OwnAngle } from '../catalogue/model.ts';
import type { Carry, Combination, Load, LoadCase } from './actions.ts';
import type { BarMark, Bay, DiagonalSpec, Join, LineHolder, Place, Recipe, Settings } from './model.ts';

export type Edit =
  | { readonly kind: 'name project'; readonly name: string }
  | { readonly kind: 'settings'; readonly change: Partial<Settings> }
  | { readonly kind: 'own stock'; readonly rows: readonly OwnAngle[] }
  | { readonly kind: 'add bay'; readonly bay: Bay; readonly after: string | null }
  | { readonly kind: 'remove bay'; readonly bay: string }
  | {
      readonly kind: 'bay';
      readonly bay: string;
      readonly change: { readonly name?: string; readonly place?: Place; readonly numberOff?: number };
    }
  | { readonly kind: 'rename bay'; readonly bay: string; readonly to: string }
  | { readonly kind: 'recipe'; readonly bay: string; readonly recipe: Recipe; readonly what: string }
  | { readonly kind: 'diagonals'; readonly bay: string; readonly change: Partial<DiagonalSpec> }
  /** Null or undefined values in `change` are left as they are; `clear` names what goes back to the bay's. */
  | {
      readonly kind: 'bars';
      readonly bars: readonly string[];
      readonly change: BarMark;
      readonly clear?: readonly (keyof BarMark)[];
    }
  /** `join` null takes the mark away. Crossing ids as in the layout. */
  | { readonly kind: 'join'; readonly crossings: readonly string[]; readonly join: Join | null }
  /** Tension in one diagonal of a crossing over compression in the other; `crossing` is its key inside the bay, `share` null says nothing of it. */
  | {
      readonly kind: 'tension share';
      readonly bay: string;
      readonly crossing: string;
      readonly share: number | null;
    }
  | {
      readonly kind: 'line holder';
      readonly bay: string;
      readonly line: string;
      readonly heldBy: LineHolder;
    }
  /** Puts a case in the place of the one with its id, or at the end; null takes it away, and its factors with it. */
  | { readonly kind: 'load case'; readonly id: string; readonly loadCase: LoadCase | null }
  | { readonly kind: 'combination'; readonly id: string; readonly combination: Combination | null }
  /** All combinations at once, as a starting set gives them. */
  | { readonly kind: 'combinations'; readonly combinations: readonly Combination[] }
  | { readonly kind: 'load'; readonly loadCase: string; readonly id: string; readonly load: Load | null }
  /** Of one eaves of a roof bay; `to` null hands its forces to the ground. */
  | {
      readonly kind: 'carry';
      readonly from: string;
      readonly eaves: Carry['eaves'];
      readonly to: string | null;
    };
